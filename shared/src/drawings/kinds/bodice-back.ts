import { buttons, cloth, fold, seam, stitching } from '../diagram/layers.js';
import type { View } from '../diagram/model.js';

/** The back of the same bodice: curved side-back seams, a pleated tail. */
export const bodiceBack: View = {
  name: 'back',
  caption: 'Back',
  anchors: {
    neckBack: [0, -402],
    waistBack: [0, 0],
    hemBack: [0, 146],
    neck: [57, -416],
    tip: [150, -378],
    scye: [128, -292],
    underarm: [186, -205],
    bustSide: [189, -165],
    waistSide: [131, 0],
    hipSide: [178, 94],
    collarSide: [51, -456],
    wristOuter: [320, 152],
    wristInner: [256, 166],
  },
  layers: [
    cloth(
      '0,-444!{0}..{-14}collarSide!--neck!{16}..{20}tip!{112}..scye{88}..{44}underarm!{86}..bustSide..{90}waistSide' +
        '..{60}hipSide!{164}..124,110!--114,132!{172}..{178}66,138!--61,146!{178}..{180}hemBack!',
    ),
    seam('neckBack{0}..{-28}neck'),
    seam('54,-420{38}..{22}164,-342'),
    seam('neckBack!--0,150', 'once'),
    seam('124,-268{150}..78,-148{106}..32,0{92}..{74}58,160'),
    seam('178,-236{142}..{112}112,-112{108}..81,0{88}..{64}128,136'),
    fold('9,34{86}..{84}18,160'),
    fold('18,40{84}..{80}36,160'),
    fold('27,34{80}..{74}52,150'),
    stitching('0,137!{0}..60,137!--108,123!--118,101{-14}..{-16}182,84'),
    cloth(
      'tip!{2}..{52}232,-300..{86}310,-50..{91}wristOuter!{172}..{166}wristInner!{-95}..{-97}220,-44..{-116}underarm!' +
        '{-136}..scye{-92}..{-66}tip!',
      'both',
    ),
    seam('160,-352{12}..208,-292{62}..{87}277,-46{87}..{90}298,106', 'both', 'last'),
    seam('330,108{172}..{166}238,124', 'both', 'last'),
    stitching('330,115{172}..{166}238,131', 'both', 'last'),
    buttons(
      [
        [306, 124],
        [308, 143],
      ],
      4.4,
      'both',
    ),
    fold('300,-66{170}..{160}256,-62', 'both', 'last'),
    fold('302,-46{176}..{166}262,-38', 'both', 'last'),
  ],
};
