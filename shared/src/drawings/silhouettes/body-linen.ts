import { buttons, cloth, lining, piece, row, seam } from '../diagram/layers.js';
import type { View } from '../diagram/model.js';
import type { Anchors } from '../geometry/path-language.js';
import { silhouette } from './silhouette.js';

/** Where a chemise's sleeve, its band and the square gusset under the arm meet. */
export const chemiseAnchors = {
  neck: [124, -4],
  tip: [176, 10],
  scyeFoot: [188, 150],
  gussetBody: [206, 196],
  gussetSleeve: [232, 166],
  bandOuter: [322, 140],
  bandInner: [250, 196],
  edgeOuter: [335, 156],
  edgeInner: [263, 213],
} satisfies Anchors;

/** A short sleeve, gathered at its head and into a band. */
export const CHEMISE_SLEEVE =
  'tip!{-6}..{40}262,40..{70}328,124..{140}bandOuter!--bandInner!{190}..{250}gussetSleeve!--scyeFoot!{-94}..{-85}tip!';
export const CHEMISE_SLEEVE_BAND = 'bandOuter!--edgeOuter!--edgeInner!--bandInner!--bandOuter!';
export const CHEMISE_GUSSET = 'scyeFoot!--gussetSleeve!--gussetBody!--scyeFoot!';
export const CHEMISE_BODY_SIDE = 'tip!{95}..{86}scyeFoot!--gussetBody!{84}..{82}298,960!';

/** A woman's chemise: wide neck, short sleeves, gores to the knee. */
export const chemise: View = {
  ...silhouette(
    lining('0,2!{0}..{24}neck!--118,24!--0,90!'),
    cloth(`0,82!{0}..{-54}neck!{14}..${CHEMISE_BODY_SIDE}{168}..{180}0,990!`),
    cloth(CHEMISE_SLEEVE, 'both'),
    piece(CHEMISE_SLEEVE_BAND, 'both'),
    cloth(CHEMISE_GUSSET, 'both'),
    seam('0,98{0}..{-52}134,8'),
    seam('20,102{86}..{88}32,240'),
    seam('60,88{82}..{86}84,210'),
    seam('206,330{92}..{96}140,1000'),
  ),
  anchors: chemiseAnchors,
};

/** A corset of the 1880s with a busk. */
export const corset = silhouette(
  cloth(
    '0,-150!{-10}..{-32}46,-184..{4}108,-204..{42}174,-140!{104}..{90}112,0..{56}170,132!{164}..{140}54,200..{180}0,222!',
  ),
  seam('0,-150--0,230', 'once'),
  seam('14,-200{91}..{89}14,230'),
  seam('52,-210{93}..{90}38,0{90}..{78}62,220'),
  seam('100,-220{97}..{90}66,0{90}..{66}112,190'),
  seam('146,-210{104}..{91}92,0{89}..{58}152,170'),
  buttons(row(5, [0, -118], [0, 172]), 4.6),
);

/** A puffed sleeve, its head and its foot gathered, and the band that holds it. */
export const CHILD_SLEEVE =
  '138,-178!{-44}..{20}176,-186..{76}226,-132..{128}200,-82!--148,-108!{196}..{150}130,-92!';
export const CHILD_SLEEVE_BAND = '202,-86!--192,-62!--138,-90!--148,-112!--202,-86!';

/** A child's dress: low neck, puffed sleeves, tucks to be let down. */
export const childDress = silhouette(
  lining('0,-176!{0}..{18}112,-188!--110,-156!--0,-128!'),
  cloth('0,0!--112,0!{22}..{64}184,84..{77}256,386!{167}..{180}0,410!'),
  seam('0,300{0}..{-9}250,280'),
  seam('0,322{0}..{-9}256,302'),
  seam('0,344{0}..{-9}260,324'),
  seam('24,8{86}..{87}42,240'),
  seam('62,8{74}..{83}116,210'),
  cloth(
    '0,-140!{0}..{-40}112,-188!{14}..138,-178!{100}..126,-130..{56}130,-92!{104}..112,0!{177}..{180}0,6!',
  ),
  cloth(`${CHILD_SLEEVE}{-126}..126,-130..{-80}138,-178!`, 'both'),
  piece(CHILD_SLEEVE_BAND, 'both'),
  piece('0,-18!{0}..{-4}114,-22!--112,6!{177}..{180}0,10!'),
);
