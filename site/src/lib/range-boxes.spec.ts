import { type LengthUnit, lengthUnits } from '@ellwand/shared/units/format-length';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { boxPoints, boxText, readBoxes } from './range-boxes';

const read = (text: string) => readBoxes(new URLSearchParams(text));

describe('the two boxes of a measuring range', () => {
  it('read inches with fractions into exact millimetres', () => {
    expect(read('typed=in&min.waist=22+1/2&max.waist=24')).toEqual({
      filters: [{ point: 'waist', minMm: '571.5', maxMm: '609.6' }],
      problems: [],
    });
  });

  it('take a comma, and a unit typed in the box before the box’s own', () => {
    expect(read('typed=cm&min.hem=310,5&max.hem=3400 mm').filters).toEqual([
      { point: 'hem', minMm: '3105', maxMm: '3400' },
    ]);
  });

  it('leave an end open, and leave the range out when both are', () => {
    expect(read('min.waist=560&max.waist=').filters).toEqual([{ point: 'waist', minMm: '560', maxMm: null }]);
    expect(read('min.waist=&max.waist=').filters).toEqual([]);
  });

  it('mean the same range when typed the wrong way round', () => {
    expect(read('min.waist=620&max.waist=560').filters[0]).toEqual({
      point: 'waist',
      minMm: '560',
      maxMm: '620',
    });
  });

  it('say in words what to write, in the unit of the box', () => {
    expect(read('typed=cm&min.waist=wide').problems).toEqual([
      {
        field: 'min.waist',
        typed: 'wide',
        sentence: '“wide” is not a length. Write centimetres, for example 56 or 56.5.',
      },
    ]);
  });

  it('ask which measurement is meant when a new range names none', () => {
    expect(read('new.point=&min.new=500').problems[0]?.field).toBe('new.point');
    expect(read('new.point=hip&min.new=900').filters).toEqual([{ point: 'hip', minMm: '900', maxMm: null }]);
  });

  it('never move a bound by showing it in another unit and sending it back untouched', () => {
    const bound = fc.integer({ min: 0, max: 60_000_000 }).map((units) => String(units / 10_000));
    fc.assert(
      fc.property(bound, fc.constantFrom<LengthUnit>(...lengthUnits), (minMm, unit) => {
        const form = new URLSearchParams({
          typed: unit,
          was: `waist:${minMm}..`,
          'min.waist': boxText(minMm, unit),
          'max.waist': '',
        });
        expect(readBoxes(form).filters).toEqual([{ point: 'waist', minMm, maxMm: null }]);
      }),
    );
  });

  it('find every range that a form names, once', () => {
    expect(boxPoints(new URLSearchParams('min.waist=1&max.waist=2&max.hem=3&q=min.x'))).toEqual([
      'waist',
      'hem',
    ]);
  });
});
