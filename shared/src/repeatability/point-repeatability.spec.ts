import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { pointRepeatability, type Repeated } from './point-repeatability.js';

const by = (...readings: readonly (readonly [reader: string, valueMm: number])[]): Repeated =>
  readings.map(([reader, valueMm]) => ({ reader, valueMm }));
const twice = (firstMm: number, secondMm: number, second = 'b'): Repeated =>
  by(['a', firstMm], [second, secondMm]);

describe('the repeatability of a point', () => {
  it('holds each later reading against the first', () => {
    const found = pointRepeatability([by(['a', 612], ['b', 610], ['c', 613]), twice(588, 590)]);
    expect(found.pairs).toEqual([
      { meanMm: 611, differenceMm: -2 },
      { meanMm: 612.5, differenceMm: 1 },
      { meanMm: 589, differenceMm: 2 },
    ]);
    expect(found).toMatchObject({ n: 2, k: 3, byAnother: 3, meanDifferenceMm: 1 / 3 });
  });

  it('says when there is too little to go by', () => {
    expect(pointRepeatability([])).toMatchObject({
      ...{ n: 0, k: 0, temMm: null, percentTem: null, r: null, meanDifferenceMm: null, limitsMm: null },
      says: 'Nothing was read twice at this point yet.',
    });
    expect(pointRepeatability([twice(612, 610)])).toMatchObject({
      ...{ n: 1, temMm: null, r: null, limitsMm: null, meanDifferenceMm: -2 },
      says: 'Only one was read twice: nothing can be worked out from one. Every later reading is another reader’s.',
    });
    expect(pointRepeatability([twice(612, 610), twice(588, 590)]).says).toMatch(
      /^Only 2 were read twice: the next one may/,
    );
    const ten = Array.from({ length: 10 }, (_, index) => twice(600 + 10 * index, 601 + 10 * index));
    expect(pointRepeatability(ten).says).toBe(
      'From 10 read twice or more. Every later reading is another reader’s.',
    );
  });

  it('says whose hands are compared, and names nobody', () => {
    const own = [twice(612, 610, 'a'), twice(588, 590, 'a')];
    expect(pointRepeatability(own).says).toMatch(/Each by one reader: this shows how one hand repeats/);
    const mixed = pointRepeatability([...own, twice(655, 655)]);
    expect(mixed.says).toMatch(/Of 3 later readings 1 is another reader’s\.$/);
    expect(JSON.stringify(mixed)).not.toMatch(/"[ab]"|reader"/);
  });

  it('has no R where all that was read is alike, and no figure is ever infinite', () => {
    expect(pointRepeatability([twice(612, 612), twice(612, 612)])).toMatchObject({
      temMm: 0,
      percentTem: 0,
      r: null,
    });
    const readings = fc.array(fc.tuple(fc.constantFrom('a', 'b'), fc.integer({ min: 0, max: 6000 })), {
      maxLength: 4,
    });
    fc.assert(
      fc.property(fc.array(readings, { maxLength: 12 }), (measured) => {
        const found = pointRepeatability(measured.map((each) => by(...each)));
        const figures = [
          found.temMm,
          found.percentTem,
          found.r,
          found.meanDifferenceMm,
          found.limitsMm?.lower,
        ];
        for (const figure of figures)
          if (figure !== null && figure !== undefined) expect(figure).toSatisfy(Number.isFinite);
        expect(found.n).toBe(measured.filter((each) => each.length > 1).length);
        expect(found.says).toMatch(/\.$/);
      }),
    );
  });
});
