import { pathLength, placeAlong } from '../geometry/path.js';
import { distance, distanceToSegment, type Point } from '../geometry/point.js';
import type { DrawnLine } from './drawn-line.js';
import { candidatesFor, type LetterPlace } from './letter-candidates.js';
import { CLEAR_OF_LETTERS, type LetterSheet } from './letter-sheet.js';

const IMPROVING_PASSES = 6;

/**
 * Finds a place for every line's letter. The hard rules (clear of other lines, of other letters, within the
 * sheet) are never bent: a line for which nothing is left keeps `undefined`. The line with fewest places
 * chooses first; then each in turn may move to a better one.
 */
export function placeLetters(
  lines: readonly DrawnLine[],
  sheet: LetterSheet,
  radius: number,
): (LetterPlace | undefined)[] {
  const candidates = lines.map((line) => candidatesFor(line, sheet, radius));
  const order = lines.map((_, index) => index).sort((a, b) => candidates[a]!.length - candidates[b]!.length);
  const chosen = new Array<LetterPlace | undefined>(lines.length).fill(undefined);
  for (let pass = 0; pass <= IMPROVING_PASSES; pass++) {
    for (const index of order) {
      const others = chosen.filter(
        (place, other): place is LetterPlace => other !== index && place !== undefined,
      );
      const best = candidates[index]!.find((place) =>
        others.every((other) => goTogether(place, other, sheet, radius)),
      );
      if (best) chosen[index] = best;
      else if (pass > 0 && !chosen[index]) makeRoom(index, candidates, chosen, sheet, radius);
    }
  }
  return chosen;
}

const ON_ITS_LINE = [0.5, 0.42, 0.58, 0.34, 0.66, 0.26, 0.74, 0.18, 0.82];

/**
 * Where a letter goes for which the rules leave no place, as may happen with a line that was not drawn for this
 * sheet: on its own line, clear of the other letters if anywhere. Rather crowded than without a letter.
 */
export function crowdedPlace(
  { stretches }: DrawnLine,
  others: readonly (LetterPlace | undefined)[],
  radius: number,
): LetterPlace {
  const longest = stretches.reduce((best, path) => (pathLength(path) > pathLength(best) ? path : best));
  const places = ON_ITS_LINE.map((share) => placeAlong(longest, share).at);
  const free = places.find((at) =>
    others.every((other) => !other || distance(other.at, at) >= 2 * radius + CLEAR_OF_LETTERS),
  );
  return { at: free ?? placeAlong(longest, 0.5).at, cost: 0 };
}

/** Sends one neighbour elsewhere when that alone frees a place. */
function makeRoom(
  index: number,
  candidates: readonly (readonly LetterPlace[])[],
  chosen: (LetterPlace | undefined)[],
  sheet: LetterSheet,
  radius: number,
): void {
  for (const place of candidates[index]!) {
    const inTheWay = chosen.flatMap((other, at) =>
      other && at !== index && !goTogether(place, other, sheet, radius) ? [at] : [],
    );
    const [neighbour] = inTheWay;
    if (inTheWay.length !== 1 || neighbour === undefined) continue;
    const rest = [place, ...chosen.filter((other, at): other is LetterPlace => !!other && at !== neighbour)];
    const elsewhere = candidates[neighbour]!.find((option) =>
      rest.every((other) => goTogether(option, other, sheet, radius)),
    );
    if (!elsewhere) continue;
    chosen[neighbour] = elsewhere;
    chosen[index] = place;
    return;
  }
}

function goTogether(a: LetterPlace, b: LetterPlace, sheet: LetterSheet, radius: number): boolean {
  return sheet.clearOfLetter(a.at, b.at) && leaderPasses(a, b.at, radius) && leaderPasses(b, a.at, radius);
}

const leaderPasses = ({ at, leaderTo }: LetterPlace, letter: Point, radius: number): boolean =>
  leaderTo === undefined || distanceToSegment(letter, at, leaderTo) >= radius + 2;
