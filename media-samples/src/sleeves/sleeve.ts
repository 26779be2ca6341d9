import type { Cloth } from '../cloths/cloth';
import { bell, curve, ease } from '../renderer/numbers';
import type { Noise } from '../renderer/noise';
import type { Layer, Scene } from '../renderer/scene';
import { line, tube, type Vec3 } from '../renderer/tube';

/** The cut of a sleeve: how the arm is held (points of the wearer's left, from inside the shoulder) and how wide. */
export interface SleeveCut {
  pose: readonly Vec3[];
  /** Radius at shares of the way down, cm. */
  widths: readonly (readonly [number, number])[];
  /** Folds at angle (0 front, +π/2 outward) and share of the way down, cm. */
  folds: (angle: number, t: number, side: 1 | -1) => number;
  clothWidth: number;
  /** Flatter than round: depth over width. */
  depth?: number;
}

/** A sleeve as a layer: side 1 is the wearer's left, -1 its mirror on the right. */
export function sleeveLayer(cut: SleeveCut, side: 1 | -1): Layer {
  const radius = curve(cut.widths);
  const depth = cut.depth ?? 1.06;
  const { layer } = tube({
    spine: line(cut.pose),
    radius: (t) => [radius(t), radius(t) * depth],
    folds: (angle, t) => cut.folds(angle, t, side),
    clothWidth: cut.clothWidth,
  });
  if (side === 1) return layer;
  return (u, v, lift, p) => {
    layer(u, v, lift, p);
    p.x = -p.x;
    p.nx = -p.nx;
  };
}

/** Lays both sleeves (or the pair of poses given) with their linings, and hands back the two layers. */
export function laySleeves(
  scene: Scene,
  cuts: SleeveCut | { left: SleeveCut; right: SleeveCut },
  cloth: Cloth,
  inside: Cloth,
  across = 440,
  along = 620,
): Layer[] {
  const of = (side: 1 | -1): SleeveCut => ('pose' in cuts ? cuts : side === 1 ? cuts.left : cuts.right);
  return ([1, -1] as const).map((side) => {
    const layer = sleeveLayer(of(side), side);
    scene.layLayer({ cloth, across, along, closed: true }, layer);
    scene.lay({ cloth: inside, across: 120, along: 40, closed: true }, (u, v, p) =>
      layer(u, 0.8 + 0.195 * v, -0.4 - 0.5 * (1 - v), p),
    );
    return layer;
  });
}

/** How arms are held on a stand: the shoulder first, the wrist last. */
export const POSES = {
  /** Hanging, the forearm a little forward. */
  hanging: [
    [13.4, 133.2, -1.9],
    [16.2, 132, -2],
    [19.5, 126.5, -2.5],
    [21.6, 119, -3.1],
    [22.6, 110, -2],
    [22, 101, 1.4],
    [20.6, 94, 6],
  ],
  /** Bent across the front. */
  bent: [
    [13.4, 133.2, -1.9],
    [16.2, 132, -2],
    [19.8, 126.5, -2.6],
    [22.2, 119, -3],
    [23.2, 111, -1],
    [21.8, 104, 4],
    [18.6, 99, 10],
  ],
  /** Held off a great sleeve or a wide skirt. */
  wide: [
    [12.6, 132, -1.4],
    [16.6, 130, -1.6],
    [22.4, 124, -1.8],
    [26.4, 116, -1],
    [28.2, 109, 1.2],
    [27.6, 102, 5],
    [25, 96.6, 9.5],
    [21.6, 92.6, 13.4],
  ],
  /** Just over the shoulder. */
  cap: [
    [16.8, 132.2, -1.9],
    [17.4, 131.8, -2],
    [18.4, 129.8, -2],
    [19.6, 126.6, -2.2],
    [20.2, 122.6, -2.2],
  ],
} as const satisfies Record<string, readonly Vec3[]>;

/** A close sleeve: creases inside the elbow, a soft head, a little strain at the wrist. */
export function closeSleeve(noise: Noise, elbow = 0.57): SleeveCut['folds'] {
  return (angle, t, side) =>
    0.32 *
      bell(t, elbow, 0.13) *
      Math.sin(t * 95 + 1.6 * Math.sin(angle) + 2 * noise.at(angle + 3 * side, t * 8)) *
      (0.45 + 0.55 * Math.cos(angle)) +
    0.25 * noise.layers(Math.cos(angle) * 2 + 5 * side + 20, t * 9 + Math.sin(angle), 3) +
    0.05 * bell(t, 0.06, 0.07) * Math.sin(angle * 14) +
    0.1 * bell(t, 0.8, 0.05) * Math.sin(t * 150 + angle);
}

export interface Fullness {
  /** Folds round the arm and how deep at their fullest, cm. */
  folds: number;
  depth: number;
  /** Shares of the way down where it is gathered in. */
  ties: readonly number[];
  /** Between which shares it is full. */
  from: number;
  to: number;
}

/** A full sleeve: folds that deepen towards each gathered tie and lie softer between. */
export function fullSleeve(noise: Noise, f: Fullness): SleeveCut['folds'] {
  return (angle, t, side) => {
    const round = angle / (2 * Math.PI) + 0.5;
    const c = Math.cos(angle);
    const s = Math.sin(angle);
    const full = ease(f.from, f.from + 0.15, t) * ease(f.to, f.to - 0.15, t);
    let tied = 0;
    for (const tie of f.ties) tied += bell(t, tie, 0.1);
    const broad =
      noise.fold(
        (round * f.folds + 0.7 * noise.at(c * 1.3 + 4 * side, t * 3 + s) + f.folds) % f.folds,
        7 + side,
      ) - 0.5;
    const fine =
      noise.fold(
        (round * f.folds * 2.4 + 0.6 * noise.at(c * 3, t * 5 + s) + f.folds) % (f.folds * 2.4),
        3 + side,
      ) - 0.5;
    return (
      f.depth * broad * (0.35 * full + 0.55 * Math.min(1, tied)) +
      0.3 * f.depth * fine * Math.min(1, tied) +
      0.5 * f.depth * full * noise.layers(c * 1.6 + 9 * side + 20, t * 6 + s * 1.2, 3)
    );
  };
}
