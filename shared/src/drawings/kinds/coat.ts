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
import type { GarmentDiagram, View } from '../diagram/model.js';
import { coat as coatOutline } from '../silhouettes/coats.js';
import { coatInside } from './coat-inside.js';

const front: View = {
  name: 'front',
  caption: 'Front',
  anchors: {
    neck: [74, -4],
    tip: [186, 52],
    scye: [174, 150],
    underarm: [214, 226],
    waistSide: [172, 440],
    wristOuter: [334, 640],
    wristInner: [260, 652],
  },
  layers: [
    ...coatOutline.layers,
    fold('196,70{18}..{62}240,132', 'both', 'last'),
    fold('252,404{-16}..{-30}304,378', 'both', 'cloth'),
    fold('252,424{-10}..{-24}298,408', 'both', 'cloth'),
    stitching('164,720{97}..{103}92,1000'),
    seam('150,268{96}..{98}128,442'),
  ],
};

const back: View = {
  name: 'back',
  caption: 'Back',
  anchors: {
    neckBack: [0, 4],
    tip: [186, 52],
    scye: [160, 150],
    underarm: [214, 226],
    waistBack: [0, 434],
    hemBack: [0, 1012],
    tailSide: [176, 452],
    tailHem: [104, 1008],
    wristOuter: [334, 640],
  },
  layers: [
    cloth(
      '0,-10!{0}..{16}72,-2!{20}..{24}tip!{116}..scye..{44}underarm!{98}..{88}172,440!--tailSide{94}..{100}160,760' +
        '..{103}tailHem!{176}..{180}0,1014!',
    ),
    seam('0,-10--0,434', 'once'),
    seam('72,-4{36}..{28}200,106'),
    seam('152,206{148}..92,304{112}..{98}48,434'),
    seam('48,434{4}..{-2}184,450'),
    seam('0,434--0,1020', 'once'),
    seam('9,438--9,1020', 'once'),
    seam('50,440{91}..{95}40,1020'),
    fold('70,444{90}..{97}58,1020'),
    fold('86,446{90}..{98}74,1000'),
    fold('24,460{91}..{93}20,1010'),
    cloth(
      'tip!{10}..{58}256,140..{84}326,470..{91}wristOuter!{174}..260,652!{-92}..{-94}248,430..{-108}underarm!' +
        '{-138}..scye{-90}..{-62}tip!',
      'both',
    ),
    seam('198,78{14}..{62}244,152{62}..{85}298,470..{90}308,568', 'both', 'last'),
    seam('340,566{175}..{174}250,578', 'both', 'last'),
    buttons(
      [
        [318, 592],
        [319, 618],
      ],
      5,
      'both',
    ),
    buttons([[48, 434]], 9, 'both'),
    piece('0,-46!{0}..{20}56,-36..{74}74,-2!{170}..{180}0,8!'),
  ],
};

/** A man's tailcoat of about 1830. */
export const coat: GarmentDiagram = {
  kind: 'coat',
  title: 'Coat',
  leastScale: 0.3,
  views: [front, back, coatInside],
  lines: [
    allRound('coat-chest', 'inside', ['~frontChest---248,240', '-184,240--184,240', '248,240--frontChest']),
    allRound('coat-waist', 'inside', ['~frontWaist---291,434', '-146,434--146,434', '291,434--frontWaist']),
    allRound(
      'armscye',
      'inside',
      ['~frontTip{104}..~frontScye{90}..{44}~frontUnderarm', '~underarm{-44}..~scye{-90}..{-66}~tip'],
      { beside: 8 },
    ),
    flatDoubled('elbow', 'front', '249,440--322,432'),
    allRound('cuff', 'front', 'wristInner--wristOuter', { beside: -16, sag: 8 }),
    alongCurve('shoulder-seam', 'front', '~tip--~neck', { beside: 12 }),
    straightLine('across-front', 'front', '~scye--scye'),
    alongCurve('sleeve-outer', 'front', '~tip{170}..{122}-256,140..{96}-326,470..{89}~wristOuter', {
      beside: -13,
    }),
    alongCurve('sleeve-under', 'front', '~underarm{108}..{94}-248,430..{92}~wristInner', { beside: 10 }),
    straightLine('across-back', 'back', '~scye--scye'),
    straightLine('coat-back-waist', 'back', '-24,4---24,432'),
    straightLine('coat-full-back', 'back', '24,4--24,1010'),
    alongCurve('centre-back-to-cuff', 'back', '4,30!--{22}188,70{22}..{58}246,146..{84}312,470..{91}320,646'),
    alongCurve('coat-skirt-sweep', 'back', 'tailSide{94}..{100}160,760..{103}tailHem!{176}..{180}9,1014', {
      beside: 13,
    }),
  ],
};
