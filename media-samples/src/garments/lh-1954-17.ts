import { grooves, layBodice, type BodiceCut } from '../bodices/bodice';
import { torso } from '../bodices/torso';
import { dye } from '../cloths/cloth';
import { thread, whiteCotton } from '../cloths/cloths';
import { laceEdging } from '../cloths/lace';
import { neckline } from '../collars/neckline';
import { whiteworkSprig, whiteworkVine } from '../motifs/motifs';
import { loft } from '../renderer/loft';
import { ease, mix } from '../renderer/numbers';
import { seededNoise } from '../renderer/noise';
import { gathered, laySkirt } from '../skirts/skirt';
import { fullSleeve, laySleeves, POSES } from '../sleeves/sleeve';
import { sewButtons } from '../trims/buttons';
import { round, sewBand, sewCord, sewFrill } from '../trims/sewn';
import { closeUp, standing, type Garment } from './garment';

const noise = seededNoise(1812);
const white = dye('#efebe1');
/** Stitches stand whiter than the muslin, each with a thin shadow under it. */
const worked = whiteCotton(
  (u, v, out) => {
    const down = v - 104;
    const stitch =
      down > -1 && down < 12 ? whiteworkVine(u, down - 4.5) : v > 14 ? whiteworkSprig(u, v, 102) : 0;
    const shade =
      down > -1 && down < 12
        ? whiteworkVine(u - 0.09, down - 4.6)
        : v > 14
          ? whiteworkSprig(u - 0.08, v - 0.09, 102)
          : 0;
    for (let i = 0; i < 3; i++) out[i] = stitch > 0 ? 0.95 : white[i]! * (shade > 0 ? 0.62 : 0.9);
  },
  0.5,
  0.26,
);
const muslin = whiteCotton(white, 0.5, 0.26);
const HIGH_WAIST = 120.5;

const form = loft([
  { y: 121, half: 12.9, front: 10.6, back: 10 },
  { y: 116, half: 14.6, front: 11.6, back: 13 },
  { y: 108, half: 16.6, front: 12.6, back: 17 },
  { y: 88, half: 20, front: 15, back: 22 },
  { y: 60, half: 23.6, front: 18.4, back: 28 },
  { y: 30, half: 27, front: 21.6, back: 34 },
  { y: 8, half: 29.4, front: 24, back: 41 },
  { y: 0.8, half: 30.4, front: 25, back: 47 },
]);

const gathers = gathered(noise, { folds: 24, depth: 3, gathers: 80, gatherDepth: 1 });
const bodice: BodiceCut = {
  form: torso({ waistY: HIGH_WAIST - 1.5, waist: [12.7, 10.4, 9.7], bustY: 126.4, bustFront: 0.4 }),
  neck: neckline(129.6, 137.4, 133, 1.6),
  lower: () => HIGH_WAIST - 0.4,
  folds: (theta, y) => {
    const a = Math.abs(theta);
    // Drawn up on two strings: at the neck and under the bust.
    const gather =
      (noise.fold(a * 9 + 0.4 * noise.at(theta * 2, y * 0.2), 4) - 0.5) *
      ease(1.35, 0.9, a) *
      (0.35 + 0.35 * ease(126, 130, y) + 0.35 * ease(124, 121, y));
    return (
      0.7 +
      gather +
      0.16 * noise.layers(theta * 3, y * 0.2, 2) +
      grooves(theta, y, [() => 1.5, (h) => 2.35 + 0.02 * (h - 120), () => Math.PI], 0.07)
    );
  },
};

export const lh1954n17: Garment = {
  number: 'LH.1954.17',
  kind: 'dress',
  build(scene) {
    // The front hangs almost plain; the fullness is gathered behind.
    const folds = (u: number, theta: number, y: number, s: number): number => {
      const behind = ease(0.7, 2.1, Math.abs(theta));
      return gathers(u, theta, y, s) * (0.35 + 0.65 * behind) + 0.3;
    };
    laySkirt(
      scene,
      { form, upper: () => 121, hem: () => 2, clothWidth: 208, folds },
      worked,
      muslin,
      1500,
      860,
    );
    const body = layBodice(scene, bodice, muslin, muslin);
    sewBand(scene, body, muslin, { from: 0.93, to: 1.06, lift: 0.4, across: 700, width: 1.6, length: 74 });
    sewCord(
      scene,
      body,
      thread(dye('#f3efe4')),
      { line: round(0.07), points: 700, closed: true, length: 80 },
      0.12,
      0,
    );
    sewFrill(scene, body, laceEdging({ repeat: 1.2, depth: 1.8 }), {
      line: round(0.03),
      points: 800,
      closed: true,
      length: 90,
      depth: 1.7,
      motifDepth: 1.8,
      way: -1,
      gathers: 34,
      stand: 0.14,
      flare: 0.2,
      lift: 0.1,
    });
    sewButtons(scene, body, (t) => [0.0015, mix(0.12, 0.92, t)], {
      count: 4,
      radius: 0.4,
      cloth: thread(white),
      height: 0.4,
    });
    const sleeve = {
      pose: POSES.cap,
      widths: [
        [0, 3.4],
        [0.1, 5.4],
        [0.42, 7.8],
        [0.68, 7.6],
        [0.9, 5.2],
        [1, 5],
      ] as const,
      folds: fullSleeve(noise, { folds: 20, depth: 1.8, ties: [0.12, 0.92], from: 0, to: 1 }),
      clothWidth: 56,
      depth: 1,
    };
    for (const layer of laySleeves(scene, sleeve, muslin, muslin, 560, 320)) {
      sewBand(scene, layer, muslin, {
        from: 0.93,
        to: 1.004,
        lift: 0.3,
        across: 240,
        width: 1.4,
        length: 32,
      });
      sewFrill(scene, layer, laceEdging({ repeat: 1.2, depth: 1.4 }), {
        line: round(0.99),
        points: 480,
        closed: true,
        length: 38,
        depth: 1.4,
        way: 1,
        gathers: 18,
        stand: 0.14,
        flare: 0.2,
        lift: 0.1,
      });
    }
  },
  pictures: [
    {
      view: 'front',
      name: 'front',
      shot: standing(34, { lookAt: [-2, 69], span: 156, aspect: 0.66, reach: 100 }, { exposure: 0.85 }),
      alt: 'A white muslin dress of about 1812: high waist, a neck drawn up on a string, short puffed sleeves, and whitework sprigs over a border at the hem.',
      caption: 'Three-quarter view from the front. Rendered; invented garment.',
    },
    {
      view: 'detail',
      name: 'detail-hem',
      shot: closeUp(22, { lookAt: [1, 15], span: 32, aspect: 1.33, pitch: 6 }, { exposure: 0.85 }),
      alt: 'A close view of the hem: a whitework vine with leaves and berries between two worked lines on muslin.',
      caption: 'Whitework border at the hem. Rendered; invented garment.',
      fineness: 1.3,
    },
  ],
};
