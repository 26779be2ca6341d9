import type { Cloth } from '../cloths/cloth';

/** The same cloth cut away where `open` says so. The cut is made pixel by pixel, so that its edge is clean. */
export const cutAway = (cloth: Cloth, open: (u: number, v: number) => boolean): Cloth => ({
  ...cloth,
  cut: (u, v) => !open(u, v) && (cloth.cut?.(u, v) ?? true),
});

export interface Armhole {
  /** Angle and height of its middle, half its width in angle and half its height. */
  theta: number;
  y: number;
  wide: number;
  high: number;
}

/** Whether a place lies in either armhole. */
export const inArmhole = (hole: Armhole, theta: number, y: number): boolean => {
  const across = (Math.abs(theta) - hole.theta) / hole.wide;
  const up = (y - hole.y) / hole.high;
  return across * across + Math.abs(up * up * up) < 1;
};

/** The rim of an armhole: angle and height for t 0–1, on the wearer's left (1) or right (-1). */
export function armholeRim(hole: Armhole, side: 1 | -1): (t: number) => readonly [number, number] {
  return (t) => {
    const a = t * 2 * Math.PI;
    const up = Math.sign(Math.sin(a)) * Math.pow(Math.abs(Math.sin(a)), 2 / 3);
    return [side * (hole.theta + hole.wide * Math.cos(a)), hole.y + hole.high * up];
  };
}
