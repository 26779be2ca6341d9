import { cloth, lining, piece, seam, stitching } from '../diagram/layers.js';
import type { View } from '../diagram/model.js';
import { fasteningsInside } from './opened-front.js';

/** Opened in front, the lining up: a cotton back, the fronts faced with their own cloth along the edge. */
export const waistcoatInside: View = {
  name: 'inside',
  caption: 'Inside, opened at the front',
  anchors: {
    neckBack: [0, 8],
    neck: [66, -6],
    tip: [146, 36],
    scye: [130, 140],
    underarm: [176, 232],
    waistSide: [168, 366],
    hemSide: [164, 470],
    hemBack: [0, 462],
    frontNeck: [372, 0],
    frontTip: [294, 36],
    frontScye: [300, 130],
    frontUnderarm: [238, 232],
    frontWaistSide: [245, 366],
    frontHemSide: [252, 470],
    frontPoint: [398, 548],
    frontEdge: [448, 514],
    frontBreak: [448, 246],
    frontChest: [448, 254],
    frontWaist: [448, 366],
  },
  layers: [
    lining(
      'neckBack!{0}..{-30}neck!{22}..{26}tip!{114}..scye..{44}underarm!{92}..waistSide..{92}hemSide!{182}..{180}hemBack!',
    ),
    seam('0,0--0,480', 'once'),
    stitching('4,12--4,470', 'once'),
    stitching('0,16{0}..{-30}70,3'),
    stitching('152,44{114}..138,142..{44}180,226'),
    seam('118,210{100}..{88}112,480'),
    stitching('123,210{100}..{88}117,480'),
    // The straps are sewn in at the side seams, outside: their stitching comes through.
    stitching('150,356--180,352--180,376--150,380'),
    lining(
      'frontNeck!{156}..frontTip!{66}..frontScye{92}..{134}frontUnderarm!{88}..frontWaistSide..{86}frontHemSide!{20}..{38}frontPoint!--frontEdge!' +
        '--frontBreak!{-104}..{-116}frontNeck!',
      'both',
    ),
    // Its own cloth along the edge, turned to the inside; the collar rolls outwards along the dotted line.
    cloth(
      'frontNeck!{66}..{80}398,246..{90}400,420..{92}396,520!--frontPoint!--frontEdge!--frontBreak!{-104}..{-116}frontNeck!',
      'both',
    ),
    stitching('448,246{-96}..{-112}384,0', 'both', 'last'),
    seam('252,456{20}..{34}372,522', 'both'),
    stitching('288,44{66}..292,130{92}..{134}234,226'),
    seam('330,250{86}..{90}334,284'),
    // A pocket in the lining of the left front, at the viewer's right.
    piece('282,288!--366,280!--367,294!--283,302!--282,288!', 'once'),
    stitching('288,302--290,374--358,368--360,294', 'once'),
    ...fasteningsInside({
      onTop: 'left',
      count: 6,
      from: [434, 276],
      to: [434, 490],
      holeLength: 16,
      buttonsFurther: -2,
    }),
  ],
};
