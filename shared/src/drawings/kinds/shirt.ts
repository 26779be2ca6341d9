import {
  allRound,
  alongCurve,
  buttons,
  cloth,
  flatDoubled,
  fold,
  piece,
  seam,
  straightLine,
} from '../diagram/layers.js';
import type { GarmentDiagram, View } from '../diagram/model.js';
import { shirt as shirtOutline } from '../silhouettes/body-linen.js';
import { shirtInside } from './shirt-inside.js';

const cuffGathers = [
  fold('526,564{-118}..{-118}486,486', 'both', 'all'),
  fold('514,574{-118}..{-118}470,484', 'both', 'all'),
  fold('502,582{-118}..{-119}448,484', 'both', 'all'),
  fold('488,592{-118}..{-120}434,500', 'both', 'all'),
] as const;

const front: View = {
  name: 'front',
  caption: 'Front',
  anchors: {
    neck: [76, 0],
    tip: [250, 36],
    underarm: [312, 300],
    wristOuter: [552, 606],
    wristInner: [490, 642],
  },
  layers: [
    ...shirtOutline.layers,
    ...cuffGathers,
    seam('240,46{186}..{196}88,18'),
    seam('238,40{92}..{90}234,190'),
    seam('-11,40---11,322--11,322--11,40', 'once'),
    seam('-16,322--16,322--16,340---16,340---16,322', 'once'),
    buttons(
      [
        [0, 96],
        [0, 170],
        [0, 244],
      ],
      5,
    ),
    fold('40,36{82}..{88}52,170'),
    fold('20,346{84}..{88}34,470'),
    seam('312,800--304,800'),
  ],
};

const back: View = {
  name: 'back',
  caption: 'Back',
  anchors: { neckBack: [0, 8], tip: [250, 36] },
  layers: [
    cloth(
      '0,964!--284,964!{-10}..{-82}316,928!--312,300!--262,250!{-90}..tip!{186}..{196}76,0!{166}..{180}neckBack!',
    ),
    seam('240,50{186}..{196}88,22'),
    seam('238,40{92}..{90}234,190'),
    fold('12,16{87}..{90}14,220'),
    fold('28,14{84}..{89}34,190'),
    fold('44,12{82}..{88}54,220'),
    fold('60,10{80}..{87}76,160'),
    cloth('tip!{14}..{64}398,220..{68}534,566!{140}..472,602!{-114}..{-122}312,300!--262,250!--tip!', 'both'),
    seam('262,250--288,212--312,300', 'both'),
    ...cuffGathers,
    piece('534,566!--552,606!--490,642!--472,602!--534,566!', 'both'),
    piece('neckBack!{0}..{-14}76,0!{-80}..80,-62!{184}..{180}0,-68!'),
  ],
};

/** A man's linen shirt of about 1820, cut in rectangles. */
export const shirt: GarmentDiagram = {
  kind: 'shirt',
  title: 'Shirt',
  leastScale: 0.3,
  views: [front, back, shirtInside],
  lines: [
    straightLine('neckband', 'inside', '-194,-44--200,-44'),
    allRound('cuff', 'inside', 'cuffHole--cuffButton', { beside: -16 }),
    alongCurve('shoulder-seam', 'front', '~tip--~neck', { beside: 14 }),
    flatDoubled('shirt-body', 'front', '-314,430--314,430'),
    straightLine('shirt-front', 'front', '-200,26---200,926'),
    alongCurve('sleeve-outer', 'front', '~tip{166}..{116}-398,220..{112}-534,566--~wristOuter', {
      beside: -14,
    }),
    flatDoubled('sleeve-widest', 'front', '330,340--440,290'),
    straightLine('cloth-width', 'inside', '~sideAt--sideAt'),
    straightLine('across-back', 'back', '-238,130--238,130'),
    alongCurve('centre-back-to-cuff', 'back', '0,30!--{12}232,66{12}..{63}388,232..{67}540,612'),
    straightLine('shirt-back', 'back', '-200,28---200,960'),
  ],
};
