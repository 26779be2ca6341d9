import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { inTapeLengths, notTaken, read, rounds } from '../testing/sample-readings.js';
import { lengthOf, mm } from '../units/length.js';
import { acceptedValue, acceptedValues, acceptedValuesOn, meanOf } from './accepted-value.js';
import { notTakenReasonIds, notTakenReasons, type TakenReading } from './reading.js';
import { readingStep } from './reading-step.js';
import { rectangularMm, shownUncertainty, stepUncertaintyMm } from './uncertainty.js';

describe('the value of a point', () => {
  it('is the mean of its rounds, with their number and spread', () => {
    expect(acceptedValue(rounds('waist', 612, 613, 614), 'waist')).toMatchObject({
      value: mm(613),
      n: 3,
      spread: mm(2),
      tapeJoins: 0,
    });
  });

  it('is rounded once, half-up, at 0.0001 mm', () => {
    expect(meanOf([mm(1), mm(1), mm(2)])).toBe(mm('1.3333'));
    expect(meanOf([lengthOf(1), lengthOf(2)])).toBe(lengthOf(2));
  });

  it('leaves out what was corrected, what was not taken and other points', () => {
    const readings = [
      read('waist', 162, { stands: false }),
      read('waist', 612, { round: 2 }),
      notTaken('waist', 'too-fragile'),
      read('bust', 820),
    ];
    expect(acceptedValue(readings, 'waist')).toMatchObject({ value: mm(612), n: 1, spread: mm(0) });
    expect([...acceptedValues(readings).keys()]).toEqual(['waist', 'bust']);
  });

  it('does not exist where nothing was taken; zero is a value', () => {
    expect(acceptedValue([notTaken('hip', 'not-applicable')], 'hip')).toBeUndefined();
    expect(acceptedValue([], 'hip')).toBeUndefined();
    expect(acceptedValue([read('point-depth', 0)], 'point-depth')?.value).toBe(mm(0));
  });

  it('does not depend on the order of readings', () => {
    const readings = fc.array(
      fc.record({ value: fc.integer({ min: 0, max: 60_000_000 }), joins: fc.nat(3) }),
      { minLength: 1 },
    );
    fc.assert(
      fc.property(readings, fc.integer(), (facts, seed) => {
        const taken = facts.map(({ value, joins }, index) =>
          read('hem', 0, {
            round: index + 1,
            length: lengthOf(value),
            tapeLengths: { count: joins, tape: mm(1500), rest: mm(1) },
          }),
        );
        const shuffled = [...taken].sort((a, b) => ((a.round * seed) % 7) - ((b.round * seed) % 7));
        expect(acceptedValue(shuffled, 'hem')).toEqual(acceptedValue(taken, 'hem'));
        expect(acceptedValue([...taken].reverse(), 'hem')).toEqual(acceptedValue(taken, 'hem'));
      }),
    );
  });
});

describe('left and right, as worn', () => {
  const sleeves = [
    read('sleeve-outer', 600, { worn: 'left' }),
    read('sleeve-outer', 604, { worn: 'left', round: 2 }),
    read('sleeve-outer', 640, { worn: 'right' }),
  ];

  it('are two values, never averaged into a sleeve that does not exist', () => {
    expect(acceptedValue(sleeves, 'sleeve-outer', 'left')).toMatchObject({
      value: mm(602),
      n: 2,
      spread: mm(4),
      worn: 'left',
    });
    expect(acceptedValue(sleeves, 'sleeve-outer', 'right')).toMatchObject({
      value: mm(640),
      n: 1,
      spread: mm(0),
    });
  });

  it('have one that speaks for both: what has no side, else the right, else the left', () => {
    expect(acceptedValue(sleeves, 'sleeve-outer')).toMatchObject({ value: mm(640), n: 1, worn: 'right' });
    const left = sleeves.filter(({ worn }) => worn === 'left');
    expect(acceptedValue(left, 'sleeve-outer')).toMatchObject({ value: mm(602), worn: 'left' });
    const both = acceptedValue([...sleeves, read('sleeve-outer', 620)], 'sleeve-outer');
    expect(both).toMatchObject({ value: mm(620), n: 1 });
    expect(both).not.toHaveProperty('worn');
  });

  it('gather with the points that have no side, each on its own', () => {
    const readings = [...sleeves, read('across-back', 320)];
    const on = (side: 'left' | 'right') =>
      [...acceptedValuesOn(side, readings)].map(([id, { value }]) => [id, value]);
    expect(on('left')).toEqual([
      ['sleeve-outer', mm(602)],
      ['across-back', mm(320)],
    ]);
    expect(on('right')).toEqual([
      ['sleeve-outer', mm(640)],
      ['across-back', mm(320)],
    ]);
  });

  it('are the mean of readings of one side, whatever the order in which they came', () => {
    const reading = fc.record({
      worn: fc.constantFrom('left' as const, 'right' as const, undefined),
      valueMm: fc.integer({ min: 1, max: 3000 }),
    });
    fc.assert(
      fc.property(
        fc.array(reading, { minLength: 1, maxLength: 12 }),
        fc.infiniteStream(fc.nat()),
        (facts, keys) => {
          const taken = facts.map(({ worn, valueMm }, index): TakenReading =>
            read('cuff', valueMm, { round: index + 1, ...(worn ? { worn } : {}) }),
          );
          const shuffled = taken
            .map((one) => ({ one, key: keys.next().value ?? 0 }))
            .sort((first, second) => first.key - second.key)
            .map(({ one }) => one);
          const accepted = acceptedValue(taken, 'cuff');
          expect(acceptedValue(shuffled, 'cuff')).toEqual(accepted);
          const ofOneSide = taken.filter(({ worn }) => worn === accepted?.worn).map(({ length }) => length);
          expect(accepted?.value).toBe(meanOf(ofOneSide));
          expect(accepted?.n).toBe(ofOneSide.length);
        },
      ),
    );
  });
});

