import { buttons, row, seam } from '../diagram/layers.js';
import type { Layer } from '../diagram/model.js';
import type { Point } from '../geometry/point.js';

/** Which of the wearer's fronts lies on top when it is closed: women's right over left, men's left over right. */
export type FrontOnTop = 'right' | 'left';

export interface FrontFastening {
  readonly onTop: FrontOnTop;
  readonly count: number;
  /** Of the first and last fastening at the viewer's right, where the wearer's left front lies. */
  readonly from: Point;
  readonly to: Point;
  readonly holeLength: number;
  /** From the buttonholes' middle to the buttons', towards the edge (positive) or away from it. */
  readonly buttonsFurther?: number;
}

/**
 * The fastenings of a garment opened in front and laid with its lining up: buttonholes in the front that lies on
 * top, in the other the threads of the buttons on the outside. The wearer's right is at the viewer's left.
 */
export function fasteningsInside({
  onTop,
  count,
  from,
  to,
  holeLength,
  buttonsFurther = 0,
}: FrontFastening): Layer[] {
  const half = holeLength / 2;
  const side = onTop === 'left' ? 1 : -1;
  const places = row(count, from, to);
  const holes = places.map(([x, y]) =>
    seam(`${tenth(side * (x - half))},${tenth(y)}--${tenth(side * (x + half))},${tenth(y)}`, 'once'),
  );
  const threads = places.map(([x, y]): Point => [-side * (x + buttonsFurther), y]);
  return [...holes, buttons(threads, 1.8)];
}

const tenth = (value: number): number => Math.round(value * 10) / 10;
