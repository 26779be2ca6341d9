import type { Cloth } from '../cloths/cloth';
import type { Projection } from './camera';
import type { Seen } from './normals';

/** Values kept for each pixel: normal (3), cloth coordinates (2), key and fill light. */
export const PER_PIXEL = 7;

/** What the camera saw: for each pixel the nearest cloth (number + 1, 0 for none) and what is known of the point. */
export interface Film {
  width: number;
  height: number;
  cloths: Cloth[];
  cloth: Uint8Array;
  near: Float32Array;
  held: Float32Array;
}

interface Exposure {
  film: Film;
  seen: Seen;
  /** Picture x, y and nearness of each point. */
  at: Float32Array;
  clothNumber: number;
}

export function expose(seen: readonly Seen[], view: Projection): Film {
  const pixels = view.width * view.height;
  const film: Film = {
    width: view.width,
    height: view.height,
    cloths: [...new Set(seen.map((one) => one.sheet.cloth))],
    cloth: new Uint8Array(pixels),
    near: new Float32Array(pixels).fill(-1e9),
    held: new Float32Array(pixels * PER_PIXEL),
  };
  for (const one of seen) exposeSheet(film, one, view);
  return film;
}

function exposeSheet(film: Film, seen: Seen, view: Projection): void {
  const { place, sheet } = seen;
  const at = new Float32Array(place.length);
  for (let k = 0; k < place.length; k += 3) view.project(place[k]!, place[k + 1]!, place[k + 2]!, at, k);
  const exposure: Exposure = { film, seen, at, clothNumber: film.cloths.indexOf(sheet.cloth) + 1 };
  const { across, along, closed, cut } = sheet;
  for (let j = 0; j < along - 1; j++) {
    for (let i = 0; i < (closed ? across : across - 1); i++) {
      const joins = i + 1 === across;
      const a = j * across + i;
      const b = j * across + (joins ? 0 : i + 1);
      const c = a + across;
      const d = b + across;
      if (cut[a]! || cut[b]! || cut[c]! || cut[d]!) continue;
      triangle(exposure, a, b, c, joins);
      triangle(exposure, b, d, c, joins);
    }
  }
}

/** At the join of a closed sheet the cloth coordinate runs on instead of jumping back to 0. */
function runOn(seen: Seen, k: number, joins: boolean): number {
  const u = seen.sheet.onCloth[k * 2]!;
  if (!joins) return u;
  const { across, onCloth } = seen.sheet;
  const whole = (onCloth[(across - 1) * 2]! - onCloth[0]!) * (across / (across - 1));
  return Math.abs(u - onCloth[0]!) < Math.abs(whole) / 2 ? u + whole : u;
}

function triangle(
  { film, seen, at, clothNumber }: Exposure,
  a: number,
  b: number,
  c: number,
  joins: boolean,
): void {
  const ax = at[a * 3]!;
  const ay = at[a * 3 + 1]!;
  const bx = at[b * 3]!;
  const by = at[b * 3 + 1]!;
  const cx = at[c * 3]!;
  const cy = at[c * 3 + 1]!;
  const area = (bx - ax) * (cy - ay) - (by - ay) * (cx - ax);
  if (area > -1e-9 && area < 1e-9) return;
  const left = Math.max(0, Math.ceil(Math.min(ax, bx, cx) - 1e-3));
  const right = Math.min(film.width - 1, Math.floor(Math.max(ax, bx, cx) + 1e-3));
  const top = Math.max(0, Math.ceil(Math.min(ay, by, cy) - 1e-3));
  const bottom = Math.min(film.height - 1, Math.floor(Math.max(ay, by, cy) + 1e-3));
  if (left > right || top > bottom) return;
  const { normal, key, fill, sheet } = seen;
  const { onCloth } = sheet;
  const cutOut = sheet.cloth.cut;
  const { near, held, cloth, width } = film;
  const over = 1 / area;
  const ua = runOn(seen, a, joins);
  const ub = runOn(seen, b, joins);
  const uc = runOn(seen, c, joins);
  for (let y = top; y <= bottom; y++) {
    for (let x = left; x <= right; x++) {
      const wb = ((x - ax) * (cy - ay) - (y - ay) * (cx - ax)) * over;
      const wc = ((bx - ax) * (y - ay) - (by - ay) * (x - ax)) * over;
      const wa = 1 - wb - wc;
      if (wa < -1e-4 || wb < -1e-4 || wc < -1e-4) continue;
      const z = wa * at[a * 3 + 2]! + wb * at[b * 3 + 2]! + wc * at[c * 3 + 2]!;
      const p = y * width + x;
      if (z <= near[p]!) continue;
      const u = wa * ua + wb * ub + wc * uc;
      const v = wa * onCloth[a * 2 + 1]! + wb * onCloth[b * 2 + 1]! + wc * onCloth[c * 2 + 1]!;
      if (cutOut?.(u, v) === false) continue;
      near[p] = z;
      cloth[p] = clothNumber;
      const h = p * PER_PIXEL;
      held[h] = wa * normal[a * 3]! + wb * normal[b * 3]! + wc * normal[c * 3]!;
      held[h + 1] = wa * normal[a * 3 + 1]! + wb * normal[b * 3 + 1]! + wc * normal[c * 3 + 1]!;
      held[h + 2] = wa * normal[a * 3 + 2]! + wb * normal[b * 3 + 2]! + wc * normal[c * 3 + 2]!;
      held[h + 3] = u;
      held[h + 4] = v;
      held[h + 5] = wa * key[a]! + wb * key[b]! + wc * key[c]!;
      held[h + 6] = wa * fill[a]! + wb * fill[b]! + wc * fill[c]!;
    }
  }
}
