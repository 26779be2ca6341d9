import { fittedFolds, layBodice, lapEdge, uOf, type BodiceCut } from '../bodices/bodice';
import { torso } from '../bodices/torso';
import { dye } from '../cloths/cloth';
import { lining, patternedSilk, thread, whiteCotton } from '../cloths/cloths';
import { eyeletEdging, fringe, laceEdging } from '../cloths/lace';
import { layPelerine } from '../collars/pelerine';
import { check } from '../motifs/motifs';
import { loft } from '../renderer/loft';
import { ease, mix } from '../renderer/numbers';
import { seededNoise } from '../renderer/noise';
import type { Scene } from '../renderer/scene';
import type { Vec3 } from '../renderer/tube';
import { gathered, laySkirt, skirtLayer } from '../skirts/skirt';
import { laySleeves, type SleeveCut } from '../sleeves/sleeve';
import { sewButtons } from '../trims/buttons';
import { round, sewFrill } from '../trims/sewn';
import { closeUp, standing, type Garment } from './garment';

const noise = seededNoise(1859);
const brown = dye('#6b5138');
const blue = dye('#3f5d7d');
const pale = dye('#b9a88a');
const checked = patternedSilk(
  check(brown, 6, [
    { from: 0.1, to: 0.42, colour: blue },
    { from: 0.48, to: 0.51, colour: pale },
    { from: 0.74, to: 0.77, colour: pale },
    { from: 0.82, to: 0.86, colour: dye('#3a2c20') },
  ]),
  0.42,
  0.55,
);
const inside = lining(dye('#c7b898'));
const WAIST = 105;

/** The dome of a cage crinoline, a little longer behind. */
const form = loft([
  { y: 106, half: 11.6, front: 9.2, back: 9.4 },
  { y: 103, half: 18, front: 15, back: 18 },
  { y: 98, half: 25, front: 21, back: 27 },
  { y: 90, half: 34, front: 29, back: 38 },
  { y: 74, half: 45, front: 39, back: 51 },
  { y: 50, half: 54, front: 47, back: 62 },
  { y: 24, half: 60, front: 52.5, back: 69 },
  { y: 1.5, half: 63, front: 55, back: 73 },
]);

function flounces(scene: Scene): void {
  const under = gathered(noise, { folds: 36, depth: 1.6, gathers: 110, gatherDepth: 1 });
  laySkirt(
    scene,
    { form, upper: () => 106, hem: () => 3, clothWidth: 430, folds: under },
    checked,
    inside,
    1400,
    420,
  );
  // Each flounce lies over the one below it and is fuller than the skirt it hangs from.
  for (const [upper, hem, row] of [
    [33.5, 2, 3],
    [64, 31.5, 5],
    [95, 62, 7],
  ] as const) {
    const full = gathered(noise, { folds: 44, depth: 2.6, gathers: 130, gatherDepth: 0.9, power: 0.9, row });
    const flounce = skirtLayer({
      form,
      upper: () => upper,
      hem: () => hem,
      clothWidth: 470,
      evenAt: 30,
      folds: (u, theta, y, v) =>
        0.5 +
        1.1 * ease(0.02, 0.3, v) +
        under(u, theta, y, 1 - y / 106) * 0.8 +
        full(u, theta, y, v) +
        2.6 * v +
        0.2 * ease(0, 0.03, v),
    });
    scene.layLayer({ cloth: checked, across: 1900, along: 330, closed: true }, flounce);
    sewFrill(scene, flounce, fringe(dye('#4c3a29'), blue, 2.6, 3), {
      line: round(0.998),
      points: 1900,
      closed: true,
      length: 460,
      depth: 2.6,
      way: 1,
      gathers: 40,
      stand: 0.06,
      flare: 0.1,
      lift: 0.1,
      fall: 0.6,
      down: 12,
    });
  }
}

const seamed = fittedFolds(noise, WAIST);
const bodice: BodiceCut = {
  form: torso({ waistY: WAIST, waist: [11.2, 9, 9], bustY: 122, shoulder: 0.8, hips: [[7, 19, 15, 18]] }),
  neck: () => 141,
  lower: (theta) => WAIST - 0.6 - 4.2 * Math.exp(-theta * theta * 5),
  folds: (theta, y) => seamed(theta, y) + lapEdge(theta) + 0.9 * ease(WAIST + 1, WAIST - 2.5, y),
};

