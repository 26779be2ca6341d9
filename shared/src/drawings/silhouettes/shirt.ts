import { buttons, cloth, lining, piece, seam } from '../diagram/layers.js';
import type { Anchors } from '../geometry/path-language.js';
import type { View } from '../diagram/model.js';
import { silhouette } from './silhouette.js';

/** Where body, sleeve and gusset of a shirt meet. The gusset is a square, folded over at the underarm. */
export const shirtAnchors = {
  neck: [76, 0],
  tip: [256, 34],
  scyeFoot: [264, 262],
  gussetBody: [316, 322],
  gussetSleeve: [338, 250],
  sleeveOuter: [606, 560],
  sleeveInner: [456, 646],
  cuffTopOuter: [582, 588],
  cuffTopInner: [494, 639],
  wristOuter: [606, 630],
  wristInner: [518, 681],
} satisfies Anchors;

/** A full sleeve, gathered at its head and into the cuff. */
export const SHIRT_SLEEVE =
  'tip!{-14}..{58}404,154..{64}sleeveOuter{70}..{150}cuffTopOuter!--cuffTopInner!{150}..{-100}sleeveInner..{-104}gussetSleeve!--scyeFoot!{-91}..{-92}tip!';
export const SHIRT_CUFF = 'cuffTopOuter!--wristOuter!--wristInner!--cuffTopInner!--cuffTopOuter!';
export const SHIRT_GUSSET = 'scyeFoot!--gussetSleeve!--gussetBody!--scyeFoot!';

/** The front's neck is cut deeper than the back's; the collar opens over a band buttoned at the throat. */
export const SHIRT_BAND = '0,40!{0}..{-58}neck!--79,-25!{124}..{180}0,12!';
export const SHIRT_COLLAR = '7,12!{-4}..{-56}79,-25!--92,-92!{190}..{166}46,-64!--7,12!';

/** The body's edge from the side over gusset, armhole and shoulder to the neck. */
export const SHIRT_SHOULDER = 'gussetBody!--scyeFoot!{-91}..{-92}tip!{184}..{196}neck!';

/** A man's shirt cut in rectangles: square gussets at the underarm, gathered sleeves, a high collar. */
export const shirt: View = {
  ...silhouette(
    lining('0,-104!{0}..{10}92,-92!--79,-24!--0,20!'),
    cloth(`0,930!--286,930!{-10}..{-84}318,896!--${SHIRT_SHOULDER}{126}..{180}0,40!`),
    cloth(SHIRT_SLEEVE, 'both'),
    cloth(SHIRT_GUSSET, 'both'),
    piece(SHIRT_CUFF, 'both'),
    piece(SHIRT_BAND),
    piece(SHIRT_COLLAR, 'both'),
    seam('-8,40---8,336', 'once'),
    buttons([[0, 26]], 5),
    seam('34,44{84}..{88}46,190'),
    seam('58,28{78}..{86}84,150'),
  ),
  anchors: shirtAnchors,
};
