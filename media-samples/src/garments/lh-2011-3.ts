import { dye, plain } from '../cloths/cloth';
import { lining, ribbon } from '../cloths/cloths';
import { noise as plushNoise } from '../motifs/motifs';
import { bell, curve, ease, mix } from '../renderer/numbers';
import { seededNoise } from '../renderer/noise';
import type { Layer } from '../renderer/scene';
import { standing, type Garment, closeUp } from './garment';

const noise = seededNoise(1845);

/** Silk plush brushed round the crown: its shine follows the brush. */
const plush = plain({
  colour: (u, v, out) => {
    const k = 1 + 0.1 * plushNoise.at(u * 0.5, v * 5) + 0.08 * plushNoise.at(u * 1.3, v * 14);
    out[0] = 0.034 * k;
    out[1] = 0.033 * k;
    out[2] = 0.036 * k;
  },
  gloss: 0.9,
  openness: 1.3,
  tightness: 7,
  pile: 0.3,
  relief: (u, v, out) => {
    out[1] += 0.12 * plushNoise.at(u * 0.35, v * 6) + 0.07 * plushNoise.at(u * 1.2, v * 17);
  },
});
/** The brim is smoother and duller than the crown. */
const felt = { ...plush, gloss: 0.35, tightness: 5, openness: 2.6 };
const band = ribbon(dye('#3a3839'));
const leather = lining(dye('#7a4f33'));
const silk = lining(dye('#c9bda4'));

/** Oval as a head: longer from front to back than across, by these shares. */
const ACROSS = 0.93;
const ALONG = 1.09;
const CROWN = 16.5;
/** Height of the foot of the crown over the table: the brim's dip touches it. */
const FOOT = 1.35;
/** The crown waists in a little and flares to the tip. */
const crownRadius = curve([
  [0, 8.75],
  [0.25, 8.5],
  [0.5, 8.5],
  [0.8, 8.9],
  [0.97, 9.3],
  [1, 9.2],
]);

const crown: Layer = (u, v, lift, p) => {
  const a = (u - 0.5) * 2 * Math.PI;
  // v: 0–0.72 up the side, then over the rounded tip to its middle.
  const up = Math.min(1, v / 0.72);
  const over = ease(0.7, 1, v);
  const tip = v > 0.72 ? (v - 0.72) / 0.28 : 0;
  const r = v <= 0.72 ? crownRadius(up) : 9.2 * (1 - Math.pow(tip, 1.6)) + 0.001;
  const rim =
    v > 0.72 ? 0.35 * Math.sin(Math.min(1, tip * 6) * (Math.PI / 2)) + 0.25 * (1 - Math.pow(1 - tip, 2)) : 0;
  const off = lift * (1 - over);
  p.x = (r + off) * ACROSS * Math.sin(a);
  p.y = FOOT + up * CROWN + rim + lift * over;
  p.z = (r + off) * ALONG * Math.cos(a);
  p.nx = Math.sin(a);
  p.ny = 0;
  p.nz = Math.cos(a);
  p.u = u * 58;
  p.v = v <= 0.72 ? up * CROWN : CROWN + tip * 9;
};

/** The brim: dipped before and behind, curled at the sides. */
const brim: Layer = (u, v, lift, p) => {
  const a = (u - 0.5) * 2 * Math.PI;
  const aside = Math.pow(Math.abs(Math.sin(a)), 2.2);
  const wide = mix(4.6, 4.2, aside);
  const curl = v * v * aside * 2.6 + 0.9 * Math.pow(v, 6) * aside;
  const inwards = aside * Math.pow(v, 3) * 1.1;
  const r = 8.75 + wide * v - inwards;
  p.x = r * ACROSS * Math.sin(a);
  p.z = (r + 0.9 * v * (1 - aside)) * ALONG * Math.cos(a);
  p.y =
    FOOT +
    curl -
    1.1 * v * (1 - aside) * (1 - 0.3 * v) +
    lift +
    0.12 * noise.at(Math.cos(a) + 3, Math.sin(a) + v);
  p.nx = 0;
  p.ny = 1;
  p.nz = 0;
  p.u = u * 70;
  p.v = 30 + v * wide;
};

export const lh2011n3: Garment = {
  number: 'LH.2011.3',
  kind: 'hat',
  build(scene) {
    scene.layLayer({ cloth: plush, across: 560, along: 420, closed: true }, crown);
    scene.layLayer({ cloth: felt, across: 560, along: 120, closed: true }, brim, 0.16);
    scene.layLayer({ cloth: felt, across: 560, along: 80, closed: true }, brim, -0.16);
    // The edge is bound in ribbed ribbon.
    scene.lay({ cloth: band, across: 560, along: 16, closed: true }, (u, v, p) => {
      const q = v * 2 * Math.PI;
      brim(u, 0.985 + 0.03 * Math.cos(q), 0.26 * Math.sin(q), p);
      p.u = u * 70;
      p.v = v * 1.6;
    });
    scene.lay({ cloth: band, across: 420, along: 40, closed: true }, (u, v, p) => {
      crown(u, mix(0.012, 0.165, v), 0.16 + 0.06 * bell(v, 0.5, 0.5), p);
      p.u = u * 58;
      p.v = v * 3.6;
    });
    // A flat bow on the wearer's left, then the leather and silk inside.
    for (const [from, to, lift] of [
      [0.715, 0.765, 0.4],
      [0.752, 0.758, 0.55],
    ] as const)
      scene.lay({ cloth: band, across: 60, along: 30 }, (u, v, p) => {
        crown(mix(from, to, u), mix(0.008, 0.17, v), lift + 0.14 * Math.sin(u * Math.PI), p);
        p.u = u * 3;
        p.v = v * 3.6;
      });
    scene.layLayer({ cloth: leather, across: 240, along: 30, closed: true }, (u, v, lift, p) =>
      crown(u, v * 0.25, lift - 0.25, p),
    );
    scene.layLayer({ cloth: silk, across: 240, along: 80, closed: true }, (u, v, lift, p) =>
      crown(u, 0.24 + v * 0.76, lift - 0.35, p),
    );
  },
  pictures: [
    {
      view: 'front',
      name: 'front',
      shot: standing(
        38,
        { lookAt: [0, 9], span: 30, aspect: 1.15, reach: 22 },
        {
          exposure: 1.25,
          bias: 0.12,
          camera: { yaw: 38, pitch: 11, distance: 240, lookAt: [0, 9], span: 30, aspect: 1.15 },
        },
      ),
      alt: "A man's black silk plush top hat of the 1840s: a tall crown flaring a little to the tip, a ribbed ribbon and a brim curled at the sides.",
      caption: 'Three-quarter view. Rendered; invented garment.',
    },
    {
      view: 'detail',
      name: 'detail-brim',
      shot: closeUp(
        58,
        { lookAt: [0, 4], span: 13, aspect: 1.33, pitch: 10 },
        { exposure: 1.25, bias: 0.06, reach: 20, backdrop: 'floor' },
      ),
      alt: 'A close view of the curled brim with its ribbed binding, against the ribbon and the brushed plush of the crown.',
      caption: 'Brim, binding and ribbon. Rendered; invented garment.',
      fineness: 1.2,
    },
  ],
};
