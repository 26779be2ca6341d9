import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { cutSheet, piece } from '../testing/sample-cut-sheets.js';
import { mm, subtract, sumOf } from '../units/length.js';
import { panelSum, panelWidths } from './panel-sum.js';
import { panelLevels } from './words.js';

const withWaists = (...widths: string[]) =>
  cutSheet({ pieces: widths.map((waist, index) => piece(`Panel ${index + 1}`, { widths: { waist } })) });

describe('the sum of panels', () => {
  it('is 8 mm over where each of eight panels is read 1 mm over (a practice of the trade, no source)', () => {
    const widths = ['82', '74', '66', '91', '91', '66', '74', '82'];
    const over = widths.map((width) => String(Number(width) + 1));
    const right = panelSum(withWaists(...widths), 'waist');
    const wrong = panelSum(withWaists(...over), 'waist');
    expect(right && wrong && subtract(wrong.sum, right.sum)).toBe(mm(8));
  });

  it('counts a piece that was cut twice twice, and one that comes to nothing as a panel of no width', () => {
    const sheet = cutSheet({
      pieces: [
        piece('Front', { count: 2, widths: { waist: '96', hem: '410' } }),
        piece('Gore', { count: 2, widths: { waist: '0', hem: '220' } }),
        piece('Back', { onFold: true, widths: { waist: '180', hem: '900' } }),
      ],
    });
    expect(panelSum(sheet, 'waist')).toMatchObject({ panels: 5, sum: mm(372), missing: [] });
    expect(panelSum(sheet, 'hem')).toMatchObject({ panels: 5, sum: mm(2160) });
    expect(panelSum(sheet, 'bust')).toBeUndefined();
  });

  it('names the panels that were read elsewhere but not here, and leaves out what does not go round', () => {
    const sheet = cutSheet({
      pieces: [
        piece('Front', { widths: { bust: '250', waist: '180' } }),
        piece('Side', { widths: { bust: '90' } }),
        piece('Collar'),
      ],
    });
    expect(panelSum(sheet, 'waist')?.missing).toEqual(['Side']);
    expect(panelSum(sheet, 'bust')?.missing).toEqual([]);
  });

  it('is that of the outside; of the lining where the outside was not read', () => {
    const lining = piece('Lining', { layer: 'lining', widths: { waist: '300' } });
    const mounted = piece('Back', { layer: 'outside-and-lining', widths: { waist: '310' } });
    const outside = piece('Front', { widths: { waist: '302' } });
    const stay = piece('Stay', { layer: 'interlining', widths: { waist: '50' } });
    expect(panelSum(cutSheet({ pieces: [lining, outside, mounted, stay] }), 'waist')?.sum).toBe(mm(612));
    expect(panelSum(cutSheet({ pieces: [lining, stay] }), 'waist')?.sum).toBe(mm(300));
  });

  it('is known less well with every panel, and less well where it was read in coarser steps', () => {
    const [two, four] = [withWaists('100', '100'), withWaists('100', '100', '100', '100')].map(
      (sheet) => panelSum(sheet, 'waist')?.uncertaintyMm ?? 0,
    );
    expect(four).toBeCloseTo(2 * (two ?? 0), 9);
    // A millimetre's laying and a millimetre's step, √(1² + 0.2887²) = 1.0408 a panel (NIST TN 1297, rectangular).
    expect(two).toBeCloseTo(2 * 1.0408, 3);
    const inInches = cutSheet({
      pieces: [{ ...piece('A'), widths: { waist: { typed: '4', unit: 'in' } } }],
    });
    expect(panelSum(inInches, 'waist')?.uncertaintyMm).toBeGreaterThan((two ?? 0) / 2);
  });

  const sheets = fc
    .array(
      fc.record({
        count: fc.integer({ min: 1, max: 8 }),
        widths: fc.record(
          Object.fromEntries(
            panelLevels.map((level) => [level, fc.integer({ min: 0, max: 1500 }).map(String)]),
          ),
        ),
      }),
      { minLength: 1, maxLength: 12 },
    )
    .map((pieces) => pieces.map((each, index) => piece(`Panel ${index}`, each)));

  it('does not depend on the order of the pieces', () => {
    fc.assert(
      fc.property(sheets, fc.constantFrom(...panelLevels), (pieces, level) => {
        const turned = panelSum(cutSheet({ pieces: [...pieces].reverse() }), level);
        expect(turned?.sum).toBe(panelSum(cutSheet({ pieces }), level)?.sum);
      }),
    );
  });

  it('is the sum of the widths, however the pieces are parted', () => {
    fc.assert(
      fc.property(sheets, fc.nat(12), (pieces, cut) => {
        const sumIn = (some: typeof pieces) =>
          sumOf(panelWidths(cutSheet({ pieces: some }), 'hem').map(({ width }) => width));
        const parted = sumOf([sumIn(pieces.slice(0, cut)), sumIn(pieces.slice(cut))]);
        expect(parted).toBe(panelSum(cutSheet({ pieces }), 'hem')?.sum);
      }),
    );
  });
});
