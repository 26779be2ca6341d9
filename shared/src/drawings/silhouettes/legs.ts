import { buttons, cloth, piece, seam } from '../diagram/layers.js';
import { silhouette } from './silhouette.js';

/** A man's fall-front trousers. */
export const trousers = silhouette(
  cloth(
    '0,0!--190,-4!--194,42!{78}..{91}232,240..{96}200,640..{92}178,1046!{174}..70,1054!{-92}..{-112}0,322!',
  ),
  seam('0,46{0}..{-4}200,42'),
  seam('114,46{88}..{90}118,232'),
  seam('-118,232--118,232', 'once'),
  seam('0,232--0,330', 'once'),
  buttons([[104, 64]], 7, 'both'),
);

/** Breeches to below the knee, with knee bands. */
export const breeches = silhouette(
  cloth(
    '0,0!--184,-4!--188,40!{74}..{92}246,220..{106}178,566!--176,632!--74,638!--72,572!{-84}..{-118}0,332!',
  ),
  seam('0,46{0}..{-4}196,40'),
  seam('100,46{88}..{90}104,220'),
  seam('-104,220--104,220', 'once'),
  seam('0,220--0,340', 'once'),
  seam('60,574{-4}..{-4}190,566'),
  buttons([[92, 64]], 7, 'both'),
  buttons(
    [
      [164, 470],
      [170, 510],
      [172, 548],
    ],
    6,
    'both',
  ),
  piece('150,588!--178,586!--178,612!--150,614!--150,588!', 'both'),
);

/** The scallops of a petticoat's edge, from its corner to the last before the centre. */
export const PETTICOAT_EDGE =
  '{156}..{190}366,950!{150}..{192}294,962!{150}..{190}222,972!{150}..{188}148,980!{150}..{186}74,984!{152}';

/** A woman's petticoat: a gathered width, tucks above a shaped edge. */
export const petticoat = silhouette(
  cloth(`0,6!--128,0!{36}..{72}236,230..{79}424,940!${PETTICOAT_EDGE}..{180}0,990!`),
  seam('0,760{0}..{-8}400,728'),
  seam('0,790{0}..{-8}410,758'),
  seam('0,820{0}..{-8}420,788'),
  seam('30,6{84}..{87}64,500'),
  seam('66,4{70}..{82}140,380'),
  seam('98,4{52}..{77}236,520'),
  piece('0,-28!{0}..{-6}126,-34!--129,0!{176}..{180}0,8!'),
);
