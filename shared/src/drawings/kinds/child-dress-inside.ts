import { buttons, fold, lining, piece, row, seam, stitching } from '../diagram/layers.js';
import type { View } from '../diagram/model.js';

/** Turned inside out, back up and parted: the lined bodice with its tape, the stitching of the tucks. */
export const childDressInside: View = {
  name: 'inside',
  caption: 'Turned inside out, back up',
  anchors: {
    neckOpen: [20, -158],
    neck: [112, -188],
    tip: [138, -178],
    scye: [120, -132],
    underarm: [130, -92],
    chestOpen: [21, -80],
    chestSide: [127, -80],
    waistSide: [112, 0],
    waistOpen: [22, 4],
    bandOpen: [21, -8],
    bandSide: [113, -8],
    placketEnd: [0, 150],
    hemSide: [256, 386],
    hemBack: [0, 412],
  },
  layers: [
    // The front lies beneath: its neck is lower.
    lining('0,-140!{0}..{-40}neck!--100,0!--50,160!--0,160!'),
    stitching('0,-132{0}..{-40}118,-182', 'both', 'last'),
    lining(
      'placketEnd!{-94}..{-90}waistOpen!{0}..{-3}waistSide!{22}..{64}184,84..{77}hemSide!{167}..{180}hemBack!',
    ),
    ...[
      [32, 84, 48, 250],
      [46, 78, 84, 280],
      [62, 70, 116, 230],
      [80, 62, 154, 270],
      [98, 46, 184, 180],
    ].map(([x, leaving, toX, toY]) => fold(`${x},8{${leaving}}..{82}${toX},${toY}`)),
    seam('placketEnd--0,420', 'once'),
    stitching('6,156--6,400'),
    seam('104,140{78}..{78}156,420'),
    stitching('110,139{78}..{78}162,420'),
    ...[300, 322, 344].map((y) => stitching(`0,${y}{0}..{-9}262,${y - 20}`)),
    stitching('0,402{0}..{-11}252,378'),
    lining(
      'neckOpen!{-4}..{-24}neck!{14}..tip!{110}..scye{86}..{46}underarm!{98}..chestSide..waistSide!{178}..{180}waistOpen!--chestOpen--neckOpen!',
      'both',
    ),
    // The sleeves hang within: their heads show as turned edges.
    seam('128,-196{52}..{44}148,-164', 'both', 'last'),
    stitching('128,-176{112}..110,-130{86}..{46}120,-86', 'both', 'last'),
    seam('112,-118{140}..{104}56,0', 'both', 'last'),
    stitching('106,-116{140}..{104}50,0', 'both', 'last'),
    stitching('28,-157--29,2', 'both', 'last'),
    buttons(
      row(5, [24, -144], [25, -34]).map(([x, y]): [number, number] => [-x, y]),
      3.4,
    ),
    ...row(5, [24, -144], [25, -34]).map(([x, y]) => seam(`${x - 1},${y}--${x + 9},${y}`, 'once', 'all')),
    // A tape takes the strain of the gathers.
    piece('22,-24!{0}..{-4}116,-28!--114,-12!{176}..{180}22,-8!--22,-24!', 'both'),
  ],
};
