import { seededNoise } from '../renderer/noise';

const noise = seededNoise(7);

export type Relief = (u: number, v: number, out: [number, number]) => void;

/** Turns a height over the cloth into the slopes of it. */
function slopes(height: (u: number, v: number) => number, strength: number, step = 0.25): Relief {
  return (u, v, out) => {
    const here = height(u, v);
    out[0] += ((height(u + step, v) - here) / step) * strength;
    out[1] += ((height(u, v + step) - here) / step) * strength;
  };
}

const ridge = (u: number, v: number): number => 1 - Math.abs(noise.at(u, v));

/** The sharp, drawn-out creases of crisp silk. */
export const silkCrinkle = (strength: number): Relief =>
  slopes(
    (u, v) =>
      ridge(u * 0.16, v * 0.055) * 0.75 +
      ridge(u * 0.42 + 7, v * 0.16 + 3) * 0.25 +
      noise.layers(u * 0.9, v * 0.6, 2) * 0.1,
    strength,
  );

/** The soft creases of washed cotton and linen. */
export const cottonCrease = (strength: number): Relief =>
  slopes(
    (u, v) =>
      ridge(u * 0.2, v * 0.09) * 0.7 +
      ridge(u * 0.6 + 7, v * 0.3 + 3) * 0.22 +
      noise.layers(u * 1.1, v * 0.9, 2) * 0.12,
    strength,
  );

/** The raised nap of wool. */
export function woolNap(strength: number): Relief {
  const body = slopes(
    (u, v) => ridge(u * 0.14, v * 0.1) * 0.35 + noise.layers(u * 0.5, v * 0.4, 3) * 0.25,
    strength,
  );
  return (u, v, out) => {
    body(u, v, out);
    out[0] += 0.05 * noise.at(u * 8, v * 8);
    out[1] += 0.05 * noise.at(u * 8 + 3, v * 8);
  };
}

/** Velvet brushed this way and that. */
export const velvetBrush =
  (strength: number): Relief =>
  (u, v, out) => {
    out[0] += strength * noise.layers(u * 0.7, v * 0.7, 3) + 0.3 * strength * noise.at(u * 9, v * 9);
    out[1] += strength * noise.layers(u * 0.7 + 9, v * 0.7, 3) + 0.3 * strength * noise.at(u * 9 + 5, v * 9);
  };

/** The pebbled face of crêpe. */
export const crepePebble =
  (strength: number): Relief =>
  (u, v, out) => {
    out[0] += strength * (0.5 * noise.at(u * 6, v * 5) + 0.5 * noise.at(u * 15, v * 13));
    out[1] += strength * (0.5 * noise.at(u * 6 + 4, v * 5) + 0.5 * noise.at(u * 15 + 8, v * 13));
  };

/** Yarn that is thicker here and thinner there, in both directions. */
export const slubbed =
  (amount: number): ((u: number, v: number) => number) =>
  (u, v) =>
    amount * 0.5 * (noise.at(u * 7, v * 1.3) + noise.at(u * 1.3, v * 7));
