import {
  allRound,
  alongCurve,
  buttons,
  cloth,
  fold,
  piece,
  row,
  seam,
  stitching,
  straightLine,
} from '../diagram/layers.js';
import type { GarmentDiagram, View } from '../diagram/model.js';
import {
  CHILD_SLEEVE,
  CHILD_SLEEVE_BAND,
  childDress as childDressOutline,
} from '../silhouettes/body-linen.js';
import { childDressInside } from './child-dress-inside.js';

const skirtFolds = [
  fold('10,8{88}..{88}18,260'),
  fold('42,8{80}..{85}80,280'),
  fold('82,6{62}..{80}156,270'),
  fold('98,4{46}..{76}184,180'),
] as const;

/** Gathers from the head of the puff, and up from its band. */
const sleeveFolds = [
  fold('139,-168{-14}..{40}178,-164', 'both', 'cloth'),
  fold('136,-156{-4}..{44}182,-140', 'both', 'cloth'),
  fold('133,-142{6}..{50}172,-120', 'both', 'cloth'),
  fold('194,-92{-50}..{-88}212,-132', 'both', 'cloth'),
  fold('182,-98{-54}..{-92}196,-140', 'both', 'cloth'),
  fold('170,-104{-60}..{-96}180,-136', 'both', 'cloth'),
  fold('160,-108{-66}..{-104}164,-128', 'both', 'cloth'),
  piece(CHILD_SLEEVE_BAND, 'both'),
  stitching('198,-82--142,-108', 'both', 'last'),
] as const;

const front: View = {
  name: 'front',
  caption: 'Front',
  anchors: {
    neck: [112, -188],
    tip: [138, -178],
  },
  layers: [
    ...childDressOutline.layers,
    ...skirtFolds,
    ...sleeveFolds,
    fold('0,-134--0,-22', 'once'),
    fold('20,-138{92}..{92}14,-22'),
    fold('42,-144{94}..{94}30,-22'),
    stitching('0,-132{0}..{-40}118,-182'),
    stitching('0,400{0}..{-11}252,378'),
  ],
};

const back: View = {
  name: 'back',
  caption: 'Back',
  anchors: { neckBack: [0, -158], scye: [120, -132], hemBack: [0, 412] },
  layers: [
    cloth('0,0!--112,0!{22}..{64}184,84..{77}256,386!{167}..{180}hemBack!'),
    ...skirtFolds,
    fold('26,8{84}..{86}50,230'),
    fold('62,8{72}..{82}118,230'),
    seam('0,300{0}..{-9}250,280'),
    seam('0,322{0}..{-9}256,302'),
    seam('0,344{0}..{-9}260,324'),
    stitching('0,402{0}..{-11}252,378'),
    seam('0,0--0,150', 'once'),
    seam('7,0--7,150', 'once'),
    cloth(
      'neckBack!{0}..{-26}112,-188!{14}..138,-178!{110}..scye{86}..{46}130,-92!{104}..112,0!{178}..{180}0,4!',
    ),
    stitching('0,-150{0}..{-26}118,-182'),
    seam('118,-118{146}..{104}58,0'),
    seam('0,-158--0,0', 'once'),
    seam('9,-157--9,0', 'once'),
    buttons(row(5, [4.5, -144], [4.5, -34]), 3.4),
    cloth(`${CHILD_SLEEVE}{-134}..scye{-92}..{-70}138,-178!`, 'both'),
    ...sleeveFolds,
    piece('0,-18!{0}..{-4}114,-22!--112,6!{177}..{180}0,8!'),
  ],
};

/** A child's dress of about 1857, its tucks waiting to be let down. */
export const childDress: GarmentDiagram = {
  kind: 'child-dress',
  title: 'Child’s dress',
  leastScale: 0.4,
  views: [front, back, childDressInside],
  lines: [
    allRound('child-chest', 'inside', ['~chestOpen--~chestSide', 'chestSide--chestOpen']),
    allRound('child-waist', 'inside', ['~bandOpen--~bandSide', 'bandSide--bandOpen']),
    allRound(
      'neck',
      'inside',
      ['~neckOpen{180}..{206}~neck', '~neck{38}..{0}0,-140..{-38}neck', 'neck{154}..{180}neckOpen'],
      { beside: -7 },
    ),
    allRound('hem', 'inside', '~hemSide{13}..{0}hemBack..{-13}hemSide', { beside: -16 }),
    alongCurve('shoulder-seam', 'front', '~tip--~neck', { beside: 12 }),
    alongCurve('sleeve-outer', 'front', '138,-178{-44}..{20}176,-186..{76}226,-132..{128}202,-86--192,-62', {
      beside: 13,
    }),
    straightLine('across-back', 'back', '~scye--scye'),
    straightLine('child-length', 'back', '-20,-156---20,408'),
  ],
};
