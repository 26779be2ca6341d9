import {
  allRound,
  alongCurve,
  cloth,
  flatDoubled,
  fold,
  piece,
  seam,
  stitching,
  straightLine,
} from '../diagram/layers.js';
import type { GarmentDiagram, View } from '../diagram/model.js';
import { jacket as jacketOutline } from '../silhouettes/coats.js';
import { jacketInside } from './jacket-inside.js';

const sleeveFolds = [
  fold('152,34{0}..{70}268,96', 'both', 'cloth'),
  fold('148,56{14}..{66}236,116', 'both', 'cloth'),
  fold('158,22{-16}..{74}312,88', 'both', 'cloth'),
  fold('262,300{-84}..{-110}232,190', 'both', 'cloth'),
  fold('282,300{-82}..{-96}288,180', 'both', 'cloth'),
] as const;

const front: View = {
  name: 'front',
  caption: 'Front',
  anchors: {
    neck: [58, -4],
    tip: [150, 18],
    scye: [142, 110],
    underarm: [172, 190],
    waistSide: [124, 396],
    wristOuter: [300, 580],
    wristInner: [246, 586],
  },
  layers: [
    ...jacketOutline.layers,
    ...sleeveFolds,
    stitching('0,557{0}..{-14}192,540'),
    stitching('16,262--16,570', 'once'),
    // Flapped pockets at the hip.
    piece('92,448--152,438--156,462--95,472--92,448', 'both'),
  ],
};

const back: View = {
  name: 'back',
  caption: 'Back',
  anchors: {
    neckBack: [0, 0],
    waistBack: [0, 396],
    hemBack: [0, 566],
    tip: [150, 18],
    scye: [126, 110],
    underarm: [172, 190],
    waistSide: [124, 396],
  },
  layers: [
    cloth(
      '0,-14!{0}..{12}58,-4!{16}..{20}tip!{116}..scye..{42}underarm!{98}..{90}waistSide..{60}196,548!{166}..{180}hemBack!',
    ),
    seam('0,-14--0,580', 'once'),
    seam('122,140{150}..74,236{108}..30,396{92}..{72}66,580'),
    seam('166,168{140}..112,286{110}..76,396{88}..{64}142,570'),
    stitching('0,557{0}..{-14}192,540'),
    cloth(
      'tip!{-34}..{8}238,-14..{78}346,130..{112}300,340..{91}300,580!{174}..246,586!{-91}..{-94}242,380..{-128}underarm!' +
        '{-132}..scye{-92}..{-66}tip!',
      'both',
    ),
    ...sleeveFolds,
    seam('310,524{175}..{174}238,530', 'both', 'last'),
    piece('0,-30!{0}..{16}50,-24..{60}66,2!{172}..{180}0,12!'),
  ],
};

const SLEEVE_OUTER = '~tip{214}..{172}-238,-14..{102}-346,130..{68}-300,340..{89}-300,580';

/** A woman's tailored jacket of about 1895. */
export const jacket: GarmentDiagram = {
  kind: 'jacket',
  title: 'Jacket',
  leastScale: 0.4,
  views: [front, back, jacketInside],
  lines: [
    allRound('bust', 'inside', [
      '~frontBust---232,254',
      '-152,254{4}..{0}0,260..{-4}152,254',
      '232,254--frontBust',
    ]),
    allRound('waist', 'inside', [
      '~frontWaist--~frontWaistSide',
      '~waistSide--waistSide',
      'frontWaistSide--frontWaist',
    ]),
    allRound(
      'neck',
      'inside',
      ['-388,44--~frontNeck', '~neck{20}..{0}neckBack..{-20}neck', 'frontNeck--388,44'],
      { beside: 7 },
    ),
    alongCurve('side-seam', 'inside', 'frontUnderarm{88}..frontBustSide..{90}frontWaistSide', { beside: -8 }),
    allRound(
      'armscye',
      'inside',
      ['~frontTip{104}..~frontScye{88}..{50}~frontUnderarm', '~underarm{-46}..~scye{-88}..{-68}~tip'],
      { beside: 7 },
    ),
    allRound('cuff', 'front', 'wristInner--wristOuter', { beside: -16, sag: 8 }),
    alongCurve('shoulder-seam', 'front', '~tip--~neck', { beside: 12 }),
    straightLine('across-front', 'front', '~scye--scye'),
    straightLine('neck-to-waist-front', 'front', '-34,-8---34,392'),
    straightLine('neck-to-hem-front', 'front', '36,-8--36,560'),
    alongCurve('sleeve-outer', 'front', SLEEVE_OUTER, { beside: -13 }),
    alongCurve('sleeve-under', 'front', '~underarm{128}..{94}-242,380..{91}~wristInner', { beside: 10 }),
    flatDoubled('sleeve-widest', 'front', '190,214--338,170'),
    flatDoubled('elbow', 'front', '240,370--301,362'),
    straightLine('across-back', 'back', '~scye--scye'),
    alongCurve('underarm-to-underarm-back', 'back', '~underarm{8}..{0}0,206..{-8}underarm'),
    straightLine('neck-to-waist-back', 'back', '-26,14---26,394'),
    straightLine('neck-to-hem-back', 'back', '26,14--26,562'),
  ],
};
