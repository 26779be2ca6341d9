import { layBelt, layBow } from '../accessories/belt';
import { grooves, layBodice, type BodiceCut } from '../bodices/bodice';
import { dye } from '../cloths/cloth';
import { lining, ribbon, woolTwill } from '../cloths/cloths';
import { eyeletEdging } from '../cloths/lace';
import { neckline } from '../collars/neckline';
import { loft } from '../renderer/loft';
import { ease } from '../renderer/numbers';
import { seededNoise } from '../renderer/noise';
import type { Vec3 } from '../renderer/tube';
import { gathered, laySkirt, tuck } from '../skirts/skirt';
import { fullSleeve, laySleeves } from '../sleeves/sleeve';
import { round, sewBand, sewFrill } from '../trims/sewn';
import { closeUp, standing, type Garment } from './garment';

const noise = seededNoise(1857);
const challis = { ...woolTwill(dye('#93a8b8'), 20), pile: 0.05, through: 0.1 };
const inside = lining(dye('#d6cbb4'));
const white = eyeletEdging({ repeat: 1.4, depth: 2.6 });
const blue = ribbon(dye('#5f7d97'));
const WAIST = 40;

/** A child of about four, on a stand: the waist 40 cm above the floor of the picture, the hem at the knee. */
const chest = loft([
  { y: 38, half: 10.4, front: 8.4, back: 8.2 },
  { y: WAIST, half: 9.4, front: 8, back: 7.6 },
  { y: 46, half: 10.2, front: 8.6, back: 7.8 },
  { y: 52, half: 11, front: 8.6, back: 8 },
  { y: 56, half: 11.4, front: 7.6, back: 7.6, cz: -0.2 },
  { y: 59, half: 10.6, front: 6.4, back: 6.6, cz: -0.5 },
  { y: 61.4, half: 8, front: 5, back: 5.2, cz: -0.7 },
]);
const form = loft([
  { y: WAIST + 0.6, half: 9.6, front: 8.2, back: 7.8 },
  { y: 38, half: 13.6, front: 11.4, back: 12 },
  { y: 33, half: 19, front: 16, back: 18 },
  { y: 24, half: 23.6, front: 20.4, back: 23.6 },
  { y: 10, half: 27, front: 23.6, back: 27.6 },
  { y: 2, half: 28.4, front: 25, back: 29 },
]);
const folds = gathered(noise, { folds: 22, depth: 2.1, gathers: 64, gatherDepth: 0.9 });

const bodice: BodiceCut = {
  form: chest,
  neck: neckline(55.4, 60, 57, 2),
  lower: () => WAIST - 0.4,
  folds: (theta, y) => {
    const a = Math.abs(theta);
    // Three tucks each side, meeting at the middle of the waist.
    const lean = a - 0.026 * (y - WAIST) - 0.08;
    let pleats = 0;
    for (const k of [0, 0.13, 0.26]) pleats += 0.28 * ease(k - 0.06, k, lean) * (1 - ease(k, k + 0.03, lean));
    return (
      0.5 +
      pleats * ease(1.2, 0.9, a) +
      0.12 * noise.layers(theta * 2.5 + 4, y * 0.25, 2) +
      grooves(theta, y, [() => 1.55, () => Math.PI], 0.08)
    );
  },
};

const pose: readonly Vec3[] = [
  [11.4, 56.3, -0.5],
  [11.9, 56, -0.5],
  [13, 54.8, -0.6],
  [14.4, 52, -0.6],
  [15, 49.2, -0.4],
];

export const lh1995n8: Garment = {
  number: 'LH.1995.8',
  kind: 'child-dress',
  build(scene) {
    const tucks = (s: number): number =>
      [0.6, 0.68, 0.76].reduce((sum, at) => sum + tuck(s, at, 0.4, 0.03), 0);
    const skirt = laySkirt(
      scene,
      {
        form,
        upper: () => WAIST + 0.4,
        hem: () => 3,
        clothWidth: 176,
        evenAt: 6,
        folds: (u, theta, y, s) => folds(u, theta, y, s) + tucks(s),
      },
      challis,
      inside,
      1300,
      620,
    );
    sewBand(scene, skirt, blue, { from: 0.9, to: 0.93, lift: 0.18, across: 1200, width: 1, length: 170 });
    const body = layBodice(scene, bodice, challis, inside, 700);
    sewFrill(scene, body, white, {
      line: round(0.02),
      points: 700,
      closed: true,
      length: 76,
      depth: 2.6,
      way: 1,
      gathers: 16,
      stand: 0.18,
      flare: 0.5,
      lift: 0.2,
    });
    layBelt(
      scene,
      noise,
      { upper: WAIST + 1.8, lower: WAIST - 1.8, half: 10.3, front: 8.9, back: 8.5, folds: 0.25 },
      blue,
    );
    layBow(scene, [0, WAIST, -9.6], 4, blue, 4);
    const widths = [
      [0, 2.1],
      [0.18, 3.8],
      [0.5, 5],
      [0.78, 4.6],
      [0.94, 3.3],
      [1, 3.2],
    ] as const;
    for (const sleeve of laySleeves(
      scene,
      {
        pose,
        widths,
        folds: fullSleeve(noise, { folds: 16, depth: 1.1, ties: [0.1, 0.93], from: 0, to: 1 }),
        clothWidth: 34,
        depth: 1,
      },
      challis,
      inside,
      420,
      220,
    )) {
      sewBand(scene, sleeve, blue, { from: 0.92, to: 1.004, lift: 0.2, across: 180, width: 1, length: 21 });
      sewFrill(scene, sleeve, white, {
        line: round(0.99),
        points: 400,
        closed: true,
        length: 30,
        depth: 1.7,
        motifDepth: 2.6,
        way: 1,
        gathers: 13,
        stand: 0.16,
        flare: 0.4,
        lift: 0.1,
      });
    }
  },
  pictures: [
    {
      view: 'front',
      name: 'front',
      shot: standing(
        22,
        { lookAt: [0, 30.5], span: 70, aspect: 0.95, reach: 50 },
        { exposure: 0.92, bias: 0.25 },
      ),
      alt: "A child's pale blue wool challis dress of about 1857: a low wide neck edged in white, short puffed sleeves, a ribbon sash and three growth tucks in the skirt.",
      caption: 'Front. Rendered; invented garment.',
    },
    {
      view: 'detail',
      name: 'detail-tucks',
      shot: closeUp(14, { lookAt: [1, 12], span: 20, aspect: 1.33, pitch: 6 }, { exposure: 0.92 }),
      alt: 'A close view of the growth tucks above a blue ribbon at the hem.',
      caption: 'Growth tucks in the skirt. Rendered; invented garment.',
      fineness: 1.2,
    },
  ],
};