describe('a point that the museum made for itself', () => {
  const ownPoints = [{ id: 'own-sash', how: 'flat-doubled' as const }];

  it('is as sure as its own way of laying the tape', () => {
    const readings = [read('own-sash', 300)];
    const doubled = acceptedValue(readings, 'own-sash', undefined, ownPoints);
    expect(doubled?.uncertaintyMm).toBeCloseTo(2 * Math.hypot(0.288675, 1), 5);
    expect(acceptedValues(readings, ownPoints).get('own-sash')).toEqual(doubled);
    // Nobody knows it: it counts as laid along a curve, the less sure way.
    expect(acceptedValue(readings, 'own-sash')?.uncertaintyMm).toBeCloseTo(Math.hypot(0.288675, 2), 5);
  });
});

describe('the uncertainty of a value', () => {
  const uncertaintyOf = (...readings: Parameters<typeof acceptedValue>[0]): number | undefined =>
    acceptedValue(readings, readings[0]?.pointId ?? '')?.uncertaintyMm;

  // NIST TN 1297: half-width a of a rectangular distribution gives a ÷ √3.
  it('is a ÷ √3 for a reading step and for a half-range', () => {
    expect(stepUncertaintyMm(mm(1), 'straight')).toBeCloseTo(0.2887, 4);
    expect(stepUncertaintyMm(mm('3.175'), 'straight')).toBeCloseTo(0.9165, 4);
    expect(rectangularMm(mm('1.5'))).toBeCloseTo(0.866, 4);
  });

  it('joins step and method: 1 mm laid straight, 2 mm round or along a curve', () => {
    expect(uncertaintyOf(read('across-back', 320))).toBeCloseTo(Math.hypot(0.288675, 1), 5);
    expect(uncertaintyOf(read('waist', 612))).toBeCloseTo(Math.hypot(0.288675, 2), 5);
    expect(uncertaintyOf(read('armscye', 420))).toBeCloseTo(Math.hypot(0.288675, 2), 5);
  });

  it('counts a half twice', () => {
    expect(uncertaintyOf(read('elbow', 290))).toBeCloseTo(2 * Math.hypot(0.288675, 1), 5);
    expect(uncertaintyOf(read('waist', 612, { method: 'flat-doubled' }))).toBeCloseTo(
      2 * Math.hypot(0.288675, 1),
      5,
    );
  });

  it('grows by that of the gap, which was read by itself', () => {
    const closed = read('waist', 612, { gap: mm(28) });
    expect(uncertaintyOf(closed)).toBeCloseTo(Math.hypot(0.288675, 2, 0.288675, 1), 5);
    expect(uncertaintyOf(read('waist', 612, { gap: mm(0) }))).toBe(uncertaintyOf(read('waist', 612)));
  });

  it('adds 1 mm for each join of tape lengths', () => {
    expect(uncertaintyOf(inTapeLengths('hem', 3, 742))).toBeCloseTo(Math.hypot(0.288675, 2, Math.sqrt(3)), 5);
    expect(uncertaintyOf(inTapeLengths('hem', 3, 0))).toBeCloseTo(Math.hypot(0.288675, 2, Math.sqrt(2)), 5);
  });

  it('grows with the spread of the rounds, and does not shrink with their number', () => {
    expect(uncertaintyOf(...rounds('waist', 611, 614))).toBeCloseTo(Math.hypot(0.288675, 2, 0.866025), 5);
    expect(uncertaintyOf(...rounds('waist', 612, 612, 612, 612))).toBe(uncertaintyOf(read('waist', 612)));
  });

  it('is shown to a tenth of a millimetre, upwards', () => {
    expect(shownUncertainty(2.0207)).toBe(mm('2.1'));
    expect(shownUncertainty(2.0000000000000004)).toBe(mm(2));
    expect(shownUncertainty(0)).toBe(mm(0));
  });
});

describe('the step of a reading', () => {
  it.each([
    ['612', 'mm', '1'],
    ['612.5', 'mm', '0.1'],
    ['61', 'cm', '10'],
    ['61,5', 'cm', '1'],
    ['61.50', 'cm', '0.1'],
    ['24', 'in', '3.175'],
    ['24 1/2', 'in', '3.175'],
    ['24 3/16', 'in', '1.5875'],
    ['24.3', 'in', '2.54'],
  ] as const)('%s %s was read to %s mm', (typed, unit, step) => {
    expect(readingStep({ typed, unit })).toBe(mm(step));
  });

  it('is a whole millimetre at the table, where nothing else is said', () => {
    expect(readingStep({})).toBe(mm(1));
  });
});

describe('reasons', () => {
  it('each have words of their own', () => {
    expect(new Set(Object.values(notTakenReasons)).size).toBe(notTakenReasonIds.length);
  });
});
