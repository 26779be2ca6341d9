import { allRound, buttons, cloth, fold, row, seam, stitching, straightLine } from '../diagram/layers.js';
import type { GarmentDiagram, View } from '../diagram/model.js';
import { corsetInside } from './corset-inside.js';
import { corset as corsetOutline } from '../silhouettes/body-linen.js';

const front: View = {
  name: 'front',
  caption: 'Front',
  anchors: {},
  layers: [
    ...corsetOutline.layers,
    stitching('58,-204{93}..{90}44,0{90}..{78}69,212'),
    stitching('107,-210{97}..{90}73,0{90}..{66}120,186'),
    stitching('154,-190{104}..{91}99,0{89}..{58}160,164'),
    stitching('0,-140!{-10}..{-32}48,-174..{4}107,-194..{42}172,-132'),
    stitching('0,212!{0}..{-40}52,190..{-16}168,122'),
  ],
};

const back: View = {
  name: 'back',
  caption: 'Back',
  anchors: { topSide: [174, -140], waistSide: [112, 0], bottomSide: [170, 132], gap: [17, 0] },
  layers: [
    cloth(
      '18,-124!{-2}..{-8}96,-132..{-6}topSide!{104}..{90}waistSide..{56}bottomSide!{166}..{180}20,156!{-90}..{-92}18,-124!',
      'both',
    ),
    seam('40,-150{91}..{90}34,0{90}..{86}44,170'),
    seam('82,-160{97}..{90}58,0{90}..{74}92,170'),
    seam('128,-170{102}..{90}86,0{90}..{62}138,170'),
    stitching('90,-160{97}..{90}65,0{90}..{74}100,170'),
    stitching('136,-170{102}..{90}93,0{90}..{62}146,166'),
    stitching('22,-114{-2}..{-8}98,-122..{-6}172,-130'),
    stitching('24,146{0}..{-14}164,122'),
    ...row(9, [0, -108], [0, 116]).map(([, y]) => fold(`-26,${y}--26,${y + 28}`, 'both', 'all')),
    buttons(row(10, [27, -110], [28, 142]), 3, 'both'),
  ],
};

/** A corset of the 1880s: busk in front, laced behind. */
export const corset: GarmentDiagram = {
  kind: 'corset',
  title: 'Corset',
  leastScale: 0.42,
  views: [front, back, corsetInside],
  lines: [
    allRound('corset-waist-closed', 'inside', '~buskWaist--buskWaist'),
    allRound(
      'corset-top',
      'inside',
      '~buskTop{-34}..{22}~bust..{10}~side..{4}~laceTop--laceTop{-4}..{-10}side..{-22}bust..{34}buskTop',
      { beside: 15 },
    ),
    allRound(
      'corset-bottom',
      'inside',
      '~buskBottom{-26}..{-10}~bottomSide..{0}~laceBottom--laceBottom{0}..{10}bottomSide..{26}buskBottom',
      { beside: -16 },
    ),
    straightLine('busk', 'front', '-26,-152---26,214'),
    straightLine('lacing-gap', 'back', '~gap--gap'),
  ],
};
