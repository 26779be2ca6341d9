import { part } from '../motifs/motifs';
import { dye, plain, type Cloth, type Rgb } from './cloth';

/** What a lace is: repeat along its edge and depth, cm. `u` runs along the edge, `v` from the sewn edge outwards. */
export interface LaceKind {
  repeat: number;
  depth: number;
  colour?: Rgb;
}

const flowerAt = (x: number, y: number, size: number, petals: number): boolean | null => {
  const r = Math.hypot(x, y);
  if (r > size) return null;
  if (r < 0.18 * size) return false;
  if (r < 0.3 * size) return true;
  if (r > 0.88 * size) return true;
  const rim = size * (0.66 + 0.18 * Math.cos(Math.atan2(y, x) * petals));
  return r < rim && Math.abs(Math.sin((Math.atan2(y, x) * petals) / 2)) > 0.2;
};

const net = (u: number, v: number, mesh: number, thick: number): boolean => {
  const a = (u / mesh) * Math.PI;
  const b = (v / mesh) * Math.PI;
  return Math.abs(Math.sin((a + b) / 2)) < thick || Math.abs(Math.sin((a - b) / 2)) < thick;
};

function base(colour: Rgb): Cloth {
  const dark = colour[0] + colour[1] + colour[2] < 0.6;
  return plain({
    colour: (u, v, out) => {
      const n = 0.95 + 0.06 * Math.sin(u * 61) * Math.sin(v * 57);
      for (let i = 0; i < 3; i++) out[i] = colour[i]! * n;
    },
    sheer: true,
    gloss: dark ? 0.5 : 0.05,
    through: dark ? 0 : 0.25,
  });
}

/** Scalloped lace edging: a footing, a net ground and a ring flower in every scallop. */
export function laceEdging({ repeat, depth, colour = dye('#f2ecde') }: LaceKind): Cloth {
  return {
    ...base(colour),
    cut: (u, v) => {
      const x = (part(u / repeat) - 0.5) * repeat;
      const rim = depth - 0.16 * depth * Math.pow(Math.abs(x / repeat) * 2, 1.6);
      if (v > rim) return false;
      if (v < 0.06 * depth || v > rim - 0.045 * depth) return true;
      const flower = flowerAt(x, v - 0.64 * depth, Math.min(0.26 * depth, 0.42 * repeat), 6);
      if (flower !== null) return flower;
      const between = flowerAt(Math.abs(x) - repeat / 2, v - 0.42 * depth, 0.12 * depth, 4);
      if (between !== null) return between;
      if (Math.abs(v - 0.16 * depth) < 0.012 * depth + 0.02) return true;
      return net(u, v, 0.062 * depth + 0.08, 0.26);
    },
  };
}

/** All-over lace for yokes and insertions: flowers on a net ground. */
export function laceCloth(repeat: number, colour: Rgb = dye('#f0e9da')): Cloth {
  return {
    ...base(colour),
    cut: (u, v) => {
      const column = Math.floor(u / repeat);
      const x = (part(u / repeat) - 0.5) * repeat;
      const y = (part(v / repeat + (column & 1 ? 0.5 : 0)) - 0.5) * repeat;
      const flower = flowerAt(x, y, 0.34 * repeat, 6);
      if (flower !== null) return flower;
      if (Math.abs(Math.abs(x) - repeat / 2) < 0.05 * repeat) return true;
      return net(u, v, 0.09 * repeat + 0.05, 0.3);
    },
  };
}

/** White embroidery with eyelets cut through: scallops, each with a spray of holes. */
export function eyeletEdging({ repeat, depth, colour = dye('#ddd7c9') }: LaceKind): Cloth {
  const worked = (u: number, v: number): number => {
    const x = (part(u / repeat) - 0.5) * repeat;
    const cy = depth - 0.42 * repeat;
    let nearest = 9;
    for (let i = 0; i < 6; i++) {
      const a = (i / 6) * 2 * Math.PI;
      nearest = Math.min(
        nearest,
        Math.hypot(x - 0.2 * repeat * Math.cos(a), v - cy - 0.2 * repeat * Math.sin(a)) / (0.075 * repeat),
      );
    }
    nearest = Math.min(nearest, Math.hypot(x, v - cy) / (0.085 * repeat));
    const small = (part((u / repeat) * 3) - 0.5) * (repeat / 3);
    return Math.min(nearest, Math.hypot(small, v - 0.28 * depth) / (0.06 * repeat));
  };
  const rimAt = (u: number): number =>
    depth - 0.2 * repeat * Math.pow(Math.abs(part(u / repeat) - 0.5) * 2, 2);
  return {
    ...base(colour),
    colour: (u, v, out) => {
      const hole = worked(u, v);
      const edge = rimAt(u) - v;
      const shadow = (hole < 1.6 && hole > 1.42) || (edge > 0.28 && edge < 0.36) ? 0.82 : 1;
      for (let i = 0; i < 3; i++) out[i] = colour[i]! * shadow;
    },
    cut: (u, v) => v <= rimAt(u) && worked(u, v) >= 1,
  };
}

/** Silk fringe under a narrow heading, cut into strands. */
export function fringe(first: Rgb, second: Rgb, depth: number, strands = 2.4): Cloth {
  return plain({
    colour: (u, v, out) => {
      const at = part(u * strands);
      const strand = Math.floor(u * strands);
      const own = v > 0.12 * depth && (strand * 7) % 5 < 2 ? second : first;
      const round = v < 0.12 * depth ? 0.9 : 0.68 + 0.5 * Math.sin((at / 0.76) * Math.PI);
      for (let i = 0; i < 3; i++) out[i] = own[i]! * round;
    },
    sheer: true,
    gloss: 0.35,
    tightness: 8,
    cut: (u, v) =>
      v < 0.12 * depth ||
      (part(u * strands) < 0.76 && v < depth * (0.93 + 0.07 * Math.sin(Math.floor(u * strands) * 2.3))),
  });
}
