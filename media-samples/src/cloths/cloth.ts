import type { Weave } from './weave';

/** Linear light, 0–1 each. */
export type Rgb = [number, number, number];

/** A cloth as the camera meets it. Coordinates are centimetres on the cloth: `u` across the warp, `v` along it. */
export interface Cloth {
  colour: (u: number, v: number, out: Rgb) => void;
  /** Slopes of the cloth's own unevenness, added into `out`. */
  relief?: (u: number, v: number, out: [number, number]) => void;
  /** Thread by thread; drawn only where a thread is wide enough to see. */
  weave?: Weave;
  /** False where there is no cloth: lace, fringe, net. */
  cut?: (u: number, v: number) => boolean;
  /** Throws no shadow worth drawing: lace, net, fringe. */
  sheer?: boolean;
  /** Lustre: 0.1 cotton, 0.2 wool, 1.2 silk, 1.6 metal. */
  gloss: number;
  /** How small the highlight is: 5 wool, 9 silk, 16 metal. */
  tightness: number;
  /** Shot cloth: the colour of the weft, which shows where the cloth turns from the camera. */
  flash?: Rgb;
  /** Velvet and nap: light caught along the edges of the form. */
  pile: number;
  /** Light let through thin cloth, about 0.5 for white muslin. */
  through: number;
  /** Share of the room's light that reaches it; above 1 for a pale lining. */
  openness: number;
  /** Unevenness of the yarn, as a share of the colour. */
  slub: (u: number, v: number) => number;
}

/** '#rrggbb' to linear light. */
export function dye(hex: string): Rgb {
  const n = Number.parseInt(hex.slice(1), 16);
  return [linear((n >> 16) & 255), linear((n >> 8) & 255), linear(n & 255)];
}
const linear = (byte: number): number => Math.pow(byte / 255, 2.2);

export const evenSlub = (): number => 0;

/** A cloth of one colour, or of a motif. */
export type Colouring = Rgb | ((u: number, v: number, out: Rgb) => void);

export function colourOf(colouring: Colouring): Cloth['colour'] {
  if (typeof colouring === 'function') return colouring;
  return (_u, _v, out) => {
    out[0] = colouring[0];
    out[1] = colouring[1];
    out[2] = colouring[2];
  };
}

/** Lays `over` on what is already in `out`. */
export function blend(out: Rgb, over: Rgb, share: number): void {
  for (let i = 0; i < 3; i++) out[i] = out[i]! + (over[i]! - out[i]!) * share;
}

export const plain = (cloth: Partial<Cloth> & Pick<Cloth, 'colour'>): Cloth => ({
  gloss: 0.1,
  tightness: 6,
  pile: 0,
  through: 0,
  openness: 1,
  slub: evenSlub,
  ...cloth,
});
