import { blend, type Rgb } from '../cloths/cloth';
import { seededNoise } from '../renderer/noise';

/** A motif colours the cloth at (u, v) cm, over what is already in `out`. */
export type Motif = (u: number, v: number, out: Rgb) => void;

export const noise = seededNoise(31);
export const part = (x: number): number => x - Math.floor(x);

const set = (out: Rgb, colour: Rgb): void => {
  out[0] = colour[0];
  out[1] = colour[1];
  out[2] = colour[2];
};

/** Distance to an ellipse's rim as a share of its radius: below 1 is inside. */
export function leaf(
  x: number,
  y: number,
  cx: number,
  cy: number,
  lean: number,
  long: number,
  wide: number,
): number {
  const c = Math.cos(lean);
  const s = Math.sin(lean);
  const px = (x - cx) * c + (y - cy) * s;
  const py = (y - cy) * c - (x - cx) * s;
  return Math.hypot(px / long, py / wide);
}

/** Stripes along the warp: each with its place and width as shares of the repeat. */
export const stripes =
  (ground: Rgb, repeat: number, bars: readonly { from: number; to: number; colour: Rgb }[]): Motif =>
  (u, _v, out) => {
    const at = part(u / repeat);
    set(out, ground);
    for (const bar of bars) if (at >= bar.from && at < bar.to) set(out, bar.colour);
  };

/** A woven check: where bars cross the two colours mix. */
export const check =
  (ground: Rgb, repeat: number, bars: readonly { from: number; to: number; colour: Rgb }[]): Motif =>
  (u, v, out) => {
    set(out, ground);
    for (const at of [part(u / repeat), part(v / repeat)])
      for (const bar of bars) if (at >= bar.from && at < bar.to) blend(out, bar.colour, 0.55);
  };

interface SprigColours {
  ground: Rgb;
  stem: Rgb;
  petal: Rgb;
  heart: Rgb;
  dot: Rgb;
}

const LEAVES = [
  [0.62, 0.2, -0.7],
  [-0.5, 0.8, 0.75],
  [0.7, 1.3, -0.6],
  [-0.6, 1.7, 0.6],
  [-0.45, -0.2, 0.8],
] as const;

/** A five-petalled flower with its bud and leaves, half dropped, turned left and right by turns, over pin dots. */
export const floralPrint =
  (c: SprigColours, repeatAcross = 4.8, repeatDown = 6.2): Motif =>
  (u, v, out) => {
    set(out, c.ground);
    const column = Math.floor(u / repeatAcross);
    const shifted = v + (column & 1 ? repeatDown / 2 : 0);
    const row = Math.floor(shifted / repeatDown);
    const turn = (column + row) & 1 ? -1 : 1;
    const x = (u - (column + 0.5) * repeatAcross) * turn;
    const y = shifted - (row + 0.5) * repeatDown;
    const dotRow = Math.floor(u * 1.5);
    if (Math.hypot(part(u * 1.5) - 0.5, part(v * 1.5 + (dotRow & 1) * 0.5) - 0.5) < 0.09)
      blend(out, c.dot, 0.5);
    const stem = 0.32 * Math.sin(y * 1.1);
    if (Math.abs(x - stem) < 0.055 && y > -1 && y < 2.2) blend(out, c.stem, 0.9);
    for (const [lx, ly, lean] of LEAVES) {
      const inside = leaf(x, y, lx, ly, lean, 0.52, 0.18);
      if (inside < 1) blend(out, c.stem, inside < 0.8 ? 0.8 : 1);
    }
    flower(x - stem * 0.4 + 0.2, y + 1.5, 0.62, c, out);
    flower(x - 0.95, y + 0.6, 0.26, c, out);
    if (Math.hypot(x + 0.85, y + 0.35) < 0.2) blend(out, c.heart, 0.9);
  };

