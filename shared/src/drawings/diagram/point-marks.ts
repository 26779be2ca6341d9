import { directionOn } from '../geometry/cubic.js';
import { endOf, pathData, startOf, type CubicPath } from '../geometry/path.js';
import { leftOf, stepped, type Point } from '../geometry/point.js';
import type { DrawnLine } from './drawn-line.js';
import type { LetterPlace } from './letter-candidates.js';
import type { SceneMark, ScenePath, ScenePoint } from './scene.js';

/** Pixels, the same at every size of sheet. */
const WIDTH = { line: 1.6, current: 2.4, halo: 4.4, behind: 0.9, leader: 0.9, hit: 24, tick: 1.5 } as const;
const ARROW = { length: 8, halfWidth: 3.1 } as const;
/** Under this length arrowheads would meet: ticks instead. */
const SHORTEST_WITH_ARROWS = 20;
const TICK_HALF = 4.5;
/** A broken line says: half, doubled. */
const DOUBLED_DASH = '5 3.4';
const STEP_DASH = '1.5 3';

export interface LetterStyle {
  /** Of the ring, its stroke included. */
  readonly radius: number;
  readonly size: number;
}

/** Everything painted for one measuring point, from the wide invisible path for the finger to the letter. */
export function pointMarks(
  drawn: DrawnLine,
  letter: { readonly text: string; readonly place: LetterPlace | undefined },
  style: LetterStyle,
  current: boolean,
): ScenePoint {
  const { pointId, view } = drawn.line;
  const marks = [...lineMarks(drawn, current), ...letterMarks(drawn, letter, style, current)];
  return {
    type: 'point',
    pointId,
    letter: letter.text,
    view,
    current,
    marks: marks.map((mark) => ({ ...mark, pointId })),
  };
}

function lineMarks(drawn: DrawnLine, current: boolean): SceneMark[] {
  const whole = drawn.stretches.map((path) => pathData(path)).join('');
  const path = (role: ScenePath['role'], d: string, strokeWidth: number, dash?: string): ScenePath => ({
    type: 'path',
    role,
    d,
    strokeWidth,
    ...(dash === undefined ? {} : { dash }),
  });
  return [
    path('hit', whole, WIDTH.hit),
    ...(drawn.behind ? [path('behind', pathData(drawn.behind), WIDTH.behind)] : []),
    ...drawn.steps.map(([a, b]) => path('step', `M${at(a)}L${at(b)}`, WIDTH.behind, STEP_DASH)),
    path('halo', whole, WIDTH.halo),
    path(
      current ? 'line-current' : 'line',
      whole,
      current ? WIDTH.current : WIDTH.line,
      drawn.line.way === 'doubled' ? DOUBLED_DASH : undefined,
    ),
    ...endMarks(drawn),
  ];
}

function endMarks({ stretches, length }: DrawnLine): ScenePath[] {
  const first = stretches[0]!;
  const last = stretches.at(-1)!;
  const ends = [
    { tip: startOf(first), outward: outwardAtStart(first) },
    { tip: endOf(last), outward: directionOn(last.at(-1)!, 1) },
  ];
  return ends.map(({ tip, outward }) =>
    length < SHORTEST_WITH_ARROWS
      ? { type: 'path', role: 'line', d: tickData(tip, outward), strokeWidth: WIDTH.tick }
      : { type: 'path', role: 'arrow', d: arrowData(tip, outward), strokeWidth: 0 },
  );
}

function outwardAtStart(path: CubicPath): Point {
  const [x, y] = directionOn(path[0]!, 0);
  return [-x, -y];
}

function arrowData(tip: Point, outward: Point): string {
  const base = stepped(tip, outward, -ARROW.length);
  const left = stepped(base, leftOf(outward), ARROW.halfWidth);
  const right = stepped(base, leftOf(outward), -ARROW.halfWidth);
  return `M${at(tip)}L${at(left)}L${at(right)}Z`;
}

function tickData(tip: Point, outward: Point): string {
  return `M${at(stepped(tip, leftOf(outward), TICK_HALF))}L${at(stepped(tip, leftOf(outward), -TICK_HALF))}`;
}

/** A ring with the letter; a second ring inside says that the tape goes all round. */
function letterMarks(
  drawn: DrawnLine,
  { text, place }: { readonly text: string; readonly place: LetterPlace | undefined },
  { radius, size }: LetterStyle,
  current: boolean,
): SceneMark[] {
  if (!place || text === '') return [];
  const [cx, cy] = [tenth(place.at[0]), tenth(place.at[1])];
  const round = drawn.line.way === 'round';
  const strokeWidth = round ? 1 : 1.3;
  const marks: SceneMark[] = [];
  if (place.leaderTo) {
    const d = `M${at(place.leaderTo)}L${at(place.at)}`;
    marks.push({ type: 'path', role: 'leader', d, strokeWidth: WIDTH.leader });
  }
  const role = current ? 'ring-current' : 'ring';
  marks.push({ type: 'circle', role, cx, cy, r: tenth(radius - strokeWidth / 2), strokeWidth });
  if (round)
    marks.push({
      type: 'circle',
      role: current ? 'inner-ring-current' : 'inner-ring',
      cx,
      cy,
      r: tenth(radius - 3),
      strokeWidth: 0.9,
    });
  const fitted = (text.length > 1 ? size - 2 : size) - (round ? 0.5 : 0);
  marks.push({
    type: 'text',
    role: current ? 'letter-current' : 'letter',
    x: cx,
    y: tenth(cy + fitted * 0.36),
    size: fitted,
    text,
  });
  return marks;
}

const tenth = (value: number): number => Math.round(value * 10) / 10;
const at = ([x, y]: Point): string => `${tenth(x)} ${tenth(y)}`;
