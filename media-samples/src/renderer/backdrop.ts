import { clamp, ease } from './numbers';
import type { Projection } from './camera';
import type { Film } from './film';
import type { Seen } from './normals';

/** A grey board behind the garment: it stands on it, or hangs a little before it, or fills the picture. */
export type Backdrop = 'floor' | 'wall' | 'none';

/** How much light falls on the board at a pixel, by the garment's own shadow: 1 is open. */
export type BoardLight = (x: number, y: number) => number;

function blurOnce(
  from: Float32Array,
  width: number,
  height: number,
  r: number,
  alongRows: boolean,
): Float32Array {
  const out = new Float32Array(from.length);
  const [lines, length, step, jump] = alongRows ? [height, width, 1, width] : [width, height, width, 1];
  for (let l = 0; l < lines; l++) {
    const start = l * jump;
    const at = (i: number): number => from[start + clamp(i, 0, length - 1) * step]!;
    let sum = 0;
    for (let i = -r; i <= r; i++) sum += at(i);
    for (let i = 0; i < length; i++) {
      out[start + i * step] = sum / (2 * r + 1);
      sum += at(i + r + 1) - at(i - r);
    }
  }
  return out;
}

/** Three box blurs each way, close to a Gaussian. */
function soften(map: Float32Array, width: number, height: number, r: number): Float32Array {
  let out = map;
  for (let i = 0; i < 3; i++) out = blurOnce(blurOnce(out, width, height, r, true), width, height, r, false);
  return out;
}

function between(map: Float32Array, width: number, height: number, x: number, y: number): number {
  const cx = clamp(x, 0, width - 1.01);
  const cy = clamp(y, 0, height - 1.01);
  const i = cx | 0;
  const j = cy | 0;
  const f = cx - i;
  const g = cy - j;
  const k = j * width + i;
  return (
    (map[k]! * (1 - f) + map[k + 1]! * f) * (1 - g) +
    (map[k + width]! * (1 - f) + map[k + width + 1]! * f) * g
  );
}

const GROUND = 384;

/** The garment's stand on the floor, filled from its first to its last point in each row. */
function standing(seen: readonly Seen[], reach: number, height: number): Float32Array {
  const map = new Float32Array(GROUND * GROUND);
  for (const { sheet, place } of seen) {
    if (!sheet.casts) continue;
    for (let k = 0; k < place.length; k += 3) {
      const y = place[k + 1]!;
      if (y > height * 2.5 || sheet.cut[k / 3]) continue;
      const gx = (((place[k]! + reach) / (2 * reach)) * GROUND) | 0;
      const gz = (((place[k + 2]! + reach) / (2 * reach)) * GROUND) | 0;
      if (gx < 0 || gz < 0 || gx >= GROUND || gz >= GROUND) continue;
      const weight = Math.exp(-Math.max(0, y) / height);
      const cell = gz * GROUND + gx;
      if (map[cell]! < weight) map[cell] = weight;
    }
  }
  for (let row = 0; row < GROUND; row++) {
    const cells = map.subarray(row * GROUND, (row + 1) * GROUND);
    const first = cells.findIndex((cell) => cell > 0.2);
    if (first < 0) continue;
    for (let x = first; x <= cells.findLastIndex((cell) => cell > 0.2); x++)
      cells[x] = Math.max(cells[x]!, 0.85);
  }
  return map;
}

/** Three shadows on the floor: one tight under the hem, one of the skirt, one of the whole garment. */
export function floorLight(
  seen: readonly Seen[],
  view: Projection,
  lookAt: readonly [number, number],
  span: number,
): BoardLight {
  const scale = span / 168;
  const reach = 170 * scale;
  const cell = GROUND / (2 * reach);
  const layers = (
    [
      [3, 3, 0.42],
      [14, 9, 0.3],
      [60, 26, 0.34],
    ] as const
  ).map(([height, blur, weight]) => ({
    weight,
    map: soften(
      standing(seen, reach, height * scale),
      GROUND,
      GROUND,
      Math.max(1, Math.round(blur * scale * cell)),
    ),
  }));
  return (px, py) => {
    const up = (view.height / 2 - py) / view.pxPerCm;
    const z = (-lookAt[1] * view.cosPitch - up) / view.sinPitch;
    const onFloor = ease(-230 * scale, -60 * scale, z);
    if (onFloor <= 0) return 1;
    const x = (px - view.width / 2) / view.pxPerCm + lookAt[0];
    let shadow = 0;
    for (const { weight, map } of layers)
      shadow += weight * between(map, GROUND, GROUND, (x + reach) * cell, (z + reach) * cell);
    return 1 - clamp(shadow, 0, 0.92) * 0.8 * onFloor;
  };
}

/** A soft shadow down and to the right, as of a garment hung a hand's breadth before the board. */
export function wallLight(film: Film): BoardLight {
  const width = film.width >> 2;
  const height = film.height >> 2;
  const shape = new Float32Array(width * height);
  for (let y = 0; y < height; y++)
    for (let x = 0; x < width; x++)
      shape[y * width + x] = film.cloth[y * 4 * film.width + x * 4]! > 0 ? 1 : 0;
  const r = Math.max(1, Math.round(height * 0.016));
  const tight = soften(shape, width, height, r);
  const wide = soften(shape, width, height, r * 3);
  const dx = 0.026 * height;
  const dy = 0.03 * height;
  return (px, py) => {
    const x = px / 4;
    const y = py / 4;
    const shadow =
      0.55 * between(tight, width, height, x - dx, y - dy) +
      0.45 * between(wide, width, height, x - dx * 1.8, y - dy * 1.8);
    return 1 - 0.5 * shadow;
  };
}
