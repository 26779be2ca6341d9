import { dye } from '../cloths/cloth';
import { lining, patternedSilk, ribbon, silkTaffeta } from '../cloths/cloths';
import { wovenSprig } from '../motifs/motifs';
import { bell, clamp, curve, ease, mix } from '../renderer/numbers';
import { seededNoise } from '../renderer/noise';
import type { Layer, Scene } from '../renderer/scene';
import { sewCord } from '../trims/sewn';
import { closeUp, type Garment } from './garment';

const noise = seededNoise(1796);
const silk = patternedSilk(wovenSprig(dye('#a3a863'), dye('#7f8a4c'), dye('#c9c48d'), 1.3), 0.12, 0.5);
const binding = ribbon(dye('#d8cfae'));
const heelSilk = silkTaffeta(dye('#d9d0b4'), 0.1);
const paper = lining(dye('#6f9a6b'));
const linen = lining(dye('#d3c6aa'));
const sole = lining(dye('#8a6a48'));

const LENGTH = 24;
/** Half the width of the sole from the back of the heel (0) to the pointed toe (1), cm. */
const halfWidth = curve([
  [0, 0.02],
  [0.008, 0.8],
  [0.03, 1.7],
  [0.1, 2.5],
  [0.25, 2.5],
  [0.42, 2.35],
  [0.6, 3.2],
  [0.72, 3.5],
  [0.84, 2.7],
  [0.94, 1.3],
  [1, 0.12],
]);
/** How high the sole stands off the ground: a small heel, then down to the tread. */
const soleHeight = curve([
  [0, 3.1],
  [0.12, 3],
  [0.28, 2.3],
  [0.44, 1.1],
  [0.58, 0.45],
  [0.75, 0.35],
  [1, 0.9],
]);
/** Height of the upper over the sole along its middle. */
const upperHeight = curve([
  [0, 5.6],
  [0.1, 5.4],
  [0.25, 4.7],
  [0.4, 4.5],
  [0.52, 4.5],
  [0.66, 3.9],
  [0.8, 2.7],
  [0.92, 1.6],
  [1, 0.5],
]);
/** The opening runs from the back seam to the throat on the instep. */
const THROAT = 0.62;

/** A place on the shoe: `t` heel to toe, `a` from the inner edge of the sole (-1) over the top (0) to the outer (1). */
function onUpper(t: number, a: number, lift: number, p: Parameters<Layer>[3], bend: number): void {
  const height = upperHeight(t);
  const angle = (a * Math.PI) / 2;
  const wide = halfWidth(t) + lift;
  const bulge = 1 + 0.12 * Math.sin(Math.abs(a) * Math.PI) * ease(0.2, 0.5, t);
  const s = Math.sign(Math.sin(angle)) * Math.pow(Math.abs(Math.sin(angle)), 0.62);
  p.x = wide * s * bulge + bend * Math.sin(t * 2.2) * 0.8;
  p.y =
    soleHeight(t) +
    (height + lift) * Math.pow(Math.max(0, Math.cos(angle)), 0.72) +
    0.08 * noise.at(t * 9, a * 2);
  p.z = t * LENGTH - LENGTH / 2 - 0.5 * bell(t, 0, 0.08) * ease(0.1, 0.8, 1 - Math.abs(a));
  p.nx = Math.sin(angle);
  p.ny = Math.cos(angle);
  p.nz = 0.01;
  p.u = a * 6;
  p.v = t * LENGTH;
}

/** How far from the top the edge of the opening lies, at each place along it. */
function opening(t: number): number {
  if (t >= THROAT) return 0;
  const k = t / THROAT;
  return 0.5 * Math.pow(1 - Math.pow(k, 3.2), 0.7) * ease(-0.02, 0.12, t) + 0.14 * (1 - ease(0, 0.14, t));
}

