import { absolute, isLonger, mm, subtract, times, toMm } from '../units/length.js';
import { check } from './check.js';

/** Hoops are not quite ellipses, and give under the hand: a tenth is allowed. A house setting. */
const PARTS = 10;

export const hoopAgainstEllipse = check({
  id: 'hoop-against-ellipse',
  title: 'Hoop that does not fit its width and depth',
  about: 'A base hoop whose round differs by more than a tenth from the ellipse of its width and depth.',
  severity: 'question',
  needs: {
    round: ['crinoline-base-round'],
    depth: ['crinoline-base-depth'],
    width: ['crinoline-base-width'],
  },
  messages: {
    differs:
      'The base hoop reads {round} round, but an ellipse {depth} deep and {width} wide is {ellipse} round. Did the hoop stand free?',
  },
  run: ({ round, depth, width }, raise) => {
    const ellipse = mm(Math.round(ellipseRound(toMm(depth.value) / 2, toMm(width.value) / 2)));
    if (!isLonger(times(absolute(subtract(round.value, ellipse)), PARTS), ellipse)) return;
    raise('differs', { round, depth, width, ellipse });
  },
});

/** Ramanujan's second approximation (1914) of the perimeter of an ellipse of half axes `a` and `b`. */
export function ellipseRound(a: number, b: number): number {
  if (a + b === 0) return 0;
  const h = ((a - b) / (a + b)) ** 2;
  return Math.PI * (a + b) * (1 + (3 * h) / (10 + Math.sqrt(4 - 3 * h)));
}
