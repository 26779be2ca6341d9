/** Small arithmetic the pictures are drawn with. All lengths are centimetres, all angles radians. */

export const clamp = (x: number, low = 0, high = 1): number => (x < low ? low : x > high ? high : x);

export const mix = (a: number, b: number, t: number): number => a + (b - a) * t;

/** A smooth step: 0 before `from`, 1 after `to` (`from` may be the larger, which turns the step round). */
export function ease(from: number, to: number, x: number): number {
  const t = clamp((x - from) / (to - from));
  return t * t * (3 - 2 * t);
}

/** A bell of height 1 at `centre`; at `width` away it has fallen to 1/e. */
export const bell = (x: number, centre: number, width: number): number =>
  Math.exp(-((x - centre) * (x - centre)) / (width * width));

/** Slopes for a monotone cubic (Fritsch and Carlson, 1980): the curve never overshoots its own points. */
function slopesOf(xs: readonly number[], ys: readonly number[]): number[] {
  const last = xs.length - 1;
  const rises = Array.from({ length: last }, (_, i) => (ys[i + 1]! - ys[i]!) / (xs[i + 1]! - xs[i]!));
  return xs.map((_, i) => {
    if (i === 0) return rises[0]!;
    if (i === last) return rises[last - 1]!;
    const before = rises[i - 1]!;
    const after = rises[i]!;
    if (before * after <= 0) return 0;
    const limit = 3 * Math.min(Math.abs(before), Math.abs(after));
    const mean = (before + after) / 2;
    return Math.abs(mean) > limit ? Math.sign(mean) * limit : mean;
  });
}

/** A smooth curve through [x, y] points in rising x; level beyond both ends. */
export function curve(points: readonly (readonly [number, number])[]): (x: number) => number {
  const xs = points.map(([x]) => x);
  const ys = points.map(([, y]) => y);
  const slopes = slopesOf(xs, ys);
  const last = xs.length - 1;
  return (x) => {
    if (x <= xs[0]!) return ys[0]!;
    if (x >= xs[last]!) return ys[last]!;
    let i = 0;
    while (x > xs[i + 1]!) i++;
    const h = xs[i + 1]! - xs[i]!;
    const t = (x - xs[i]!) / h;
    const rest = 1 - t;
    return (
      rest * rest * ((1 + 2 * t) * ys[i]! + t * h * slopes[i]!) +
      t * t * ((3 - 2 * t) * ys[i + 1]! - rest * h * slopes[i + 1]!)
    );
  };
}

/** The same through evenly spaced values over 0–1. */
export const evenCurve = (values: readonly number[]): ((t: number) => number) =>
  curve(values.map((value, i) => [i / (values.length - 1), value] as const));
