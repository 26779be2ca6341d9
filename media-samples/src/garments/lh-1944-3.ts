import { dye } from '../cloths/cloth';
import { lining, metal, woolTwill } from '../cloths/cloths';
import { loft } from '../renderer/loft';
import { bell, curve, ease, mix } from '../renderer/numbers';
import { seededNoise } from '../renderer/noise';
import type { Layer } from '../renderer/scene';
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
const seatFolds = (theta: number, y: number): number =>
  0.5 +
  0.3 * noise.layers(theta * 2 + 5, y * 0.14, 3) +
  0.35 * bell(Math.abs(theta), Math.PI, 0.7) * (noise.fold(y * 0.2 + Math.abs(theta) * 2, 4) - 0.5) -
  0.16 * bell(Math.abs(theta), Math.PI, 0.013) -
  0.12 * bell(Math.abs(theta), 1.6, 0.014);

/** The waist, for what is sewn round it. */
const waist: Layer = (u, v, lift, p) => {
  const theta = (u - 0.5) * 2 * Math.PI;
  const y = mix(107.6 + 1.6 * bell(Math.abs(theta), Math.PI, 0.8), 80, v);
  hips(y, theta, seatFolds(theta, y) + lift, p);
  p.u = theta * 15;
  p.v = 110 - y;
};

const hipHalf = curve([
  [82, 18.2],
  [88, 18.4],
  [96, 17.2],
  [104, 14.9],
  [109, 14.2],
]);
const hipFront = curve([
  [82, 12.4],
  [88, 12.9],
  [96, 12.6],
  [104, 11.4],
  [109, 11],
]);
const hipBack = curve([
  [82, 13.6],
  [88, 14.2],
  [96, 13],
  [104, 10.8],
  [109, 10.2],
]);
const legMiddle = curve([
  [2, 10.9],
  [46, 10.4],
  [76, 9.5],
  [88, 9.1],
]);
const legRadius = curve([
  [2, 7.3],
  [20, 7.2],
  [45, 7.8],
  [64, 8.6],
  [80, 9.1],
]);

function legFolds(angle: number, y: number, side: 1 | -1): number {
  const t = 1 - y / 86;
  return (
    0.35 * noise.layers(Math.cos(angle) * 1.8 + 9 * side + 20, t * 7 + Math.sin(angle), 3) +
    0.4 *
      bell(y, 44, 9) *
      (noise.fold(t * 26 + 0.9 * Math.sin(angle) + 9, 5) - 0.5) *
      (0.5 - 0.4 * Math.cos(angle)) +
    0.4 *
      bell(y, 76, 6) *
      (noise.fold(t * 46 + 2.2 * angle + 30, 7) - 0.5) *
      Math.max(0, -Math.sin(angle + 0.4)) +
    0.12 * bell(y, 7, 5) * (noise.fold(t * 30 + 0.8 * Math.cos(angle) + side, 8) - 0.5) -
    0.1 * bell(angle, Math.PI / 2, 0.02)
  );
}

/** Share of the cloth that goes round the outside, from the middle of the front to the middle of the back. */
const OUTSIDE = 0.68;

/** One half of the trousers: half the hips above the fork, a whole leg below it, and one surface between. */
function half(side: 1 | -1): Layer {
  return (u, v, lift, p) => {
    const within = u <= OUTSIDE ? u / OUTSIDE : (u - OUTSIDE) / (1 - OUTSIDE);
    const theta = (u <= OUTSIDE ? within : 1 - within) * Math.PI;
    const y = mix(107.6 + 1.6 * bell(theta, Math.PI, 0.8), 2, v);
    const closed = ease(86, 73, y);
    const angle = u <= OUTSIDE ? mix(-0.36, 1.36, within) * Math.PI : mix(1.36, 1.64, within) * Math.PI;
    const hipX = u <= OUTSIDE ? hipHalf(y) * Math.sin(theta) : 0;
    const hipZ =
      u <= OUTSIDE
        ? (Math.cos(theta) > 0 ? hipFront(y) : hipBack(y)) * Math.cos(theta)
        : mix(-hipBack(y), hipFront(y), within);
    const legX = legMiddle(y) + legRadius(y) * Math.sin(angle);
    const legZ = legRadius(y) * 1.08 * Math.cos(angle) + 0.6 * ease(30, 0, y);
    // Both halves must meet in the middle, so the hips' folds die away there.
    const edge = ease(0, 0.05, Math.min(within, 1 - within));
    const off =
      mix(u <= OUTSIDE ? seatFolds(theta, y) * edge : 0, 0.3 + legFolds(angle, y, side), closed) + lift;
    p.nx = mix(u <= OUTSIDE ? Math.sin(theta) : -0.2, Math.sin(angle), closed);
    p.nz = mix(u <= OUTSIDE ? Math.cos(theta) : 0, Math.cos(angle), closed);
    p.ny = 0;
    p.x = side * (mix(hipX, legX, closed) + p.nx * off);
    p.z = mix(hipZ, legZ, closed) + p.nz * off;
    p.y = y;
    p.nx *= side;
    p.u = u * 52;
    p.v = 110 - y;
  };
}

/** The fall: a flap across the front, buttoned at its upper edge. */
const FALL = 0.82;
const fall: Layer = (u, v, lift, p) => {
  const theta = mix(-FALL, FALL, u) * mix(1, 0.72, v);
  const y = mix(103.6, 91, v);
  const rim = Math.min(ease(0, 0.03, u) * ease(1, 0.97, u), ease(0, 0.04, v));
  hips(y, theta, seatFolds(theta, y) + 0.12 + 0.34 * rim * ease(1, 0.75, v) + lift, p);
  p.u = theta * 15;
  p.v = 110 - y;
};

export const lh1944n3: Garment = {
  number: 'LH.1944.3',
  kind: 'trousers',
  build(scene) {
    scene.layLayer({ cloth: inside, across: 300, along: 60, closed: true }, (u, v, lift, p) =>
      waist(u, mix(0.005, 0.5, v), lift - 0.7, p),
    );
    for (const side of [1, -1] as const) {
      const layer = half(side);
      scene.layLayer({ cloth: fawn, across: 760, along: 1000, closed: true }, layer);
      scene.layLayer({ cloth: inside, across: 160, along: 40, closed: true }, (u, v, lift, p) =>
        layer(u, mix(0.9, 0.999, v), lift - 0.45, p),
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
    sewCord(scene, waist, fawn, { line: round(0.085), points: 600, closed: true, length: 90 }, 0.12, 0.9);
    sewButtons(scene, fall, (t) => [mix(0.035, 0.965, t), 0.07], {
      count: 4,
      radius: 0.75,
      cloth: horn,
      lift: 0.1,
      height: 0.3,
      points: 36,
    });
    sewButtons(scene, waist, (t) => [0.5, mix(0.03, 0.12, t)], {
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
