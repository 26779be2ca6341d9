import { cloth, lining, piece, seam, stitching } from '../diagram/layers.js';
import type { View } from '../diagram/model.js';
import { fasteningsInside } from './opened-front.js';

/** Opened in front, the lining up: lined to the edge of the facings, a waist tape across the back. */
export const jacketInside: View = {
  name: 'inside',
  caption: 'Inside, opened at the front',
  anchors: {
    neckBack: [0, 2],
    neck: [54, -8],
    tip: [142, 18],
    scye: [120, 110],
    underarm: [158, 190],
    bustSide: [158, 214],
    waistSide: [108, 396],
    hipSide: [174, 552],
    hemBack: [0, 566],
    frontNeck: [352, -4],
    frontTip: [260, 18],
    frontScye: [268, 110],
    frontUnderarm: [226, 190],
    frontBustSide: [226, 214],
    frontWaistSide: [280, 396],
    frontHipSide: [210, 548],
    frontHem: [422, 566],
    frontBreak: [422, 254],
    frontBust: [422, 254],
    frontWaist: [422, 396],
  },
  layers: [
    lining(
      'neckBack!{0}..{-20}neck!{14}..{18}tip!{112}..scye{88}..{46}underarm!{92}..bustSide..{90}waistSide..{62}hipSide!{170}..{180}hemBack!',
    ),
    seam('0,0--0,580', 'once'),
    // A pleat of ease in the lining, and the loop it hangs by.
    stitching('-7,6{92}..{90}-3,300', 'once'),
    seam('116,110{152}..66,236{110}..26,396{92}..{74}56,580'),
    seam('152,176{142}..98,286{110}..66,396{88}..{66}122,580'),
    stitching('0,551{0}..{-12}170,536'),
    // The waist tape, caught at the centre back.
    piece('-118,362!--118,362!--118,378!---118,378!---118,362!', 'once'),
    stitching('-8,362---8,378', 'both', 'all'),
    seam('118,367--130,367{0}..{180}130,374--122,374', 'both', 'all'),
    piece('-20,10!{20}..{-20}20,10!--20,16!{160}..{200}-20,16!--20,10!', 'once'),
    lining(
      'frontNeck!{166}..{162}frontTip!{76}..frontScye{92}..{130}frontUnderarm!{88}..frontBustSide..{90}frontWaistSide..{118}frontHipSide!' +
        '{14}..{0}frontHem!--frontBreak!--388,44!--frontNeck!',
      'both',
    ),
    seam('262,150{60}..302,236{76}..332,396{88}..{104}312,580'),
    stitching('256,150{60}..296,238{76}..326,396{88}..{104}306,580'),
    // Facing and lapel: the jacket's own cloth. The lapel rolls outwards along the dotted line.
    cloth(
      'frontNeck!{62}..{94}366,90{96}..{80}374,300{88}..{94}372,562!{4}..{0}frontHem!--frontBreak!{-74}..{-108}456,140!--428,74!--388,44!--frontNeck!',
      'both',
    ),
    stitching('422,254{-98}..{-112}366,12', 'both', 'last'),
    stitching('372,551--430,555', 'both', 'last'),
    stitching('210,537{14}..{4}372,551'),
    piece('296,432!--358,424!--359,436!--297,444!--296,432!', 'once'),
    stitching('302,444--304,512--356,506--353,437', 'once'),
    ...fasteningsInside({
      onTop: 'right',
      count: 4,
      from: [410, 280],
      to: [410, 416],
      holeLength: 17,
      buttonsFurther: -10,
    }),
  ],
};
