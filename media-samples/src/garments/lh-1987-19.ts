import { dye } from '../cloths/cloth';
import { lining, metal, ribbon, sateen, thread } from '../cloths/cloths';
import { laceEdging } from '../cloths/lace';
import { part } from '../motifs/motifs';
import { loft } from '../renderer/loft';
import { bell, ease, mix } from '../renderer/numbers';
import { seededNoise } from '../renderer/noise';
import { newPoint, type Layer, type Scene } from '../renderer/scene';
import { line, tube, type Vec3 } from '../renderer/tube';
import { sewButton } from '../trims/buttons';
import { round, sewCord, sewFrill } from '../trims/sewn';
import { closeUp, hung, type Garment } from './garment';

const noise = seededNoise(1882);
const rust = dye('#90543c');
const floss = dye('#e6d6b4');
const WAIST = 104;

const form = loft([
  { y: 88, half: 18, front: 13.4, back: 14.8 },
  { y: 93, half: 16.8, front: 12.9, back: 13.6 },
  { y: 99, half: 12.9, front: 10.6, back: 10 },
  { y: WAIST, half: 10.3, front: 8.7, back: 8.3 },
  { y: 109, half: 11.4, front: 9.8, back: 8.8 },
  { y: 116, half: 14, front: 12.4, back: 9.8 },
  { y: 122, half: 15.4, front: 14.2, back: 10.2 },
  { y: 128, half: 15.2, front: 13, back: 10.2 },
]);

const upper = (theta: number): number =>
  123.4 +
  1.6 * bell(Math.abs(theta), 0.75, 0.45) -
  1.5 * ease(1.3, 2.6, Math.abs(theta)) -
  1.2 * bell(theta, 0, 0.12);
const lower = (theta: number): number =>
  93.6 -
  4.4 * bell(Math.abs(theta), 0, 0.5) +
  3 * bell(Math.abs(theta), 1.5, 0.55) -
  1.2 * ease(2.2, 3, Math.abs(theta));
/** The lacing stands open behind by about 6 cm. */
const GAP = 0.22;

/** Boned channels: groups of three, drawn in to the waist; angle of each at the bust. */
const GROUPS = [0.2, 0.62, 1.08, 1.6, 2.1, 2.55] as const;
const STEP = 0.072;
const pinch = (y: number): number => 1 + 0.1 * (1 - bell(y, WAIST, 9));
const channelsOf = (theta: number, y: number): { from: number; group: number } => {
  const a = Math.abs(theta) / pinch(y);
  let from = 9;
  let group = -1;
  GROUPS.forEach((middle, g) => {
    for (const k of [-1, 0, 1]) {
      const d = (a - middle - k * STEP) * 13;
      if (Math.abs(d) < Math.abs(from)) {
        from = d;
        group = g;
      }
    }
  });
  return { from, group };
};

const folds = (theta: number, y: number): number => {
  const { from } = channelsOf(theta, y);
  return (
    0.5 +
    0.17 * Math.sqrt(Math.max(0, 1 - Math.pow(from / 0.42, 2))) +
    0.1 * noise.layers(theta * 2 + 4, y * 0.2, 2) +
    0.14 * bell(Math.abs(theta), 0.05, 0.07)
  );
};

/** Rust sateen stitched in pale thread; flossing like an arrow at each end of the bones. */
const worked = sateen((theta, y, out) => {
  const { from } = channelsOf(theta, y);
  for (let i = 0; i < 3; i++) out[i] = rust[i]!;
  const stitched = Math.abs(Math.abs(from) - 0.44) < 0.045 && part(y * 5) < 0.66;
  const fromTop = upper(theta) - y;
  const fromFoot = y - lower(theta);
  const flossed = arrow(from, fromTop - 1.3) || arrow(from, fromFoot - 1.3);
  if (stitched || flossed)
    for (let i = 0; i < 3; i++) out[i] = floss[i]! * (flossed ? 0.82 + 0.18 * Math.cos(from * 44) : 0.9);
});

function arrow(across: number, along: number): boolean {
  if (along < 0 || along > 2.6) return false;
  const wide = 0.46 * (1 - along / 2.6);
  return Math.abs(across) < wide && Math.abs(Math.sin(across * 22 + along * 3)) > 0.25 + 0.1 * along;
}

const layer: Layer = (u, v, lift, p) => {
  const theta = mix(-Math.PI + GAP, Math.PI - GAP, u);
  const y = mix(upper(theta), lower(theta), v);
  form(y, theta, folds(theta, y) + lift, p);
  p.u = theta;
  p.v = y;
};

const binding = ribbon(dye('#d9c49a'));
const steel = metal(dye('#8a857b'));

