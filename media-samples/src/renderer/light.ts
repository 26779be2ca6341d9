import { cross, unit, type Vec3 } from './tube';
import type { Seen } from './normals';
import { shadeTriangle, type DepthMap } from './depth-map';

/** One sample of the studio's light: where it stands, which lamp it belongs to and its share of that lamp. */
export interface Ray {
  towards: Vec3;
  lamp: 'key' | 'fill';
  share: number;
}

export interface Studio {
  /** Where the big soft box stands. */
  keyTowards: Vec3;
  keySamples: number;
  /** Samples of the pale room around the garment. */
  fillSamples: number;
  /** Half the width that the shadow maps cover, and the height and side of their middle, cm. */
  reach: number;
  middle: readonly [number, number];
  /** How far off the cloth shadows begin, cm; smaller for close-ups. */
  bias: number;
}

const GOLDEN = Math.PI * (3 - Math.sqrt(5));
/** Width of the soft box, as the tangent of half its angle. */
const BOX = 0.34;
const MAP = 800;

/** The studio's rays. The shares of each lamp are such that cloth facing it, with nothing before it, gets 1. */
export function studioRays(studio: Studio): Ray[] {
  const centre = unit(studio.keyTowards);
  const rays: Ray[] = [];
  for (let i = 0; i < studio.keySamples; i++) {
    const r = Math.sqrt((i + 0.5) / studio.keySamples) * BOX;
    const a = i * GOLDEN;
    const towards = unit([
      centre[0] + r * Math.cos(a),
      centre[1] + r * 0.8 * Math.sin(a),
      centre[2] + r * 0.4 * Math.sin(a),
    ]);
    rays.push({ towards, lamp: 'key', share: 1 / studio.keySamples });
  }
  return [...rays, ...roomRays(studio.fillSamples)];
}

/** A pale room: brightest above and before the garment, with some light thrown back by the floor. */
function roomRays(samples: number): Ray[] {
  const rays = Array.from({ length: samples }, (_, i): Ray => {
    const y = 1 - ((i + 0.5) / samples) * 1.3;
    const r = Math.sqrt(Math.max(0, 1 - y * y));
    const towards: Vec3 = [r * Math.cos(i * GOLDEN), y, r * Math.sin(i * GOLDEN)];
    const strength = (y > 0 ? 0.55 + 0.45 * y : 0.34) * (towards[2] > -0.2 ? 1 : 0.55);
    return { towards, lamp: 'fill', share: strength };
  });
  // Scaled so that cloth facing up and forward, under the open room, gets 1.
  const facing = unit([0, 0.7, 0.7]);
  const got = rays.reduce((sum, { towards: t, share }) => sum + share * Math.max(0, dotOf(t, facing)), 0);
  return rays.map((ray) => ({ ...ray, share: ray.share / got }));
}

const dotOf = (a: Vec3, b: Vec3): number => a[0] * b[0] + a[1] * b[1] + a[2] * b[2];

/** Lights every point of every sheet: for each ray a shadow map is drawn and then asked. */
export function lightScene(seen: readonly Seen[], studio: Studio): void {
  const map: DepthMap = { size: MAP, depth: new Float32Array(MAP * MAP) };
  const laid = seen.map((one) => new Float32Array(one.place.length));
  for (const ray of studioRays(studio)) {
    const d = ray.towards;
    const across = unit(Math.abs(d[1]) < 0.9 ? [-d[2], 0, d[0]] : cross(d, [1, 0, 0]));
    const down = cross(d, across);
    map.depth.fill(-1e9);
    seen.forEach((one, i) => {
      project(one.place, laid[i]!, d, across, down, studio);
      if (one.sheet.casts && !one.sheet.cloth.sheer) drawShadow(one, laid[i]!, map);
    });
    seen.forEach((one, i) => receive(one, laid[i]!, ray, across, down, map, studio));
  }
}

function project(
  place: Float32Array,
  out: Float32Array,
  d: Vec3,
  across: Vec3,
  down: Vec3,
  studio: Studio,
): void {
  const scale = MAP / (2 * studio.reach);
  const [mx, my] = studio.middle;
  const half = MAP / 2;
  for (let k = 0; k < place.length; k += 3) {
    const x = place[k]! - mx;
    const y = place[k + 1]! - my;
    const z = place[k + 2]!;
    out[k] = (x * across[0] + y * across[1] + z * across[2]) * scale + half;
    out[k + 1] = (x * down[0] + y * down[1] + z * down[2]) * scale + half;
    out[k + 2] = x * d[0] + y * d[1] + z * d[2];
  }
}

/** Shadows are soft, so every second point is enough to throw them. */
function drawShadow({ sheet }: Seen, laid: Float32Array, map: DepthMap): void {
  const { across, along, closed, cut } = sheet;
  const stepI = across > 80 ? 2 : 1;
  const stepJ = along > 40 ? 2 : 1;
  for (let j = 0; j < along - 1; j += stepJ) {
    const below = Math.min(along - 1, j + stepJ);
    for (let i = 0; i < (closed ? across : across - 1); i += stepI) {
      const next = i + stepI < across ? i + stepI : closed ? 0 : across - 1;
      const a = j * across + i;
      const b = j * across + next;
      const c = below * across + i;
      const d = below * across + next;
      if (cut[a]! || cut[b]! || cut[c]! || cut[d]!) continue;
      shadeTriangle(map, laid, a, b, c);
      shadeTriangle(map, laid, b, d, c);
    }
  }
}

/** Distance over which a shadow's edge fades into light, as a multiple of the bias. */
const SOFT = 1.1;

function receive(
  one: Seen,
  laid: Float32Array,
  ray: Ray,
  across: Vec3,
  down: Vec3,
  map: DepthMap,
  studio: Studio,
): void {
  const { normal } = one;
  const got = ray.lamp === 'key' ? one.key : one.fill;
  const d = ray.towards;
  const off = studio.bias;
  const offPx = (off * MAP) / (2 * studio.reach);
  const soft = SOFT * studio.bias;
  for (let k = 0, q = 0; q < normal.length; k++, q += 3) {
    const nx = normal[q]!;
    const ny = normal[q + 1]!;
    const nz = normal[q + 2]!;
    const facing = nx * d[0] + ny * d[1] + nz * d[2];
    if (facing <= 0) continue;
    const x = (laid[q]! + (nx * across[0] + ny * across[1] + nz * across[2]) * offPx) | 0;
    const y = (laid[q + 1]! + (nx * down[0] + ny * down[1] + nz * down[2]) * offPx) | 0;
    let open = 1;
    if (x >= 0 && y >= 0 && x < MAP && y < MAP) {
      const before = map.depth[y * MAP + x]! - (laid[q + 2]! + facing * off + off);
      open = before <= 0 ? 1 : before < soft ? 1 - before / soft : 0;
    }
    got[k]! += ray.share * facing * open;
  }
}
