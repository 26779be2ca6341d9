import { describe, expect, it } from 'vitest';
import { read } from '../testing/sample-readings.js';
import { mm } from '../units/length.js';
import { deriveFromReadings } from './registry.js';

const smallest = (...[kind, readings, context]: Parameters<typeof deriveFromReadings>) =>
  deriveFromReadings(kind, readings, context).find(({ id }) => id === 'smallest-girth');
const bodice = [read('waist', 630), read('inner-waist-band', 610)];

// The smaller waist governs the figure: common practice, and "Interpret and Display Historic Dress" on two-piece dresses.
describe('the smallest girth', () => {
  it('is often the band inside', () => {
    const found = smallest('bodice', bodice);
    expect(found?.worked).toBe('smallest of 630 mm, 610 mm = 610 mm: Inner waist band');
    expect(found?.figure).toMatchObject({ length: mm(610) });
  });

  it('may be that of another part, and says which', () => {
    const skirt = { kind: 'skirt', readings: [read('waistband', 590)] } as const;
    const found = smallest('bodice', bodice, { otherParts: [skirt] });
    expect(found?.worked).toBe('smallest of 630 mm, 610 mm, 590 mm = 590 mm: Waistband, skirt');
    expect(
      smallest('skirt', skirt.readings, { otherParts: [{ kind: 'bodice', readings: bodice }] })?.figure,
    ).toEqual(found?.figure);
  });

  it('leaves out what is worn beneath and is not shown with it', () => {
    const petticoat = { kind: 'petticoat', readings: [read('waistband', 500)] } as const;
    expect(smallest('bodice', bodice, { otherParts: [petticoat] })?.figure).toMatchObject({
      length: mm(610),
    });
  });

  it('says nothing of a single girth', () => {
    expect(smallest('skirt', [read('waistband', 590)])).toBeUndefined();
  });
});
