import { buttons, cloth, fold, piece, seam, stitching } from '../diagram/layers.js';
import type { View } from '../diagram/model.js';
import { pleatsBetween } from './pleats.js';

const FLOUNCE_TOP = '0,1242{0}..{-14}170,1220..{-46}400,1030';
const FLOUNCE_FOOT = '0,1392{0}..{-12}220,1366..{-52}404,1312..{-84}438,1216';

/** The same skirt, back up: gathered at the placket, the fullness falling into the train. */
export const skirtBack: View = {
  name: 'back',
  caption: 'Back',
  anchors: {
    bandTop: [129, -38],
    waistSide: [132, 0],
    centre: [0, 4],
    hip: [198, 176],
    corner: [438, 1216],
    hemBack: [0, 1392],
  },
  layers: [
    cloth(
      'centre!{0}..{-3}waistSide!{54}..{76}hip..{74}262,560..{66}334,900..{84}corner{96}..{128}404,1312..{180}hemBack!',
    ),
    seam('0,4--0,1400', 'once'),
    seam('8,4--8,262', 'once'),
    seam('88,2{66}..{77}150,300{77}..{62}270,820..{56}340,1120'),
    ...[
      [10, 88, 26, 86, 470],
      [19, 86, 58, 80, 320],
      [28, 83, 84, 80, 560],
      [38, 80, 98, 76, 280],
      [48, 77, 128, 74, 470],
      [58, 74, 132, 72, 240],
    ].map(([x, leaving, toX, arriving, toY]) => fold(`${x},4{${leaving}}..{${arriving}}${toX},${toY}`)),
    fold('24,640{88}..{86}44,1230'),
    fold('84,660{82}..{78}140,1215'),
    fold('130,560{78}..{68}226,1000'),
    fold('190,720{70}..{58}298,1080'),
    fold('240,640{72}..{58}330,920'),
    seam(FLOUNCE_TOP),
    stitching('0,1253{0}..{-14}174,1230..{-46}404,1040'),
    ...pleatsBetween(FLOUNCE_TOP, FLOUNCE_FOOT, 19, 0.012).map((pleat) => fold(pleat)),
    piece('0,-34!{0}..{-3}bandTop!--waistSide!{177}..{180}centre!'),
    seam('8,-36--8,6', 'once', 'last'),
    buttons(
      [
        [3, -25],
        [3, -9],
      ],
      2.6,
    ),
  ],
};
