import type { Cloth } from '../cloths/cloth';
import type { Loft } from '../renderer/loft';
import { bell, ease, mix } from '../renderer/numbers';
import type { Noise } from '../renderer/noise';
import type { Layer, Scene } from '../renderer/scene';

/** The cut of a bodice: on what form, from which neck to which lower edge (heights by angle), and how it creases. */
export interface BodiceCut {
  form: Loft;
  neck: (theta: number) => number;
  lower: (theta: number) => number;
  /** How far it stands off the form, with every seam and fold, cm. */
  folds: (theta: number, y: number) => number;
  /** Where its cloth is measured from: width round and the lean of the grain at the front. */
  clothWidth?: number;
}

export const thetaOf = (u: number): number => (u - 0.5) * 2 * Math.PI;
export const uOf = (theta: number): number => theta / (2 * Math.PI) + 0.5;

export function bodiceLayer(cut: BodiceCut): Layer {
  const width = cut.clothWidth ?? 84;
  return (u, v, lift, p) => {
    const theta = thetaOf(u);
    const y = mix(cut.neck(theta), cut.lower(theta), v);
    cut.form(y, theta, cut.folds(theta, y) + lift, p);
    p.u = u * width;
    p.v = (150 - y) * 1.04;
  };
}

/** Lays a bodice with its lining, which shows at the neck and under the lower edge. */
export function layBodice(scene: Scene, cut: BodiceCut, cloth: Cloth, inside: Cloth, across = 1000): Layer {
  const layer = bodiceLayer(cut);
  scene.layLayer({ cloth, across, along: 640, closed: true }, layer);
  scene.lay({ cloth: inside, across: 320, along: 160, closed: true }, (u, v, p) => {
    const theta = thetaOf(u);
    const y = mix(cut.neck(theta) - 0.05, cut.lower(theta) + 0.15, v);
    cut.form(y, theta, Math.min(cut.folds(theta, y), 0.9) - 0.42, p);
    p.u = u * 84;
    p.v = 150 - y;
  });
  return layer;
}

/** A seam drawn as a groove: `where` gives its angle at a height, or null where it has ended. */
export type Seam = (y: number) => number | null;

/** Angles to distances over the cloth: the mean radius of a torso, cm. */
export const RADIUS = 13;

export function grooves(theta: number, y: number, seams: readonly Seam[], depth = 0.11, width = 0.2): number {
  const a = Math.abs(theta);
  let sum = 0;
  for (const seam of seams) {
    const at = seam(y);
    if (at === null) continue;
    const d = ((a - at) * RADIUS) / width;
    if (d > -3 && d < 3) sum -= depth * Math.exp(-d * d);
  }
  return sum;
}

/** Two darts, a side seam, a curved side-back seam and the back seam of a fitted bodice. */
export function fittedSeams(waistY: number, bustY = 121.5): Seam[] {
  const rise = bustY - waistY;
  const up = (y: number): number => (y - waistY) / rise;
  return [
    (y) => (y < bustY - 1 ? 0.2 + 0.16 * Math.max(0, up(y)) + 0.1 * Math.max(0, -up(y)) : null),
    (y) => (y < bustY - 1.5 ? 0.52 + 0.22 * Math.max(0, up(y)) + 0.1 * Math.max(0, -up(y)) : null),
    (y) => (y < 129 ? 1.45 : null),
    (y) => (y < 133 ? 2.62 - 0.42 * Math.pow(Math.max(0, (y - waistY) / 30), 1.5) : null),
    () => Math.PI,
  ];
}

/** What a close bodice does over stays: seams, strain at the waist, wrinkles from the armpit, a breath everywhere. */
export function fittedFolds(
  noise: Noise,
  waistY: number,
  seams: readonly Seam[] = fittedSeams(waistY),
): BodiceCut['folds'] {
  return (theta, y) => {
    const a = Math.abs(theta);
    const strain = bell(y, waistY + 1.5, 4.5);
    return (
      0.9 +
      grooves(theta, y, seams) +
      0.14 *
        strain *
        Math.sin(y * 2.6 + 3 * a + 2 * noise.at(theta * 3, y * 0.2)) *
        (0.35 + 0.65 * bell(a, 1.4, 0.7)) +
      0.2 * noise.layers(theta * 2.2 + 5, y * 0.17, 2) * (1 - 0.5 * strain) +
      0.26 * bell(a, 1.05, 0.33) * bell(y, 126, 6) * Math.sin((y * 0.27 - a * 3) * 5)
    );
  };
}

/** The edge of a front that laps over the other, seen as a low step just beside the middle. */
export const lapEdge = (theta: number, at = 0.06): number =>
  Math.abs(theta) < 0.6
    ? 0.22 * ease(-0.08, 0.08, at * RADIUS - theta * RADIUS) * ease(0.6, 0.25, Math.abs(theta))
    : 0;
