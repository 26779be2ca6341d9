import { cloth, fold, lining, piece, row, seam, stitching } from '../diagram/layers.js';
import type { View } from '../diagram/model.js';

const hooks = row(8, [24, -298], [24, -60]).map(([x, y]) => {
  const edgeX = 34 + (y + 318) * 0.02;
  return seam(`${x + 6},${y.toFixed(1)}--${edgeX.toFixed(1)},${y.toFixed(1)}`, 'both', 'all');
});

/** Turned inside out, back up and parted: the lined bodice, the waist tape, the seams and the hem facing. */
export const dressInside: View = {
  name: 'inside',
  caption: 'Turned inside out, back up',
  anchors: {
    neckOpen: [32, -320],
    neck: [124, -366],
    tip: [190, -334],
    scye: [150, -262],
    underarm: [168, -190],
    waistSide: [126, 0],
    waistOpen: [36, 6],
    placketEnd: [0, 250],
    hemSide: [398, 976],
    hemBack: [0, 1028],
    bustSide: [161, -168],
    underBustSide: [146, -98],
  },
  layers: [
    lining('0,-292!{0}..{-22}70,-312..{-62}neck!--100,0!--60,260!--0,260!'),
    stitching('0,-284{0}..{-22}73,-304..{-62}130,-366', 'both', 'last'),
    seam('0,-292--0,0', 'once', 'last'),
    lining(
      'placketEnd!{-94}..{-92}waistOpen!{0}..{-4}waistSide!{24}..{58}214,84..{80}330,560..{83}hemSide!{168}..{180}hemBack!',
    ),
    ...[
      [44, 84, 70, 84, 380],
      [56, 78, 104, 83, 620],
      [68, 72, 128, 81, 330],
      [80, 64, 190, 81, 700],
      [94, 54, 206, 78, 380],
      [108, 40, 262, 79, 620],
    ].map(([x, leaving, toX, arriving, toY]) => fold(`${x},8{${leaving}}..{${arriving}}${toX},${toY}`)),
    seam('0,250--0,1040', 'once'),
    stitching('7,258--7,880'),
    seam('150,330{81}..{83}232,1010'),
    stitching('158,330{81}..{83}240,1010'),
    seam('0,884{0}..{-9}384,846'),
    stitching('0,1014{0}..{-9}396,964'),
    lining(
      'neckOpen!{-14}..{-48}neck!{22}..{28}tip!{128}..scye{88}..{48}underarm!{104}..bustSide..underBustSide..{104}waistSide!{177}..{180}waistOpen!{-92}..{-90}neckOpen!',
      'both',
    ),
    // Seam allowances of the armscye: the sleeves hang within.
    stitching('180,-340{128}..140,-262{88}..{48}158,-182', 'both', 'last'),
    seam('118,-376{40}..{34}190,-304', 'both', 'last'),
    seam('146,-246{140}..104,-170{112}..{102}62,0', 'both', 'last'),
    stitching('140,-242{140}..98,-170{112}..{102}56,0', 'both', 'last'),
    seam('160,-214{120}..{106}92,0', 'both', 'last'),
    stitching('43,-322{90}..{90}45,0', 'both', 'last'),
    ...hooks,
    piece('22,-44!{-2}..{-4}132,-48!--131,-30!{176}..{178}22,-26!--22,-44!', 'both'),
    seam('22,-40--12,-40{180}..{0}12,-31--22,-31', 'both', 'all'),
    // The pocket hangs free inside the right-hand seam.
    cloth(
      '-228,196!{94}..{92}-240,280{96}..-228,400{60}..{0}-190,424{0}..{-80}-158,384{-86}..{-112}-218,204!---228,196!',
      'once',
    ),
    seam('-226,202{96}..{92}-236,270', 'once', 'last'),
  ],
};
