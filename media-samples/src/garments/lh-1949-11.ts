import { layBow } from '../accessories/belt';
import { fittedFolds, layBodice, lapEdge, uOf, type BodiceCut } from '../bodices/bodice';
import { torso } from '../bodices/torso';
import { dye } from '../cloths/cloth';
import { lining, ribbon, silkFaille, silkVelvet, thread } from '../cloths/cloths';
import { fringe, laceEdging } from '../cloths/lace';
import { neckline } from '../collars/neckline';
import { loft } from '../renderer/loft';
import { bell, clamp, ease, mix } from '../renderer/numbers';
import { seededNoise } from '../renderer/noise';
import type { Layer, Scene } from '../renderer/scene';
import { gathered, knifePleats, laySkirt, skirtLayer } from '../skirts/skirt';
import { closeSleeve, laySleeves, POSES } from '../sleeves/sleeve';
import { sewButtons } from '../trims/buttons';
import { round, sewBand, sewFrill } from '../trims/sewn';
import { standing, type Garment } from './garment';

const noise = seededNoise(1873);
const violet = dye('#574869');
const faille = silkFaille(violet, 0.5);
const failleBody = silkFaille(violet, 0.24);
const velvet = silkVelvet(dye('#3b2d4e'));
const inside = lining(dye('#c3b49a'));
const lace = laceEdging({ repeat: 1.8, depth: 3 });
const WAIST = 104.5;

/** The first bustle: a low, soft puff over a skirt that runs out behind. */
const form = loft([
  { y: 105.5, half: 11.5, front: 8.8, back: 9 },
  { y: 102, half: 15, front: 11, back: 17 },
  { y: 96, half: 19.5, front: 13.5, back: 27 },
  { y: 86, half: 23, front: 16, back: 33 },
  { y: 72, half: 26.5, front: 19, back: 37 },
  { y: 52, half: 31, front: 23, back: 43 },
  { y: 30, half: 36, front: 27.5, back: 53 },
  { y: 10, half: 40.5, front: 31.5, back: 66 },
  { y: 0.6, half: 43, front: 33.4, back: 76 },
]);

const underFolds = gathered(noise, { folds: 22, depth: 2.2, gathers: 70, gatherDepth: 0.6 });

function skirt(scene: Scene): void {
  laySkirt(
    scene,
    { form, upper: () => 104, hem: () => 2, clothWidth: 300, folds: underFolds },
    faille,
    inside,
    1300,
    480,
  );
  const pleats = knifePleats(112, 1.3, noise);
  const flounce = skirtLayer({
    form,
    upper: () => 21,
    hem: () => 0.6,
    clothWidth: 520,
    folds: (u, theta, y, v) => 0.9 + underFolds(u, theta, y, 1 - y / 104) + pleats(u, v) + 0.9 * v * v,
  });
  scene.layLayer({ cloth: faille, across: 2400, along: 110, closed: true }, flounce);
  sewBand(scene, flounce, velvet, { from: -0.06, to: 0.09, lift: 0.7, across: 1500, width: 3, length: 290 });
  sewBand(scene, flounce, velvet, { from: 0.84, to: 0.91, lift: 0.5, across: 1500, width: 1.5, length: 290 });
}

const HALF = 1.95;
/** The apron front, drawn up at both sides. */
const apron: Layer = (u, v, lift, p) => {
  const theta = (u - 0.5) * 2 * HALF;
  const aside = Math.abs(theta) / HALF;
  const y = mix(104, 38 + 40 * Math.pow(clamp(aside), 2.2), v);
  const swing = y - 34 * Math.pow(aside, 2) * v;
  const drawn = ease(0.62, 1, aside);
  const at = (104 - swing) / mix(13, 6.5, drawn) + 0.4 * noise.at(theta * 1.4 + 3, swing * 0.04);
  const off =
    (1.7 +
      (noise.fold(at, 13) - 0.3) * (0.5 + 2.6 * drawn + 1.2 * v) +
      1.9 * v +
      0.5 * noise.at(theta * 2.2, y * 0.05)) *
    (0.1 + 0.9 * ease(0, 0.05, v));
  form(y, theta, off + lift, p);
  p.u = theta * 28;
  p.v = v * 68;
};

/** Two soft puffs behind, one over the other, and a short fall under them. */
const puff: Layer = (u, v, lift, p) => {
  const theta = mix(1.5, 2 * Math.PI - 1.5, u);
  const aside = Math.abs(u - 0.5) * 2;
  const y = mix(104.5, mix(34, 60, Math.pow(aside, 1.7)), v);
  const free = 1 - Math.pow(aside, 3.2);
  const swell = 7.5 * bell(y, 91, 8) + 6.5 * bell(y, 70, 8);
  const tied = -2.4 * bell(y, 80.5, 3) - 1.6 * bell(y, 58, 3.4);
  const low = ease(58, 40, y);
  const gathers = 1.5 + 2 * bell(y, 80, 6) + 1.8 * bell(y, 103, 6) + 2.8 * low + 1.8 * bell(y, 58, 6);
  const at = u * 13 + 0.7 * noise.at(u * 5 + 3, y * 0.04) + 0.25 * noise.at(u * 12, y * 0.11);
  let off =
    4.2 +
    (swell + tied) * (0.1 + 0.9 * free) +
    gathers * (noise.fold(at, 6) - 0.45) * (0.4 + 0.6 * free) +
    low * 2 * free;
  off +=
    (noise.fold(u * 40 + noise.at(u * 9, y * 0.07), 21) - 0.5) *
    (0.9 * bell(y, 80, 4) + 0.9 * bell(y, 102, 4));
  off = mix(0.9, off, ease(1, 0.7, aside)) * (0.15 + 0.85 * ease(0, 0.05, v));
  form(y, theta, off + lift, p);
  p.y -= swell * 0.3 * free;
  p.u = u * 130;
  p.v = v * 72;
};

