import { buttons, fold, lining, piece, seam, stitching } from '../diagram/layers.js';
import type { View } from '../diagram/model.js';

/** Turned inside out, back up; neckband and cuffs unbuttoned and laid out straight. */
export const shirtInside: View = {
  name: 'inside',
  caption: 'Turned inside out, back up; band and cuffs open',
  anchors: {
    neck: [76, 0],
    tip: [250, 36],
    scyeFoot: [262, 250],
    underarm: [312, 300],
    bandEnd: [204, -44],
    wristOuter: [534, 566],
    wristInner: [472, 602],
    cuffOuter: [584, 562],
    cuffInner: [453, 638],
    cuffButton: [576, 566],
    cuffHole: [461, 634],
    sideAt: [314, 740],
  },
  layers: [
    // The upper corners of the front, drawn up with the band.
    lining('neck!--60,-30!--bandEnd!{78}..{84}218,60!--neck!', 'both'),
    fold('92,-28{80}..{70}104,4', 'both', 'last'),
    fold('116,-28{80}..{72}132,8', 'both', 'last'),
    fold('140,-28{82}..{76}158,12', 'both', 'last'),
    fold('164,-28{84}..{80}180,14', 'both', 'last'),
    stitching('196,-28{80}..{86}208,40', 'both', 'last'),
    lining(
      '0,964!--284,964!{-10}..{-82}316,928!--underarm!--scyeFoot!{-90}..{-92}tip!{186}..{196}neck!--72,-30!--0,-30!',
    ),
    ...[
      [14, 88, 18, 190],
      [28, 85, 38, 230],
      [42, 83, 58, 180],
      [56, 81, 82, 210],
    ].map(([x, leaving, toX, toY]) => fold(`${x},-26{${leaving}}..{89}${toX},${toY}`)),
    // Linen straps bind the shoulders and the armholes.
    stitching('249,52{186}..{196}78,16'),
    seam('240,60{186}..{196}76,26'),
    seam('226,44{92}..{90}232,256--262,256'),
    stitching('232,46{92}..{90}238,250'),
    // Felled side seams, down to a small gusset above the slit.
    stitching('304,300--306,800'),
    seam('306,812--296,800--314,792'),
    stitching('300,812--302,930'),
    stitching('0,954--286,954{-10}..{-82}306,930'),
    lining(
      'tip!{14}..{64}398,220..{68}wristOuter!{140}..{150}wristInner!{-114}..{-122}underarm!--scyeFoot!{-90}..{-92}tip!',
      'both',
    ),
    seam('scyeFoot--288,212--underarm', 'both', 'last'),
    stitching('268,248--288,221--306,292', 'both', 'last'),
    stitching('259,250{-90}..{-92}256,46', 'both', 'last'),
    stitching('320,304{58}..{66}478,590', 'both', 'last'),
    ...[
      [526, 564, 490, 480],
      [514, 572, 470, 478],
      [488, 588, 440, 494],
    ].map(([x, y, toX, toY]) => fold(`${x},${y}{-118}..{-118}${toX},${toY}`, 'both', 'last')),
    // The slit of the sleeve, narrowly hemmed.
    seam('503,585{-118}..{-117}462,504', 'both', 'last'),
    piece(
      'wristOuter!--574,542!--cuffOuter--590,572!--459,648!--cuffInner--443,628!--wristInner!--wristOuter!',
      'both',
    ),
    buttons([[-461, 634]], 2.4),
    buttons([[576, 566]], 2.4),
    piece('0,-62!--202,-62!--bandEnd--206,-26!--0,-26!'),
    stitching('0,-32--204,-32', 'both', 'last'),
    stitching('0,-56--202,-56', 'both', 'last'),
    seam('188,-44--200,-44', 'once', 'all'),
    buttons([[-194, -44]], 2.4),
    // The collar stands up from the band.
    lining('0,-62!--202,-62!--214,-128!{184}..{180}0,-134!'),
    stitching('0,-126{0}..{4}206,-121', 'both', 'last'),
    stitching('206,-122--196,-62', 'both', 'last'),
  ],
};
