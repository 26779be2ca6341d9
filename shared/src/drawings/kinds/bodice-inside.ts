import { buttons, lining, piece, row, seam, stitching } from '../diagram/layers.js';
import type { View } from '../diagram/model.js';

const buttonholes = row(15, [-374, -328], [-374, 122]).map(([x, y]) =>
  seam(`${x - 6},${y.toFixed(1)}--${x + 7},${y.toFixed(1)}`, 'once'),
);

/** Opened at the front and laid with the lining up; the pieces a little apart, as their seams join them. */
export const bodiceInside: View = {
  name: 'inside',
  caption: 'Inside, opened at the front',
  anchors: {
    neckBack: [0, -400],
    neck: [56, -414],
    tip: [140, -376],
    scye: [121, -292],
    underarm: [154, -205],
    bustSide: [156, -165],
    waistSide: [102, 0],
    hipSide: [150, 94],
    frontNeck: [386, -344],
    frontNeckPoint: [317, -408],
    frontTip: [226, -378],
    frontScye: [234, -292],
    frontUnderarm: [190, -205],
    frontBustSide: [187, -165],
    frontWaistSide: [244, 0],
    frontHipSide: [198, 94],
    frontPoint: [386, 158],
    frontWaist: [386, 0],
    frontBust: [386, -158],
    dartInner: [305, -146],
    dartOuter: [263, -130],
    band: [236, -46],
  },
  layers: [
    lining(
      'neckBack!{0}..{-28}neck!{16}..{20}tip!{112}..scye{88}..{44}underarm!{86}..bustSide..{90}waistSide..{60}hipSide!' +
        '{164}..110,110!--102,132!{172}..{178}60,138!--55,146!{178}..{180}0,146!',
    ),
    seam('neckBack!--0,150', 'once'),
    seam('116,-268{150}..70,-148{106}..26,0{92}..{74}48,160'),
    seam('148,-236{142}..{112}92,-112{108}..62,0{88}..{64}112,136'),
    stitching('-4,-90--4,110'),
    stitching('33,-60{98}..{86}20,0{86}..{76}36,110'),
    stitching('27,-60{98}..{86}14,0{86}..{76}29,110'),
    stitching('72,-60{104}..{86}55,0{86}..{68}88,100'),
    stitching('79,-60{104}..{86}62,0{86}..{68}96,98'),
    lining(
      'frontNeck!{180}..{-112}frontNeckPoint!{166}..{162}frontTip!{76}..frontScye{92}..{128}frontUnderarm!' +
        '{94}..frontBustSide..{90}frontWaistSide..{120}frontHipSide!{14}..282,110..{34}frontPoint!--frontNeck!',
      'both',
    ),
    seam('377,-346--377,150'),
    seam('dartInner{82}..326,0{84}..{96}320,150'),
    seam('dartInner{76}..340,0{88}..{90}336,160'),
    seam('dartOuter{80}..292,0{88}..{106}271,124'),
    seam('dartOuter{74}..306,0{90}..{100}295,136'),
    seam('222,-252{80}..{70}238,-130{68}..265,0{92}..{114}229,116'),
    stitching('314,-80{76}..{86}334,0{92}..{94}329,120'),
    stitching('270,-70{78}..{86}299,0{94}..{102}283,104'),
    stitching('228,-120{70}..{84}255,0{96}..{110}228,90'),
    // Buttonholes in the right front; only the buttons' threads show inside the left.
    ...buttonholes,
    buttons(row(15, [366, -328], [366, 122]), 1.6),
    piece('0,-46!--band!--236,-26!--0,-26!'),
    stitching('22,-44--22,-28'),
    seam('236,-40--250,-40{0}..{180}250,-32--244,-32', 'both', 'all'),
  ],
};
