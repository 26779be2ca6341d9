import { fittedFolds, grooves, layBodice, lapEdge, uOf, type BodiceCut, type Seam } from '../bodices/bodice';
import { torso } from '../bodices/torso';
import { dye } from '../cloths/cloth';
import { jet, lining, ribbon, woolTwill } from '../cloths/cloths';
import { layStandCollar } from '../collars/stand-collar';
import { ease, mix } from '../renderer/numbers';
import { seededNoise } from '../renderer/noise';
import { closeSleeve, laySleeves, POSES } from '../sleeves/sleeve';
import { sewButtons } from '../trims/buttons';
import { round, sewBand, sewCord } from '../trims/sewn';
import { closeUp, hung, type Garment } from './garment';

const noise = seededNoise(1882);
const red = woolTwill(dye('#6e2c2f'), 11);
const inside = lining(dye('#c8b89a'));
const braid = ribbon(dye('#4d2124'));
const WAIST = 102;

const longDarts: Seam[] = [
  (y) => (y < 121 ? 0.22 + 0.006 * Math.abs(y - WAIST) : null),
  (y) => (y < 120 ? 0.56 + 0.008 * Math.abs(y - WAIST) : null),
];
const close = fittedFolds(noise, WAIST);

/** The cuirass: one length from the neck over the hips, pointed before and behind. */
const bodice: BodiceCut = {
  form: torso({
    waistY: WAIST,
    waist: [10.7, 8.6, 8.6],
    hips: [
      [22, 19.4, 14.6, 19],
      [14, 17.8, 13.4, 17],
      [6.5, 14.2, 10.8, 12],
    ],
  }),
  neck: () => 141.8,
  lower: (theta) => {
    const a = Math.abs(theta);
    return 81.5 + 8 * ease(0.05, 1.35, a) - 5.2 * ease(1.6, 3, a);
  },
  folds: (theta, y) =>
    close(theta, y) + lapEdge(theta) + grooves(theta, y, longDarts, 0.05, 0.16) + 0.4 * ease(92, 84, y),
};

export const lh1958n6: Garment = {
  number: 'LH.1958.6',
  kind: 'bodice',
  build(scene) {
    const body = layBodice(scene, bodice, red, inside);
    sewCord(scene, body, braid, { line: round(1), points: 700, closed: true, length: 100 }, 0.26, 0.8);
    sewBand(scene, body, braid, { from: 0.955, to: 0.975, lift: 0.2, across: 700, width: 1, length: 100 });
    const collar = layStandCollar(
      scene,
      { foot: 141.1, top: 146.6, footHalf: 7, footFront: 5.6, lift: 0.35 },
      red,
      inside,
    );
    sewCord(scene, collar, braid, { line: round(0.03), points: 360, closed: true, length: 38 }, 0.2, 0.6);
    sewCord(scene, collar, red, { line: round(0.97), points: 400, closed: true, length: 46 }, 0.14, 0.6);
    sewButtons(scene, body, (t) => [uOf(0.03), mix(0.02, 0.95, t)], {
      count: 19,
      radius: 0.6,
      cloth: jet(dye('#4a2b2c')),
      lift: 0.2,
      height: 0.6,
    });
    const widths = [
      [0, 2.6],
      [0.1, 4.7],
      [0.2, 5.7],
      [0.36, 5.5],
      [0.55, 4.9],
      [0.72, 4.4],
      [0.88, 3.7],
      [1, 3.4],
    ] as const;
    for (const sleeve of laySleeves(
      scene,
      { pose: POSES.hanging, widths, folds: closeSleeve(noise), clothWidth: 32 },
      red,
      inside,
    )) {
      for (const t of [0.885, 0.925, 0.965])
        sewBand(scene, sleeve, braid, {
          from: t,
          to: t + 0.02,
          lift: 0.25,
          across: 200,
          width: 1,
          length: 24,
        });
      sewButtons(scene, sleeve, (t) => [0.7, mix(0.86, 0.97, t)], {
        count: 3,
        radius: 0.5,
        cloth: jet(dye('#4a2b2c')),
        lift: 0.35,
      });
    }
  },
  pictures: [
    {
      view: 'front',
      name: 'front',
      shot: hung(30, { lookAt: [0, 114], span: 82, aspect: 0.8, reach: 56 }, { exposure: 0.95 }),
      alt: 'A dark red wool bodice of about 1882: a long cuirass shape to the hips with nineteen buttons, a stand collar and bands of braid at the wrists.',
      caption: 'Front. Rendered; invented garment.',
    },
    {
      view: 'detail',
      name: 'detail-collar',
      shot: closeUp(16, { lookAt: [1.5, 138], span: 22, aspect: 1.33 }, { exposure: 0.95 }),
      alt: 'A close view of the corded stand collar and the first buttons over red wool twill.',
      caption: 'Stand collar and buttons. Rendered; invented garment.',
      fineness: 1.3,
    },
  ],
};
