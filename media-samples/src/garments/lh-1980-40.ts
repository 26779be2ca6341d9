import { fittedFolds, fittedSeams, type BodiceCut } from '../bodices/bodice';
import { torso } from '../bodices/torso';
import { dye } from '../cloths/cloth';
import { jet, lining, woolTwill } from '../cloths/cloths';
import { layFallCollar } from '../collars/fall-collar';
import { layLapel } from '../collars/lapel';
import { noise as weaveNoise, part } from '../motifs/motifs';
import { curve, ease, mix } from '../renderer/numbers';
import { seededNoise } from '../renderer/noise';
import type { Layer } from '../renderer/scene';
import type { Vec3 } from '../renderer/tube';
import { fullSleeve, laySleeves } from '../sleeves/sleeve';
import { sewButtons } from '../trims/buttons';
import { round, sewBand, sewCord } from '../trims/sewn';
import { closeUp, hung, type Garment } from './garment';

const noise = seededNoise(1896);
const brown = dye('#6f5a42');
const dark = dye('#4a3a2b');
const fleck = dye('#b39a72');
/** Herringbone with flecks of a lighter yarn. */
const tweed = woolTwill((u, v, out) => {
  const row = Math.floor(u / 1.1);
  const rib = part(v * 1.9 + (row & 1 ? 1 : -1) * u * 1.9);
  const share = rib < 0.5 ? 0.15 : 0.62;
  const flecked = weaveNoise.at(u * 6.1, v * 6.3) > 0.66 ? 0.28 : 0;
  for (let i = 0; i < 3; i++) out[i] = mix(mix(brown[i]!, dark[i]!, share), fleck[i]!, flecked);
}, 12);
const inside = lining(dye('#a3876a'));
const WAIST = 102.5;
const BREAK = 119;

const close = fittedFolds(noise, WAIST, fittedSeams(WAIST));
const cut: BodiceCut = {
  form: torso({
    waistY: WAIST,
    waist: [11.2, 9, 9],
    bustFront: 0.4,
    hips: [
      [17, 20.6, 16, 19.6],
      [10, 17.8, 13.8, 16],
      [4, 13.4, 10.6, 11.4],
    ],
  }),
  neck: () => 142,
  lower: () => 86,
  folds: (theta, y) =>
    close(theta, y) +
    0.5 +
    ease(98, 87, y) *
      (0.8 + 2 * (noise.fold(Math.abs(theta) * 2.6 + 0.2, 5) - 0.5) * ease(0.6, 1.6, Math.abs(theta))),
};
const edge = (y: number): number => (y < BREAK ? 0 : 0.62 * Math.pow((y - BREAK) / 23, 0.9));
const body: Layer = (u, v, lift, p) => {
  const side = u < 0.5 ? -1 : 1;
  const across = side < 0 ? u * 2 : 2 - u * 2;
  const y0 = mix(141.6, 86, v);
  // The fronts are cut away in a round below the last button.
  const away = 0.16 * Math.pow(ease(98, 85, y0), 2);
  const theta = side * mix(Math.PI, edge(y0) + away, across);
  const lap =
    0.3 * ease(BREAK + 1, BREAK - 6, y0) * ease(-0.17, -0.13, theta) * ease(0.9, 0.3, Math.abs(theta));
  cut.form(y0, theta, cut.folds(theta, y0) + lap + lift, p);
  p.u = (theta / (2 * Math.PI)) * 90;
  p.v = 150 - y0;
};

const pose: readonly Vec3[] = [
  [15.2, 131.8, -1.7],
  [17, 131.4, -1.8],
  [21, 129.4, -2.2],
  [24.4, 122.4, -2.6],
  [25, 114.4, -2],
  [23.8, 106.4, 0.8],
  [22.2, 99, 5],
  [20.6, 92.6, 9],
];

export const lh1980n40: Garment = {
  number: 'LH.1980.40',
  kind: 'jacket',
  build(scene) {
    scene.layHalves({ cloth: tweed, across: 1000, along: 560 }, body);
    scene.layHalves(
      { cloth: inside, across: 400, along: 180 },
      (u, v, lift, p) => body(u, v * 0.996, lift, p),
      -0.45,
    );
    sewCord(scene, body, tweed, { line: round(0.997), points: 700, length: 110 }, 0.22, 0.9);
    const width = curve([
      [0, 0.3],
      [0.3, 4],
      [0.62, 7.4],
      [0.72, 7.8],
      [1, 5],
    ]);
    for (const side of [1, -1] as const)
      layLapel(
        scene,
        {
          form: cut.form,
          breakY: BREAK + 0.2,
          gorgeY: 139.6,
          edge: (y) => edge(y) - 0.012,
          width,
          lift: side > 0 ? 1.75 : 1.55,
          side,
        },
        tweed,
      );
    layFallCollar(
      scene,
      noise,
      { foot: 140, roll: 145.4, fall: 138.8, opens: 0.66, drop: 3.6, half: 6.4, middleZ: -1.4 },
      tweed,
    );
    sewButtons(scene, body, (t) => [0.5 + 0.006, mix(0.43, 0.78, t)], {
      count: 4,
      radius: 1,
      cloth: jet(dye('#4b3b30')),
      lift: 0.35,
      height: 0.35,
      points: 40,
    });
    const widths = [
      [0, 2.4],
      [0.06, 5.6],
      [0.12, 9.4],
      [0.26, 11.4],
      [0.4, 10.4],
      [0.54, 7.2],
      [0.68, 5.2],
      [0.85, 4.3],
      [1, 3.8],
    ] as const;
    const sleeves = laySleeves(
      scene,
      {
        pose,
        widths,
        folds: fullSleeve(noise, { folds: 11, depth: 2.2, ties: [0.05], from: 0, to: 0.7 }),
        clothWidth: 66,
        depth: 0.98,
      },
      tweed,
      inside,
      620,
      700,
    );
    for (const sleeve of sleeves) {
      sewBand(scene, sleeve, tweed, { from: 0.885, to: 1.003, lift: 0.4, across: 220, width: 6, length: 28 });
      sewButtons(scene, sleeve, (t) => [0.72, mix(0.91, 0.97, t)], {
        count: 2,
        radius: 0.6,
        cloth: jet(dye('#4b3b30')),
        lift: 0.5,
      });
    }
  },
  pictures: [
    {
      view: 'front',
      name: 'front',
      shot: hung(26, { lookAt: [0, 116], span: 78, aspect: 0.88, reach: 54 }, { exposure: 1 }),
      alt: "A woman's tailored jacket of about 1895 in brown herringbone tweed: leg-of-mutton sleeves, broad lapels, four buttons and a flared skirt.",
      caption: 'Front. Rendered; invented garment.',
    },
    {
      view: 'detail',
      name: 'detail-lapel',
      shot: closeUp(16, { lookAt: [-7, 125], span: 26, aspect: 1.25 }, { exposure: 1 }),
      alt: 'A close view of the lapel and collar in herringbone tweed with lighter flecks.',
      caption: 'Lapel and herringbone. Rendered; invented garment.',
      fineness: 1.3,
    },
  ],
};
