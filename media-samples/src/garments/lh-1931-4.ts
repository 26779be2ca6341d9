import { grooves, layBodice, type BodiceCut } from '../bodices/bodice';
import { torso } from '../bodices/torso';
import { dye } from '../cloths/cloth';
import { lining, patternedSilk, whiteCotton } from '../cloths/cloths';
import { eyeletEdging } from '../cloths/lace';
import { neckline } from '../collars/neckline';
import { stripes } from '../motifs/motifs';
import { loft } from '../renderer/loft';
import { bell, ease, mix } from '../renderer/numbers';
import { seededNoise } from '../renderer/noise';
import type { Layer, Scene } from '../renderer/scene';
import type { Vec3 } from '../renderer/tube';
import { gathered, laySkirt, skirtLayer } from '../skirts/skirt';
import { closeSleeve, laySleeves } from '../sleeves/sleeve';
import { round, sewFrill } from '../trims/sewn';
import { closeUp, standing, type Garment } from './garment';

const noise = seededNoise(1786);
const cream = dye('#e3d5b8');
const rose = dye('#b8737a');
const bars = [
  { from: 0.04, to: 0.4, colour: rose },
  { from: 0.47, to: 0.5, colour: rose },
  { from: 0.56, to: 0.59, colour: dye('#8d9a78') },
  { from: 0.66, to: 0.69, colour: dye('#8d9a78') },
  { from: 0.9, to: 0.93, colour: rose },
];
const striped = patternedSilk(stripes(cream, 3.2, bars), 0.5, 0.6);
const stripedBody = patternedSilk(stripes(cream, 3.2, bars), 0.24, 0.55);
const gauze = whiteCotton(dye('#d8d1c0'), 0.3, 0.3);
const inside = lining(dye('#cdbd9c'));
const WAIST = 103.5;

/** Pads behind and at the hips throw the skirts out, most at the back; a short train. */
const form = loft([
  { y: 104.5, half: 11.6, front: 9.2, back: 9.2 },
  { y: 101, half: 17, front: 12.4, back: 19 },
  { y: 95, half: 24, front: 16, back: 30 },
  { y: 84, half: 30.5, front: 20, back: 37 },
  { y: 62, half: 36.5, front: 25.5, back: 42 },
  { y: 34, half: 41.5, front: 30.5, back: 47 },
  { y: 10, half: 45, front: 34, back: 55 },
  { y: 0.8, half: 46.5, front: 35.5, back: 63 },
]);

const petticoatFolds = gathered(noise, { folds: 26, depth: 2.8, gathers: 84, gatherDepth: 1 });
const robeFolds = gathered(noise, { folds: 24, depth: 3.6, gathers: 96, gatherDepth: 1.7, row: 5 });

/** The robe: its fronts part from the waist and fall aside to show the petticoat. */
const whole = skirtLayer({
  form,
  upper: () => 104.4,
  hem: () => 1,
  clothWidth: 320,
  evenAt: 30,
  folds: (u, theta, y, s) => 1.7 + robeFolds(u, theta, y, s) + 1.4 * s,
});
const parting = (v: number): number => 0.012 + 0.135 * Math.pow(v, 0.72);
const robe: Layer = (u, v, lift, p) => {
  const gap = parting(v);
  // u runs from one front edge round the back to the other: half a turn away from the skirt's own join.
  const at = mix(0.5 + gap, 1.5 - gap, u);
  const edge = Math.min(u, 1 - u);
  whole(at % 1, v, lift + 0.7 * bell(edge, 0.012, 0.012) - 0.8 * ease(0.012, 0, edge), p);
  p.u = at * 320;
};

const bodice: BodiceCut = {
  form: torso({
    waistY: WAIST,
    waist: [11.4, 9, 9],
    bustY: 123,
    bustFront: -0.6,
    shoulder: -0.6,
    hips: [[6, 16, 12, 14]],
  }),
  neck: neckline(128.8, 137.6, 136.4, 1.5),
  lower: (theta) =>
    WAIST -
    0.8 -
    4.6 * Math.exp(-theta * theta * 7) -
    2.4 * Math.exp(-Math.pow((Math.abs(theta) - Math.PI) * 3.2, 2)),
  folds: (theta, y) => {
    const a = Math.abs(theta);
    const fourreau = grooves(
      theta,
      y,
      [
        (h) => 2.98 - 0.004 * (h - WAIST),
        (h) => 2.78 - 0.01 * (h - WAIST),
        (h) => 2.5 - 0.016 * (h - WAIST),
        () => 1.55,
      ],
      0.13,
    );
    const closed = -0.14 * bell(theta, 0, 0.012) + 0.1 * bell(a, 0.05, 0.03) * Math.sin(y * 3.1);
    return (
      0.95 +
      fourreau +
      closed +
      0.16 * noise.layers(theta * 2.4 + 8, y * 0.18, 2) +
      0.1 * bell(y, WAIST + 3, 4) * Math.sin(y * 3 + a * 4) * ease(0.4, 0.9, a) +
      0.8 * ease(WAIST + 0.5, WAIST - 3, y)
    );
  },
};