const close = fittedFolds(noise, WAIST);
const bodice: BodiceCut = {
  form: torso({
    waistY: WAIST,
    waist: [10.8, 8.6, 8.7],
    hips: [
      [9, 18.6, 13, 25],
      [4.5, 14.6, 10.6, 17],
    ],
  }),
  neck: neckline(134.4, 141.8, 142, 1.4),
  lower: (theta) => {
    const a = Math.abs(theta);
    return WAIST - 7 + 4.6 * ease(0.1, 1.2, a) - 5.4 * ease(2.2, 2.8, a);
  },
  folds: (theta, y) =>
    close(theta, y) +
    lapEdge(theta) +
    (4.4 + 1.8 * ease(1.5, 2.4, Math.abs(theta))) * ease(WAIST + 0.8, WAIST - 4, y),
};

export const lh1949n11: Garment = {
  number: 'LH.1949.11',
  kind: 'dress',
  build(scene) {
    skirt(scene);
    scene.layLayer({ cloth: faille, across: 1000, along: 600 }, puff);
    sewBand(scene, puff, velvet, {
      from: 0.94,
      to: 1.004,
      lift: 0.5,
      across: 900,
      closed: false,
      width: 3.4,
      length: 130,
    });
    scene.layLayer({ cloth: faille, across: 900, along: 520 }, apron);
    sewBand(scene, apron, velvet, {
      from: 0.92,
      to: 0.985,
      lift: 0.5,
      across: 900,
      closed: false,
      width: 4,
      length: 120,
    });
    sewFrill(scene, apron, fringe(violet, dye('#8d7f9c'), 5), {
      line: round(0.995),
      points: 900,
      length: 130,
      depth: 5,
      way: 1,
      gathers: 14,
      stand: 0.2,
      flare: 0.1,
      lift: 0.3,
      fall: 0.85,
    });
    const body = layBodice(scene, bodice, failleBody, inside);
    sewBand(scene, body, velvet, { from: 0.945, to: 1.003, lift: 0.4, across: 700, width: 2.4, length: 90 });
    sewBand(scene, body, velvet, { from: -0.005, to: 0.045, lift: 0.35, across: 600, width: 2, length: 56 });
    sewFrill(scene, body, lace, {
      line: round(0.01),
      points: 700,
      closed: true,
      length: 64,
      depth: 2.6,
      motifDepth: 3,
      way: -1,
      gathers: 20,
      stand: 0.22,
      flare: 0.5,
      lift: 0.1,
    });
    sewButtons(scene, body, (t) => [uOf(0.03), mix(0.09, 0.92, t)], {
      count: 9,
      radius: 0.7,
      cloth: thread(dye('#3b2d4e')),
      lift: 0.2,
      height: 0.6,
    });
    const widths = [
      [0, 2.8],
      [0.12, 4.9],
      [0.26, 5.9],
      [0.5, 5.4],
      [0.72, 5],
      [0.88, 5.6],
      [1, 6.4],
    ] as const;
    const sleeves = laySleeves(
      scene,
      { pose: POSES.hanging, widths, folds: closeSleeve(noise), clothWidth: 36 },
      failleBody,
      inside,
    );
    for (const sleeve of sleeves) {
      sewBand(scene, sleeve, velvet, { from: 0.83, to: 0.9, lift: 0.4, across: 240, width: 3.4, length: 34 });
      sewFrill(scene, sleeve, faille, {
        line: round(0.9),
        points: 600,
        closed: true,
        length: 60,
        depth: 5,
        way: 1,
        gathers: 14,
        stand: 0.45,
        flare: 1.2,
        lift: 0.4,
      });
      sewFrill(scene, sleeve, lace, {
        line: round(0.985),
        points: 600,
        closed: true,
        length: 46,
        depth: 4.4,
        motifDepth: 3,
        way: 1,
        gathers: 14,
        stand: 0.4,
        flare: 0.8,
        lift: 0,
      });
    }
    layBow(scene, [0, 133, 10.6], 4.4, ribbon(dye('#46365a')), 1.5);
  },
  pictures: [
    {
      view: 'front',
      name: 'front',
      shot: standing(46, { lookAt: [-10, 71], span: 160, aspect: 0.86, reach: 124 }, { exposure: 1.0 }),
      alt: 'A violet silk dress of about 1873 with darker velvet bands: a fringed apron overskirt, two low puffs behind, frilled sleeves and a pleated flounce on a trained skirt.',
      caption: 'Three-quarter view from the front. Rendered; invented garment.',
    },
  ],
};
