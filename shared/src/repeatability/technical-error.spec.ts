import fc from 'fast-check';
import { sampleStandardDeviation } from 'simple-statistics';
import { describe, expect, it } from 'vitest';
import { limitsOfAgreement } from './agreement.js';
import { meanOfNumbers, sampleDeviation } from './spread.js';
import {
  percentTechnicalError,
  reliability,
  repeatabilityCoefficient,
  type Row,
  technicalError,
  withinMeanSquare,
} from './technical-error.js';

const paired = (first: readonly number[], second: readonly number[]): readonly Row[] =>
  first.map((value, index) => [value, second[index] ?? value]);
const differencesOf = (rows: readonly Row[]): readonly number[] =>
  rows.map(([first = 0, second = 0]) => first - second);
const sumOfSquares = (values: readonly number[]): number =>
  values.reduce((sum, value) => sum + value ** 2, 0);

// Peak expiratory flow, l/min, of seventeen people: Bland & Altman, Lancet 1986; i: 307–310, table 1.
const wrightFirst = [494, 395, 516, 434, 476, 557, 413, 442, 650, 433, 417, 656, 267, 478, 178, 423, 427];
const wrightSecond = [490, 397, 512, 401, 470, 611, 415, 431, 638, 429, 420, 633, 275, 492, 165, 372, 421];
const miniFirst = [512, 430, 520, 428, 500, 600, 364, 380, 658, 445, 432, 626, 260, 477, 259, 350, 451];

// Waists of ten study pieces, read by two: invented, and worked through by hand with the formulas below.
const waistsA = [612, 588, 655, 701, 634, 597, 622, 680, 645, 610];
const waistsB = [610, 590, 655, 698, 636, 597, 620, 682, 645, 613];

// Six targets, four judges: Shrout & Fleiss, Psychol Bull 86 (1979) 420–428, table 2.
const judged = [
  [9, 2, 5, 8],
  [6, 1, 3, 2],
  [8, 4, 6, 8],
  [7, 1, 2, 6],
  [10, 5, 6, 9],
  [6, 2, 4, 7],
];

