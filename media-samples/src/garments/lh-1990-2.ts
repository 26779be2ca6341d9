import { layBelt } from '../accessories/belt';
import { layBodice, type BodiceCut } from '../bodices/bodice';
import { torso } from '../bodices/torso';
import { dye, type Cloth } from '../cloths/cloth';
import { lining, ribbon, whiteCotton } from '../cloths/cloths';
import { laceCloth, laceEdging } from '../cloths/lace';
import { layStandCollar } from '../collars/stand-collar';
import { loft } from '../renderer/loft';
import { bell, ease, mix } from '../renderer/numbers';
import { seededNoise } from '../renderer/noise';
import type { Layer, Scene } from '../renderer/scene';
import type { Vec3 } from '../renderer/tube';
import { gathered, laySkirt, tuck } from '../skirts/skirt';
import { fullSleeve, laySleeves } from '../sleeves/sleeve';
import { round, sewFrill } from '../trims/sewn';
import { closeUp, standing, type Garment } from './garment';

const noise = seededNoise(1906);
const ivory = dye('#ece2cb');
const lawn = whiteCotton(ivory, 0.5, 0.24);
const slip = whiteCotton(dye('#d8c9a8'), 0.2, 0.2);
const lace: Cloth = laceCloth(2.4, dye('#f3ead6'));
const edging = laceEdging({ repeat: 2, depth: 3.4, colour: dye('#f3ead6') });
const WAIST = 101.5;

/** Smooth over the hips, springing out below the knee, sweeping the floor behind. */
const form = loft([
  { y: 102.5, half: 11, front: 8.7, back: 8.7 },
  { y: 97, half: 14.8, front: 10.6, back: 14 },
  { y: 88, half: 18.2, front: 12.4, back: 18.6 },
  { y: 68, half: 20.6, front: 15, back: 23 },
  { y: 44, half: 24.4, front: 19.4, back: 30 },
  { y: 24, half: 31, front: 25.4, back: 41 },
  { y: 8, half: 39, front: 32, back: 57 },
  { y: 0.6, half: 43.4, front: 35.4, back: 68 },
]);

const flare = gathered(noise, { folds: 24, depth: 3.6, gathers: 60, gatherDepth: 0.5, power: 1.5 });

/** Fullness of lawn drawn over the belt in front: the pouch of 1905. */
const bodice: BodiceCut = {
  form: torso({
    waistY: WAIST,
    waist: [11, 9.4, 8.9],
    bustY: 117,
    bustFront: 2.6,
    bustHalf: 0.6,
    shoulder: -0.6,
  }),
  neck: () => 142.4,
  lower: (theta) => WAIST - 0.4 - 2.2 * bell(theta, 0, 0.6),
  folds: (theta, y) => {
    const a = Math.abs(theta);
    const before = ease(1.5, 0.4, a);
    const pouch = before * 4.4 * bell(y, 104.4, 4.6) * ease(100.2, 103.6, y);
    const full =
      (noise.fold(a * 7.4 + 0.3 + 0.2 * noise.at(theta * 2, y * 0.1), 6) - 0.5) *
      0.7 *
      ease(1.4, 0.8, a) *
      ease(127, 119, y);
    const pintucks = 0.1 * Math.sin(theta * 46) * ease(1.1, 0.9, a) * bell(y, 125, 3.2);
    return (
      0.9 +
      pouch +
      full +
      pintucks +
      0.18 * noise.layers(theta * 2.4 + 5, y * 0.15, 2) +
      0.6 * (noise.fold(a * 9 + 0.2, 3) - 0.5) * ease(1.9, 2.6, a) * ease(116, 104, y)
    );
  },
};

const pose: readonly Vec3[] = [
  [8.5, 134.6, -1.6],
  [15.4, 132.4, -1.8],
  [19.6, 125.6, -2.2],
  [22, 117, -2.4],
  [23.4, 108, -0.4],
  [22.6, 100, 4],
  [20.4, 94.4, 9],
];

/** Lace let in: the lawn under it cut away, so that a cream slip shows through. */
function letIn(scene: Scene, layer: Layer, from: number, to: number, length: number, across: number): void {
  scene.lay({ cloth: slip, across, along: 16, closed: true }, (u, v, p) =>
    layer(u, mix(from, to, v), 0.08, p),
  );
  scene.lay({ cloth: lace, across, along: 16, closed: true, casts: false }, (u, v, p) => {
    layer(u, mix(from, to, v), 0.2, p);
    p.u = u * length;
    p.v = v * 4.8;
  });
}

