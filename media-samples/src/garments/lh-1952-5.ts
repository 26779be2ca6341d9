import { dye } from '../cloths/cloth';
import { thread, whiteCotton } from '../cloths/cloths';
import { bell, ease, mix } from '../renderer/numbers';
import { loft } from '../renderer/loft';
import { seededNoise } from '../renderer/noise';
import type { Layer } from '../renderer/scene';
import type { Vec3 } from '../renderer/tube';
import { fullSleeve, laySleeves, sleeveLayer } from '../sleeves/sleeve';
import { sewButtons } from '../trims/buttons';
import { sewBand, sewCord } from '../trims/sewn';
import { closeUp, hung, type Garment } from './garment';

const noise = seededNoise(1820);
const linen = whiteCotton(dye('#ece7da'), 0.3, 0.34);
const inner = whiteCotton(dye('#d9d2c1'), 0.3, 0.4);
/** A shirt is cut from straight lengths: it hangs from the shoulders and has no waist. */
const form = loft([
  { y: 54, half: 24.5, front: 15.5, back: 15.5 },
  { y: 100, half: 23.4, front: 15.4, back: 15 },
  { y: 126, half: 22.6, front: 16, back: 15 },
  { y: 132, half: 21.8, front: 14.6, back: 14.2, cz: -0.4 },
  { y: 138, half: 18.8, front: 11.4, back: 12.2, cz: -1 },
  { y: 142, half: 15, front: 8.8, back: 9.8, cz: -1.8 },
  { y: 145, half: 10.6, front: 7.2, back: 7.8, cz: -2 },
  { y: 147, half: 8, front: 6.8, back: 6.8, cz: -1.8 },
  { y: 152, half: 7.4, front: 7, back: 6.8, cz: -2 },
]);

/** The slit in front, worked at its foot; the body falls in gathers from neckband and shoulder. */
const SLIT = 112;
const body: Layer = (u, v, lift, p) => {
  const side = u < 0.5 ? -1 : 1;
  const across = side < 0 ? u * 2 : 2 - u * 2;
  const tail = Math.pow(Math.abs(Math.sin(across * Math.PI)), 6);
  const y = mix(146.4, 54 + 3 * tail, v);
  const slit = 0.16 * Math.pow(ease(SLIT, 144, y), 1.2);
  const theta = side * mix(Math.PI, slit, across);
  const a = Math.abs(theta);
  const gathers =
    (noise.fold(a * 11 + 0.4 * noise.at(theta * 2, y * 0.1) + 0.3, 3) - 0.5) * (0.7 * bell(y, 142, 7) + 0.12);
  const broad =
    (noise.fold(a * 3.4 + 0.5 * noise.at(theta * 1.4, y * 0.04) + 0.1, 5) - 0.5) * 2.6 * ease(138, 100, y);
  form(y, theta, 0.4 + gathers + broad + 1.5 * noise.layers(theta * 1.8 + 6, y * 0.06, 3) + lift, p);
  p.y = y;
  p.u = theta * 17;
  p.v = 150 - y;
};

const pose: readonly Vec3[] = [
  [13, 138.6, -2],
  [20, 136.4, -2.2],
  [26.6, 129, -2],
  [32, 118, -1],
  [36.4, 105.6, 1],
  [39.4, 92, 3.4],
];
const full = fullSleeve(noise, { folds: 15, depth: 2, ties: [0.06, 0.84], from: 0, to: 0.95 });
const sleeve = {
  pose,
  widths: [
    [0, 5],
    [0.1, 7.2],
    [0.25, 8.6],
    [0.5, 8.4],
    [0.72, 7.6],
    [0.84, 5.6],
    [0.89, 3.9],
    [1, 3.8],
  ] as const,
  // The gathers end at the cuff.
  folds: (angle: number, t: number, side: 1 | -1) =>
    full(angle, t, side) * (0.12 + 0.88 * ease(0.9, 0.86, t)),
  clothWidth: 56,
  depth: 1,
};

