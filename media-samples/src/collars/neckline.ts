import { mix } from '../renderer/numbers';

/** A neckline by angle: its heights in front, on the shoulders and behind. `curve` above 2 makes it squarer. */
export const neckline =
  (front: number, side: number, back: number, curve = 2) =>
  (theta: number): number => {
    const c = Math.cos(theta);
    return c > 0 ? mix(side, front, Math.pow(c, curve)) : mix(side, back, Math.pow(-c, curve));
  };
