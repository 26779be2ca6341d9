import { fittedFolds, fittedSeams, lapEdge, layBodice, uOf, type BodiceCut } from '../bodices/bodice';
import { torso } from '../bodices/torso';
import { dye } from '../cloths/cloth';
import { lining, metal, patternedSilk, silkTaffeta, silkVelvet } from '../cloths/cloths';
import { fringe, laceEdging } from '../cloths/lace';
import { layStandCollar } from '../collars/stand-collar';
import { stripes } from '../motifs/motifs';
import { loft } from '../renderer/loft';
import { bell, clamp, ease, mix } from '../renderer/numbers';
import { seededNoise } from '../renderer/noise';
import { type Layer, type Scene } from '../renderer/scene';
import { skirtLayer, knifePleats } from '../skirts/skirt';
import { closeSleeve, laySleeves, POSES } from '../sleeves/sleeve';
import { sewButtons } from '../trims/buttons';
import { round, sewBand, sewCord, sewFrill } from '../trims/sewn';
import { closeUp, standing, type Garment } from './garment';

const noise = seededNoise(1885);
const teal = dye('#1f4a50');
const ecru = dye('#cbb98f');
const skirtSilk = silkTaffeta(teal, 0.62);
const bodiceSilk = silkTaffeta(teal, 0.28);
const panelSilk = patternedSilk(
  stripes(teal, 3.4, [
    { from: 0.46, to: 0.56, colour: ecru },
    { from: 0.6, to: 0.64, colour: ecru },
    { from: 0.68, to: 0.8, colour: ecru },
    { from: 0.84, to: 0.88, colour: ecru },
    { from: 0.92, to: 1, colour: ecru },
  ]),
  0.5,
  0.28,
);
const velvet = silkVelvet(dye('#173a40'));
const inside = lining(dye('#b9a98a'));
const brass = metal(dye('#a9843f'), 0.8);
const lace = laceEdging({ repeat: 1.6, depth: 2.6 });

const WAIST = 102.5;
/** The shelf of 1885: narrow before, thrown out level behind and carried on to a short train. */
const form = loft([
  { y: 103, half: 11.6, front: 8.6, back: 8.8 },
  { y: 99, half: 13.6, front: 10.2, back: 17 },
  { y: 95, half: 16.2, front: 11.6, back: 29 },
  { y: 90, half: 18.3, front: 12.6, back: 36 },
  { y: 82, half: 19.8, front: 13.6, back: 39 },
  { y: 68, half: 21.6, front: 15.5, back: 40.5 },
  { y: 48, half: 24.6, front: 18.5, back: 43 },
  { y: 28, half: 28, front: 21.5, back: 47 },
  { y: 14, half: 30.5, front: 23.5, back: 51 },
  { y: 6, half: 32.5, front: 24.6, back: 56 },
  { y: 0.6, half: 34, front: 25.4, back: 62 },
]);

function underFolds(u: number, theta: number, y: number): number {
  const down = 1 - y / 103;
  const behind = ease(1.5, 2.4, Math.abs(theta));
  const c = Math.cos(u * 2 * Math.PI) * 1.4 + 5;
  const n = Math.sin(u * 2 * Math.PI) * 1.4 + 8;
  const at = (u * 26 + 0.6 * noise.at(c, n + down) + 26) % 26;
  const depth =
    (0.25 + (2.4 + 2.2 * behind) * Math.pow(Math.max(0, down), 1.1)) * (1 - 0.45 * ease(26, 6, y));
  return depth * (noise.fold(at, 3) - 0.5) + 0.5 * noise.at(c * 2, n * 2 + down * 5) * down;
}

function underskirt(scene: Scene): void {
  const cut = { form, upper: () => 99, clothWidth: 210 };
  const panel = skirtLayer({ ...cut, hem: () => 5, folds: underFolds });
  scene.layLayer({ cloth: panelSilk, across: 1200, along: 420, closed: true }, panel);
  const pleats = knifePleats(130, 1.15, noise);
  for (const [upper, hem, off] of [
    [18, 8.4, 1.3],
    [10, 0.5, 2.2],
  ] as const) {
    const flounce = skirtLayer({
      form,
      upper: () => upper,
      hem: () => hem,
      clothWidth: 420,
      folds: (u, theta, y, v) => off + 0.8 * underFolds(u, theta, y) + pleats(u, v) + 0.7 * v * v,
    });
    scene.layLayer({ cloth: skirtSilk, across: 2600, along: 60, closed: true }, flounce);
  }
  for (const [upper, hem, off] of [
    [19.6, 17, 1.7],
    [11.4, 8.8, 3],
  ] as const)
    scene.layLayer(
      { cloth: velvet, across: 1200, along: 26, closed: true },
      skirtLayer({
        form,
        upper: () => upper,
        hem: () => hem,
        clothWidth: 210,
        folds: (u, theta, y, v) => off + 0.5 * Math.sin(v * Math.PI) + 0.85 * underFolds(u, theta, y),
      }),
    );
}

