import { layBelt, layBuckle } from '../accessories/belt';
import { grooves, layBodice, type BodiceCut } from '../bodices/bodice';
import { torso } from '../bodices/torso';
import { dye } from '../cloths/cloth';
import { lining, metal, printedCotton, ribbon, thread, whiteCotton } from '../cloths/cloths';
import { eyeletEdging } from '../cloths/lace';
import { layPelerine } from '../collars/pelerine';
import { neckline } from '../collars/neckline';
import { floralPrint } from '../motifs/motifs';
import { loft } from '../renderer/loft';
import { ease, mix } from '../renderer/numbers';
import { seededNoise } from '../renderer/noise';
import { gathered, laySkirt, tuck } from '../skirts/skirt';
import { fullSleeve, laySleeves, POSES } from '../sleeves/sleeve';
import { sewButtons } from '../trims/buttons';
import { sewBand } from '../trims/sewn';
import { closeUp, standing, type Garment } from './garment';

const noise = seededNoise(1834);
const print = printedCotton(
  floralPrint({
    ground: dye('#ece0c6'),
    stem: dye('#6f7148'),
    petal: dye('#c98273'),
    heart: dye('#9c3f37'),
    dot: dye('#4a5d80'),
  }),
);
const white = whiteCotton(dye('#f3eee2'), 0.5);
const inside = lining(dye('#d8c9ab'));
const WAIST = 106;

const form = loft([
  { y: 107, half: 11, front: 8.6, back: 8.7 },
  { y: 103.5, half: 15.2, front: 11.8, back: 13.5 },
  { y: 98, half: 21, front: 16, back: 20 },
  { y: 90, half: 26.5, front: 20.5, back: 26 },
  { y: 76, half: 32.5, front: 26.5, back: 32.5 },
  { y: 55, half: 38.5, front: 32.5, back: 38 },
  { y: 32, half: 43, front: 37, back: 42 },
  { y: 4, half: 46.5, front: 40.5, back: 45.5 },
]);

const gathers = gathered(noise, { folds: 30, depth: 3.9, gathers: 92 });
const tucks = (down: number): number => tuck(down, 0.8) + tuck(down, 0.835) + tuck(down, 0.87);

/** The front is gathered in to the belt in a fan; the sides and back are plain. */
const bodice: BodiceCut = {
  form: torso({ waistY: WAIST, waist: [11.2, 9, 9], bustY: 122, shoulder: 0.6 }),
  neck: neckline(134.6, 139.4, 140.4),
  lower: () => WAIST - 0.8,
  folds: (theta, y) => {
    const a = Math.abs(theta);
    const up = (y - WAIST) / 16;
    const fan = noise.fold(a * (1.9 - 0.42 * up) * 5.2 + 0.5 + 0.15 * noise.at(theta * 2, up * 2), 4) - 0.5;
    return (
      0.85 +
      ease(1.5, 1, a) * 0.75 * fan * (0.55 + 0.45 * ease(0, 0.8, up)) +
      0.2 * noise.layers(theta * 3 + 9, y * 0.17, 2) +
      grooves(theta, y, [() => 1.45, (h) => 2.5 - 0.012 * (h - WAIST), () => Math.PI])
    );
  },
};

const sleeve = {
  pose: POSES.wide,
  widths: [
    [0, 3.4],
    [0.07, 5.2],
    [0.16, 8.8],
    [0.28, 12.4],
    [0.4, 14.2],
    [0.52, 12.4],
    [0.64, 7.8],
    [0.76, 5],
    [0.88, 4],
    [1, 3.5],
  ] as const,
  folds: fullSleeve(noise, { folds: 17, depth: 3, ties: [0.08, 0.64], from: 0.02, to: 0.78 }),
  clothWidth: 92,
  depth: 0.98,
};

export const lh1962n8: Garment = {
  number: 'LH.1962.8',
  kind: 'dress',
  build(scene) {
    laySkirt(
      scene,
      {
        form,
        upper: () => 107,
        hem: () => 3,
        clothWidth: 300,
        folds: (u, theta, y, s) => gathers(u, theta, y, s) + tucks(s),
      },
      print,
      inside,
      1800,
      860,
    );
    const body = layBodice(scene, bodice, print, inside);
    layBelt(
      scene,
      noise,
      { upper: 109.4, lower: 104.8, half: 12.8, front: 10.75, back: 10.6 },
      ribbon(dye('#6d2b27')),
    );
    layBuckle(scene, { y: 107.1, z: 11.5 }, 2.2, 2.7, metal(dye('#a8873f')));
    // Hooks behind: the lap of the back opening, with its thread bars.
    sewButtons(scene, body, (t) => [0.001, mix(0.1, 0.95, t)], {
      count: 11,
      radius: 0.22,
      cloth: thread(dye('#8d8372')),
      height: 0.3,
      points: 14,
    });
    for (const layer of laySleeves(scene, sleeve, print, inside, 760, 800))
      sewBand(scene, layer, white, { from: 0.94, to: 1.004, lift: 0.5, across: 240, width: 3.4, length: 24 });
    const collar = {
      neckY: 140.2,
      dropFront: 7.5,
      dropSide: 9.5,
      dropBack: 8,
      reachSide: 13.5,
      reachFront: 9,
      reachBack: 7,
      neckHalf: 9.6,
      ripples: 19,
      rippleHeight: 0.5,
      openAt: 0.02,
      opens: 0.14,
      length: 96,
      depth: 10,
    };
    layPelerine(scene, noise, collar, eyeletEdging({ repeat: 2.4, depth: 10, colour: dye('#cbc4b3') }));
    layPelerine(
      scene,
      noise,
      {
        ...collar,
        neckY: 141,
        dropFront: 4.4,
        dropSide: 4.6,
        dropBack: 4.6,
        reachSide: 8,
        reachFront: 5.4,
        reachBack: 4.4,
        depth: 6,
        length: 84,
      },
      eyeletEdging({ repeat: 2.1, depth: 6, colour: dye('#cbc4b3') }),
    );
  },
  pictures: [
    {
      view: 'front',
      name: 'front',
      shot: standing(24, { lookAt: [0, 71], span: 160, aspect: 0.82, reach: 112 }, { exposure: 0.92 }),
      alt: 'A cotton dress of about 1834 printed with madder flowers on cream: great sleeves, a double white collar, a dark red belt with a gilt buckle and three tucks above the hem.',
      caption: 'Front. Rendered; invented garment.',
    },
    {
      view: 'back',
      name: 'back',
      shot: standing(196, { lookAt: [0, 71], span: 160, aspect: 0.82, reach: 112 }, { exposure: 0.92 }),
      alt: 'The printed cotton dress from behind, closing down the middle of the back under the white collar.',
      caption: 'Back, with its opening. Rendered; invented garment.',
    },
    {
      view: 'detail',
      name: 'detail-belt',
      shot: closeUp(10, { lookAt: [1, 108], span: 25, aspect: 1.33 }, { exposure: 0.92 }),
      alt: 'A close view of the waist: the gathered print, a ribbed dark red belt and its gilt buckle.',
      caption: 'Belt and buckle over the gathered waist. Rendered; invented garment.',
      fineness: 1.3,
    },
  ],
};
