import { cloth, fold, lining, piece, seam, stitching } from '../diagram/layers.js';
import type { View } from '../diagram/model.js';
import { pleatsBetween } from './pleats.js';

const FLOUNCE_TOP = '0,898{0}..{22}190,924..{46}380,1046';
const FLOUNCE_FOOT = '0,1040{0}..{20}220,1072..{44}438,1216';

/** A trained skirt of about 1880, front up: flat over the hips, a kilted flounce, the train lying behind. */
export const skirtFront: View = {
  name: 'front',
  caption: 'Front',
  anchors: {
    bandTop: [129, -36],
    waistSide: [132, 0],
    centre: [0, 8],
    hip: [198, 176],
    corner: [438, 1216],
    hemFront: [0, 1040],
    sideHem: [276, 1098],
  },
  layers: [
    lining('0,1000!--320,1090!--corner!{96}..{128}404,1312..{180}0,1392!'),
    stitching('0,1366!{0}..{-48}402,1262', 'both', 'last'),
    seam('0,1040!--0,1392', 'once', 'last'),
    seam('120,1040!{74}..{70}176,1400', 'both', 'last'),
    cloth(
      'centre!{0}..{-5}waistSide!{54}..{76}hip..{74}262,560..{66}334,900..{84}corner!{-136}..{200}220,1072..{180}hemFront!',
    ),
    seam('50,6{80}..{82}96,300{82}..{84}150,930'),
    seam('102,2{62}..{78}160,220{78}..{76}236,640..{72}300,1000'),
    seam('74,6{84}..{82}86,128', 'both'),
    fold('130,40{60}..{77}186,210{77}..{73}236,470'),
    fold('20,420{88}..{88}40,890'),
    fold('96,560{84}..{80}146,880'),
    fold('206,620{78}..{74}258,900'),
    fold('270,700{72}..{62}330,960'),
    fold('60,20{86}..{86}70,230'),
    seam(FLOUNCE_TOP),
    stitching('0,909{0}..{22}188,935..{46}376,1057'),
    ...pleatsBetween(FLOUNCE_TOP, FLOUNCE_FOOT, 17, 0.012).map((pleat) => fold(pleat)),
    piece('0,-28!{0}..{-6}bandTop!--waistSide!{175}..{180}centre!'),
  ],
};
