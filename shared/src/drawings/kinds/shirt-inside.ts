import { buttons, fold, lining, piece, seam, stitching } from '../diagram/layers.js';
import type { View } from '../diagram/model.js';
import { SHIRT_GUSSET, SHIRT_SHOULDER, SHIRT_SLEEVE, shirtAnchors } from '../silhouettes/shirt.js';

/** Turned inside out, back up; neckband and cuffs unbuttoned and laid out straight. */
export const shirtInside: View = {
  name: 'inside',
  caption: 'Turned inside out, back up; band and cuffs open',
  anchors: {
    ...shirtAnchors,
    bandEnd: [204, -46],
    bandHole: [-196, -46],
    bandButton: [190, -46],
    cuffOuter: [626, 562],
    cuffOuterFoot: [650, 604],
    cuffInner: [450, 664],
    cuffInnerFoot: [474, 706],
    cuffButton: [628, 589],
    cuffHole: [468, 681],
    sideAt: [317, 720],
  },
  layers: [
    // The upper corners of the front, drawn up with the band.
    lining('neck!--60,-32!--bandEnd!{80}..{86}222,60!--neck!', 'both'),
    ...[
      [90, 80, 100],
      [106, 78, 120],
      [122, 78, 138],
      [138, 80, 154],
      [154, 82, 168],
      [170, 84, 182],
    ].map(([x, leaving, toX]) => fold(`${x},-32{${leaving}}..${toX},24`, 'both', 'last')),
    stitching('196,-32{80}..{86}212,40', 'both', 'last'),
    lining(`0,964!--286,964!{-10}..{-84}318,930!--${SHIRT_SHOULDER}--74,-32!--0,-32!`),
    ...[
      [8, 90, 9, 210],
      [19, 88, 24, 150],
      [30, 87, 38, 240],
      [41, 85, 56, 170],
      [52, 83, 72, 220],
      [63, 80, 92, 140],
    ].map(([x, leaving, toX, toY]) => fold(`${x},-28{${leaving}}..{89}${toX},${toY}`)),
    // Linen straps bind the shoulders and the armholes.
    seam('256,60{184}..{196}80,28'),
    stitching('256,54{184}..{196}80,22'),
    seam('230,56{92}..{88}234,262--264,262'),
    stitching('236,58{92}..{88}240,256'),
    // Felled side seams, down to a small gusset above the slit.
    stitching('307,314--308,776'),
    seam('318,790--302,777--318,764'),
    stitching('308,792--308,930'),
    stitching('0,954--286,954{-10}..{-84}308,930'),
    lining(SHIRT_SLEEVE, 'both'),
    stitching('346,256{74}..{80}464,632', 'both', 'last'),
    ...[
      [575, 592, -100, 556, 500],
      [562, 600, -106, 526, 476],
      [549, 607, -112, 508, 512],
      [523, 622, -124, 470, 544],
      [509, 630, -130, 452, 574],
    ].map(([x, y, leaving, toX, toY]) => fold(`${x},${y}{${leaving}}..${toX},${toY}`, 'both', 'last')),
    // The slit of the sleeve, narrowly hemmed, ends in a bar.
    seam('536,614{-114}..{-112}496,516', 'both', 'last'),
    stitching('530,612{-114}..{-112}490,518', 'both', 'last'),
    seam('488,520--501,513', 'both', 'last'),
    lining(SHIRT_GUSSET, 'both'),
    stitching('272,264--330,255--313,312--272,266', 'both', 'last'),
    piece('cuffOuter!--cuffOuterFoot!--cuffInnerFoot!--cuffInner!--cuffOuter!', 'both'),
    stitching('624,570--640,599--478,693--462,664--624,570', 'both', 'last'),
    // A hole in one end of each cuff, in the other the threads of its button.
    seam('460,686--474,678', 'both', 'last'),
    buttons([[628, 589]], 2.4, 'both'),
    piece('0,-62!--202,-62!--bandEnd!--205,-30!--0,-30!'),
    seam('-202,-46---189,-46', 'once', 'last'),
    buttons([[190, -46]], 2.4),
    // The collar stands up from the band.
    lining('0,-62!--202,-62!--222,-136!{184}..{180}0,-146!'),
    stitching('0,-138{0}..{4}212,-129--196,-66', 'both', 'last'),
    stitching('0,-68--200,-68', 'both', 'last'),
  ],
};
