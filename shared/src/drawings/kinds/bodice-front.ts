import { buttons, cloth, fold, pieceLining, row, seam, stitching } from '../diagram/layers.js';
import type { View } from '../diagram/model.js';

/** A day bodice of the 1880s: stand collar, two darts a side, a point in front. A woman's: right over left. */
export const bodiceFront: View = {
  name: 'front',
  caption: 'Front',
  anchors: {
    neckFront: [0, -344],
    neck: [58, -408],
    tip: [150, -378],
    scye: [141, -292],
    underarm: [186, -205],
    bustSide: [189, -165],
    waistSide: [131, 0],
    hipSide: [178, 94],
    point: [0, 158],
    collarSide: [52, -452],
    wristOuter: [320, 152],
    wristInner: [256, 166],
    dartInner: [70, -146],
    dartOuter: [112, -130],
  },
  layers: [
    pieceLining('0,-440{0}..{-14}collarSide!{-140}..{180}0,-470'),
    cloth(
      'neckFront!{-78}..4,-378!{-6}..{-82}collarSide!--neck!{14}..{18}tip!{104}..scye{88}..{52}underarm!' +
        '{86}..bustSide..{90}waistSide..{60}hipSide!{166}..94,110..{146}point!',
    ),
    seam('neckFront!{0}..{-68}neck'),
    seam('dartInner{98}..50,0{96}..{84}55,150'),
    seam('dartInner{104}..36,0{92}..{90}39,160'),
    seam('dartOuter{100}..84,0{92}..{74}104,124'),
    seam('dartOuter{106}..70,0{90}..{80}80,136'),
    seam('152,-252{100}..{110}136,-130{112}..109,0{88}..{66}146,116'),
    stitching('0,148!{-34}..94,101..{-14}180,84'),
    // The right front lies on top: its edge is seen on the left breast.
    seam('12,-342{90}..{90}12,165', 'once'),
    stitching('17,-338{90}..{90}17,165', 'once'),
    buttons(row(15, [0, -328], [0, 122]), 5.2),
    cloth(
      'tip!{2}..{52}232,-300..{86}310,-50..{91}wristOuter!{172}..{166}wristInner!{-95}..{-97}220,-44..{-116}underarm!' +
        '{-128}..scye{-90}..{-76}tip!',
      'both',
    ),
    fold('158,-366{20}..{64}194,-312', 'both', 'last'),
    fold('156,-340{30}..{66}180,-290', 'both', 'last'),
    fold('222,-36{-20}..{-32}270,-66', 'both', 'last'),
    fold('222,-20{-14}..{-26}262,-40', 'both', 'last'),
    seam('330,108{172}..{166}230,126', 'both', 'last'),
    stitching('330,115{172}..{166}238,131', 'both', 'last'),
  ],
};