function layShoe(scene: Scene, place: (p: Parameters<Layer>[3]) => void, bend: number): void {
  const upper =
    (side: 1 | -1): Layer =>
    (u, v, lift, p) => {
      onUpper(u, side * mix(opening(u), 1, v), lift, p, bend);
      place(p);
    };
  for (const side of [1, -1] as const) {
    const layer = upper(side);
    scene.layLayer({ cloth: silk, across: 520, along: 140 }, layer);
    scene.layLayer({ cloth: linen, across: 300, along: 70 }, (u, v, lift, p) =>
      layer(mix(0, 0.96, u), v, lift - 0.16, p),
    );
    sewCord(
      scene,
      layer,
      binding,
      { line: (t) => [mix(0.001, THROAT, t), 0], points: 300, length: 30 },
      0.13,
      0.9,
    );
    // The rand, where upper and sole meet.
    sewCord(
      scene,
      layer,
      binding,
      { line: (t) => [mix(0.004, 0.998, t), 1], points: 400, length: 50 },
      0.11,
      0.8,
    );
  }
  const flat =
    (depth: number): Layer =>
    (u, v, lift, p) => {
      const half = halfWidth(u) + (depth < 0 ? 0.06 : -0.18);
      p.x = mix(-half, half, v) + bend * Math.sin(u * 2.2) * 0.8;
      p.y = soleHeight(u) + depth + lift;
      p.z = u * LENGTH - LENGTH / 2;
      p.nx = 0;
      p.ny = 1;
      p.nz = 0;
      p.u = v * 6;
      p.v = u * LENGTH;
      place(p);
    };
  scene.layLayer({ cloth: sole, across: 200, along: 40 }, flat(-0.28));
  scene.layLayer({ cloth: paper, across: 240, along: 60 }, flat(0.12));
  layHeel(scene, place, bend);
}

/** A small Italian heel: waisted, set a little forward, covered in pale silk. */
function layHeel(scene: Scene, place: (p: Parameters<Layer>[3]) => void, bend: number): void {
  scene.lay({ cloth: heelSilk, across: 120, along: 70, closed: true }, (u, v, p) => {
    const a = u * 2 * Math.PI;
    const r = mix(1.15, 2.35, Math.pow(1 - v, 2.1)) * (1 + 0.08 * ease(0.85, 1, v));
    const before = Math.max(0, Math.cos(a));
    p.x = r * 0.92 * Math.sin(a) + bend * 0.1;
    p.y = mix(3.05, 0, v) - 0.6 * before * (1 - v);
    p.z = -LENGTH / 2 + 2.7 + 0.9 * v + r * (1 + 0.45 * before * (1 - v)) * Math.cos(a);
    p.u = u * 10;
    p.v = v * 3;
    place(p);
  });
}

/** A ruched rosette of ribbon on the throat. */
function layRosette(scene: Scene, place: (p: Parameters<Layer>[3]) => void, bend: number): void {
  for (const [turns, radius, lift] of [
    [11, 1.25, 0.12],
    [8, 0.75, 0.35],
  ] as const)
    scene.lay({ cloth: binding, across: 220, along: 30, closed: true }, (u, v, p) => {
      const a = u * 2 * Math.PI;
      const r = radius * v;
      onUpper(
        clamp(THROAT + 0.035 - (r * Math.cos(a)) / LENGTH),
        (r * Math.sin(a)) / 4.6,
        lift + 0.22 * v * (1 + Math.sin(a * turns)),
        p,
        bend,
      );
      place(p);
      p.u = u * 12;
      p.v = v;
    });
}

/** The pair: one a little turned and set behind the other. */
function layPair(scene: Scene): void {
  for (const [dx, dz, turn, bend] of [
    [-4.6, 1.4, -0.1, 0.25],
    [4.8, -1.6, 0.2, -0.25],
  ] as const) {
    const place = (p: Parameters<Layer>[3]): void => {
      const x = p.x * Math.cos(turn) + p.z * Math.sin(turn);
      const z = p.z * Math.cos(turn) - p.x * Math.sin(turn);
      p.x = x + dx;
      p.z = z + dz;
    };
    layShoe(scene, place, bend);
    layRosette(scene, place, bend);
  }
}

export const lh2011n4: Garment = {
  number: 'LH.2011.4',
  kind: 'shoe',
  build: layPair,
  pictures: [
    {
      view: 'side',
      name: 'side',
      shot: closeUp(
        56,
        { lookAt: [0, 3.4], span: 21, aspect: 1.5, pitch: 20 },
        { exposure: 0.95, bias: 0.08, reach: 22, backdrop: 'floor', lampsAt: [0, 4] },
      ),
      alt: "A pair of woman's shoes of about 1795 in yellow-green silk: pointed toes, a small waisted heel covered in pale silk, bound edges and a ribbon rosette at the throat; the insole is lined with green paper.",
      caption: 'The pair from the side. Rendered; invented garment.',
    },
    {
      view: 'detail',
      name: 'detail-rosette',
      shot: closeUp(
        30,
        { lookAt: [-2, 5.5], span: 11, aspect: 1.33, pitch: 34 },
        { exposure: 0.95, bias: 0.05, reach: 20, backdrop: 'floor', lampsAt: [0, 4] },
      ),
      alt: 'A close view of the ribbon rosette and bound throat over green figured silk.',
      caption: 'Rosette and binding. Rendered; invented garment.',
      fineness: 1.2,
    },
  ],
};
