import { evenCurve, mix } from './numbers';
import type { Layer } from './scene';

export type Vec3 = readonly [number, number, number];

const minus = (a: Vec3, b: Vec3): Vec3 => [a[0] - b[0], a[1] - b[1], a[2] - b[2]];
const dot = (a: Vec3, b: Vec3): number => a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
export const cross = (a: Vec3, b: Vec3): Vec3 => [
  a[1] * b[2] - a[2] * b[1],
  a[2] * b[0] - a[0] * b[2],
  a[0] * b[1] - a[1] * b[0],
];
export function unit(a: Vec3): Vec3 {
  const length = Math.hypot(...a) || 1;
  return [a[0] / length, a[1] / length, a[2] / length];
}

/** One step along a spine: its middle, its way, and two directions square to it. */
export interface Frame {
  middle: Vec3;
  way: Vec3;
  ahead: Vec3;
  aside: Vec3;
  /** How far along the spine, cm. */
  run: number;
}

const STEPS = 240;

/** A smooth line through given points, over 0–1. */
export function line(points: readonly Vec3[]): (t: number) => Vec3 {
  const [x, y, z] = [0, 1, 2].map((axis) => evenCurve(points.map((point) => point[axis]!)));
  return (t) => [x!(t), y!(t), z!(t)];
}

/** Frames along a spine that never twist about it. `facing` is the way angle 0 looks at the start. */
export function framesAlong(spine: (t: number) => Vec3, facing: Vec3 = [0, 0, 1]): Frame[] {
  const frames: Frame[] = [];
  let ahead = facing;
  let run = 0;
  for (let i = 0; i <= STEPS; i++) {
    const t = i / STEPS;
    const middle = spine(t);
    const way = unit(minus(spine(Math.min(1, t + 0.002)), spine(Math.max(0, t - 0.002))));
    const lean = dot(ahead, way);
    ahead = unit([ahead[0] - lean * way[0], ahead[1] - lean * way[1], ahead[2] - lean * way[2]]);
    if (i > 0) run += Math.hypot(...minus(middle, frames[i - 1]!.middle));
    frames.push({ middle, way, ahead, aside: cross(ahead, way), run });
  }
  return frames;
}

export interface TubeShape {
  spine: (t: number) => Vec3;
  /** Radii at t: towards `aside` and towards `ahead`, cm. */
  radius: (t: number) => readonly [number, number];
  /** Displacement off the tube at angle and t, cm. */
  folds?: (angle: number, t: number) => number;
  /** Width of the cloth round the tube, cm. */
  clothWidth: number;
  facing?: Vec3;
}

/** A tube as a layer: u once round with the join at the back of the arm, v down the spine. */
export function tube(shape: TubeShape): { layer: Layer; frames: Frame[] } {
  const frames = framesAlong(shape.spine, shape.facing);
  const length = frames[STEPS]!.run;
  const layer: Layer = (u, v, lift, p) => {
    const step = Math.min(STEPS - 1, Math.max(0, Math.floor(v * STEPS)));
    const part = v * STEPS - step;
    const a = frames[step]!;
    const b = frames[step + 1]!;
    const angle = (u - 0.5) * 2 * Math.PI;
    const [side, front] = shape.radius(v);
    const off = lift + (shape.folds?.(angle, v) ?? 0);
    const s = Math.sin(angle);
    const c = Math.cos(angle);
    const along = (axis: 0 | 1 | 2, key: 'middle' | 'ahead' | 'aside') =>
      mix(a[key][axis], b[key][axis], part);
    p.nx = along(0, 'aside') * s + along(0, 'ahead') * c;
    p.ny = along(1, 'aside') * s + along(1, 'ahead') * c;
    p.nz = along(2, 'aside') * s + along(2, 'ahead') * c;
    const x = (side + off) * s;
    const z = (front + off) * c;
    p.x = along(0, 'middle') + along(0, 'aside') * x + along(0, 'ahead') * z;
    p.y = along(1, 'middle') + along(1, 'aside') * x + along(1, 'ahead') * z;
    p.z = along(2, 'middle') + along(2, 'aside') * x + along(2, 'ahead') * z;
    p.u = u * shape.clothWidth;
    p.v = v * length;
  };
  return { layer, frames };
}
