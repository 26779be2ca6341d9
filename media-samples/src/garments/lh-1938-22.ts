import { grooves, layBodice, type BodiceCut } from '../bodices/bodice';
import { torso } from '../bodices/torso';
import { dye } from '../cloths/cloth';
import { lining, shotSilk, thread } from '../cloths/cloths';
import { laceEdging } from '../cloths/lace';
import { neckline } from '../collars/neckline';
import { loft } from '../renderer/loft';
import { bell, ease, mix } from '../renderer/numbers';
import { seededNoise } from '../renderer/noise';
import type { Vec3 } from '../renderer/tube';
import { gathered, laySkirt } from '../skirts/skirt';
import { closeSleeve, laySleeves } from '../sleeves/sleeve';
import { sewButtons } from '../trims/buttons';
import { round, sewBand, sewCord, sewFrill } from '../trims/sewn';
import { closeUp, standing, type Garment } from './garment';

const noise = seededNoise(1844);
const green = dye('#2c4a38');
const bronze = dye('#8a7a3c');
const shot = shotSilk(green, bronze, 0.56);
const shotBody = shotSilk(green, bronze, 0.24);
const inside = lining(dye('#c5b594'));
const WAIST = 102;

/** A bell of many petticoats, round and even. */
const form = loft([
  { y: 103, half: 11.4, front: 9, back: 9.2 },
  { y: 100, half: 17, front: 13.6, back: 16 },
  { y: 95, half: 24.5, front: 20, back: 24 },
  { y: 86, half: 32.5, front: 27.5, back: 33 },
  { y: 70, half: 40, front: 34.6, back: 41 },
  { y: 46, half: 46.5, front: 41, back: 47.5 },
  { y: 20, half: 51, front: 45.4, back: 52 },
  { y: 1.5, half: 53.6, front: 47.8, back: 55 },
]);

/** Folds that open from the point at the waist to the shoulders, stitched down below the bust. */
const bodice: BodiceCut = {
  form: torso({
    waistY: WAIST,
    waist: [10.7, 8.6, 8.7],
    bustY: 121,
    shoulder: 1,
    hips: [[9, 18.5, 14.2, 17]],
  }),
  neck: neckline(133.6, 137, 136.4, 1.7),
  lower: (theta) => WAIST - 0.6 - 8.4 * Math.exp(-Math.abs(theta) * 3.2),
  folds: (theta, y) => {
    const a = Math.abs(theta);
    const up = (y - (WAIST - 8)) / 42;
    const spread = a / (0.1 + 0.95 * up);
    const fan = ease(1.05, 0.9, spread) * 0.62 * (noise.fold(spread * 5 + 0.02, 4) - 0.45) * (0.5 + 0.7 * up);
    return (
      0.95 +
      fan -
      0.12 * bell(spread, 1.02, 0.05) +
      grooves(theta, y, [() => 1.48, (h) => 2.7 - 0.014 * (h - WAIST), () => Math.PI], 0.12) +
      0.16 * noise.layers(theta * 2 + 3, y * 0.16, 2) +
      1.6 * ease(WAIST + 1, WAIST - 7, y)
    );
  },
};

const pose: readonly Vec3[] = [
  [15, 132, -1.7],
  [16.8, 131, -1.8],
  [20, 125, -2.4],
  [22, 117, -2.8],
  [22.6, 109, -1],
  [20.8, 102.6, 4.4],
  [17.4, 99.4, 10],
];
const creases = closeSleeve(noise, 0.55);

export const lh1938n22: Garment = {
  number: 'LH.1938.22',
  kind: 'dress',
  build(scene) {
    const gauged = gathered(noise, { folds: 34, depth: 4, gathers: 104, gatherDepth: 1.9, power: 0.65 });
    laySkirt(
      scene,
      {
        form,
        upper: (theta) => 103.2 - 7.4 * Math.exp(-Math.abs(theta) * 3.4),
        hem: () => 1.6,
        clothWidth: 360,
        folds: gauged,
      },
      shot,
      inside,
      1900,
      760,
    );
    const body = layBodice(scene, bodice, shotBody, inside);
    sewCord(scene, body, shotBody, { line: round(1), points: 700, closed: true, length: 80 }, 0.24, 0.8);
    sewFrill(scene, body, laceEdging({ repeat: 2, depth: 4.6 }), {
      line: round(0.012),
      points: 900,
      closed: true,
      length: 96,
      depth: 4.4,
      motifDepth: 4.6,
      way: 1,
      gathers: 16,
      stand: 0.14,
      flare: 0.35,
      lift: 0.35,
    });
    sewButtons(scene, body, (t) => [0.0012, mix(0.06, 0.98, t)], {
      count: 14,
      radius: 0.2,
      cloth: thread(dye('#59624a')),
      height: 0.3,
      points: 14,
    });
    const sleeve = {
      pose,
      widths: [
        [0, 3.6],
        [0.12, 5],
        [0.26, 5.7],
        [0.5, 4.9],
        [0.72, 4.3],
        [0.88, 3.7],
        [1, 3.4],
      ] as const,
      folds: creases,
      clothWidth: 33,
    };
    for (const layer of laySleeves(scene, sleeve, shotBody, inside)) {
      // A cap of two bias folds over the dropped shoulder.
      for (const t of [0.2, 0.27])
        sewBand(scene, layer, shotBody, {
          from: t - 0.035,
          to: t + 0.035,
          lift: 0.5,
          across: 260,
          width: 3,
          length: 36,
        });
      sewFrill(scene, layer, laceEdging({ repeat: 1.4, depth: 2 }), {
        line: round(0.99),
        points: 460,
        closed: true,
        length: 30,
        depth: 2,
        way: 1,
        gathers: 13,
        stand: 0.2,
        flare: 0.4,
        lift: 0,
      });
    }
  },
  pictures: [
    {
      view: 'front',
      name: 'front',
      shot: standing(24, { lookAt: [0, 68], span: 156, aspect: 0.86, reach: 112 }, { exposure: 0.92 }),
      alt: 'A deep green shot silk dress of about 1844: a long pointed bodice with fan pleats, tight sleeves, a wide neck edged with lace and a full gauged skirt.',
      caption: 'Front. Rendered; invented garment.',
    },
    {
      view: 'detail',
      name: 'detail-fan-pleats',
      shot: closeUp(10, { lookAt: [0, 106], span: 28, aspect: 1.33 }, { exposure: 0.95 }),
      alt: 'A close view of the waist: pleats drawn together to a corded point over the gauged skirt.',
      caption: 'Fan pleats at the point. Rendered; invented garment.',
      fineness: 1.3,
    },
  ],
};
