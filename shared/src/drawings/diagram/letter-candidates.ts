import { placeAlong, type PathPlace } from '../geometry/path.js';
import { leftOf, stepped, type Point } from '../geometry/point.js';
import type { DrawnLine } from './drawn-line.js';
import type { LetterSheet } from './letter-sheet.js';

/** A place where a line's letter could stand. */
export interface LetterPlace {
  readonly at: Point;
  /** Where on its line the letter's leader ends, when it stands apart. */
  readonly leaderTo?: Point;
  readonly cost: number;
}

const ON_LINE = [0.5, 0.42, 0.58, 0.34, 0.66, 0.27, 0.73, 0.2, 0.8];
const BESIDE = [0.5, 0.35, 0.65, 0.2, 0.8];
const LEADER_FROM = [0.5, 0.25, 0.75];
const LEADER_ANGLES = 24;
const LEADER_REACHES = [14, 22, 32, 44, 58, 76];
/** A letter on its line must leave the arrowheads free. */
const ARROW_ROOM = 11;
/** With this many places near the line there is no need to look at leaders. */
const ENOUGH = 8;

/** All places allowed for one line's letter on an otherwise letterless sheet, the best first. */
export function candidatesFor(drawn: DrawnLine, sheet: LetterSheet, radius: number): LetterPlace[] {
  const near = allowed(
    [...onLine(drawn, radius), ...beside(drawn, radius), ...beyond(drawn, radius)],
    drawn,
    sheet,
  );
  const places = near.length >= ENOUGH ? near : [...near, ...allowed(onLeaders(drawn, radius), drawn, sheet)];
  return places.sort((a, b) => a.cost - b.cost);
}

interface Proposal extends LetterPlace {
  readonly onLine?: boolean;
}

function allowed(proposals: readonly Proposal[], drawn: DrawnLine, sheet: LetterSheet): LetterPlace[] {
  return proposals
    .filter(
      ({ at, onLine: sits }) =>
        sheet.holds(at) &&
        sheet.clearOfCaptions(at) &&
        (sits === true || sheet.clearOfOwnLine(at, drawn)) &&
        sheet.clearOfOtherLines(at, drawn),
    )
    .map(({ at, leaderTo, cost, onLine: sits }) => ({
      at,
      ...(leaderTo ? { leaderTo } : {}),
      cost:
        cost +
        sheet.inkUnder(at) * (sits === true ? 0.35 : 0.6) +
        (leaderTo ? 12 * sheet.linesUnder(at, leaderTo, drawn) : 0),
    }));
}

/** The longest stretch carries the letter. */
function placeOn({ stretches }: DrawnLine, share: number): PathPlace {
  const middle = stretches[Math.floor(stretches.length / 2)] ?? stretches[0]!;
  return placeAlong(middle, share);
}

function onLine(drawn: DrawnLine, radius: number): Proposal[] {
  if (drawn.length < 4.2 * radius + 16) return [];
  return ON_LINE.filter((share) => Math.min(share, 1 - share) * drawn.length > radius + ARROW_ROOM).map(
    (share) => ({
      at: placeOn(drawn, share).at,
      onLine: true,
      cost: Math.abs(share - 0.5) * 14,
    }),
  );
}

function beside(drawn: DrawnLine, radius: number): Proposal[] {
  return [4, 9].flatMap((gap) =>
    BESIDE.flatMap((share) => {
      const { at, direction } = placeOn(drawn, share);
      const cost = 14 + gap + Math.abs(share - 0.5) * 8;
      return [1, -1].map((side) => ({ at: stepped(at, leftOf(direction), side * (radius + gap)), cost }));
    }),
  );
}

function beyond(drawn: DrawnLine, radius: number): Proposal[] {
  return [5, 10].flatMap((gap) =>
    [0, 1].map((end) => {
      const { at, direction } = placeOn(drawn, end);
      return { at: stepped(at, direction, (end === 1 ? 1 : -1) * (radius + gap)), cost: 12 + gap };
    }),
  );
}

function onLeaders(drawn: DrawnLine, radius: number): Proposal[] {
  return LEADER_FROM.flatMap((share) => {
    const leaderTo = placeOn(drawn, share).at;
    return LEADER_REACHES.flatMap((reach) =>
      Array.from({ length: LEADER_ANGLES }, (_, index) => {
        const angle = (index / LEADER_ANGLES) * 2 * Math.PI;
        const at = stepped(leaderTo, [Math.cos(angle), Math.sin(angle)], radius + reach);
        return { at, leaderTo, cost: 34 + reach + Math.abs(share - 0.5) * 8 };
      }),
    );
  });
}
