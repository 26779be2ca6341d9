import { grooves, type Seam } from '../bodices/bodice';
import { manTorso } from '../bodices/coat-body';
import { dye } from '../cloths/cloth';
import { broadcloth, lining, metal, silkVelvet } from '../cloths/cloths';
import { layFallCollar } from '../collars/fall-collar';
import { layLapel } from '../collars/lapel';
import { loft } from '../renderer/loft';
import { bell, clamp, curve, ease, mix } from '../renderer/numbers';
import { seededNoise } from '../renderer/noise';
import { newPoint, type Layer, type Scene } from '../renderer/scene';
import type { Vec3 } from '../renderer/tube';
import { closeSleeve, laySleeves } from '../sleeves/sleeve';
import { faceOf, sewButton, sewButtons } from '../trims/buttons';
import { sewBand } from '../trims/sewn';
import { closeUp, hung, type Garment } from './garment';

const noise = seededNoise(1827);
const blue = broadcloth(dye('#343b4e'));
const velvet = silkVelvet(dye('#2f354c'));
const inside = lining(dye('#a8987c'));
const gilt = metal(dye('#b58f45'), 0.8);

const form = manTorso();
const sideBack: Seam = (y) =>
  y > 104 && y < 139 ? 2.86 - 0.46 * Math.pow(clamp((y - 105) / 33), 1.6) : null;
const seams: Seam[] = [sideBack, (y) => (y < 135 ? 1.72 : null), () => Math.PI];

function folds(theta: number, y: number): number {
  const a = Math.abs(theta);
  return (
    1 +
    grooves(theta, y, seams, 0.14, 0.22) +
    0.26 * noise.layers(theta * 2.2 + 7, y * 0.13, 3) +
    0.22 *
      bell(y, 106, 4) *
      Math.sin(y * 1.5 + 2 * a + 2 * noise.at(theta * 3, y * 0.2)) *
      ease(2.9, 2.1, a) +
    0.3 * bell(a, 1.95, 0.35) * bell(y, 132, 6) * Math.sin((a * 5.5 + y * 0.2) * 2.6)
  );
}

/** The turned front edge: closed below the break at the chest, open to the neck above it. */
const BREAK = 121;
const edge = (y: number): number => (y < BREAK ? 0 : 0.66 * Math.pow((y - BREAK) / 24, 0.9));

/** The body, open in a V; the wearer's left front laps over the right. */
const body: Layer = (u, v, lift, p) => {
  const y = mix(146, 104.2, v);
  const open = edge(y);
  const theta = u < 0.5 ? mix(-Math.PI - 0.006, -open, u * 2) : mix(open, Math.PI + 0.006, (u - 0.5) * 2);
  const lap =
    0.3 * ease(BREAK + 1, BREAK - 8, y) * ease(-0.33, -0.29, theta) * ease(1.2, 0.5, Math.abs(theta));
  form(y, theta, folds(theta, y) + lap + lift, p);
  p.u = (theta / (2 * Math.PI)) * 104;
  p.v = 150 - y;
};

const tailForm = loft([
  { y: 106, half: 14.4, front: 11.9, back: 10.6 },
  { y: 102, half: 15.4, front: 12.4, back: 12.2 },
  { y: 96, half: 17.4, front: 13, back: 14.6 },
  { y: 85, half: 18, front: 13, back: 16.2 },
  { y: 70, half: 18.2, front: 13, back: 16.8 },
  { y: 38, half: 18.4, front: 13, back: 17.4 },
]);

/** A tail: from the waist seam, its front edge sloping away behind, a pleat under each hip button. */
function tail(side: 1 | -1): Layer {
  return (u, v, lift, p) => {
    const y = mix(105.4, 40, v);
    const front = mix(0.78, 2.3, 1 - Math.pow(1 - v, 2.4));
    const theta = mix(front, Math.PI + (side > 0 ? 0.14 : 0.02), u);
    const fromPleat = (theta - (2.8 - 0.1 * v)) * 15;
    const pleat =
      fromPleat < 0 ? Math.exp((-fromPleat * fromPleat) / 5) : Math.exp((-fromPleat * fromPleat) / 0.12);
    const off =
      1.15 +
      0.5 * ease(0, 0.06, v) +
      (side > 0 ? 0.55 * ease(2.95, 3.1, theta) : 0) +
      (0.25 + 1.6 * v) * pleat +
      (0.15 + 1.1 * v) *
        (noise.fold(u * 3.2 + 0.5 * noise.at(u * 3 + side, v * 2) + 3.3, 6 + side) - 0.5) *
        (1 - 0.5 * ease(0.75, 1, u)) +
      0.4 * noise.layers(u * 3 + 9 + side * 4, v * 4, 2);
    tailForm(y, theta, off + lift, p);
    p.x *= side;
    p.nx *= side;
    p.y -= 0.5 * Math.sin(u * Math.PI) * v;
    p.u = side * theta * 17;
    p.v = v * 66;
  };
}

