import type { Cloth } from '../cloths/cloth';
import { mix } from '../renderer/numbers';
import { newPoint, type Layer, type Scene } from '../renderer/scene';
import { cross, unit, type Vec3 } from '../renderer/tube';
import type { Line } from './sewn';

/** A domed button (or stud, bead, clasp end) at `at`, facing `facing`; `height` is the dome's height over its radius. */
export function sewButton(
  scene: Scene,
  at: Vec3,
  facing: Vec3,
  radius: number,
  cloth: Cloth,
  height = 0.55,
  points = 30,
): void {
  const n = unit(facing);
  const a = unit(Math.abs(n[1]) < 0.95 ? cross([0, 1, 0], n) : [1, 0, 0]);
  const b = cross(n, a);
  scene.lay({ cloth, across: points, along: 14, closed: true }, (u, v, p) => {
    const angle = u * 2 * Math.PI;
    const slope = v * Math.PI * 0.62;
    const r = radius * Math.sin(slope);
    const rise = radius * height * (Math.cos(slope) + 0.3);
    p.x = at[0] + a[0] * r * Math.cos(angle) + b[0] * r * Math.sin(angle) + n[0] * rise;
    p.y = at[1] + a[1] * r * Math.cos(angle) + b[1] * r * Math.sin(angle) + n[1] * rise;
    p.z = at[2] + a[2] * r * Math.cos(angle) + b[2] * r * Math.sin(angle) + n[2] * rise;
    p.u = v;
    p.v = angle;
  });
}

/** The place of a layer and the way its face looks there, tilt and all. */
export function faceOf(layer: Layer, u: number, v: number, lift: number): { at: Vec3; facing: Vec3 } {
  const p = newPoint();
  const across = newPoint();
  const down = newPoint();
  layer(u, v, lift, p);
  layer(u + 0.004, v, lift, across);
  layer(u, v + 0.004, lift, down);
  const n = cross(
    [across.x - p.x, across.y - p.y, across.z - p.z],
    [down.x - p.x, down.y - p.y, down.z - p.z],
  );
  const outward = n[0] * p.nx + n[1] * p.ny + n[2] * p.nz < 0 ? -1 : 1;
  return { at: [p.x, p.y, p.z], facing: unit([n[0] * outward, n[1] * outward, n[2] * outward]) };
}

/** Buttons at even distances along a line over a layer, first and last at its ends. */
export function sewButtons(
  scene: Scene,
  layer: Layer,
  line: Line,
  row: { count: number; radius: number; cloth: Cloth; lift?: number; height?: number; points?: number },
): void {
  const steps = 300;
  const lengths = [0];
  const p = newPoint();
  const q = newPoint();
  for (let i = 1; i <= steps; i++) {
    layer(...line((i - 1) / steps), 0, p);
    layer(...line(i / steps), 0, q);
    lengths.push(lengths[i - 1]! + Math.hypot(q.x - p.x, q.y - p.y, q.z - p.z));
  }
  for (let k = 0; k < row.count; k++) {
    const want = mix(0, lengths[steps]!, row.count > 1 ? k / (row.count - 1) : 0.5);
    const i = Math.max(
      0,
      lengths.findIndex((length) => length >= want - 1e-9),
    );
    const [u, v] = line(i / steps);
    const { at, facing } = faceOf(layer, u, v, row.lift ?? 0.15);
    sewButton(scene, at, facing, row.radius, row.cloth, row.height, row.points);
  }
}
