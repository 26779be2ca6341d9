import {
  allRound,
  buttons,
  cloth,
  flatDoubled,
  fold,
  lining,
  piece,
  seam,
  stitching,
  straightLine,
} from '../diagram/layers.js';
import type { GarmentDiagram, View } from '../diagram/model.js';
import { glove as gloveOutline, hat as hatOutline, shoe as shoeOutline } from '../silhouettes/accessories.js';

const hatFront: View = {
  name: 'front',
  caption: 'Front',
  anchors: {},
  layers: [
    ...hatOutline.layers,
    seam('0,-161{0}..{7}100,-155', 'both', 'cloth'),
    // The sheen of the brushed silk.
    fold('62,-152{99}..{90}52,-48'),
    fold('74,-151{100}..{90}64,-52'),
    fold('86,-148{99}..{90}76,-90'),
    stitching('0,27{0}..{-18}98,14..{-46}142,-30', 'both', 'last'),
  ],
};

/** From below: the brim is longer before and behind than it is wide, and the opening is an oval. */
const hatBelow: View = {
  name: 'below',
  caption: 'From below, front at the top',
  anchors: {
    openFront: [0, -98],
    openBack: [0, 98],
    openSide: [80, 0],
    front: [0, -152],
    back: [0, 150],
    side: [128, 0],
  },
  layers: [
    cloth('front!{0}..{90}side..{180}back!'),
    stitching('0,-145{0}..{90}121,0{90}..{180}0,143'),
    lining('openFront!{0}..{90}openSide..{180}openBack!'),
    seam('0,-84{0}..{90}67,0{90}..{180}0,84', 'both', 'last'),
  ],
};

export const hat: GarmentDiagram = {
  kind: 'hat',
  title: 'Hat',
  leastScale: 0.6,
  views: [hatFront, hatBelow],
  lines: [
    straightLine('crown-height', 'front', '36,-170--36,4'),
    allRound('head-opening', 'below', '0,-84{180}..{90}-67,0{90}..{0}0,84{0}..{-90}67,0{-90}..{200}14,-82'),
    straightLine('brim-front', 'below', 'openFront--front'),
    straightLine('brim-back', 'below', 'openBack--back'),
    straightLine('brim-left', 'below', 'openSide--side'),
    straightLine('brim-right', 'below', '~openSide--~side'),
  ],
};

export const glove: GarmentDiagram = {
  kind: 'glove',
  title: 'Gloves',
  leastScale: 0.6,
  views: [
    {
      name: 'front',
      caption: 'Backs of the hands',
      anchors: {},
      layers: [
        ...gloveOutline.layers,
        stitching('40,226{6}..{-6}132,226'),
        stitching('40,218{6}..{-6}132,218'),
        fold('56,126{20}..{10}84,136', 'both', 'last'),
        fold('118,118{166}..{176}92,122', 'both', 'last'),
        fold('54,150{14}..{4}80,156', 'both', 'last'),
      ],
    },
  ],
  lines: [
    flatDoubled('palm', 'front', '51,8--129,8'),
    straightLine('glove-length', 'front', '-81,-137---81,236'),
  ],
};

const shoeSole: View = {
  name: 'below',
  wearersRight: 'neither',
  caption: 'Sole',
  anchors: { toe: [-128, 0], heel: [112, 0] },
  layers: [
    cloth(
      'toe!{-40}..{-8}-62,-36..{4}-20,-30..{14}40,-19..{-4}84,-26..{90}heel..{184}84,26..{166}40,19..{176}-20,30..{188}-62,36..{220}toe!',
      'once',
    ),
    piece('66,-25!{-4}..84,-26{0}..{90}112,0..{180}84,26{180}..66,25!{-70}..{-110}66,-25!', 'once'),
    stitching('-118,0{-36}..{-8}-62,-29..{4}-20,-24..{12}40,-13..{4}60,-16', 'once', 'cloth'),
    stitching('-118,0{36}..{8}-62,29..{-4}-20,24..{-12}40,13..{-4}60,16', 'once', 'cloth'),
  ],
};

export const shoe: GarmentDiagram = {
  kind: 'shoe',
  title: 'Shoes',
  leastScale: 0.6,
  views: [
    {
      name: 'side',
      caption: 'From the side',
      anchors: {},
      layers: [
        ...shoeOutline.layers,
        // The throat and top edge are bound; a string in the binding is tied in front.
        stitching('-38,-13{34}..{6}15,-10..{-20}73,-21..{-40}110,-54', 'once', 'cloth'),
        piece('-46,-20!{200}..{270}-64,-24{-90}..{10}-56,-32{20}..{60}-44,-22!---46,-20!', 'once'),
        piece('-40,-22!{-60}..{10}-30,-36{20}..{90}-18,-30{100}..{190}-40,-20!---40,-22!', 'once'),
        buttons([[-43, -21]], 3),
        seam('-44,-19{130}..{100}-60,-2', 'once', 'all'),
        seam('-41,-18{80}..{60}-34,0', 'once', 'all'),
        // Quarters meet behind.
        stitching('102,-50{92}..{100}98,4', 'once', 'cloth'),
      ],
    },
    shoeSole,
  ],
  lines: [
    straightLine('heel', 'side', '126,4--126,48'),
    straightLine('sole', 'below', 'heel--toe'),
    straightLine('tread', 'below', '-58,-37---58,37'),
  ],
};