export const lh1952n5: Garment = {
  number: 'LH.1952.5',
  kind: 'shirt',
  build(scene) {
    scene.layHalves({ cloth: linen, across: 1100, along: 640 }, body);
    scene.layHalves(
      { cloth: inner, across: 500, along: 220 },
      (u, v, lift, p) => body(u, v * 0.995, lift, p),
      -0.35,
    );
    const sleeves = laySleeves(scene, sleeve, linen, inner, 560, 640);
    for (const layer of sleeves) {
      sewBand(scene, layer, linen, {
        from: 0.885,
        to: 1.003,
        lift: 0.35,
        across: 200,
        width: 6.4,
        length: 24,
      });
      sewButtons(scene, layer, (t) => [0.3, mix(0.92, 0.93, t)], {
        count: 1,
        radius: 0.45,
        cloth: thread(dye('#e6dfcd')),
        lift: 0.45,
        height: 0.4,
      });
    }
    // The binder over the shoulder, and the square gusset under the arm.
    for (const side of [1, -1] as const) {
      const arm = sleeveLayer(sleeve, side);
      scene.lay({ cloth: linen, across: 60, along: 60 }, (u, v, p) =>
        arm(0.25 + 0.09 * (u - v), 0.12 + 0.09 * (u + v), 0.5 * bell(u, 0.5, 0.6) * bell(v, 0.5, 0.6), p),
      );
    }
    // A tall collar, turned over, open at the throat.
    const stand = loft([
      { y: 145, half: 8, front: 7.4, back: 7.2, cz: -1.9 },
      { y: 152, half: 7.6, front: 8, back: 6.8, cz: -1.8 },
      { y: 156, half: 7.8, front: 8.6, back: 6.8, cz: -1.7 },
    ]);
    const collar: Layer = (u, v, lift, p) => {
      const theta = mix(0.22 + 0.2 * (1 - v), 2 * Math.PI - 0.22 - 0.2 * (1 - v), u);
      const lean = ease(0.5, 0, v);
      stand(
        mix(155 - 3.2 * bell(u, 0.5, 0.25), 145, v),
        theta,
        0.2 + 0.5 * lean * bell(Math.min(u, 1 - u), 0, 0.2) + 0.25 * noise.layers(u * 7, v * 2, 2) + lift,
        p,
      );
      p.y -= 1.4 * (0.5 + 0.5 * Math.cos(theta)) * v;
      p.u = u * 46;
      p.v = v * 11;
    };
    scene.layLayer({ cloth: linen, across: 420, along: 120 }, collar);
    scene.layLayer({ cloth: inner, across: 300, along: 60 }, (u, v, lift, p) =>
      collar(mix(0.003, 0.997, u), mix(0.01, 1, v), lift - 0.25, p),
    );
    sewCord(scene, collar, linen, { line: (t) => [t, 0.985], points: 400, length: 46 }, 0.2, 0.9);
    // The frill of the slit: a gathered strip on each edge, turned outwards.
    for (const side of [1, -1] as const)
      scene.lay({ cloth: linen, across: 420, along: 40 }, (u, v, p) => {
        body(0.5 + side * 0.0005, mix(0.05, 0.47, u), 0.3, p);
        const wave = Math.sin(u * 62 + 0.9 * Math.sin(u * 23)) + 0.3 * Math.sin(u * 151);
        p.x += side * (3.4 * v - 0.2);
        p.z += 1.5 * Math.sin(v * 2.2) + 0.75 * wave * v;
        p.u = u * 60;
        p.v = v * 3;
      });
    sewButtons(scene, collar, (t) => [0.006 + 0.001 * t, 0.8], {
      count: 1,
      radius: 0.5,
      cloth: thread(dye('#e6dfcd')),
      lift: 0.25,
      height: 0.4,
    });
  },
  pictures: [
    {
      view: 'front',
      name: 'front',
      shot: hung(14, { lookAt: [0, 105], span: 116, aspect: 0.86, reach: 76 }, { exposure: 0.78 }),
      alt: "A man's white linen shirt of about 1820, hung: a tall open collar, a frilled slit in front, full sleeves gathered at shoulder and cuff, and a long square-cut body.",
      caption: 'Front. Rendered; invented garment.',
    },
    {
      view: 'detail',
      name: 'detail-cuff',
      shot: closeUp(6, { lookAt: [38, 97], span: 22, aspect: 1.33 }, { exposure: 0.78 }),
      alt: 'A close view of the sleeve gathered into a narrow cuff that fastens with a thread button.',
      caption: 'Gathers at the cuff. Rendered; invented garment.',
      fineness: 1.4,
    },
  ],
};
