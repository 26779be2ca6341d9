import { cloth, fold, lining, piece, seam, stitching } from '../diagram/layers.js';
import type { View } from '../diagram/model.js';
import { fasteningsInside } from './opened-front.js';

/** Opened in front, the lining up: quilted foreparts, the tails with their pockets hanging from the waist. */
export const coatInside: View = {
  name: 'inside',
  caption: 'Inside, opened at the front',
  anchors: {
    neckBack: [0, 4],
    neck: [72, -4],
    tip: [172, 52],
    scye: [150, 150],
    underarm: [186, 226],
    waistSide: [146, 448],
    tailSide: [150, 448],
    tailHem: [116, 1006],
    frontNeck: [392, -4],
    frontTip: [280, 52],
    frontScye: [290, 150],
    frontUnderarm: [250, 226],
    frontWaistSide: [292, 446],
    frontEdge: [512, 448],
    frontBreak: [512, 334],
    frontChest: [512, 240],
    frontWaist: [512, 434],
  },
  layers: [
    lining('neckBack!{0}..{-22}neck!{20}..{24}tip!{114}..scye..{44}underarm!{100}..{88}waistSide!--0,448!'),
    seam('0,-4--0,448', 'once'),
    stitching('5,10--5,440', 'once'),
    seam('136,206{148}..80,304{112}..{98}42,448'),
    stitching('142,214{148}..88,306{112}..{98}50,448'),
    piece('-24,14!{14}..{-14}24,14!--24,20!{166}..{194}-24,20!--24,14!', 'once'),
    // The tails: lined, slit at the centre back, a pocket in the pleat of each.
    lining('3,448!--tailSide!{98}..{100}146,760..{98}tailHem!{176}..{180}3,1014!--3,448!', 'both'),
    seam('112,452{94}..{96}84,1014', 'both', 'last'),
    stitching('118,452{94}..{96}90,1014', 'both', 'last'),
    stitching('12,452--12,1014', 'both', 'last'),
    stitching('0,1002{0}..{-4}120,994', 'both', 'last'),
    fold('60,470{92}..{94}48,900', 'both', 'last'),
    seam('98,496{95}..{94}94,560', 'both', 'last'),
    stitching('97,490{110}..{90}56,540--54,640{60}..{0}76,656{0}..{-76}92,640--97,560', 'both', 'last'),
    lining(
      'frontNeck!{154}..{158}frontTip!{76}..frontScye{90}..{136}frontUnderarm!{82}..{94}frontWaistSide!{4}..{0}frontEdge!--frontBreak!--456,48!--frontNeck!',
      'both',
    ),
    seam('292,250{84}..{88}316,460'),
    stitching('286,250{84}..{88}310,460'),
    // Quilting over the chest, where the coat is padded.
    ...[0, 1, 2, 3, 4, 5].map((line) =>
      stitching(`${318 + line * 16},${120 + line * 4}{88}..{96}${312 + line * 16},${300 - line * 8}`),
    ),
    // Facing and lapel: the coat's own cloth. The lapel rolls outwards along the dotted line.
    cloth(
      'frontNeck!{64}..{90}432,180{92}..{84}430,320..{88}436,448!--frontEdge!--frontBreak!{-70}..{-106}548,196!--506,112!--452,106!--456,48!--frontNeck!',
      'both',
    ),
    stitching('512,334{-104}..{-116}404,10', 'both', 'last'),
    piece('336,330!--414,322!--415,334!--337,342!--336,330!', 'once'),
    stitching('342,342--344,416--410,410--410,334', 'once'),
    ...fasteningsInside({
      onTop: 'left',
      count: 3,
      from: [492, 352],
      to: [492, 424],
      holeLength: 20,
      buttonsFurther: -68,
    }),
  ],
};
