import { layBelt } from '../accessories/belt';
import { layBodice, type BodiceCut } from '../bodices/bodice';
import { torso } from '../bodices/torso';
import { dye } from '../cloths/cloth';
import { jet, lining, ribbon, silkCrepe, whiteCotton } from '../cloths/cloths';
import { laceCloth } from '../cloths/lace';
import { neckline } from '../collars/neckline';
import { loft } from '../renderer/loft';
import { bell, ease, mix } from '../renderer/numbers';
import { seededNoise } from '../renderer/noise';
import type { Layer } from '../renderer/scene';
import type { Vec3 } from '../renderer/tube';
import { gathered, laySkirt } from '../skirts/skirt';
import { laySleeves } from '../sleeves/sleeve';
import { sewButton } from '../trims/buttons';
import { round, sewBand, sewCord } from '../trims/sewn';
import { standing, type Garment } from './garment';

const noise = seededNoise(1912);
const crepe = silkCrepe(dye('#74859a'));
const inside = lining(dye('#a9a79e'));
const dark = ribbon(dye('#3f4a5c'));
const WAIST = 109;

/** A column, its hem narrower than its hips, with a small square train. */
const form = loft([
  { y: 110, half: 13, front: 10.4, back: 10.4 },
  { y: 104, half: 14.8, front: 11.6, back: 12.6 },
  { y: 94, half: 17, front: 12.8, back: 15.2 },
  { y: 76, half: 17.6, front: 13.6, back: 16 },
  { y: 50, half: 16.6, front: 14, back: 16 },
  { y: 24, half: 16.2, front: 14.4, back: 17.4 },
  { y: 6, half: 17, front: 15, back: 21 },
  { y: 0.6, half: 18, front: 15.6, back: 28 },
]);

const soft = gathered(noise, { folds: 14, depth: 1.5, gathers: 44, gatherDepth: 0.5 });

/** The drape: caught up on the left hip, it crosses the front and falls lower to the right. */
const drape: Layer = (u, v, lift, p) => {
  const theta = mix(-Math.PI * 1.02, 1.25, u);
  const caught = ease(0.55, 1, u);
  const y = mix(109.6, mix(26, 66, Math.pow(u, 1.5)), v);
  const slant = y + 30 * Math.pow(u, 1.6) * (v - 0.25) - 34 * (1 - u) * v * 0.2;
  const at = (110 - slant) / mix(8.5, 3.4, caught) + u * 3.2 + 0.4 * noise.at(theta * 1.3 + 6, slant * 0.05);
  const off =
    (0.9 + (noise.fold(at, 8) - 0.3) * (0.5 + 1.0 * caught + 0.6 * v) + 1.3 * v) *
      (0.12 + 0.88 * ease(0, 0.05, v)) +
    0.5 * noise.at(theta * 2, y * 0.05) * v;
  form(y, theta, off + lift - 0.7 * ease(0.04, 0, Math.min(u, 1 - u)), p);
  p.u = theta * 17;
  p.v = v * 70;
};

/** Kimono cut: body and sleeve are one, so that soft folds run from neck to underarm and nothing is seamed. */
const bodice: BodiceCut = {
  form: torso({ waistY: WAIST, waist: [12.8, 10.4, 10.2], bustY: 122, bustFront: -0.4 }),
  neck: neckline(127, 141.4, 140.6, 3.2),
  lower: () => WAIST - 0.6,
  folds: (theta, y) => {
    const a = Math.abs(theta);
    const crossing =
      0.35 * ease(0.02, -0.02, theta - 0.09 * (y - 126) * 0.35) * ease(1.3, 0.4, a) * ease(132, 126, y);
    const fall =
      (noise.fold(a * 5 + y * 0.12 + 0.3 * noise.at(theta * 2, y * 0.1), 5) - 0.5) *
      1.1 *
      bell(a, 1.0, 0.8) *
      ease(137, 130, y);
    return 1 + crossing + fall + 0.25 * noise.layers(theta * 2 + 4, y * 0.14, 2);
  },
};

const pose: readonly Vec3[] = [
  [9, 135, -1.6],
  [14.2, 132, -1.7],
  [18, 126.6, -2],
  [21, 120.6, -2.2],
  [22.8, 114, -1.6],
  [23.6, 108, 0.4],
];

export const lh1977n14: Garment = {
  number: 'LH.1977.14',
  kind: 'dress',
  build(scene) {
    laySkirt(
      scene,
      { form, upper: () => 109.8, hem: () => 1, clothWidth: 150, folds: soft },
      crepe,
      inside,
      1100,
      640,
    );
    scene.layLayer({ cloth: crepe, across: 1000, along: 620 }, drape);
    sewCord(scene, drape, dark, { line: round(0.997, 0.01, 0.995), points: 700, length: 100 }, 0.3, 0.6);
    const body = layBodice(scene, bodice, crepe, inside);
    sewBand(scene, body, dark, { from: -0.004, to: 0.055, lift: 0.3, across: 500, width: 2, length: 60 });
    // A modesty of net fills the V.
    scene.lay({ cloth: whiteCotton(dye('#b9a98e'), 0.1, 0.1), across: 240, along: 90 }, (u, v, p) => {
      bodice.form(mix(137.5, 125, v), mix(-0.8, 0.8, u), 0.1, p);
      p.u = u * 20;
      p.v = v * 14;
    });
    scene.lay({ cloth: laceCloth(1.9), across: 240, along: 90, casts: false }, (u, v, p) => {
      bodice.form(mix(137.8, 125, v), mix(-0.8, 0.8, u), 0.25, p);
      p.u = u * 20;
      p.v = v * 14;
    });
    layBelt(
      scene,
      noise,
      { upper: 111.6, lower: 106, half: 14.8, front: 12.7, back: 12.7, folds: 0.4 },
      dark,
    );
    for (const [x, y, z] of [
      [8.6, 106.6, 10.6],
      [10.2, 103.8, 10.4],
    ] as const)
      sewButton(scene, [x, y, z], [0.5, 0.1, 1], 1.2, jet(dye('#3b4250')), 0.4, 40);
    const widths = [
      [0, 4],
      [0.14, 5.2],
      [0.4, 6.4],
      [0.7, 6],
      [1, 5.5],
    ] as const;
    const sleeves = laySleeves(
      scene,
      {
        pose,
        widths,
        clothWidth: 46,
        folds: (angle, t, side) =>
          0.9 *
            bell(t, 0.35, 0.3) *
            (noise.fold(t * 7 + 1.2 * Math.cos(angle) + 9 + side, 4) - 0.5) *
            (0.5 - 0.5 * Math.sin(angle)) +
          0.35 * noise.layers(Math.cos(angle) * 2 + 9 * side + 20, t * 5 + Math.sin(angle), 2),
      },
      crepe,
      inside,
      440,
      420,
    );
    for (const sleeve of sleeves)
      sewBand(scene, sleeve, dark, { from: 0.93, to: 1.004, lift: 0.3, across: 240, width: 2.4, length: 38 });
  },
  pictures: [
    {
      view: 'front',
      name: 'front',
      shot: standing(20, { lookAt: [0, 70], span: 158, aspect: 0.6, reach: 100 }, { exposure: 0.95 }),
      alt: 'A grey-blue crêpe dress of about 1912: a narrow column with a drape caught up on one hip, kimono sleeves to the elbow, a dark sash and a lace-filled neck.',
      caption: 'Front. Rendered; invented garment.',
    },
  ],
};
