import {
  allRound,
  alongCurve,
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
import type { GarmentDiagram, Layer, View } from '../diagram/model.js';
import {
  SHIRT_BAND,
  SHIRT_COLLAR,
  SHIRT_CUFF,
  SHIRT_GUSSET,
  SHIRT_SHOULDER,
  SHIRT_SLEEVE,
  shirtAnchors,
} from '../silhouettes/shirt.js';
import { shirtInside } from './shirt-inside.js';

/** Fine gathers: from, with the direction of leaving, to where each runs out. */
const gathers = (
  ends: readonly (readonly [number, number, number, number, number])[],
  within: 'cloth' | 'last' = 'last',
): Layer[] =>
  ends.map(([x, y, leaving, toX, toY]) => fold(`${x},${y}{${leaving}}..${toX},${toY}`, 'both', within));

const sleeveLayers: readonly Layer[] = [
  cloth(SHIRT_SLEEVE, 'both'),
  ...gathers([
    [258, 60, -6, 340, 104],
    [259, 84, 0, 318, 130],
    [259, 108, 6, 326, 168],
    [260, 132, 12, 304, 180],
    [260, 156, 18, 306, 214],
    [575, 592, -100, 556, 496],
    [562, 600, -106, 526, 470],
    [549, 607, -112, 508, 506],
    [536, 615, -118, 478, 488],
    [523, 622, -124, 470, 540],
    [509, 630, -130, 452, 570],
  ]),
  cloth(SHIRT_GUSSET, 'both'),
  stitching('270,262--332,253--314,314--270,264', 'both', 'last'),
];

const cuffLayers: readonly Layer[] = [
  piece(SHIRT_CUFF, 'both'),
  stitching('591,583--612,620', 'both', 'last'),
  stitching('602,623--514,674', 'both', 'last'),
  stitching('585,594--497,645', 'both', 'last'),
];

/** Felled side seams, the slits below them with their small gussets, the narrow hem. */
const bodyStitching = (hem: number): Layer[] => [
  stitching('309,320--310,780'),
  seam('318,786--304,776--318,764'),
  stitching('310,790--310,900', 'both', 'cloth'),
  stitching(`0,${hem - 10}--286,${hem - 10}{-10}..{-84}309,${hem - 36}`),
];

const front: View = {
  name: 'front',
  caption: 'Front',
  anchors: shirtAnchors,
  layers: [
    lining('0,-104!{0}..{10}92,-92!--79,-24!--0,20!'),
    seam('0,-80{0}..{14}96,-64', 'both', 'last'),
    cloth(`0,930!--286,930!{-10}..{-84}318,896!--${SHIRT_SHOULDER}{126}..{180}0,40!`),
    ...bodyStitching(930),
    // A strap binds each shoulder, and another the armhole.
    seam('256,56{184}..{196}88,24'),
    stitching('256,50{184}..{196}86,17'),
    stitching('240,54{92}..{88}244,262'),
    // The opening: narrow hems, the wearer's left lying over, a bar across its foot.
    ...gathers(
      [
        [16, 42, 90, 18, 200],
        [24, 41, 88, 30, 270],
        [32, 39, 86, 42, 180],
        [40, 37, 84, 56, 240],
        [48, 34, 82, 68, 170],
        [56, 29, 80, 84, 210],
        [64, 22, 76, 98, 150],
      ],
      'cloth',
    ),
    seam('-9,40---9,326', 'once'),
    stitching('-3,40---3,326', 'once'),
    stitching('9,40--9,326', 'once'),
    piece('-14,326!--14,326!--14,342!---14,342!---14,326!', 'once'),
    fold('6,344{86}..{88}16,430'),
    fold('0,346--0,400', 'once'),
    buttons(
      [
        [0, 130],
        [0, 222],
      ],
      5,
    ),
    ...sleeveLayers,
    ...cuffLayers,
    piece(SHIRT_BAND),
    stitching('0,34{0}..{-58}72,-2', 'both', 'last'),
    seam('-10,10---10,44', 'once', 'last'),
    buttons([[0, 26]], 5.5),
    piece(SHIRT_COLLAR, 'both'),
    stitching('16,6--50,-56{-14}..{10}86,-84--74,-26', 'both', 'last'),
  ],
};

const back: View = {
  name: 'back',
  caption: 'Back',
  anchors: { ...shirtAnchors, neckBack: [0, 8] },
  layers: [
    cloth(`0,964!--286,964!{-10}..{-84}318,930!--${SHIRT_SHOULDER}{166}..{180}neckBack!`),
    ...bodyStitching(964),
    seam('256,56{184}..{196}88,28'),
    stitching('256,50{184}..{196}84,20'),
    stitching('240,54{92}..{88}244,262'),
    ...gathers(
      [
        [8, 12, 90, 9, 250],
        [18, 12, 88, 22, 180],
        [28, 12, 86, 36, 280],
        [38, 12, 84, 52, 200],
        [48, 11, 82, 68, 260],
        [58, 10, 80, 86, 170],
      ],
      'cloth',
    ),
    ...sleeveLayers,
    ...cuffLayers,
    buttons([[596, 618]], 5, 'both'),
    piece('neckBack!{0}..{-14}neck!--79,-26!{170}..{180}0,-20!'),
    piece('0,-20!{0}..{-10}79,-26!--90,-92!{190}..{180}0,-102!'),
    stitching('0,-95{0}..{10}84,-85--74,-26', 'both', 'last'),
  ],
};

/** A man's linen shirt of about 1820, cut in rectangles. */
export const shirt: GarmentDiagram = {
  kind: 'shirt',
  title: 'Shirt',
  leastScale: 0.27,
  views: [front, back, shirtInside],
  lines: [
    straightLine('neckband', 'inside', 'bandHole--bandButton'),
    allRound('cuff', 'inside', 'cuffHole--cuffButton', { beside: -16 }),
    alongCurve('shoulder-seam', 'front', '~tip--~neck', { beside: 14 }),
    flatDoubled('shirt-body', 'front', '-316,440--316,440'),
    straightLine('shirt-front', 'front', '-180,22---180,926'),
    alongCurve('sleeve-outer', 'front', '~tip{194}..{122}-404,154..{106}-612,630', { beside: -14 }),
    flatDoubled('sleeve-widest', 'front', '402,478--532,408'),
    straightLine('cloth-width', 'inside', '~sideAt--sideAt'),
    straightLine('across-back', 'back', '-256,130--256,130'),
    alongCurve('centre-back-to-cuff', 'back', '0,30!--{12}240,62{12}..{62}392,180..{64}586,560--598,634'),
    straightLine('shirt-back', 'back', '-180,24---180,960'),
  ],
};
