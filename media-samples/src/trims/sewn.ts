import type { Cloth } from '../cloths/cloth';
import { mix } from '../renderer/numbers';
import { newPoint, type Layer, type Point, type Scene } from '../renderer/scene';

/** A line over a layer: where it runs in the layer's own u and v, for t 0–1. */
export type Line = (t: number) => readonly [number, number];

export interface Along {
  line: Line;
  /** Points along it, at fineness 1. */
  points: number;
  closed?: boolean;
  /** Length of the trim, cm: stretches its motif. */
  length: number;
}

/** A line round a layer at one v. */
export const round =
  (v: number, from = 0, to = 1): Line =>
  (t) => [mix(from, to, t), v];

/** A flat band sewn over a layer between two heights of it. */
export function sewBand(
  scene: Scene,
  layer: Layer,
  cloth: Cloth,
  band: {
    from: number;
    to: number;
    lift?: number;
    across: number;
    closed?: boolean;
    width: number;
    length: number;
    u0?: number;
    u1?: number;
  },
): void {
  const { from, to, lift = 0.35, u0 = 0, u1 = 1 } = band;
  scene.lay({ cloth, across: band.across, along: 26, closed: band.closed ?? true }, (u, v, p) => {
    // Its two edges lie down on the cloth; its middle stands off it.
    const rise = 1 - Math.pow(Math.abs(v - 0.5) * 2, 6);
    layer(mix(u0, u1, u), mix(from, to, v), 0.06 + lift * (0.35 + 0.65 * rise), p);
    p.u = u * band.length;
    p.v = v * band.width;
  });
}

/** A round cord along a line over a layer. */
export function sewCord(
  scene: Scene,
  layer: Layer,
  cloth: Cloth,
  along: Along,
  radius: number,
  sink = 0.2,
): void {
  const q = newPoint();
  scene.lay({ cloth, across: along.points, along: 14, closed: along.closed ?? false }, (t, v, p) => {
    const a = v * 2 * Math.PI;
    const [u, w] = along.line(t);
    const [u2, w2] = along.line(t + 0.001);
    layer(u, w, 0.1, p);
    layer(u2, w2, 0.1, q);
    const s = crossways(p, q);
    const out = radius * (Math.cos(a) + 1 - sink);
    const side = radius * Math.sin(a);
    p.x += p.nx * out + s[0] * side;
    p.y += p.ny * out + s[1] * side;
    p.z += p.nz * out + s[2] * side;
    p.u = t * along.length;
    p.v = v * 2 * Math.PI * radius;
  });
}

/** The way across a line: square to its run (p to q) and to the cloth under it. */
function crossways(p: Point, q: Point): [number, number, number] {
  const x = q.x - p.x;
  const y = q.y - p.y;
  const z = q.z - p.z;
  const s: [number, number, number] = [y * p.nz - z * p.ny, z * p.nx - x * p.nz, x * p.ny - y * p.nx];
  const length = Math.hypot(...s) || 1;
  return [s[0] / length, s[1] / length, s[2] / length];
}

export interface Frill extends Along {
  /** Depth, cm. */
  depth: number;
  /** Which way it leaves the line: +1 on down the layer, -1 up it. */
  way: 1 | -1;
  /** Gathers along it, how far they stand and how far the free edge flares, cm. */
  gathers: number;
  stand: number;
  flare: number;
  lift?: number;
  /** How much it falls straight down instead of along the layer, 0–1. */
  fall?: number;
  down?: number;
  /** The motif's own coordinate runs to this at the free edge, cm; its depth by default. */
  motifDepth?: number;
}

/** A gathered strip — lace, ruffle, flounce — sewn along a line and leaving it. */
export function sewFrill(scene: Scene, layer: Layer, cloth: Cloth, frill: Frill): void {
  const q = newPoint();
  const { depth, way, fall = 0, lift = 0.2 } = frill;
  scene.lay(
    { cloth, across: frill.points, along: frill.down ?? 40, closed: frill.closed ?? false },
    (t, v, p) => {
      const [u, w] = frill.line(t);
      const step = 0.004 * (w > 0.5 ? -1 : 1);
      layer(u, w, lift, p);
      layer(u, w + step, lift, q);
      const sign = way * Math.sign(step);
      let dx = (q.x - p.x) * sign;
      let dy = (q.y - p.y) * sign;
      let dz = (q.z - p.z) * sign;
      const length = Math.hypot(dx, dy, dz) || 1;
      dx = (dx / length) * (1 - fall);
      dy = (dy / length) * (1 - fall) - fall;
      dz = (dz / length) * (1 - fall);
      const turn = t * frill.gathers * 2 * Math.PI;
      const wave = Math.sin(turn + 0.9 * Math.sin(turn * 0.37)) + 0.3 * Math.sin(turn * 2.6);
      const out = frill.flare * v * (0.4 + 0.6 * v) + frill.stand * wave * Math.pow(v, 0.8);
      p.x += dx * depth * v + p.nx * out;
      p.y += dy * depth * v + p.ny * out;
      p.z += dz * depth * v + p.nz * out;
      p.u = t * frill.length;
      p.v = v * (frill.motifDepth ?? depth);
    },
  );
}