function layTails(scene: Scene): void {
  for (const side of [1, -1] as const) {
    const layer = tail(side);
    scene.layLayer({ cloth: blue, across: 480, along: 560 }, layer);
    scene.lay({ cloth: inside, across: 480, along: 300 }, (u, v, p) =>
      layer(mix(0.02, 0.985, u), mix(0.02, 0.99, v), -0.62, p),
    );
    const flap: Layer = (u, v, lift, p) =>
      layer(mix(0.34, 0.78, u), mix(0.1, 0.185, v) + 0.009 * Math.sin(u * 2 * Math.PI), lift, p);
    scene.layLayer({ cloth: blue, across: 120, along: 50 }, (u, v, lift, p) =>
      flap(u, v, lift + 0.3 * ease(0, 0.12, v) * ease(0, 0.04, u) * ease(1, 0.96, u) + 0.12, p),
    );
  }
}

const pose: readonly Vec3[] = [
  [15.6, 136.6, -2],
  [18, 136, -2.2],
  [22.6, 131.5, -2.8],
  [25.6, 121, -3.8],
  [27, 110, -3.2],
  [27, 100, 0.6],
  [25.8, 91, 5.6],
  [24.6, 84.5, 9.4],
];
const creased = closeSleeve(noise, 0.56);
const sleeve = {
  pose,
  widths: [
    [0, 3.4],
    [0.07, 5.6],
    [0.18, 7.2],
    [0.36, 6.9],
    [0.52, 6],
    [0.68, 5.3],
    [0.84, 4.6],
    [1, 4.3],
  ] as const,
  folds: (angle: number, t: number, side: 1 | -1) =>
    1.1 * creased(angle, t, side) +
    0.4 * bell(t, 0.16, 0.06) * (noise.fold(angle * 2.2 + 20 + 0.6 * noise.at(angle, t * 4), 9) - 0.4),
  clothWidth: 44,
};

function layFronts(scene: Scene): void {
  const width = curve([
    [0, 0.4],
    [0.3, 4.6],
    [0.66, 8.6],
    [0.8, 9.4],
    [1, 6.4],
  ]);
  for (const side of [1, -1] as const)
    layLapel(
      scene,
      {
        form,
        breakY: BREAK + 0.2,
        gorgeY: 143.6,
        edge: (y) => edge(y) - 0.015,
        width,
        lift: side > 0 ? 1.5 : 1.35,
        side,
      },
      blue,
    );
  for (const side of [1, -1] as const)
    sewButtons(
      scene,
      body,
      (t) => [0.5 + (side * mix(0.058, 0.028, Math.pow(t, 0.8)) + 0.006), mix(0.66, 0.96, t)],
      { count: 4, radius: 0.95, cloth: gilt, lift: 0.35, height: 0.42, points: 40 },
    );
}

export const lh1944n1: Garment = {
  number: 'LH.1944.1',
  kind: 'coat',
  build(scene) {
    scene.layHalves({ cloth: blue, across: 1000, along: 620 }, body);
    scene.layHalves(
      { cloth: inside, across: 400, along: 200 },
      (u, v, lift, p) => body(u, v * 0.995, lift, p),
      -0.45,
    );
    layTails(scene);
    layFronts(scene);
    layFallCollar(
      scene,
      noise,
      { foot: 142.2, roll: 151.5, fall: 142.6, opens: 0.56, drop: 5.2, half: 7.6 },
      velvet,
    );
    const p = newPoint();
    for (const side of [1, -1] as const) {
      form(105.6, side * 2.86, 1.9, p);
      sewButton(scene, [p.x, p.y, p.z], [p.nx, 0.05, p.nz], 1.1, gilt, 0.4, 48);
    }
    for (const layer of laySleeves(scene, sleeve, blue, inside, 440, 700)) {
      sewBand(scene, layer, blue, { from: 0.9, to: 1.003, lift: 0.45, across: 260, width: 7, length: 32 });
      for (const t of [0.918, 0.945, 0.972]) {
        const { at, facing } = faceOf(layer, 0.5 + 0.36, t, 0.5);
        sewButton(scene, at, facing, 0.62, gilt, 0.45, 36);
      }
    }
  },
  pictures: [
    {
      view: 'front',
      name: 'front',
      shot: hung(22, { lookAt: [0, 97], span: 132, aspect: 0.8, reach: 84 }, { exposure: 1.0 }),
      alt: "A man's dark blue wool tailcoat of 1825 to 1830, hung: double-breasted with gilt buttons, broad lapels and a velvet collar, cut away at the waist.",
      caption: 'Front. Rendered; invented garment.',
    },
    {
      view: 'back',
      name: 'back',
      shot: hung(203, { lookAt: [0, 97], span: 132, aspect: 0.8, reach: 84 }, { exposure: 1.0 }),
      alt: 'The dark blue tailcoat from behind: curved side-back seams, two gilt buttons at the waist and pleats in the tails.',
      caption: 'Back. Rendered; invented garment.',
    },
    {
      view: 'detail',
      name: 'detail-buttons',
      shot: closeUp(182, { lookAt: [0, 104], span: 22, aspect: 1.33, pitch: 4 }, { exposure: 1.05 }),
      alt: 'A close view of the back waist: two gilt buttons where the side-back seams meet the waist seam.',
      caption: 'Hip buttons and waist seam. Rendered; invented garment.',
      fineness: 1.3,
    },
  ],
};
