import { curve } from './numbers';
import type { Point } from './scene';

/** A cross-section of a figure: half its width, its depth before and behind its middle, and how square it is. */
export interface Station {
  /** Where it stands along the loft; its height unless said. */
  at?: number;
  y: number;
  half: number;
  front: number;
  back: number;
  /** How far the middle lies sideways and forward. */
  cx?: number;
  cz?: number;
  /** Superellipse exponent: 2 is an ellipse. */
  square?: number;
}

/** The point at station `s` and angle `theta` (0 the front, rising to the wearer's left), `lift` cm off the form. */
export type Loft = (s: number, theta: number, lift: number, p: Point) => void;

export function loft(stations: readonly Station[]): Loft {
  const rows = [...stations].sort((a, b) => (a.at ?? a.y) - (b.at ?? b.y));
  const through = (value: (row: Station) => number) =>
    curve(rows.map((row) => [row.at ?? row.y, value(row)] as const));
  const height = through((row) => row.y);
  const half = through((row) => row.half);
  const front = through((row) => row.front);
  const back = through((row) => row.back);
  const sideways = through((row) => row.cx ?? 0);
  const forward = through((row) => row.cz ?? 0);
  const square = through((row) => row.square ?? 2);
  return (s, theta, lift, p) => {
    const c = Math.cos(theta);
    const n = Math.sin(theta);
    const width = half(s);
    const depth = c > 0 ? front(s) : back(s);
    const power = 2 / square(s);
    const px = power === 1 ? n : Math.sign(n) * Math.pow(Math.abs(n), power);
    const pz = power === 1 ? c : Math.sign(c) * Math.pow(Math.abs(c), power);
    let nx = px / Math.max(width, 0.1);
    let nz = pz / Math.max(depth, 0.1);
    const length = Math.hypot(nx, nz) || 1;
    nx /= length;
    nz /= length;
    p.x = sideways(s) + width * px + nx * lift;
    p.y = height(s);
    p.z = forward(s) + depth * pz + nz * lift;
    p.nx = nx;
    p.ny = 0;
    p.nz = nz;
  };
}

/** Maps u 0–1 to angles at even steps of cloth round a loft at station `s`, the join at the back. */
export function evenRound(form: Loft, s: number): (u: number) => number {
  const steps = 1440;
  const p: Point = { x: 0, y: 0, z: 0, u: 0, v: 0, nx: 0, ny: 0, nz: 1 };
  const lengths = [0];
  let px = 0;
  let pz = 0;
  for (let i = 0; i <= steps; i++) {
    form(s, (i / steps - 0.5) * 2 * Math.PI, 0, p);
    if (i > 0) lengths.push(lengths[i - 1]! + Math.hypot(p.x - px, p.z - pz));
    px = p.x;
    pz = p.z;
  }
  const total = lengths[steps]!;
  return (u) => {
    const want = u * total;
    let low = 0;
    let high = steps;
    while (high - low > 1) {
      const middle = (low + high) >> 1;
      if (lengths[middle]! > want) high = middle;
      else low = middle;
    }
    const part = (want - lengths[low]!) / Math.max(1e-6, lengths[high]! - lengths[low]!);
    return ((low + part) / steps - 0.5) * 2 * Math.PI;
  };
}