const pose: readonly Vec3[] = [
  [9, 134, -1.6],
  [16, 131.6, -1.8],
  [21.5, 125, -2.2],
  [25.6, 117, -1.6],
  [28.4, 109, 0.8],
  [29, 102, 4.4],
];
const pagoda: SleeveCut = {
  pose,
  widths: [
    [0, 3],
    [0.12, 5.2],
    [0.3, 6.2],
    [0.5, 7.2],
    [0.7, 9.6],
    [0.86, 12],
    [1, 13.6],
  ],
  folds: (angle, t, side) =>
    (0.4 + 2.4 * ease(0.35, 1, t)) *
      (noise.fold((angle / (2 * Math.PI) + 0.5) * 9 + 0.4 * noise.at(Math.cos(angle) + 4 * side, t * 2), 5) -
        0.5) +
    0.3 * noise.layers(Math.cos(angle) * 2 + 20 * side, t * 6 + Math.sin(angle), 2),
  clothWidth: 74,
  depth: 1,
};
const undersleeve: SleeveCut = {
  pose: [
    [26.4, 114, -0.6],
    [27.4, 109, 1.4],
    [27.8, 102, 4.6],
    [26.2, 96.5, 8.6],
  ],
  widths: [
    [0, 3.4],
    [0.3, 5.2],
    [0.55, 6.6],
    [0.8, 6],
    [0.93, 3.6],
    [1, 3.5],
  ],
  folds: (angle, t) =>
    1.6 *
      ease(1, 0.75, t) *
      (noise.fold((angle / (2 * Math.PI) + 0.5) * 15 + 0.5 * noise.at(Math.cos(angle) * 2 + 8, t * 4), 9) -
        0.5) +
    0.5 * (noise.fold((angle / (2 * Math.PI) + 0.5) * 32, 3) - 0.5),
  clothWidth: 40,
  depth: 1,
};

export const lh1971n3: Garment = {
  number: 'LH.1971.3',
  kind: 'dress',
  build(scene) {
    flounces(scene);
    const body = layBodice(scene, bodice, checked, inside);
    sewButtons(scene, body, (t) => [uOf(0.03), mix(0.11, 0.96, t)], {
      count: 12,
      radius: 0.6,
      cloth: thread(dye('#3f5d7d')),
      lift: 0.2,
      height: 0.6,
    });
    layPelerine(
      scene,
      noise,
      {
        neckY: 143.2,
        dropFront: 2.8,
        dropSide: 2.4,
        dropBack: 3.4,
        reachSide: 3,
        reachFront: 3,
        reachBack: 2.4,
        neckHalf: 7.3,
        ripples: 10,
        rippleHeight: 0.12,
        openAt: 0.02,
        opens: 0.1,
        length: 56,
        depth: 4.6,
      },
      eyeletEdging({ repeat: 1.5, depth: 4.6 }),
      700,
    );
    for (const layer of laySleeves(scene, pagoda, checked, inside, 520, 480))
      sewFrill(scene, layer, fringe(dye('#4c3a29'), blue, 2.2, 3), {
        line: round(0.998),
        points: 600,
        closed: true,
        length: 84,
        depth: 2.2,
        way: 1,
        gathers: 9,
        stand: 0.05,
        flare: 0,
        lift: 0,
        fall: 0.5,
        down: 12,
      });
    const muslin = whiteCotton(dye('#f4f0e6'), 0.6, 0.2);
    for (const layer of laySleeves(scene, undersleeve, muslin, muslin, 420, 300))
      sewFrill(scene, layer, laceEdging({ repeat: 1.7, depth: 2.6 }), {
        line: round(0.97),
        points: 560,
        closed: true,
        length: 34,
        depth: 2.6,
        way: 1,
        gathers: 14,
        stand: 0.3,
        flare: 0.7,
        lift: 0.2,
      });
  },
  pictures: [
    {
      view: 'front',
      name: 'front',
      shot: standing(26, { lookAt: [0, 69], span: 162, aspect: 0.94, reach: 126 }, { exposure: 1 }),
      alt: 'A dress of about 1860 in brown and blue checked silk: three fringed flounces over a wide crinoline, pagoda sleeves over white undersleeves, and a buttoned front with a small white collar.',
      caption: 'Front. Rendered; invented garment.',
    },
    {
      view: 'detail',
      name: 'detail-collar',
      shot: closeUp(16, { lookAt: [2, 133], span: 26, aspect: 1.25 }, { exposure: 1 }),
      alt: 'A close view of the neck: a white collar with eyelets over the checked silk, and thread-covered buttons down the front.',
      caption: 'Collar and buttons. Rendered; invented garment.',
      fineness: 1.3,
    },
  ],
};
