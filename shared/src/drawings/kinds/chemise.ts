import {
  allRound,
  alongCurve,
  buttons,
  cloth,
  flatDoubled,
  fold,
  piece,
  seam,
  stitching,
  straightLine,
} from '../diagram/layers.js';
import type { GarmentDiagram, Layer, View } from '../diagram/model.js';
import {
  CHEMISE_BODY_SIDE,
  CHEMISE_GUSSET,
  CHEMISE_SLEEVE,
  CHEMISE_SLEEVE_BAND,
  chemise as chemiseOutline,
  chemiseAnchors,
} from '../silhouettes/body-linen.js';

const sleeves: readonly Layer[] = [
  cloth(CHEMISE_SLEEVE, 'both'),
  ...[
    [181, 30, -4, 262, 66],
    [183, 52, 4, 244, 82],
    [185, 74, 10, 248, 108],
    [186, 96, 16, 230, 118],
    [312, 148, -128, 276, 96],
    [300, 157, -130, 262, 116],
    [286, 168, -132, 246, 122],
    [272, 179, -134, 240, 148],
  ].map(([x, y, leaving, toX, toY]) => fold(`${x},${y}{${leaving}}..${toX},${toY}`, 'both', 'last')),
  piece(CHEMISE_SLEEVE_BAND, 'both'),
  stitching('330,150--258,207', 'both', 'last'),
  stitching('326,145--254,202', 'both', 'last'),
  cloth(CHEMISE_GUSSET, 'both'),
];

/** Below the gusset, the gore's seam and the side's, felled; the hem. */
const skirt: readonly Layer[] = [
  seam('228,260{102}..{95}142,1010'),
  stitching('220,270{102}..{95}136,1010'),
  stitching('0,978{0}..{-10}294,948'),
];

const front: View = {
  name: 'front',
  caption: 'Front',
  anchors: { ...chemiseAnchors, neckFront: [0, 82], hemSide: [298, 960], hemFront: [0, 990] },
  layers: [
    ...chemiseOutline.layers.slice(0, 2),
    ...skirt,
    // A band binds the neck; the fullness is gathered into it either side of the opening.
    seam('0,98{0}..{-52}134,8'),
    stitching('0,92{0}..{-53}130,4'),
    ...[
      [14, 100, 89, 18, 290],
      [26, 98, 88, 34, 220],
      [38, 94, 86, 50, 300],
      [50, 89, 84, 68, 210],
      [62, 82, 82, 86, 270],
      [74, 73, 80, 104, 190],
      [86, 62, 78, 120, 230],
    ].map(([x, y, leaving, toX, toY]) => fold(`${x},${y}{${leaving}}..{89}${toX},${toY}`)),
    seam('-6,84---6,246', 'once'),
    stitching('6,84--6,246', 'once'),
    piece('-11,246!--11,246!--11,258!---11,258!---11,246!', 'once'),
    buttons(
      [
        [0, 91],
        [0, 160],
      ],
      4.4,
    ),
    stitching('180,14{96}..{86}194,148'),
    ...sleeves,
  ],
};

const back: View = {
  name: 'back',
  caption: 'Back',
  anchors: { ...chemiseAnchors, neckBack: [0, 36] },
  layers: [
    cloth(`neckBack!{0}..{-32}neck!{14}..${CHEMISE_BODY_SIDE}{168}..{180}0,992!`),
    ...skirt,
    seam('0,52{0}..{-32}134,10'),
    stitching('0,46{0}..{-32}130,5'),
    ...[
      [8, 54, 89, 10, 250],
      [22, 53, 88, 28, 190],
      [36, 51, 86, 46, 270],
      [50, 48, 84, 66, 200],
      [64, 44, 82, 86, 240],
      [78, 39, 80, 106, 180],
    ].map(([x, y, leaving, toX, toY]) => fold(`${x},${y}{${leaving}}..{89}${toX},${toY}`)),
    ...sleeves,
  ],
};

export const chemise: GarmentDiagram = {
  kind: 'chemise',
  title: 'Chemise',
  leastScale: 0.28,
  views: [front, back],
  lines: [
    allRound('neck', 'front', '~neck{54}..{0}neckFront..{-54}neck', { beside: 9 }),
    allRound('hem', 'front', '~hemSide{11}..{0}hemFront..{-11}hemSide', { beside: -16 }),
    flatDoubled('shirt-body', 'front', '-217,280--217,280'),
    straightLine('shirt-front', 'front', '-146,8---146,972'),
    alongCurve('sleeve-outer', 'front', 'tip{-6}..{40}262,40..{66}edgeOuter', { beside: 13 }),
    straightLine('shirt-back', 'back', '-146,8---146,974'),
    straightLine('cloth-width', 'back', '-167,700--167,700'),
  ],
};