describe('the technical error of measurement', () => {
  it('of seventeen pairs by one meter: Σd² 7966, TEM 15.3067, 3.4176 %, repeatability 42.428', () => {
    const rows = paired(wrightFirst, wrightSecond);
    expect(sumOfSquares(differencesOf(rows))).toBe(7966);
    const error = technicalError(rows) ?? 0;
    expect(error).toBeCloseTo(15.3067, 4);
    expect(error).toBeCloseTo(Math.sqrt(7966 / 34), 10);
    expect(percentTechnicalError(error, rows)).toBeCloseTo(3.4176, 4);
    expect(repeatabilityCoefficient(error)).toBeCloseTo(42.428, 3);
  });

  it('of ten waists: Σd² 38, TEM 1.3784, 0.21724 %, SD 35.0451, R 0.99845', () => {
    const rows = paired(waistsA, waistsB);
    expect(sumOfSquares(differencesOf(rows))).toBe(38);
    const error = technicalError(rows) ?? 0;
    expect(error).toBeCloseTo(1.3784, 4);
    expect(percentTechnicalError(error, rows)).toBeCloseTo(0.21724, 5);
    expect(sampleDeviation(rows.flat())).toBeCloseTo(35.0451, 4);
    expect(reliability(error, rows)).toBeCloseTo(0.99845, 5);
  });

  // TEM² = Σᵢ[ΣM² − (ΣM)² ÷ K] ÷ N(K − 1): Ulijaszek & Kerr, Br J Nutr 82 (1999) 165–177.
  it('of three readers is 1.5 exactly', () => {
    const rows = [
      [612, 610, 613],
      [588, 590, 590],
      [655, 655, 652],
      [701, 698, 700],
    ];
    expect(technicalError(rows)).toBe(1.5);
  });

  it('of four judges is the root of the mean square within: 6.26389, 2.50278; ICC 0.1657, 0.2898, 0.7148', () => {
    const within = withinMeanSquare(judged) ?? 0;
    expect(within).toBeCloseTo(6.26389, 5);
    expect(technicalError(judged)).toBeCloseTo(2.50278, 5);
    const [n, k] = [6, 4];
    const about = (values: readonly number[]): number => (sampleDeviation(values) ?? 0) ** 2;
    const between = k * about(judged.map((row) => meanOfNumbers(row) ?? 0));
    const judges = n * about([0, 1, 2, 3].map((at) => meanOfNumbers(judged.map((row) => row[at] ?? 0)) ?? 0));
    const residual = (within * n * (k - 1) - judges * (k - 1)) / ((n - 1) * (k - 1));
    expect((between - within) / (between + (k - 1) * within)).toBeCloseTo(0.1657, 4);
    const second = (between - residual) / (between + (k - 1) * residual + (k * (judges - residual)) / n);
    expect(second).toBeCloseTo(0.2898, 4);
    expect((between - residual) / (between + (k - 1) * residual)).toBeCloseTo(0.7148, 4);
  });

  it('has no value for fewer than two pieces, nor R where all readings are alike', () => {
    expect(technicalError([])).toBeNull();
    expect(technicalError([[612, 613]])).toBeNull();
    expect(technicalError([[612], [588]])).toBeNull();
    expect(
      reliability(0, [
        [612, 612],
        [612, 612],
      ]),
    ).toBeNull();
    expect(
      percentTechnicalError(0, [
        [0, 0],
        [0, 0],
      ]),
    ).toBeNull();
    expect(withinMeanSquare([[612]])).toBeNull();
  });

  it('of pairs is √(Σd² ÷ 2N), whichever of the two came first and in whatever order the pieces', () => {
    const pair = fc.tuple(fc.integer({ min: 1, max: 6000 }), fc.integer({ min: 1, max: 6000 }));
    fc.assert(
      fc.property(fc.array(pair, { minLength: 2, maxLength: 30 }), (rows) => {
        const error = technicalError(rows) ?? 0;
        expect(error).toBeCloseTo(Math.sqrt(sumOfSquares(differencesOf(rows)) / (2 * rows.length)), 6);
        const turned = rows.map(([first, second]): Row => [second, first]).reverse();
        expect(technicalError(turned)).toBeCloseTo(error, 6);
        const deviation = sampleDeviation(rows.flat()) ?? 0;
        expect(deviation).toBeCloseTo(sampleStandardDeviation(rows.flat()), 6);
        expect(reliability(error, rows) ?? 0).toBeLessThanOrEqual(1);
      }),
    );
  });
});

describe('limits of agreement', () => {
  it('of two meters: mean −2.1176, SD 38.7651, −78.097 to 73.862', () => {
    const agreement = limitsOfAgreement(differencesOf(paired(wrightFirst, miniFirst)));
    expect(agreement?.bias).toBeCloseTo(-2.1176, 4);
    expect(agreement?.deviation).toBeCloseTo(38.7651, 4);
    expect(agreement?.lower).toBeCloseTo(-78.097, 3);
    expect(agreement?.upper).toBeCloseTo(73.862, 3);
  });

  it('of ten waists: −4.2062 to 3.8062', () => {
    const agreement = limitsOfAgreement(differencesOf(paired(waistsA, waistsB)));
    expect(agreement?.lower).toBeCloseTo(-4.2062, 4);
    expect(agreement?.upper).toBeCloseTo(3.8062, 4);
  });

  it('need two differences', () => {
    expect(limitsOfAgreement([])).toBeNull();
    expect(limitsOfAgreement([2])).toBeNull();
    expect(limitsOfAgreement([2, 2])).toEqual({ bias: 2, deviation: 0, lower: 2, upper: 2 });
  });
});
