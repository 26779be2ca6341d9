import { armholeRim, cutAway, inArmhole, type Armhole } from '../bodices/openings';
import { dye, type Cloth } from '../cloths/cloth';
import { jet, lining, silkCrepe } from '../cloths/cloths';
import { part } from '../motifs/motifs';
import { loft } from '../renderer/loft';
import { bell, ease, mix } from '../renderer/numbers';
import { seededNoise } from '../renderer/noise';
import type { Layer, Scene } from '../renderer/scene';
import { sewCord } from '../trims/sewn';
import { closeUp, standing, type Garment } from './garment';

const noise = seededNoise(1927);
const black = dye('#38363b');
const silver = dye('#b9b4a6');
const gold = dye('#9c8454');

/** A straight tube that only touches the hips. */
const form = loft([
  { y: 40, half: 22.5, front: 16, back: 16.5 },
  { y: 60, half: 20.6, front: 14.4, back: 15 },
  { y: 78, half: 18.8, front: 13.2, back: 14 },
  { y: 90, half: 18.2, front: 12.8, back: 13.6 },
  { y: 104, half: 16, front: 12, back: 11.6 },
  { y: 116, half: 15.8, front: 12.4, back: 10.6 },
  { y: 124, half: 16, front: 12.6, back: 10.4 },
  { y: 130, half: 16, front: 11, back: 10.2 },
  { y: 135, half: 14.4, front: 8.4, back: 8.8, cz: -0.9 },
  { y: 138.4, half: 11.6, front: 6.2, back: 6.8, cz: -1.4 },
  { y: 140.2, half: 8.6, front: 4.4, back: 5, cz: -1.5 },
]);

const armhole: Armhole = { theta: Math.PI / 2, y: 128.4, wide: 0.52, high: 9.2 };
/** A soft U before and a deeper one behind; the straps are level on the shoulders. */
const neck = (theta: number): number => {
  const c = Math.cos(theta);
  return c > 0 ? mix(140, 124.5, ease(0.3, 1, c)) : mix(140, 121, ease(0.3, 1, -c));
};
const RADIUS = 15;

const nearBand = (y: number): boolean => Math.abs(y - 112) < 4.2 || Math.abs(y - 87.6) < 5.8 || y < 82;

/** Beads in bands: rows of bugles laid in zigzags between lines of round beads. */
function beadAt(u: number, y: number): 0 | 1 | 2 {
  for (const [middle, half] of [
    [112, 3.6],
    [87.6, 5.2],
    [56.5, 2.6],
  ] as const) {
    const d = y - middle;
    if (Math.abs(d) > half) continue;
    if (Math.abs(Math.abs(d) - half + 0.5) < 0.24 && Math.abs(part(u * 2) - 0.5) < 0.4) return 2;
    const zig = Math.abs(part(u / 4.7) - 0.5) * 4 - 1;
    const lines = part((d - zig * half * 0.62) / 1.15);
    if (Math.abs(d) < half - 0.9 && lines < 0.46 && part(u * 1.6) < 0.86) return 1;
  }
  if (nearBand(y)) return 0;
  // A scatter between the bands, thicker towards them.
  const cell = 2.6;
  const shift = Math.floor(y / cell) & 1 ? 0.5 : 0;
  const r = Math.hypot(part(u / cell + shift) - 0.5, part(y / cell) - 0.5) * cell;
  return r < 0.19 ? 1 : 0;
}

const beaded: Cloth = {
  ...silkCrepe((u, v, out) => {
    const bead = beadAt(u, v);
    const own = bead === 1 ? silver : bead === 2 ? gold : black;
    const round = bead === 0 ? 1 : 0.55 + 0.75 * Math.abs(noise.at(u * 5.3, v * 7.1));
    for (let i = 0; i < 3; i++) out[i] = own[i]! * round;
  }),
  gloss: 0.5,
  relief: (u, v, out) => {
    if (beadAt(u, v) === 0) return;
    out[0] += 0.55 * noise.at(u * 7, v * 7);
    out[1] += 0.55 * noise.at(u * 7 + 5, v * 7);
  },
};
const isOpen = (u: number, v: number): boolean => inArmhole(armhole, u / RADIUS, v);
const inside = lining(dye('#6f6862'));

