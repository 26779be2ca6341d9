import { allRound, alongCurve, cloth, piece, seam, straightLine } from '../diagram/layers.js';
import type { GarmentDiagram, View } from '../diagram/model.js';
import { bustle as bustleOutline } from '../silhouettes/body-linen.js';

const behind: View = { name: 'back', caption: 'From behind', anchors: {}, layers: bustleOutline.layers };

const side: View = {
  name: 'side',
  caption: 'From the side',
  anchors: { top: [0, 0], foot: [0, 384] },
  layers: [
    cloth('top!{14}..{84}176,110..{96}190,220..{130}120,340..{170}foot!--top', 'once'),
    ...[80, 150, 220, 290].map((y) => seam(`-10,${y + 30}{-6}..{-16}260,${y - 8}`, 'once')),
    piece('-64,-28!--6,-30!--8,2!---64,0!---64,-28', 'once'),
    seam('-64,-14{176}..{100}-150,60', 'once', 'all'),
  ],
};

/** A wire bustle of about 1885. */
export const bustle: GarmentDiagram = {
  kind: 'bustle',
  title: 'Bustle',
  leastScale: 0.5,
  views: [behind, side],
  lines: [
    allRound('bustle-band', 'back', '-116,-17--116,-17', { sag: 6 }),
    straightLine('bustle-width', 'back', '-178,212--178,212'),
    straightLine('bustle-depth', 'side', '0,200--191,200'),
    alongCurve('bustle-length', 'side', 'top{14}..{84}176,110..{96}190,220..{130}120,340..{170}foot', {
      beside: 13,
    }),
  ],
};