const pose: readonly Vec3[] = [
  [13.8, 132.8, -1.8],
  [16, 132, -2],
  [19.2, 127.4, -2.4],
  [21.4, 121, -2.6],
  [23, 114, -1.4],
  [23.4, 109.6, 1],
];
const widths = [
  [0, 3.2],
  [0.14, 4.8],
  [0.3, 5.7],
  [0.6, 5.4],
  [0.85, 5],
  [1, 4.9],
] as const;

function layBody(scene: Scene): void {
  const body = layBodice(scene, bodice, stripedBody, inside);
  sewFrill(scene, body, eyeletEdging({ repeat: 1.5, depth: 3 }), {
    line: round(0.02),
    points: 900,
    closed: true,
    length: 96,
    depth: 2.8,
    motifDepth: 3,
    way: -1,
    gathers: 26,
    stand: 0.3,
    flare: 0.2,
    lift: 0.15,
  });
  const sleeves = laySleeves(
    scene,
    { pose, widths, folds: closeSleeve(noise, 0.9), clothWidth: 33 },
    stripedBody,
    inside,
    400,
    420,
  );
  for (const sleeve of sleeves) {
    sewFrill(scene, sleeve, striped, {
      line: round(0.975),
      points: 620,
      closed: true,
      length: 70,
      depth: 4.4,
      way: 1,
      gathers: 9,
      stand: 0.6,
      flare: 2.4,
      lift: 0.5,
      fall: 0.3,
    });
    sewFrill(scene, sleeve, eyeletEdging({ repeat: 2.2, depth: 9 }), {
      line: round(0.985),
      points: 700,
      closed: true,
      length: 62,
      depth: 9,
      way: 1,
      gathers: 9,
      stand: 0.8,
      flare: 2.2,
      lift: 0,
      fall: 0.35,
    });
  }
}

/** A gauze kerchief crossed over the bosom and tucked into the front. */
function layKerchief(scene: Scene): void {
  scene.lay({ cloth: gauze, across: 760, along: 200 }, (u, v, p) => {
    const theta = mix(-1.62, 1.62, u);
    const a = Math.abs(theta);
    const foot = mix(121.5, 134, Math.pow(a / 1.62, 0.7));
    const y = mix(mix(136.2, 139.2, ease(0, 1.1, a)), foot, v);
    const crush =
      0.9 * (noise.fold(v * 5 + 1.4 * Math.cos(theta * 1.1) + 0.4 * noise.at(theta * 2, v * 3), 6) - 0.4) +
      0.35 * noise.layers(theta * 2 + 5, v * 4, 2);
    bodice.form(y, theta, mix(0.1, 0.75, ease(0.75, 0.2, v)) + crush, p);
    p.u = theta * 14;
    p.v = v * 18;
  });
}

export const lh1931n4: Garment = {
  number: 'LH.1931.4',
  kind: 'dress',
  build(scene) {
    const petticoat = laySkirt(
      scene,
      { form, upper: () => 104, hem: () => 3.4, clothWidth: 300, folds: petticoatFolds },
      striped,
      inside,
      1500,
      620,
    );
    sewFrill(scene, petticoat, striped, {
      line: round(0.84, 0.32, 0.68),
      points: 900,
      length: 130,
      depth: 11,
      way: 1,
      gathers: 26,
      stand: 0.5,
      flare: 0.8,
      lift: 0.5,
      down: 60,
    });
    scene.layLayer({ cloth: striped, across: 1700, along: 780 }, robe);
    sewFrill(scene, robe, striped, {
      line: (t) => [0.004, mix(0.02, 0.97, t)],
      points: 700,
      length: 130,
      depth: 2.6,
      way: 1,
      gathers: 40,
      stand: 0.5,
      flare: 0,
      lift: 0.4,
      down: 16,
    });
    layKerchief(scene);
    layBody(scene);
  },
  pictures: [
    {
      view: 'front',
      name: 'front',
      shot: standing(30, { lookAt: [-2, 68], span: 158, aspect: 0.82, reach: 112 }, { exposure: 0.92 }),
      alt: 'An open robe of about 1785 over its petticoat, both of rose and cream striped silk: a close front meeting at the middle, elbow sleeves with ruffles, a gauze kerchief and a flounced petticoat.',
      caption: 'Three-quarter view from the front. Rendered; invented garment.',
    },
    {
      view: 'detail',
      name: 'detail-ruffle',
      shot: closeUp(24, { lookAt: [-15, 108], span: 28, aspect: 1.33 }, { exposure: 0.92 }),
      alt: 'A close view of the sleeve end: a striped silk ruffle over a deeper white one worked with eyelets.',
      caption: 'Sleeve ruffles. Rendered; invented garment.',
      fineness: 1.3,
    },
  ],
};
