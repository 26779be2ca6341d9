import { allowedSpreadAt } from '../points/tolerance.js';
import { howTaken } from '../readings/accepted-value.js';
import type { TakenReading } from '../readings/reading.js';
import { absolute, isLonger, subtract, toMmString } from '../units/length.js';
import { sheetCheck } from './check.js';
import { type ReadPoint, readPoints } from './sheet-view.js';

export const transposedDigits = sheetCheck({
  id: 'transposed-digits',
  title: 'Two digits changed places',
  about:
    'Two rounds of one point, further apart than the house allows, whose figures differ by two neighbouring digits that changed places.',
  severity: 'question',
  messages: {
    swapped: '{point} reads {first} in one round and {second} in another. Did two digits change places?',
  },
  run: (sheet, raise) => {
    for (const read of readPoints(sheet)) {
      const pair = transposedPair(read);
      if (!pair) continue;
      const [first, second] = pair;
      raise('swapped', { point: read.mention, first: first.length, second: second.length });
    }
  },
});

/** The first two rounds that a change of places would make alike. */
export function transposedPair({
  point,
  readings,
}: Pick<ReadPoint, 'point' | 'readings'>): readonly [TakenReading, TakenReading] | undefined {
  for (const [index, first] of readings.entries()) {
    const second = readings.slice(index + 1).find((other) => isApart(point, first, other));
    if (second && changedPlaces(digitsOf(first), digitsOf(second))) return [first, second];
  }
  return undefined;
}

function isApart(point: ReadPoint['point'], first: TakenReading, second: TakenReading): boolean {
  if ((first.tapeLengths?.count ?? 0) !== (second.tapeLengths?.count ?? 0)) return false;
  const allowed = allowedSpreadAt({ ...point, how: howTaken(first, [point]) }, first.length);
  return isLonger(absolute(subtract(first.length, second.length)), allowed);
}

/** What was keyed; a reading that came without its text, by its value. */
function digitsOf({ typed, length }: TakenReading): string {
  return (typed ?? toMmString(length)).trim();
}

function changedPlaces(first: string, second: string): boolean {
  if (first.length !== second.length || !/^[\d.,]+$/.test(first)) return false;
  const at = [...first].findIndex((digit, index) => digit !== second.charAt(index));
  if (at < 0) return false;
  const swapped = first.slice(0, at) + first.charAt(at + 1) + first.charAt(at) + first.slice(at + 2);
  return swapped === second && /\d/.test(first.charAt(at)) && /\d/.test(first.charAt(at + 1));
}
