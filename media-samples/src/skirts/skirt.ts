import type { Cloth } from '../cloths/cloth';
import { evenRound, type Loft } from '../renderer/loft';
import { ease, mix } from '../renderer/numbers';
import type { Noise } from '../renderer/noise';
import type { Layer, Scene } from '../renderer/scene';

/** The cut of a skirt: over what form, from what height to what hem, and how its cloth folds. */
export interface SkirtCut {
  form: Loft;
  /** Height of its upper edge, by angle. */
  upper: (theta: number) => number;
  hem: (theta: number) => number;
  /** Folds at u (0–1 of the cloth), angle, height and share of the way down, cm. */
  folds: (u: number, theta: number, y: number, down: number) => number;
  /** Width of the cloth at the hem, cm. */
  clothWidth: number;
  /** The height at which the cloth is spread evenly round; near the hem as a rule. */
  evenAt?: number;
}

export function skirtLayer(cut: SkirtCut): Layer {
  const theta = evenRound(cut.form, cut.evenAt ?? 12);
  const table = Float64Array.from({ length: 4097 }, (_, i) => theta(i / 4096));
  return (u, v, lift, p) => {
    const at = Math.min(4095.999, Math.max(0, u * 4096));
    const i = at | 0;
    const angle = mix(table[i]!, table[i + 1]!, at - i);
    const upper = cut.upper(angle);
    const y = mix(upper, cut.hem(angle), v);
    cut.form(y, angle, cut.folds(u, angle, y, v) + lift, p);
    p.u = u * cut.clothWidth;
    p.v = upper - y;
  };
}

/** Lays a skirt, and inside its hem the facing that shows when one looks down. */
export function laySkirt(
  scene: Scene,
  cut: SkirtCut,
  cloth: Cloth,
  inside: Cloth,
  across = 1700,
  along = 760,
): Layer {
  const layer = skirtLayer(cut);
  scene.layLayer({ cloth, across, along, closed: true }, layer);
  // As many points round as the skirt itself has: with fewer it would cut through the folds.
  scene.lay({ cloth: inside, across, along: 16, closed: true }, (u, v, p) =>
    layer(u, mix(0.93, 0.996, v), -0.6, p),
  );
  return layer;
}

export interface Gathering {
  /** Broad folds round the hem and their depth there, cm. */
  folds: number;
  depth: number;
  /** Fine gathers at the waist, dying away over about 10 cm. */
  gathers: number;
  gatherDepth?: number;
  /** How the folds come in on the way down: 1 evenly, below 1 at once. */
  power?: number;
  row?: number;
}

/** Cloth gathered into a band: fine gathers that run together into broad folds. `u` must close on itself. */
export function gathered(noise: Noise, g: Gathering): SkirtCut['folds'] {
  const { power = 0.75, gatherDepth = 1.25, row = 2 } = g;
  return (u, _theta, _y, s) => {
    // Noise over a circle, so that the join at the back does not show.
    const c = Math.cos(u * 2 * Math.PI) * 1.3 + 4;
    const n = Math.sin(u * 2 * Math.PI) * 1.3 + 9;
    const drift = 0.75 * noise.at(c * 1.1, n + s * 1.1) + 0.25 * noise.at(c * 3, n * 3 + s * 2.4);
    const broad = noise.fold((u * g.folds + drift + g.folds) % g.folds, row) - 0.6;
    const fine =
      noise.fold((u * g.gathers + 1.3 * noise.at(c * 4, n * 4 + s * 3) + g.gathers) % g.gathers, row + 7) -
      0.5;
    const depth = 0.4 + g.depth * Math.pow(s, power) * (1 - 0.18 * s);
    const off =
      depth * 1.15 * broad +
      fine * (gatherDepth * Math.exp(-s / 0.1) + 0.2) +
      1.2 * noise.at(c * 1.5, n * 1.5 + s * 2.2) * s;
    return off * (0.3 + 0.7 * ease(0, 0.05, s));
  };
}

/** Knife pleats: each rises slowly and falls at once. */
export function knifePleats(count: number, depth: number, noise: Noise): (u: number, v: number) => number {
  return (u, v) => {
    const at = u * count + 0.1 * noise.at(u * 80, v * 2);
    const part = at - Math.floor(at);
    return (0.3 + 0.7 * v) * depth * (part < 0.8 ? part / 0.8 : (1 - part) / 0.2);
  };
}

/** A tuck standing off a skirt at `at` of the way down: it swells and then falls sheer. */
export const tuck = (down: number, at: number, height = 0.42, wide = 0.012): number =>
  height * ease(at - wide, at, down) * (1 - ease(at, at + 0.0025, down));
