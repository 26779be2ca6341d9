import { layBelt } from '../accessories/belt';
import { fittedFolds, layBodice, type BodiceCut } from '../bodices/bodice';
import { torso } from '../bodices/torso';
import { dye } from '../cloths/cloth';
import { lining, ribbon, silkFaille } from '../cloths/cloths';
import { laceCloth, laceEdging } from '../cloths/lace';
import { layPelerine } from '../collars/pelerine';
import { layStandCollar } from '../collars/stand-collar';
import { loft } from '../renderer/loft';
import { bell, ease, mix } from '../renderer/numbers';
import { seededNoise } from '../renderer/noise';
import type { Vec3 } from '../renderer/tube';
import { laySkirt } from '../skirts/skirt';
import { fullSleeve, laySleeves } from '../sleeves/sleeve';
import { round, sewBand, sewFrill } from '../trims/sewn';
import { closeUp, standing, type Garment } from './garment';

const noise = seededNoise(1895);
const straw = silkFaille(dye('#c6ae7c'), 0.42);
const strawBody = silkFaille(dye('#c6ae7c'), 0.22);
const black = dye('#3a3638');
const inside = lining(dye('#cdbb93'));
const satin = ribbon(dye('#2f2c30'));
const WAIST = 103;

/** Gored: close over the hips, flaring from the knee, its fullness at the back. */
const form = loft([
  { y: 104, half: 11.2, front: 8.8, back: 8.9 },
  { y: 99, half: 15.4, front: 11.6, back: 13.6 },
  { y: 90, half: 19.6, front: 14.2, back: 18.6 },
  { y: 74, half: 24.5, front: 18, back: 25 },
  { y: 50, half: 32.5, front: 25, back: 35 },
  { y: 24, half: 42.5, front: 34, back: 47 },
  { y: 1, half: 52, front: 43, back: 59 },
]);

function gores(u: number, theta: number, y: number, s: number): number {
  const a = Math.abs(theta);
  const behind = ease(2, 2.8, a);
  const c = Math.cos(u * 2 * Math.PI) * 1.3 + 4;
  const n = Math.sin(u * 2 * Math.PI) * 1.3 + 7;
  const low = ease(70, 8, y);
  const soft = (noise.fold((u * 13 + 0.5 * noise.at(c, n + s) + 13) % 13, 4) - 0.5) * 3.2 * low;
  const organ = (noise.fold(u * 34 + 0.2, 9) - 0.5) * (0.7 + 3 * s) * behind * ease(0, 0.06, s);
  let seams = 0;
  for (const seam of [0.62, 1.5, 2.2]) seams -= 0.1 * bell(a - seam, 0, 0.014) * ease(0, 0.05, s);
  return 0.4 + soft + organ + seams + 0.3 * noise.at(c * 2, n * 2 + s * 3);
}

const close = fittedFolds(noise, WAIST);
/** The front is draped over its lining: soft folds drawn in to the waist. */
const bodice: BodiceCut = {
  form: torso({ waistY: WAIST, waist: [10.8, 8.6, 8.6], bustFront: 0.8, shoulder: -0.4 }),
  neck: () => 142.6,
  lower: () => WAIST - 1,
  folds: (theta, y) => {
    const a = Math.abs(theta);
    const up = (y - WAIST) / 19;
    const drape =
      (noise.fold(a * (6.4 - 3 * up) + 0.2 + 0.2 * noise.at(theta * 2 + 3, up * 2), 6) - 0.45) *
      0.75 *
      ease(1.25, 0.7, a) *
      ease(134, 126, y);
    return mix(close(theta, y), 1 + 0.15 * noise.layers(theta * 2, y * 0.2, 2), ease(1.4, 1, a)) + drape;
  },
};

const pose: readonly Vec3[] = [
  [13.4, 132.8, -1.7],
  [16.4, 132.4, -1.8],
  [22.4, 128.5, -2.2],
  [26.4, 121, -2.6],
  [26.8, 113, -1.4],
  [24.8, 105.5, 2.4],
  [22.4, 99, 7.2],
  [20.6, 94, 11],
];
const greatSleeve = {
  pose,
  widths: [
    [0, 3.2],
    [0.06, 6],
    [0.14, 10.6],
    [0.27, 14.6],
    [0.4, 14.4],
    [0.52, 10],
    [0.62, 5.9],
    [0.75, 4.8],
    [0.9, 3.9],
    [1, 3.4],
  ] as const,
  folds: fullSleeve(noise, { folds: 14, depth: 3.2, ties: [0.05, 0.58], from: 0, to: 0.66 }),
  clothWidth: 84,
  depth: 0.96,
};

