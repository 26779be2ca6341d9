import {
  allRound,
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
    seam('-16,-36---16,6--16,6--16,-36', 'once', 'cloth'),
    fold('60,-150{96}..{88}56,-50'),
    fold('74,-146{98}..{88}68,-60'),
    stitching('0,26{0}..{-18}96,14..{-54}136,-28', 'both', 'cloth'),
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
    straightLine('crown-height', 'front', '40,-164--40,6'),
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
      layers: [...gloveOutline.layers, stitching('40,226{6}..{-6}132,226')],
    },
  ],
  lines: [
    flatDoubled('palm', 'front', '47,24--127,24'),
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
        stitching('8,-50{42}..{4}58,-24..{-38}108,-60', 'once', 'cloth'),
        // A ribbon drawn up at the throat.
        piece('-6,-50!{200}..{260}-30,-66{-60}..{0}-14,-74{20}..{80}-2,-52!---6,-50!', 'once'),
        piece('2,-54!{-60}..{-10}22,-78{10}..{90}30,-66{110}..{190}4,-50!--2,-54!', 'once'),
        seam('-14,-62---6,-52', 'once', 'all'),
        seam('18,-66--4,-53', 'once', 'all'),
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
