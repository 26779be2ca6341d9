import { dye } from '../cloths/cloth';
import { broadcloth, jet, lining, ribbon, silkCrepe } from '../cloths/cloths';
import { layBow } from '../accessories/belt';
import { layStandCollar } from '../collars/stand-collar';
import { part } from '../motifs/motifs';
import { loft } from '../renderer/loft';
import { mix } from '../renderer/numbers';
import { seededNoise } from '../renderer/noise';
import type { Layer, Scene } from '../renderer/scene';
import { faceOf, sewButton } from '../trims/buttons';
import { sewCord, sewFrill } from '../trims/sewn';
import { closeUp, hung, type Garment } from './garment';

const noise = seededNoise(1892);
const black = broadcloth(dye('#3d3b40'));
const beads = jet(dye('#2e2c31'));
const inside = { ...lining(dye('#8d8088')), openness: 3 };

const form = loft([
  { y: 144, half: 6.8, front: 6.2, back: 6, cz: -1.2 },
  { y: 141.6, half: 9, front: 7.4, back: 7.4, cz: -1.3 },
  { y: 138.6, half: 13.4, front: 9, back: 9, cz: -1.2 },
  { y: 135, half: 18, front: 11, back: 11, cz: -0.8 },
  { y: 129, half: 22.2, front: 13.6, back: 13.4, cz: -0.4 },
  { y: 118, half: 26, front: 17, back: 16 },
  { y: 104, half: 29.6, front: 20, back: 19 },
  { y: 94, half: 32, front: 22, back: 21 },
]);

/** A short cape, cut to flare: it lies close on the shoulders and ripples at its edge; open before. */
const cape =
  (upper: number, lower: number, gap: number, row: number): Layer =>
  (u, v, lift, p) => {
    const open = gap * (0.4 + 0.6 * v);
    const theta = mix(open, 2 * Math.PI - open, u);
    const y = mix(upper, lower, v);
    const wave =
      (noise.fold((u * 15 + 0.4 * noise.at(u * 5 + row, v)) % 40, 4 + row) - 0.5) * 4.4 * Math.pow(v, 1.5);
    form(y, theta, 0.6 + wave + 0.2 * noise.layers(u * 8, v * 4, 2) + lift, p);
    p.u = u * 190;
    p.v = v * (upper - lower) * 1.2;
  };
const long = cape(143, 95, 0.09, 0);
/** The upper cape is cut to the same folds, so that it lies on the lower. */
const short: Layer = (u, v, lift, p) => long(u, 0.5 * v, lift + 0.3 * v, p);

/** Scrolls of cord set with beads, repeated along a layer. */
function scrollwork(
  scene: Scene,
  layer: Layer,
  from: number,
  to: number,
  repeats: number,
  points: number,
): void {
  for (let k = 0; k < repeats; k++) {
    const side = k & 1 ? 1 : -1;
    const curl = (t: number): readonly [number, number] => {
      const a = mix(-0.6, 4.6, t);
      const r = mix(0.46, 0.05, t);
      return [
        (k + 0.5 + side * r * Math.cos(a)) / repeats,
        mix(to, from, 0.5 + r * 1.7 * Math.sin(a) * 0.55),
      ];
    };
    sewCord(scene, layer, beads, { line: curl, points, length: 14 }, 0.17, 0.4);
    for (const t of [0, 0.2, 0.38, 0.55, 0.72, 0.86, 1]) {
      const { at, facing } = faceOf(layer, ...curl(t), 0.35);
      sewButton(scene, at, facing, t === 1 ? 0.62 : 0.3, beads, 0.7, 16);
    }
  }
}

/** A row of round beads along an edge. */
function beadRow(scene: Scene, layer: Layer, v: number, count: number, radius: number): void {
  for (let i = 0; i < count; i++) {
    const { at, facing } = faceOf(layer, mix(0.004, 0.996, i / (count - 1)), v, 0.12);
    sewButton(scene, at, facing, radius, beads, 0.8, 12);
  }
}

export const lh1969n12: Garment = {
  number: 'LH.1969.12',
  kind: 'cape',
  build(scene) {
    scene.layLayer({ cloth: black, across: 1100, along: 420 }, long);
    scene.layLayer({ cloth: inside, across: 420, along: 120 }, (u, v, lift, p) =>
      long(mix(0.002, 0.998, u), v * 0.995, lift - 0.5, p),
    );
    scene.layLayer({ cloth: black, across: 1000, along: 240 }, (u, v, lift, p) => short(u, v, lift + 0.9, p));
    const upperCape: Layer = (u, v, lift, p) => short(u, v, lift + 0.9, p);
    scrollwork(scene, upperCape, 0.58, 0.94, 22, 80);
    beadRow(scene, upperCape, 0.985, 210, 0.3);
    scrollwork(scene, long, 0.8, 0.955, 26, 80);
    beadRow(scene, long, 0.985, 300, 0.3);
    for (const u of [0.002, 0.998])
      sewCord(scene, long, black, { line: (t) => [u, t], points: 300, length: 50 }, 0.24, 0.9);
    const collar = layStandCollar(
      scene,
      { foot: 141.8, top: 148.8, footHalf: 7, topHalf: 7.4, lift: 0.7 },
      black,
      inside,
    );
    const ruche = silkCrepe((u, _v, out) => {
      const k = part(u * 0.9) < 0.5 ? 1 : 0.8;
      for (let i = 0; i < 3; i++) out[i] = 0.045 * k;
    });
    sewFrill(scene, collar, ruche, {
      line: (t) => [t, 0.08],
      points: 700,
      closed: true,
      length: 90,
      depth: 3.4,
      way: -1,
      gathers: 26,
      stand: 0.7,
      flare: 1.6,
      lift: 0,
    });
    layBow(scene, [0, 141, 8.6], 5.4, ribbon(dye('#38363b')), 3.6);
  },
  pictures: [
    {
      view: 'front',
      name: 'front',
      shot: hung(24, { lookAt: [0, 120.5], span: 72, aspect: 1.08, reach: 52, pitch: 7 }, { exposure: 1.2 }),
      alt: 'A black wool shoulder cape of about 1892 in two tiers, trimmed with scrolls of cord and jet-like beads, with a ruched stand collar and a ribbon bow.',
      caption: 'Front. Rendered; invented garment.',
    },
    {
      view: 'detail',
      name: 'detail-beads',
      shot: closeUp(-14, { lookAt: [6, 121], span: 20, aspect: 1.33 }, { exposure: 1.25 }),
      alt: 'A close view of beaded cord laid in scrolls along the edge of the upper cape.',
      caption: 'Scrolls of beaded cord. Rendered; invented garment.',
      fineness: 1.2,
    },
  ],
};
