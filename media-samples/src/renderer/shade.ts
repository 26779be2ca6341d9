import { blend, type Cloth, type Rgb } from '../cloths/cloth';
import { weaveAt } from '../cloths/weave';
import { clamp } from './numbers';
import { unit, type Vec3 } from './tube';

/** The studio as the shader needs it: where the key light stands and where the camera looks from. */
export interface Standpoint {
  key: Vec3;
  view: Vec3;
  /** Half way between the two: the way a mirror of cloth would have to face. */
  half: Vec3;
  pxPerCm: number;
}

export function standpoint(
  keyTowards: Vec3,
  sinPitch: number,
  cosPitch: number,
  pxPerCm: number,
): Standpoint {
  const key = unit(keyTowards);
  const view: Vec3 = [0, sinPitch, cosPitch];
  return { key, view, half: unit([key[0] + view[0], key[1] + view[1], key[2] + view[2]]), pxPerCm };
}

const KEY_TINT = [1.04, 1, 0.95] as const;
const FILL_TINT = [0.98, 0.99, 1.02] as const;
/** Least fill: the inside of a garment is never black in a studio. */
const LEAST_FILL = 0.2;

const colour: Rgb = [0, 0, 0];
const relief: [number, number] = [0, 0];
const bent: [number, number, number] = [0, 0, 0];

/** Tilts the normal by the cloth's own relief, which is given as slopes along and down the cloth. */
function tilt(cloth: Cloth, u: number, v: number, nx: number, ny: number, nz: number, pxPerCm: number): void {
  bent[0] = nx;
  bent[1] = ny;
  bent[2] = nz;
  relief[0] = 0;
  relief[1] = 0;
  cloth.relief?.(u, v, relief);
  if (cloth.weave) weaveAt(cloth.weave, u, v, pxPerCm, relief);
  if (relief[0] === 0 && relief[1] === 0) return;
  let tx = nz;
  let tz = -nx;
  const t = Math.sqrt(tx * tx + tz * tz) || 1;
  tx /= t;
  tz /= t;
  const x = nx + relief[0] * tx + relief[1] * ny * tz;
  const y = ny + relief[1] * (nz * tx - nx * tz);
  const z = nz + relief[0] * tz - relief[1] * ny * tx;
  const length = Math.sqrt(x * x + y * y + z * z) || 1;
  bent[0] = x / length;
  bent[1] = y / length;
  bent[2] = z / length;
}

/** The light one point of cloth sends to the camera, linear, into `out`. `held` is the film's record of the point. */
export function shade(cloth: Cloth, held: Float32Array, h: number, from: Standpoint, out: Rgb): void {
  let nx = held[h]!;
  let ny = held[h + 1]!;
  let nz = held[h + 2]!;
  const length = Math.sqrt(nx * nx + ny * ny + nz * nz) || 1;
  nx /= length;
  ny /= length;
  nz /= length;
  const u = held[h + 3]!;
  const v = held[h + 4]!;
  const key = held[h + 5]!;
  const fill = held[h + 6]!;
  tilt(cloth, u, v, nx, ny, nz, from.pxPerCm);
  const [bx, by, bz] = bent;
  const flat = Math.max(0.02, nx * from.key[0] + ny * from.key[1] + nz * from.key[2]);
  const tilted = Math.max(0, bx * from.key[0] + by * from.key[1] + bz * from.key[2]);
  const relative = clamp(tilted / flat, 0.35, 1.9);
  const towards = Math.max(0, by * from.view[1] + bz * from.view[2]);
  const mirror = Math.max(0, bx * from.half[0] + by * from.half[1] + bz * from.half[2]);
  const open = clamp(key / (flat + 0.05), 0, 1.1);
  const edge = 1 - towards;
  const shine =
    cloth.gloss *
    ((0.55 * Math.pow(mirror, cloth.tightness) + 0.42 * Math.pow(mirror, cloth.tightness * 4)) * open +
      0.1 * fill * edge * edge * edge);
  const pile = cloth.pile * (Math.pow(edge, 2.2) * (0.5 * fill + 0.8 * key) + 0.02);
  const core = cloth.pile > 0 ? 1 - Math.min(1, cloth.pile) * 0.62 * towards : 1;
  const lit = key * relative * 1.15;
  const deep = clamp(1 - (lit + fill * 0.64) * 1.4);
  const slub = 1 + cloth.slub(u, v);
  cloth.colour(u, v, colour);
  if (cloth.flash) blend(colour, cloth.flash, 0.75 * Math.pow(edge, 1.3));
  for (let i = 0; i < 3; i++) {
    const own = colour[i]! * slub;
    // Deep shadow inside cloth is lit by the cloth itself, so its colour grows stronger there.
    const body = deep > 0 ? Math.pow(own, 1 + 0.28 * deep) : own;
    const root = Math.sqrt(own);
    const light =
      lit * KEY_TINT[i]! +
      Math.max(fill, LEAST_FILL) * 0.64 * cloth.openness * FILL_TINT[i]! +
      cloth.through * 0.1;
    out[i] =
      body * light * core + (0.24 * root + 1.05 * own + 0.03) * shine + pile * (0.25 * root + 0.3 * own);
  }
}
