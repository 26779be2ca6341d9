/** Chance that can be drawn again: the same seed always gives the same folds. */
export interface Noise {
  /** Smooth noise, -1 to 1, one feature to a unit. */
  at(x: number, y: number): number;
  /** Several octaves of it, about -1 to 1. */
  layers(x: number, y: number, octaves: number): number;
  /** A fixed draw from 0–1 for a whole number (and row). */
  pick(i: number, row?: number): number;
  /** Folds in cloth, 0 to about 1.3: broad crests and narrow valleys, each fold its own height. */
  fold(p: number, row?: number): number;
}

function shuffled(seed: number): Uint8Array {
  const table = Uint8Array.from({ length: 512 }, (_, i) => i & 255);
  let state = (Math.imul(seed, 2654435761) ^ 0x9e3779b9) >>> 0;
  for (let i = 255; i > 0; i--) {
    state = (Math.imul(state, 1664525) + 1013904223) >>> 0;
    const j = (state >>> 8) % (i + 1);
    const held = table[i]!;
    table[i] = table[j]!;
    table[j] = held;
  }
  table.copyWithin(256, 0, 256);
  return table;
}

/** The shape of one fold over 0–1: a plain sine would look like corrugated iron. */
const FOLD = Float32Array.from({ length: 1025 }, (_, i) =>
  Math.pow(0.5 - 0.5 * Math.cos((2 * Math.PI * i) / 1024), 0.62),
);

export function seededNoise(seed: number): Noise {
  const table = shuffled(seed);
  const pick = (i: number, row = 0): number => table[(table[i & 255]! + row) & 255]! / 255;
  const at = (x: number, y: number): number => {
    const xi = Math.floor(x);
    const yi = Math.floor(y);
    const fx = x - xi;
    const fy = y - yi;
    const s = fx * fx * fx * (fx * (fx * 6 - 15) + 10);
    const t = fy * fy * fy * (fy * (fy * 6 - 15) + 10);
    const left = table[xi & 255]!;
    const right = table[(xi + 1) & 255]!;
    const a = table[(left + yi) & 255]!;
    const b = table[(right + yi) & 255]!;
    const c = table[(left + yi + 1) & 255]!;
    const d = table[(right + yi + 1) & 255]!;
    return (a + (b - a) * s + (c - a) * t + (a - b - c + d) * s * t) / 127.5 - 1;
  };
  const layers = (x: number, y: number, octaves: number): number => {
    let sum = 0;
    let weight = 0.5;
    for (let i = 0; i < octaves; i++) {
      sum += weight * at(x, y);
      x = x * 2.03 + 17.1;
      y = y * 2.01 + 5.7;
      weight /= 2;
    }
    return sum;
  };
  const fold = (p: number, row = 0): number => {
    const i = Math.floor(p);
    return FOLD[((p - i) * 1024) | 0]! * (0.55 + 0.75 * pick(i, row));
  };
  return { at, layers, pick, fold };
}