function busk(scene: Scene): void {
  for (const y of [95.5, 102, 108.6, 115.2, 120.6]) {
    const p = newPoint();
    form(y, 0, 0.98, p);
    const z = p.z;
    scene.lay({ cloth: steel, across: 90, along: 40 }, (u, v, q) => {
      const x = mix(-1.7, 1.3, u);
      const h = mix(-0.42, 0.42, v);
      const end = Math.abs((x + 0.2) / 1.5);
      q.x = x;
      q.y = y + h * (1 - 0.4 * Math.pow(end, 6));
      q.z = z - 0.035 * x * x + 0.12 * (1 - Math.pow(Math.abs(h) / 0.42, 4));
      q.u = 0.2;
      q.v = h;
    });
    sewButton(scene, [0.72, y, z + 0.06], [0.05, 0, 1], 0.5, steel, 0.55, 40);
    for (const x of [-1.3, -0.75]) sewButton(scene, [x, y, z + 0.1], [0, 0, 1], 0.15, steel, 0.5, 16);
  }
}

/** Eyelets down both edges behind, and one cord crossed through them. */
function lacing(scene: Scene): void {
  const cord = thread(dye('#d8c8a6'));
  const p = newPoint();
  const holes = Array.from({ length: 13 }, (_, i) => {
    const y = mix(119.5, 93, i / 12);
    form(y, Math.PI - GAP - 0.06, 0.75, p);
    return { y, x: Math.abs(p.x), z: p.z };
  });
  for (const hole of holes)
    for (const side of [1, -1])
      sewButton(scene, [side * hole.x, hole.y, hole.z], [side * 0.2, 0, -1], 0.3, steel, 0.2, 24);
  holes.slice(1).forEach((hole, i) => {
    const above = holes[i]!;
    for (const side of [1, -1]) {
      const path: Vec3[] = [
        [side * above.x, above.y, above.z - 0.15],
        [side * above.x * 0.3, mix(above.y, hole.y, 0.35), above.z - 0.3 - 0.18 * side],
        [-side * hole.x * 0.3, mix(above.y, hole.y, 0.65), hole.z - 0.3 - 0.18 * side],
        [-side * hole.x, hole.y, hole.z - 0.15],
      ];
      const { layer: strand } = tube({
        spine: line(path),
        radius: () => [0.16, 0.16],
        clothWidth: 1,
        facing: [0, 0, -1],
      });
      scene.layLayer({ cloth: cord, across: 14, along: 40, closed: true }, strand);
    }
  });
}

export const lh1987n19: Garment = {
  number: 'LH.1987.19',
  kind: 'corset',
  build(scene) {
    scene.layLayer({ cloth: worked, across: 1900, along: 760 }, layer);
    scene.lay({ cloth: lining(dye('#c2ab8c')), across: 420, along: 120 }, (u, v, p) => {
      layer(u, v, -0.4, p);
      p.u = u * 70;
    });
    for (const v of [0, 1])
      sewCord(scene, layer, binding, { line: round(v, 0.001, 0.999), points: 1200, length: 72 }, 0.34, 1);
    for (const u of [0.002, 0.998])
      sewCord(scene, layer, worked, { line: (t) => [u, t], points: 400, length: 34 }, 0.22, 1);
    sewFrill(scene, layer, laceEdging({ repeat: 1.5, depth: 2.4 }), {
      line: round(0.006, 0.002, 0.998),
      points: 1500,
      length: 100,
      depth: 2.3,
      motifDepth: 2.4,
      way: -1,
      gathers: 40,
      stand: 0.18,
      flare: 0.3,
      lift: 0.5,
    });
    busk(scene);
    lacing(scene);
  },
  pictures: [
    {
      view: 'front',
      name: 'front',
      shot: hung(
        24,
        { lookAt: [0, 106.5], span: 48, aspect: 0.82, reach: 34, pitch: 7 },
        { exposure: 1, bias: 0.2 },
      ),
      alt: 'A rust-coloured sateen corset of the 1880s: five steel clasps down the front, groups of boned channels flossed in cream, and lace at the top.',
      caption: 'Front, closed at the busk. Rendered; invented garment.',
    },
    {
      view: 'back',
      name: 'back',
      shot: hung(
        186,
        { lookAt: [0, 106.5], span: 48, aspect: 0.82, reach: 34, pitch: 4 },
        { exposure: 1, bias: 0.2 },
      ),
      alt: 'The rust-coloured corset from behind: one cord crossed through thirteen pairs of eyelets, the edges standing about six centimetres apart.',
      caption: 'Back lacing. Rendered; invented garment.',
    },
    {
      view: 'detail',
      name: 'detail-flossing',
      shot: closeUp(
        24,
        { lookAt: [1, 95], span: 16, aspect: 1.33, pitch: 6 },
        { exposure: 1, bias: 0.1, reach: 30 },
      ),
      alt: 'A close view of the lower edge: cream flossing at the ends of the bones beside a steel clasp.',
      caption: 'Flossing at the lower edge. Rendered; invented garment.',
      fineness: 1.2,
    },
  ],
};