/** How far round each way the apron reaches. */
const APRON = 1.66;

/** The apron: cloth hung from both sides, its folds swinging lower in front. v runs to a rounded edge. */
const apron: Layer = (u, v, lift, p) => {
  const theta = (u - 0.5) * 2 * APRON;
  const aside = (theta + 0.12) / APRON;
  const y = mix(102.5, 31 + 50 * Math.pow(clamp(Math.abs(aside)), 1.8), v);
  const swing = y - 52 * Math.pow(Math.abs(aside), 1.55) * (1 - 0.15 * v);
  const at =
    (102 - swing) / 8.2 +
    0.5 * noise.at(theta * 1.4 + 3, swing * 0.04) +
    0.25 * noise.at(theta * 3.3, swing * 0.12);
  const depth =
    (0.5 + 3.6 * ease(0.1, 0.7, v)) *
    (0.5 + 0.75 * Math.pow(Math.abs(aside), 0.8)) *
    (1 - 0.55 * ease(0.94, 1, v)) *
    (1 - 0.55 * ease(0.74, 1, Math.abs(aside)));
  const fold = noise.fold(at, 11);
  let off =
    (1.7 + 1.1 * depth * fold + 0.6 * noise.at(theta * 2, y * 0.05) * v + 1.6 * v) *
    (0.1 + 0.9 * ease(0, 0.06, v));
  off += 0.5 * ease(0.72, 1, Math.abs(aside)) * Math.sin(y * 1.25 + 2 * noise.at(theta * 3, y * 0.1));
  form(y, theta, off + lift, p);
  p.y -= 0.4 * depth * (fold - 0.5);
  p.u = theta * 26;
  p.v = v * 75;
};

function layApron(scene: Scene): void {
  scene.layLayer({ cloth: skirtSilk, across: 880, along: 600 }, apron);
  sewBand(scene, apron, velvet, {
    from: 0.955,
    to: 1.004,
    lift: 0.4,
    across: 900,
    closed: false,
    width: 4,
    length: 130,
  });
  const depth = 5.6;
  sewFrill(scene, apron, fringe(teal, ecru, depth), {
    line: round(1),
    points: 900,
    length: 150,
    depth,
    way: 1,
    gathers: 14,
    stand: 0.25,
    flare: 0.1,
    lift: 0.3,
    fall: 0.85,
  });
}

/** The back drapery: a puff tied in twice below the shelf, then falling free over the train. */
const puff: Layer = (u, v, lift, p) => {
  const theta = mix(1.22, 2 * Math.PI - 1.22, u);
  const aside = Math.abs(u - 0.5) * 2;
  const y = mix(102, mix(13, 52, Math.pow(aside, 1.5)), v);
  const free = 1 - Math.pow(aside, 3);
  const swell = bell(y, 88, 9) * 5.5 + bell(y, 66, 8.5) * 6;
  const tied = -2.6 * bell(y, 77, 3.2) - 1.2 * bell(y, 54, 4);
  const low = ease(60, 25, y);
  const at = u * 15 + 0.7 * noise.at(u * 5, y * 0.035) + 0.28 * noise.at(u * 11, y * 0.1);
  const depth = 1.3 + 2 * bell(y, 77, 6.5) + 1.9 * bell(y, 100, 8) + 3.6 * low + 1.8 * bell(y, 54, 6.5);
  const fine =
    (noise.fold(u * 44 + 1.5 * noise.at(u * 9, y * 0.06), 21) - 0.5) *
    (bell(y, 77, 4.5) + 0.9 * bell(y, 54, 4.5) + 0.8 * bell(y, 101, 5));
  const inwards = 1 - 0.8 * ease(0.8, 0.98, aside);
  let off =
    4.6 -
    1.6 * ease(0.965, 1, aside) +
    (swell + tied) * (0.1 + 0.9 * free) +
    depth * inwards * (noise.fold(at, 5) - 0.45) * (0.4 + 0.6 * free);
  off +=
    0.35 * (noise.fold(Math.abs(u - 0.5) * 7 + y * 0.13 + 0.7 * noise.at(u * 4, y * 0.08), 8) - 0.5) * swell;
  off += low * 2.4 * free + fine * inwards;
  off = mix(0.6, off, ease(0.99, 0.66, aside)) * (0.15 + 0.85 * ease(0, 0.05, v));
  form(y, theta, off + lift, p);
  p.y -= swell * 0.25 * free;
  p.u = u * 150;
  p.v = v * 95;
};

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
    underskirt(scene);
    scene.layLayer({ cloth: skirtSilk, across: 1150, along: 660 }, puff);
    sewBand(scene, puff, velvet, {
      from: 0.965,
      to: 1.003,
      lift: 0.4,
      across: 1000,
      closed: false,
      width: 4,
      length: 150,
    });
    layApron(scene);
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
  ],
};
