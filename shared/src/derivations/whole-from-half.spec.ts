import { describe, expect, it } from 'vitest';
import { read, rounds } from '../testing/sample-readings.js';
import { mm } from '../units/length.js';
import { deriveFromReadings } from './registry.js';

const wholes = (...readings: Parameters<typeof deriveFromReadings>[1]) =>
  deriveFromReadings('bodice', readings).filter(({ id }) => id.startsWith('whole-from-half'));

describe('the whole from a half', () => {
  it('shows the half that was read and its doubling', () => {
    const [elbow] = wholes(read('elbow', 320));
    expect(elbow).toMatchObject({
      id: 'whole-from-half:elbow',
      label: 'Elbow, whole',
      worked: '2 × 160 mm = 320 mm',
      figure: { type: 'length', length: mm(320) },
      trace: [{ pointId: 'elbow', label: 'Elbow, the half', value: mm(160) }],
    });
  });

  it('doubles the uncertainty with the figure', () => {
    const [elbow] = wholes(read('elbow', 320));
    const whole = elbow?.figure.type === 'length' ? elbow.figure.uncertaintyMm : 0;
    expect(elbow?.trace[0]?.uncertaintyMm).toBeCloseTo(Math.hypot(0.288675, 1), 5);
    expect(whole).toBeCloseTo(2 * Math.hypot(0.288675, 1), 5);
  });

  it('is shown for a round that was read flat, and for its mean', () => {
    const flat = { method: 'flat-doubled' } as const;
    expect(wholes(read('waist', 612, flat))[0]?.worked).toBe('2 × 306 mm = 612 mm');
    expect(wholes(...rounds('elbow', 320, 322))[0]?.worked).toBe('2 × 160.5 mm = 321 mm');
  });

  it('is not shown where any reading was of the whole', () => {
    expect(wholes(read('waist', 612))).toEqual([]);
    expect(wholes(read('waist', 612, { method: 'flat-doubled' }), read('waist', 613, { round: 2 }))).toEqual(
      [],
    );
  });

  it('says which side of a pair it was', () => {
    expect(wholes(read('elbow', 320, { worn: 'left' }))[0]?.trace[0]?.label).toBe(
      'Elbow, left, as worn, the half',
    );
  });
});
