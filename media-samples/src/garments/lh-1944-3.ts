import { dye } from '../cloths/cloth';
import { lining, metal, woolTwill } from '../cloths/cloths';
import { loft, type Loft } from '../renderer/loft';
import { bell, curve, ease, mix } from '../renderer/numbers';
import { seededNoise } from '../renderer/noise';
import { type Layer } from '../renderer/scene';
import { line, tube, type Vec3 } from '../renderer/tube';
import { sewButtons } from '../trims/buttons';
import { round, sewCord } from '../trims/sewn';
import { hung, type Garment } from './garment';

const noise = seededNoise(1832);
const fawn = woolTwill(dye('#a4906c'), 14);
const inside = lining(dye('#cbbd9f'));
const horn = metal(dye('#7d674a'));

const hips = loft([
  { y: 82, half: 18.2, front: 12.4, back: 13.6 },
  { y: 88, half: 18.4, front: 12.9, back: 14.2 },
  { y: 96, half: 17.2, front: 12.6, back: 13 },
  { y: 104, half: 14.9, front: 11.4, back: 10.8 },
  { y: 109, half: 14.2, front: 11, back: 10.2 },
]);
/** The hips drawn in between the legs, before and behind, as they come down to the fork. */
const seat: Loft = (y, theta, lift, p) => {
  hips(y, theta, lift, p);
  const between = Math.exp(-Math.pow(p.x / mix(2.2, 5.2, ease(94, 82, y)), 2));
  p.z *= 1 - 0.92 * between * Math.pow(ease(95, 81, y), 1.4);
};
const seatFolds = (theta: number, y: number): number =>
  0.5 +
  0.3 * noise.layers(theta * 2 + 5, y * 0.14, 3) +
  0.35 * bell(Math.abs(theta), Math.PI, 0.7) * (noise.fold(y * 0.2 + Math.abs(theta) * 2, 4) - 0.5) -
  0.16 * bell(Math.abs(theta), Math.PI, 0.013) -
  0.12 * bell(Math.abs(theta), 1.6, 0.014);

const top: Layer = (u, v, lift, p) => {
  const theta = (u - 0.5) * 2 * Math.PI;
  const y = mix(107.6 + 1.6 * bell(Math.abs(theta), Math.PI, 0.8), 80, v);
  seat(y, theta, seatFolds(theta, y) + lift, p);
  p.u = theta * 15;
  p.v = 110 - y;
};

const legSpine: readonly Vec3[] = [
  [8.8, 88, 0.2],
  [9.6, 78, 0],
  [10.2, 62, -0.2],
  [10.4, 46, -0.3],
  [10.6, 28, 0],
  [10.8, 10, 0.4],
  [10.9, 2, 0.6],
];
const across = curve([
  [0, 8.6],
  [0.12, 9.4],
  [0.4, 8.4],
  [0.62, 7.6],
  [0.85, 7.2],
  [1, 7.3],
]);

function leg(side: 1 | -1): Layer {
  const { layer } = tube({
    spine: line(legSpine),
    radius: (t) => [across(t), across(t) * mix(1.32, 1.06, ease(0, 0.4, t))],
    clothWidth: 52,
    folds: (angle, t) =>
      0.35 * noise.layers(Math.cos(angle) * 1.8 + 9 * side + 20, t * 7 + Math.sin(angle), 3) +
      0.4 *
        bell(t, 0.5, 0.1) *
        (noise.fold(t * 26 + 0.9 * Math.sin(angle) + 9, 5) - 0.5) *
        (0.5 - 0.4 * Math.cos(angle)) +
      0.5 *
        bell(t, 0.06, 0.07) *
        (noise.fold(t * 60 + 2.2 * angle + 30, 7) - 0.5) *
        Math.max(0, -Math.sin(angle)) +
      0.22 * bell(t, 0.93, 0.07) * (noise.fold(t * 36 + 0.8 * Math.cos(angle) + side, 8) - 0.5) -
      0.1 * bell(angle, Math.PI / 2, 0.02),
  });
  return (u, v, lift, p) => {
    layer(u, v, lift, p);
    p.x *= side;
    p.nx *= side;
  };
}

/** The fall: a flap across the front, buttoned at its upper edge. */
const FALL = 0.82;
const fall: Layer = (u, v, lift, p) => {
  const theta = mix(-FALL, FALL, u) * mix(1, 0.72, v);
  const y = mix(103.6, 89.5, v);
  const rim = Math.min(ease(0, 0.03, u) * ease(1, 0.97, u), ease(0, 0.04, v));
  seat(y, theta, seatFolds(theta, y) + 0.12 + 0.34 * rim * ease(1, 0.75, v) + lift, p);
  p.u = theta * 15;
  p.v = 110 - y;
};

export const lh1944n3: Garment = {
  number: 'LH.1944.3',
  kind: 'trousers',
  build(scene) {
    scene.layLayer({ cloth: fawn, across: 800, along: 320, closed: true }, top);
    scene.layLayer({ cloth: inside, across: 300, along: 80, closed: true }, (u, v, lift, p) =>
      top(u, mix(0.005, 0.7, v), lift - 0.5, p),
    );
    for (const side of [1, -1] as const) {
      const layer = leg(side);
      scene.layLayer({ cloth: fawn, across: 520, along: 900, closed: true }, layer);
      scene.layLayer({ cloth: inside, across: 160, along: 40, closed: true }, (u, v, lift, p) =>
        layer(u, mix(0.85, 0.998, v), lift - 0.45, p),
      );
      // A strap under the boot.
      scene.lay({ cloth: fawn, across: 80, along: 24 }, (u, v, p) => {
        const a = mix(-1, 1, u) * (Math.PI / 2);
        p.x = side * (10.9 + 7.1 * Math.sin(a));
        p.y = 2.4 - 3.4 * Math.cos(a);
        p.z = 0.6 + mix(-1.4, 1.4, v);
        p.u = u * 20;
        p.v = v * 2.8;
      });
    }
    scene.layLayer({ cloth: fawn, across: 420, along: 240 }, fall);
    sewCord(scene, top, fawn, { line: round(0.085), points: 600, closed: true, length: 90 }, 0.12, 0.9);
    sewButtons(scene, fall, (t) => [mix(0.035, 0.965, t), 0.07], {
      count: 4,
      radius: 0.75,
      cloth: horn,
      lift: 0.1,
      height: 0.3,
      points: 36,
    });
    sewButtons(scene, top, (t) => [0.5, mix(0.03, 0.12, t)], {
      count: 2,
      radius: 0.7,
      cloth: horn,
      lift: 0.25,
      height: 0.3,
      points: 36,
    });
  },
  pictures: [
    {
      view: 'front',
      name: 'front',
      shot: hung(18, { lookAt: [0, 54], span: 126, aspect: 0.56, reach: 76, pitch: 4 }, { exposure: 0.95 }),
      alt: "A man's fawn wool trousers of 1830 to 1835: a broad fall front with four horn buttons, straight legs and a strap under each foot.",
      caption: 'Front, with the fall buttoned. Rendered; invented garment.',
    },
  ],
};
