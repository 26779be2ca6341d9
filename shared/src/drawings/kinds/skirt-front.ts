import { cloth, fold, lining, piece, seam, stitching } from '../diagram/layers.js';
import type { View } from '../diagram/model.js';
import { pleatsBetween } from './pleats.js';

const RUCHE_TOP = '0,872{0}..{22}186,897..{46}396,1034';
const FLOUNCE_TOP = '0,898{0}..{22}190,924..{46}404,1068';
const FLOUNCE_FOOT = '0,1040{0}..{20}220,1072..{44}438,1216';

/** Of the pleated ruffle along the inside of the train. */
const RUFFLE_TOP = '0,1346{0}..{-10}216,1322..{-54}392,1252..{-82}430,1170';
const RUFFLE_FOOT = '0,1392{0}..{-6}250,1372..{-52}404,1312..{-84}438,1216';

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
    seam('0,1000--0,1400', 'once', 'last'),
    seam('120,1000{78}..{72}176,1400', 'both', 'last'),
    stitching('128,1000{78}..{72}184,1400', 'both', 'last'),
    // A dust ruffle inside the train takes the wear.
    seam(RUFFLE_TOP, 'both', 'last'),
    ...pleatsBetween(RUFFLE_TOP, RUFFLE_FOOT, 30, 0.006).map((pleat) => fold(pleat, 'both', 'last')),
    cloth(
      'centre!{0}..{-5}waistSide!{54}..{76}hip..{74}262,560..{66}334,900..{84}corner!{-136}..{200}220,1072..{180}hemFront!',
    ),
    // Three gores in front; darts fit them to the hip.
    seam('50,6{80}..{82}96,300{82}..{84}147,882'),
    seam('102,2{62}..{78}160,220{78}..{76}236,640..{73}291,952'),
    seam('76,4{76}..{80}96,118'),
    seam('20,6{86}..{88}26,96'),
    ...[
      [30, 330, 88, 46, 880],
      [62, 470, 85, 92, 872],
      [130, 420, 80, 186, 880],
      [160, 560, 78, 226, 896],
      [214, 470, 74, 296, 900],
      [250, 640, 72, 326, 950],
    ].map(([x, y, leaving, toX, toY]) => fold(`${x},${y}{${leaving}}..{${leaving}}${toX},${toY}`)),
    // The flounce is set on beneath a narrow ruche.
    seam(RUCHE_TOP),
    ...pleatsBetween(RUCHE_TOP, FLOUNCE_TOP, 26, 0.008).map((tuck) => fold(tuck)),
    seam(FLOUNCE_TOP),
    ...pleatsBetween(FLOUNCE_TOP, FLOUNCE_FOOT, 24, 0.01).map((pleat) => fold(pleat)),
    piece('0,-28!{0}..{-6}bandTop!--waistSide!{175}..{180}centre!'),
    stitching('0,-21{0}..{-6}126,-29', 'both', 'last'),
  ],
};
