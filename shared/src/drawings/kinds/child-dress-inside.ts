import { buttons, fold, lining, piece, row, seam, stitching } from '../diagram/layers.js';
import type { View } from '../diagram/model.js';

/** Of the buttons on the wearer's left half; the holes lie opposite, in its right. */
const fastenings = row(5, [30, -142], [34, -36]);

/** Turned inside out, back up and parted: the lined bodice, the backs of the tucks, the hem. */
export const childDressInside: View = {
  name: 'inside',
  caption: 'Turned inside out, back up',
  anchors: {
    neckOpen: [22, -156],
    neck: [118, -188],
    tip: [146, -178],
    scye: [127, -132],
    underarm: [138, -92],
    chestSide: [132, -78],
    chestOpen: [25, -78],
    waistSide: [120, 0],
    waistOpen: [28, 5],
    bandSide: [121, -7],
    bandOpen: [28, -3],
    placketEnd: [0, 150],
    hemSide: [256, 386],
    hemBack: [0, 412],
  },
  layers: [
    // The front beneath, lining up.
    lining('0,-140!{0}..{-38}neck!--112,0!--60,170!--0,170!'),
    stitching('0,-131{0}..{-38}124,-182', 'both', 'last'),
    fold('0,-126--0,-24', 'once', 'last'),
    lining(
      'placketEnd!{-94}..{-84}waistOpen!{0}..{-3}waistSide!{24}..{64}186,84..{77}hemSide!{168}..{180}hemBack!',
    ),
    ...[
      [38, 86, 48, 87, 190],
      [50, 80, 72, 84, 250],
      [62, 74, 98, 82, 180],
      [74, 68, 126, 80, 260],
      [88, 58, 146, 78, 200],
      [104, 44, 184, 77, 260],
    ].map(([x, leaving, toX, arriving, toY]) => fold(`${x},6{${leaving}}..{${arriving}}${toX},${toY}`)),
    stitching('6,142{-88}..{-84}35,8'),
    seam('-8,152--8,152', 'once', 'all'),
    seam('-8,156--8,156', 'once', 'all'),
    seam('0,158--0,412', 'once'),
    stitching('6,162--6,374'),
    seam('116,120{74}..{77}170,420'),
    stitching('122,118{74}..{77}177,420'),
    // Tucks to be let down lie outside; inside, the lines of their stitching.
    stitching('0,306{0}..{-9}260,285'),
    stitching('0,328{0}..{-9}260,307'),
    stitching('0,350{0}..{-9}260,329'),
    // A deep hem, for letting down too.
    seam('0,374{0}..{-9}256,350'),
    lining(
      'neckOpen!{0}..{-26}neck!{14}..tip!{110}..scye{88}..{46}underarm!{110}..chestSide..{98}waistSide!{177}..{180}waistOpen!{-92}..{-92}neckOpen!',
      'both',
    ),
    // Piped neck and armscye; the sleeves hang within.
    stitching('23,-149{0}..{-26}122,-180', 'both', 'last'),
    stitching('139,-182{112}..119,-130{86}..{44}134,-82', 'both', 'last'),
    seam('126,-116{146}..{104}66,4', 'both', 'last'),
    stitching('121,-120{146}..{104}60,4', 'both', 'last'),
    stitching('34,-160{90}..{90}40,4', 'both', 'last'),
    // Buttonholes at one edge, the threads of the buttons at the other.
    ...fastenings.map(([x, y]) =>
      seam(`${(-x - 4).toFixed(1)},${y.toFixed(1)}--${(-x + 5).toFixed(1)},${y.toFixed(1)}`, 'once', 'last'),
    ),
    buttons(fastenings, 1.8),
    piece('26,-17!{0}..{-3}122,-20!--120,4!{177}..{180}28,8!--26,-17!', 'both'),
    stitching('30,-11{0}..{-3}120,-14', 'both', 'last'),
    // A drawstring in the neck, for the growing child.
    seam('24,-150{170}..{100}6,-128{100}..{70}10,-104', 'once', 'all'),
    seam('-24,-150{10}..{80}-6,-126{80}..{104}-10,-100', 'once', 'all'),
  ],
};
