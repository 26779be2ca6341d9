import type { Cloth } from '../cloths/cloth';
import { thetaOf } from '../bodices/bodice';
import type { Noise } from '../renderer/noise';
import { mix } from '../renderer/numbers';
import type { Layer, Scene } from '../renderer/scene';

export interface Belt {
  upper: number;
  lower: number;
  /** Radii at its middle, cm: width, before and behind. */
  half: number;
  front: number;
  back: number;
  /** Crushed into folds, as a sash is. */
  folds?: number;
}

/** A belt or sash round the waist. */
export function layBelt(scene: Scene, noise: Noise, belt: Belt, cloth: Cloth): Layer {
  const middle = (belt.upper + belt.lower) / 2;
  const layer: Layer = (u, v, lift, p) => {
    const theta = thetaOf(u);
    const y = mix(belt.upper, belt.lower, v);
    const crush =
      (belt.folds ?? 0) *
      (noise.fold(v * 4 + 0.5 * noise.at(Math.cos(theta) * 2 + 4, Math.sin(theta) * 2 + v), 3) - 0.5);
    const off = 0.16 * Math.abs(y - middle) + 0.2 * Math.sin(v * Math.PI) + crush + lift;
    const s = Math.sin(theta);
    const c = Math.cos(theta);
    p.x = (belt.half + off) * s;
    p.y = y + 0.25 * noise.at(Math.cos(theta) + 3, Math.sin(theta) + 3);
    p.z = ((c > 0 ? belt.front : belt.back) + off) * c;
    p.nx = s;
    p.ny = 0;
    p.nz = c;
    p.u = u * 70;
    p.v = v * (belt.upper - belt.lower);
  };
  scene.layLayer({ cloth, across: 600, along: belt.folds ? 90 : 40, closed: true }, layer);
  return layer;
}

/** A rounded square buckle in front, its sides `wide` and `high` from its middle, cm. */
export function layBuckle(
  scene: Scene,
  at: { y: number; z: number },
  wide: number,
  high: number,
  cloth: Cloth,
): void {
  scene.lay({ cloth, across: 120, along: 16, closed: true }, (u, v, p) => {
    const a = u * 2 * Math.PI;
    const q = v * 2 * Math.PI;
    const squared = (x: number): number => Math.sign(x) * Math.pow(Math.abs(x), 0.35);
    const x = squared(Math.cos(a)) * wide;
    const y = squared(Math.sin(a)) * high;
    const thick = 1 + (0.34 * Math.cos(q)) / Math.hypot(x, y);
    p.x = x * thick;
    p.y = at.y + y * thick;
    p.z = at.z + 0.3 * Math.sin(q) - 0.05 * x * x;
    p.u = 0.4;
    p.v = a;
  });
}

/** A bow of ribbon: two loops, a knot and two tails, about `size` cm to a loop. */
export function layBow(
  scene: Scene,
  at: readonly [number, number, number],
  size: number,
  cloth: Cloth,
  tails = 1.6,
): void {
  const [x0, y0, z0] = at;
  for (const side of [-1, 1]) {
    scene.lay({ cloth, across: 90, along: 70 }, (u, v, p) => {
      const a = u * 2 * Math.PI;
      const width =
        size * 0.34 * (0.35 + 0.65 * Math.sin(Math.min(1, (1 - Math.cos(a)) / 2 + 0.1) * Math.PI * 0.5));
      p.x = x0 + side * size * 0.5 * (1 - Math.cos(a));
      p.y =
        y0 +
        (v - 0.5) * 2 * width +
        size * 0.06 * Math.sin(v * 9 + a) -
        0.12 * size * (1 - Math.cos(a)) * 0.5;
      p.z = z0 + 0.3 + size * 0.22 * Math.sin(a) * 0.8 + size * 0.16 + 0.1 * Math.sin(v * 14);
      p.u = u * size * 2;
      p.v = v * size * 0.7;
    });
    scene.lay({ cloth, across: 60, along: 90 }, (u, v, p) => {
      p.x = x0 + side * (v * size * 0.45 + (u - 0.5) * size * (0.3 + 0.35 * v));
      p.y = y0 - v * size * tails - 0.2 * size * v * Math.abs(u - 0.5);
      p.z = z0 + 0.25 + 0.35 * Math.sin(u * 7 + v * 3) * v + 0.3 * (1 - v);
      p.u = u * size * 0.7;
      p.v = v * size * tails;
    });
  }
  scene.lay({ cloth, across: 40, along: 40, closed: true }, (u, v, p) => {
    const a = u * 2 * Math.PI;
    const r = size * 0.17 * (1 + 0.25 * Math.sin(v * Math.PI));
    p.x = x0 + r * Math.cos(a) * 0.9;
    p.y = y0 + (v - 0.5) * size * 0.5;
    p.z = z0 + size * 0.16 + r * Math.sin(a);
    p.u = u * size;
    p.v = v * size * 0.5;
  });
}