const tubeFolds = (theta: number, y: number): number =>
  0.9 +
  0.3 * noise.layers(theta * 2 + 6, y * 0.08, 3) +
  0.5 * bell(y, 100, 8) * (noise.fold(theta * 2.4 + 8 + 0.3 * noise.at(theta, y * 0.2), 3) - 0.5) +
  1.4 * ease(88, 45, y) * (noise.fold(theta * 2.4 + 8 + 0.4 * noise.at(theta, y * 0.06), 4) - 0.5);

const tubeOfSilk: Layer = (u, v, lift, p) => {
  const theta = mix(-Math.PI, Math.PI, u);
  const y = mix(neck(theta), 52, v);
  form(y, theta, tubeFolds(theta, y) + lift, p);
  p.u = theta * RADIUS;
  p.v = y;
};

/** Squares of silk set into the skirt from the hip, each corner falling in a point. */
function layHandkerchiefs(scene: Scene): void {
  for (const [row, top, short, long, off] of [
    [0, 81.4, 50, 30, 0.15],
    [1, 81.6, 54, 37, 0.35],
  ] as const) {
    const points = 4;
    const turn = row * 0.5;
    scene.lay({ cloth: beadedPlain, across: 1300, along: 420, closed: true }, (u, v, p) => {
      const theta = mix(-Math.PI, Math.PI, u);
      const at = part(u * points + turn + 0.25);
      const fall = 1 - Math.abs(at - 0.5) * 2;
      const foot = mix(short, long, fall);
      const y = mix(top, foot, v);
      const wave =
        (noise.fold(
          (u * 14 + 0.5 * noise.at(Math.cos(theta) + 4 + row, Math.sin(theta) + v) + 14) % 14,
          5 + row,
        ) -
          0.5) *
        4.6 *
        v *
        v;
      form(
        Math.max(40, y),
        theta,
        tubeFolds(theta, y) + off + ease(0, 0.3, v) * off * 3 + wave + 2.2 * v * v,
        p,
      );
      p.y = y;
      p.u = theta * RADIUS;
      p.v = v * (top - foot) + 300;
    });
  }
}
const beadedPlain = silkCrepe(black);

export const lh2004n9: Garment = {
  number: 'LH.2004.9',
  kind: 'dress',
  build(scene) {
    scene.layLayer({ cloth: cutAway(beaded, isOpen), across: 1100, along: 700, closed: true }, tubeOfSilk);
    scene.lay({ cloth: cutAway(inside, isOpen), across: 400, along: 200, closed: true }, (u, v, p) =>
      tubeOfSilk(u, v, -0.4, p),
    );
    layHandkerchiefs(scene);
    const bound = jet(dye('#47423f'));
    const onForm: Layer = (u, v, lift, p) => form(v, u, tubeFolds(u, v) + lift, p);
    sewCord(
      scene,
      onForm,
      bound,
      {
        line: (t) => [mix(-Math.PI, Math.PI, t), neck(mix(-Math.PI, Math.PI, t))],
        points: 700,
        closed: true,
        length: 80,
      },
      0.22,
      0.9,
    );
    for (const side of [1, -1] as const)
      sewCord(scene, onForm, bound, { line: armholeRim(armhole, side), points: 400, length: 50 }, 0.22, 0.9);
  },
  pictures: [
    {
      view: 'front',
      name: 'front',
      shot: standing(
        24,
        { lookAt: [0, 85], span: 128, aspect: 0.62, reach: 84 },
        { exposure: 0.98, backdrop: 'wall' },
      ),
      alt: 'A black sleeveless evening dress of about 1927: a straight tube with zigzag bands of silver and gold beads, a low round neck, and a handkerchief hem of falling points.',
      caption: 'Front. Rendered; invented garment.',
    },
    {
      view: 'detail',
      name: 'detail-beads',
      shot: closeUp(18, { lookAt: [1, 87], span: 20, aspect: 1.33 }, { exposure: 0.98 }),
      alt: 'A close view of the hip band: silver bugle beads in zigzags between two lines of gold ones, on black crêpe.',
      caption: 'Beaded band at the hip. Rendered; invented garment.',
      fineness: 1.2,
    },
  ],
};
