/** The repeatability of one measuring point, from every thing that was read at it more than once. */
import { limitsOfAgreement } from './agreement.js';
import { meanOfNumbers } from './spread.js';
import { percentTechnicalError, reliability, technicalError } from './technical-error.js';

/** A reading in the order in which it was taken. Who read it is only ever compared, never told. */
export interface RepeatedReading {
  readonly valueMm: number;
  readonly reader: string;
}

/** One thing, measured at one point two times or more. */
export type Repeated = readonly RepeatedReading[];

/** A later reading against the first. */
export interface ReadingPair {
  readonly meanMm: number;
  /** Later less first. */
  readonly differenceMm: number;
}

export interface PointRepeatability {
  /** How many things were read more than once. */
  readonly n: number;
  /** The most readings that one of them had. */
  readonly k: number;
  /** Of the pairs, how many had their later reading from somebody else. */
  readonly byAnother: number;
  readonly temMm: number | null;
  readonly percentTem: number | null;
  readonly r: number | null;
  readonly meanDifferenceMm: number | null;
  readonly limitsMm: { readonly lower: number; readonly upper: number } | null;
  readonly pairs: readonly ReadingPair[];
  /** How far the figures can be trusted, in words. */
  readonly says: string;
}

/** With fewer the figures move with every garment that is added. A house setting. */
const ENOUGH = 10;

export function pointRepeatability(measured: readonly Repeated[]): PointRepeatability {
  const repeated = measured.filter((readings) => readings.length > 1);
  const rows = repeated.map((readings) => readings.map(({ valueMm }) => valueMm));
  const pairs = repeated.flatMap(pairsOf);
  const byAnother = repeated.reduce((sum, readings) => sum + fromAnother(readings), 0);
  const temMm = technicalError(rows);
  const differences = pairs.map(({ differenceMm }) => differenceMm);
  const agreement = limitsOfAgreement(differences);
  return {
    n: rows.length,
    k: Math.max(0, ...rows.map((row) => row.length)),
    byAnother,
    temMm,
    percentTem: temMm === null ? null : percentTechnicalError(temMm, rows),
    r: temMm === null ? null : reliability(temMm, rows),
    meanDifferenceMm: meanOfNumbers(differences),
    limitsMm: agreement && rows.length > 1 ? { lower: agreement.lower, upper: agreement.upper } : null,
    pairs,
    says: inWords(rows.length, byAnother, pairs.length),
  };
}

function pairsOf([first, ...later]: Repeated): readonly ReadingPair[] {
  if (!first) return [];
  return later.map(({ valueMm }) => ({
    meanMm: (first.valueMm + valueMm) / 2,
    differenceMm: valueMm - first.valueMm,
  }));
}

function fromAnother([first, ...later]: Repeated): number {
  return later.filter(({ reader }) => reader !== first?.reader).length;
}

function inWords(n: number, byAnother: number, pairs: number): string {
  return [howMany(n), byWhom(n, byAnother, pairs)].filter(Boolean).join(' ');
}

function howMany(n: number): string {
  if (n === 0) return 'Nothing was read twice at this point yet.';
  if (n === 1) return 'Only one was read twice: nothing can be worked out from one.';
  if (n < ENOUGH) return `Only ${n} were read twice: the next one may change these figures much.`;
  return `From ${n} read twice or more.`;
}

function byWhom(n: number, byAnother: number, pairs: number): string {
  if (n === 0) return '';
  if (byAnother === 0) return 'Each by one reader: this shows how one hand repeats, not how two agree.';
  if (byAnother === pairs) return 'Every later reading is another reader’s.';
  return `Of ${pairs} later readings ${byAnother} ${byAnother === 1 ? 'is' : 'are'} another reader’s.`;
}
