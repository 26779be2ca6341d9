import { describe, expect, it } from 'vitest';
import type { GarmentKind } from '../points/kinds.js';
import { read } from '../testing/sample-readings.js';
import type { OtherPartRead } from './part-figures.js';
import { deriveFromReadings } from './registry.js';

const bodice: OtherPartRead = {
  kind: 'bodice',
  readings: [read('waist', 630), read('inner-waist-band', 610)],
};
const skirt: OtherPartRead = { kind: 'skirt', readings: [read('waistband', 640)] };
const easeOf = (kind: GarmentKind, readings: OtherPartRead['readings'], ...otherParts: OtherPartRead[]) =>
  deriveFromReadings(kind, readings, { otherParts }).filter(({ id }) => id.startsWith('ease-between-layers'));

describe('ease between layers', () => {
  it('is the same from either part’s sheet', () => {
    const [fromSkirt] = easeOf('skirt', skirt.readings, bodice);
    const [fromBodice] = easeOf('bodice', bodice.readings, skirt);
    expect(fromSkirt?.figure).toEqual(fromBodice?.figure);
    expect(fromSkirt?.worked).toBe(fromBodice?.worked);
    expect(fromSkirt?.trace.map(({ elsewhere }) => elsewhere)).toEqual([true, undefined]);
    expect(fromBodice?.trace.map(({ elsewhere }) => elsewhere)).toEqual([undefined, true]);
    expect(fromSkirt).toMatchObject({
      label: 'Ease, bodice over skirt',
      worked: '630 mm − 640 mm = −10 mm',
    });
    expect(fromSkirt?.trace.map(({ label }) => label)).toEqual(['Waist, bodice', 'Waistband, skirt']);
  });

  it('carries the uncertainty of both: √2 times that of one', () => {
    const [{ figure } = { figure: undefined }] = easeOf('skirt', skirt.readings, bodice);
    const one = Math.hypot(0.288675, 2);
    expect(figure?.type === 'length' && figure.uncertaintyMm).toBeCloseTo(Math.SQRT2 * one, 5);
  });

  it('is worked out for each top that belongs to a skirt', () => {
    const evening = { ...bodice, name: 'Evening bodice', readings: [read('waist', 600)] };
    const eases = easeOf('skirt', skirt.readings, { ...bodice, name: 'Day bodice' }, evening);
    expect(eases.map(({ id, label }) => [id, label])).toEqual([
      ['ease-between-layers', 'Ease, day bodice over skirt'],
      ['ease-between-layers:2', 'Ease, evening bodice over skirt'],
    ]);
  });

  it('needs both, and parts that go one over the other', () => {
    expect(easeOf('skirt', skirt.readings)).toEqual([]);
    expect(easeOf('skirt', skirt.readings, { kind: 'bodice', readings: [] })).toEqual([]);
    expect(easeOf('bodice', bodice.readings, { kind: 'petticoat', readings: skirt.readings })).toEqual([]);
  });
});
