import { describe, expect, it } from 'vitest';
import type { PanelledSheet } from '../cut-sheet/panel-sum.js';
import { mm, subtract } from '../units/length.js';
import type { DerivedValue } from './derivation.js';
import { deriveFromReadings } from './registry.js';

const sheetOf = (...widthsMm: readonly (number | null)[]): PanelledSheet => ({
  pieces: widthsMm.map((width, index) => ({
    name: `Panel ${index + 1}`,
    count: 1,
    layer: 'outside',
    widths: {
      ...{ bust: null, waist: null, hip: null },
      ...{ hem: width === null ? null : { typed: `${width}`, unit: 'mm', mm: `${width}` } },
      ...(width === null ? { waist: { typed: '80', unit: 'mm', mm: '80' } } : {}),
    },
  })),
});
const sumOf = (...widthsMm: readonly (number | null)[]): DerivedValue | undefined =>
  deriveFromReadings('skirt', [], { cutSheet: sheetOf(...widthsMm) }).find(
    ({ id }) => id === 'sum-of-panels:hem',
  );
const lengthOfSum = (sum: DerivedValue | undefined) =>
  sum?.figure.type === 'length' ? sum.figure : { length: mm(0), uncertaintyMm: 0 };

describe('the sum of panels', () => {
  it('is worked out with every width in the trace', () => {
    const sum = sumOf(400, 410, 405);
    expect(sum?.label).toBe('Sum of 3 panels, hem');
    expect(sum?.worked).toBe('400 mm + 410 mm + 405 mm = 1215 mm');
    expect(sum?.trace.map(({ label }) => label)).toEqual(['Panel 1', 'Panel 2', 'Panel 3']);
  });

  it('of eight panels each read 1 mm over is 8 mm over (a practice of the trade, no source)', () => {
    const right = lengthOfSum(sumOf(...Array.from({ length: 8 }, () => 420)));
    const over = lengthOfSum(sumOf(...Array.from({ length: 8 }, () => 421)));
    expect(subtract(over.length, right.length)).toBe(mm(8));
  });

  // JCGM 100:2008 (GUM), 5.2.2, note 1, from memory: inputs that are wholly correlated add their uncertainties; ten
  // resistors compared with one standard, each known to 100 mΩ, are together known to 1 Ω.
  it('adds the uncertainties of its panels one after the other', () => {
    const one = Math.hypot(0.288675, 1);
    expect(lengthOfSum(sumOf(...Array.from({ length: 10 }, () => 300))).uncertaintyMm).toBeCloseTo(
      10 * one,
      4,
    );
  });

  it('says nothing while a panel was left out, nor of a single one', () => {
    expect(sumOf(400, null, 405)).toBeUndefined();
    expect(sumOf(400)).toBeUndefined();
  });
});