function flower(x: number, y: number, size: number, c: SprigColours, out: Rgb): void {
  const r = Math.hypot(x, y);
  const around = Math.atan2(y, x);
  const rim = size * (1 + 0.26 * Math.cos(around * 5));
  if (r >= rim) return;
  blend(out, c.petal, 0.95);
  if (r > rim - size * 0.17 || (Math.abs(Math.sin(around * 2.5)) < 0.12 && r > size * 0.3))
    blend(out, c.heart, 0.85);
  if (r < size * 0.32) blend(out, c.heart, 1);
}

/** A small woven sprig, drawn in whole picks as a loom must. */
export const wovenSprig =
  (ground: Rgb, stem: Rgb, bloom: Rgb, repeat = 3.6): Motif =>
  (u, v, out) => {
    const qu = Math.round(u * 24) / 24;
    const qv = Math.round(v * 24) / 24;
    set(out, ground);
    // A damask ground: the smallest lozenges, in the ground's own colour.
    if (Math.abs(part(qu * 1.6) - 0.5) + Math.abs(part(qv * 1.6) - 0.5) < 0.22)
      for (let i = 0; i < 3; i++) out[i] = out[i]! * 0.93;
    const column = Math.floor(qu / repeat);
    const x = qu - (column + 0.5) * repeat;
    const y = part((qv + (column & 1 ? repeat / 2 : 0)) / repeat) * repeat - repeat / 2;
    if (Math.abs(x - 0.12 * Math.sin(y * 3)) < 0.04 && y > -0.35 && y < 0.75) set(out, stem);
    for (const [lx, ly, lean] of [
      [0.24, 0.3, -0.7],
      [-0.24, 0.5, 0.7],
    ] as const)
      if (leaf(x, y, lx, ly, lean, 0.26, 0.09) < 1) set(out, stem);
    const r = Math.hypot(x, y + 0.5);
    if (r < 0.3 * (1 + 0.25 * Math.cos(Math.atan2(y + 0.5, x) * 5))) set(out, r < 0.1 ? stem : bloom);
  };

/** White embroidery on white: the stitches show by their shadow. `weight` 0–1 where there is a stitch. */
export const whiteworkSprig = (u: number, v: number, until: number, repeat = 7): number => {
  const column = Math.floor(u / repeat);
  const x = u - (column + 0.5) * repeat;
  const y = part((v + (column & 1 ? repeat / 2 : 0)) / repeat) * repeat - repeat / 2;
  // A sprig that would run into the border is not begun.
  if (v - y + 2.6 > until) return 0;
  const r = Math.hypot(x, y);
  if (r < 0.2) return 1;
  for (let i = 0; i < 5; i++) {
    const a = (i / 5) * 2 * Math.PI - Math.PI / 2;
    if (leaf(x, y, 0.52 * Math.cos(a), 0.52 * Math.sin(a), a, 0.27, 0.15) < 1) return 1;
  }
  if (y > 0.5 && y < 2.3 && Math.abs(x - 0.2 * Math.sin(y * 2)) < 0.06) return 1;
  return leaf(x, y, 0.45, 1.4, -0.6, 0.34, 0.13) < 1 || leaf(x, y, -0.3, 1.8, 0.7, 0.34, 0.13) < 1 ? 1 : 0;
};

/** A running vine with leaves and berries between two lines, 0–1 by stitch; `y` cm across its band. */
export function whiteworkVine(u: number, y: number, repeat = 8): number {
  const wave = 1.5 * Math.sin((u / repeat) * 2 * Math.PI);
  if (Math.abs(y - wave) < 0.08) return 1;
  const step = repeat / 4;
  const k = Math.round(u / step);
  const cx = k * step;
  const cy = 1.5 * Math.sin((cx / repeat) * 2 * Math.PI);
  for (const side of [1, -1]) {
    if (leaf(u, y, cx + 0.5, cy + side * 0.75, side * 0.9, 0.62, 0.22) < 1) return 1;
    if (Math.hypot(u - cx + 0.35, y - cy - side * 1.2) < 0.2) return 1;
  }
  return Math.abs(Math.abs(y) - 2.9) < 0.1 ? 1 : 0;
}