export const lh1983n5: Garment = {
  number: 'LH.1983.5',
  kind: 'dress',
  build(scene) {
    const skirt = laySkirt(
      scene,
      { form, upper: () => 103.6, hem: () => 1.6, clothWidth: 340, folds: gores },
      straw,
      inside,
      1700,
      640,
    );
    const lace = laceEdging({ repeat: 4.2, depth: 9, colour: black });
    sewFrill(scene, skirt, lace, {
      line: round(0.905),
      points: 1500,
      closed: true,
      length: 336,
      depth: 8.6,
      motifDepth: 9,
      way: 1,
      gathers: 30,
      stand: 0.15,
      flare: 0.3,
      lift: 0.35,
      down: 30,
    });
    sewBand(scene, skirt, satin, {
      from: 0.897,
      to: 0.911,
      lift: 0.5,
      across: 1500,
      width: 1.5,
      length: 330,
    });
    const body = layBodice(scene, bodice, strawBody, inside);
    layYoke(scene, body);
    layBelt(
      scene,
      noise,
      { upper: 105.8, lower: 101.4, half: 12.9, front: 10.9, back: 10.8, folds: 0.25 },
      satin,
    );
    for (const sleeve of laySleeves(scene, greatSleeve, strawBody, inside, 720, 760)) {
      sewFrill(scene, sleeve, laceEdging({ repeat: 2, depth: 3.4, colour: black }), {
        line: round(0.96),
        points: 520,
        closed: true,
        length: 30,
        depth: 3.4,
        way: 1,
        gathers: 12,
        stand: 0.25,
        flare: 0.5,
        lift: 0.3,
      });
      sewBand(scene, sleeve, satin, {
        from: 0.945,
        to: 0.968,
        lift: 0.4,
        across: 220,
        width: 1.6,
        length: 26,
      });
    }
  },
  pictures: [
    {
      view: 'front',
      name: 'front',
      shot: standing(28, { lookAt: [0, 72], span: 164, aspect: 0.82, reach: 116 }, { exposure: 0.9 }),
      alt: 'A straw-coloured silk dress of about 1895: very full sleeves drawn in at the elbow, a gored skirt, black lace over the yoke and hem, and a black waistband.',
      caption: 'Three-quarter view from the front. Rendered; invented garment.',
    },
    {
      view: 'back',
      name: 'back',
      shot: standing(198, { lookAt: [0, 71], span: 164, aspect: 0.86, reach: 116 }, { exposure: 0.9 }),
      alt: 'The straw-coloured silk dress from behind: organ folds fall from the waist, and black lace lies over the shoulders.',
      caption: 'Back. Rendered; invented garment.',
    },
    {
      view: 'detail',
      name: 'detail-lace',
      shot: closeUp(20, { lookAt: [4, 131], span: 28, aspect: 1.33 }, { exposure: 1 }),
      alt: 'A close view of black lace falling from the yoke over ribbed straw-coloured silk.',
      caption: 'Black lace at the yoke. Rendered; invented garment.',
      fineness: 1.3,
    },
  ],
};

function layYoke(scene: Parameters<Garment['build']>[0], body: ReturnType<typeof layBodice>): void {
  const all = laceCloth(2.6, black);
  scene.lay({ cloth: all, across: 500, along: 130, closed: true, casts: false }, (u, v, p) =>
    body(u, mix(0, 0.3, v), 0.22, p),
  );
  layPelerine(
    scene,
    noise,
    {
      neckY: 139.6,
      dropFront: 9,
      dropSide: 7.5,
      dropBack: 8,
      reachSide: 12,
      reachFront: 8.8,
      reachBack: 6.4,
      neckHalf: 9.6,
      ripples: 17,
      rippleHeight: 0.6,
      length: 100,
      depth: 9,
    },
    laceEdging({ repeat: 4, depth: 9, colour: black }),
    1100,
  );
  const collar = layStandCollar(scene, { foot: 141.8, top: 147.6 }, satin, inside);
  sewFrill(scene, collar, laceEdging({ repeat: 1.6, depth: 2.2, colour: black }), {
    line: round(0.1),
    points: 560,
    closed: true,
    length: 50,
    depth: 2.1,
    motifDepth: 2.2,
    way: -1,
    gathers: 18,
    stand: 0.25,
    flare: 0.5,
    lift: 0,
  });
}
