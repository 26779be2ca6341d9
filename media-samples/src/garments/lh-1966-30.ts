import { fittedFolds, fittedSeams, lapEdge, layBodice, uOf, type BodiceCut } from '../bodices/bodice';
import { torso } from '../bodices/torso';
import { layWaistTape } from '../accessories/waist-tape';
import { dye } from '../cloths/cloth';
import { lining, metal, silkTaffeta, silkVelvet } from '../cloths/cloths';
import { laceEdging } from '../cloths/lace';
import { layStandCollar } from '../collars/stand-collar';
import { ease, mix } from '../renderer/numbers';
import { seededNoise } from '../renderer/noise';
import type { Scene } from '../renderer/scene';
import { closeSleeve, laySleeves, POSES } from '../sleeves/sleeve';
import { sewButtons } from '../trims/buttons';
import { round, sewBand, sewCord, sewFrill } from '../trims/sewn';
import { closeUp, standing, type Garment } from './garment';
import { layBustleSkirt } from './lh-1966-30-skirt';

const noise = seededNoise(1885);
const teal = dye('#1f4a50');
const ecru = dye('#cbb98f');
const skirtSilk = silkTaffeta(teal, 0.62);
const bodiceSilk = silkTaffeta(teal, 0.28);
const velvet = silkVelvet(dye('#173a40'));
const inside = lining(dye('#b9a98a'));
const brass = metal(dye('#a9843f'), 0.8);
const lace = laceEdging({ repeat: 1.6, depth: 2.6 });

const WAIST = 102.5;
const hips = torso({
  waistY: WAIST,
  hips: [
    [10.5, 17.8, 12.6, 34],
    [5.5, 15.2, 11.3, 24],
  ],
});
const seams = fittedSeams(WAIST);
const close = fittedFolds(noise, WAIST, seams);
const bodice: BodiceCut = {
  form: hips,
  neck: () => 143,
  lower: (theta) => {
    const a = Math.abs(theta);
    return a < 1 ? 92.6 + 6 * ease(0.06, 1, a) : 98.6 + 1.6 * ease(1, 2.1, a);
  },
  // Over the skirt the basque stands off by as much as the drapery under it.
  folds: (theta, y) =>
    close(theta, y) +
    lapEdge(theta) +
    (2.9 + 1.2 * ease(1.45, 2.1, Math.abs(theta))) * ease(WAIST + 0.7, 98, y),
};

function layBody(scene: Scene): void {
  const layer = layBodice(scene, bodice, bodiceSilk, inside);
  sewCord(scene, layer, velvet, { line: round(1), points: 800, closed: true, length: 90 }, 0.34, 0.7);
  const collar = layStandCollar(scene, { foot: 142.2, top: 147.4 }, velvet, inside);
  sewFrill(scene, collar, lace, {
    line: round(0.12),
    points: 800,
    closed: true,
    length: 52,
    depth: 2.5,
    motifDepth: 2.6,
    way: -1,
    gathers: 22,
    stand: 0.22,
    flare: 0.35,
    lift: -0.12,
  });
  sewButtons(scene, layer, (t) => [uOf(0.028), mix(0.035, 0.985, t)], {
    count: 15,
    radius: 0.62,
    cloth: brass,
    lift: 0.2,
    height: 0.62,
  });
  const sleeves = laySleeves(
    scene,
    {
      left: { pose: POSES.bent, widths: WIDTHS, folds: closeSleeve(noise), clothWidth: 34 },
      right: { pose: POSES.hanging, widths: WIDTHS, folds: closeSleeve(noise), clothWidth: 34 },
    },
    bodiceSilk,
    inside,
  );
  for (const sleeve of sleeves) {
    sewBand(scene, sleeve, velvet, { from: 0.845, to: 1.003, lift: 0.42, across: 260, width: 9, length: 26 });
    sewFrill(scene, sleeve, lace, {
      line: round(0.995),
      points: 640,
      closed: true,
      length: 34,
      depth: 2.8,
      motifDepth: 2.6,
      way: 1,
      gathers: 16,
      stand: 0.3,
      flare: 0.5,
      lift: -0.15,
    });
    sewButtons(scene, sleeve, (t) => [0.5 + 0.16, mix(0.875, 0.965, t)], {
      count: 3,
      radius: 0.5,
      cloth: brass,
      lift: 0.55,
    });
  }
}
const WIDTHS = [
  [0, 2.6],
  [0.1, 4.6],
  [0.19, 5.9],
  [0.32, 5.9],
  [0.5, 5.3],
  [0.68, 4.7],
  [0.85, 3.9],
  [1, 3.4],
] as const;

export const lh1966n30: Garment = {
  number: 'LH.1966.30',
  kind: 'dress',
  build(scene) {
    layBustleSkirt(scene, { silk: skirtSilk, velvet, teal, ecru });
    layBody(scene);
  },
  pictures: [
    {
      view: 'front',
      name: 'front',
      shot: standing(52, { lookAt: [-8, 74], span: 168, aspect: 0.78, reach: 128 }, { exposure: 1.08 }),
      alt: 'A teal silk dress of about 1885 in three-quarter view: a close bodice with brass buttons and velvet cuffs, a draped apron with fringe over a striped panel, and a high shelf bustle.',
      caption: 'Three-quarter view from the front. Rendered; invented garment.',
    },
    {
      view: 'back',
      name: 'back',
      shot: standing(152, { lookAt: [-4, 70], span: 168, aspect: 0.78, reach: 128 }, { exposure: 1.08 }),
      alt: 'The same teal dress from behind: a puff tied in twice below the waist falls over pleated flounces.',
      caption: 'Back, with the tied puff. Rendered; invented garment.',
    },
    {
      view: 'detail',
      name: 'detail-cuff',
      shot: closeUp(18, { lookAt: [-15, 98], span: 24, aspect: 1.33 }, { exposure: 1.1 }),
      alt: 'A close view of a velvet cuff with three brass buttons and a lace frill at the wrist.',
      caption: 'Velvet cuff with brass buttons and lace. Rendered; invented garment.',
      fineness: 1.4,
    },
    {
      view: 'label',
      name: 'detail-waist-tape',
      build: (scene) => layWaistTape(scene, noise),
      shot: {
        camera: { yaw: 0, pitch: 1, distance: 160, lookAt: [3, -0.2], span: 14.2, aspect: 1.5 },
        backdrop: 'none',
        reach: 24,
        bias: 0.06,
        exposure: 0.92,
        keyTowards: [-0.62, 0.55, 0.5],
      },
      alt: 'The inside of the bodice at the waist: a ribbed tape with a woven label of scrolls and a rosette, sewn to a striped lining, and two wire hooks facing their eyes.',
      caption: 'Waist tape with a woven label, hooks and eyes. Rendered; invented garment.',
    },
  ],
};