export const lh1990n2: Garment = {
  number: 'LH.1990.2',
  kind: 'dress',
  build(scene) {
    const tucks = (s: number): number =>
      tuck(s, 0.62, 0.3, 0.008) +
      tuck(s, 0.64, 0.3, 0.008) +
      tuck(s, 0.66, 0.3, 0.008) +
      tuck(s, 0.8, 0.3, 0.008) +
      tuck(s, 0.82, 0.3, 0.008);
    const skirt = laySkirt(
      scene,
      {
        form,
        upper: () => 102.4,
        hem: () => 1.4,
        clothWidth: 300,
        folds: (u, theta, y, s) => flare(u, theta, y, s) * (0.3 + 0.7 * ease(0.3, 0.75, s)) + tucks(s),
      },
      lawn,
      slip,
      1600,
      800,
    );
    letIn(scene, skirt, 0.7, 0.755, 280, 1200);
    letIn(scene, skirt, 0.86, 0.91, 280, 1200);
    sewFrill(scene, skirt, edging, {
      line: round(0.965),
      points: 1500,
      closed: true,
      length: 320,
      depth: 4.4,
      motifDepth: 3.4,
      way: 1,
      gathers: 40,
      stand: 0.4,
      flare: 0.8,
      lift: 0.3,
    });
    const body = layBodice(scene, bodice, lawn, lining(dye('#dccdb0')));
    letIn(scene, body, 0, 0.28, 60, 500);
    sewFrill(scene, body, edging, {
      line: round(0.28),
      points: 900,
      closed: true,
      length: 100,
      depth: 5,
      motifDepth: 3.4,
      way: 1,
      gathers: 14,
      stand: 0.25,
      flare: 0.9,
      lift: 0.4,
    });
    layBelt(
      scene,
      noise,
      { upper: 103.6, lower: 99.6, half: 12.1, front: 10.9, back: 10, folds: 0.3 },
      ribbon(dye('#cdb98c')),
    );
    const collar = layStandCollar(scene, { foot: 141.6, top: 149, footHalf: 6.3, topHalf: 5.5 }, slip, slip);
    scene.lay({ cloth: lace, across: 400, along: 50, closed: true, casts: false }, (u, v, p) => {
      collar(u, v, 0.14, p);
      p.u = u * 38.4;
    });
    sewFrill(scene, collar, laceEdging({ repeat: 1.2, depth: 1.4 }), {
      line: round(0.04),
      points: 460,
      closed: true,
      length: 44,
      depth: 1.3,
      motifDepth: 1.4,
      way: -1,
      gathers: 18,
      stand: 0.15,
      flare: 0.2,
      lift: 0,
    });
    const widths = [
      [0, 3],
      [0.1, 5],
      [0.24, 5.9],
      [0.42, 5.4],
      [0.58, 6.6],
      [0.72, 7.6],
      [0.82, 6.4],
      [0.9, 3.8],
      [1, 3.5],
    ] as const;
    for (const sleeve of laySleeves(
      scene,
      {
        pose,
        widths,
        folds: fullSleeve(noise, { folds: 18, depth: 1.7, ties: [0.04, 0.87], from: 0.3, to: 0.95 }),
        clothWidth: 46,
      },
      lawn,
      slip,
      520,
      640,
    )) {
      letIn(scene, sleeve, 0.4, 0.47, 36, 260);
      letIn(scene, sleeve, 0.9, 1, 24, 200);
      sewFrill(scene, sleeve, edging, {
        line: round(0.99),
        points: 460,
        closed: true,
        length: 32,
        depth: 2.8,
        motifDepth: 3.4,
        way: 1,
        gathers: 12,
        stand: 0.25,
        flare: 0.5,
        lift: 0.1,
      });
    }
  },
  pictures: [
    {
      view: 'front',
      name: 'front',
      shot: standing(38, { lookAt: [-5, 73], span: 164, aspect: 0.74, reach: 116 }, { exposure: 0.8 }),
      alt: 'An ivory lawn and lace dress of about 1906: a high lace collar, a front pouched over the belt, bishop sleeves, and a skirt with tucks and let-in lace that sweeps the floor.',
      caption: 'Three-quarter view from the front. Rendered; invented garment.',
    },
    {
      view: 'detail',
      name: 'detail-insertion',
      shot: closeUp(20, { lookAt: [0, 27], span: 28, aspect: 1.33, pitch: 6 }, { exposure: 0.8 }),
      alt: 'A close view of the skirt: a band of lace let into the lawn between groups of tucks.',
      caption: 'Tucks and let-in lace. Rendered; invented garment.',
      fineness: 1.3,
    },
  ],
};
