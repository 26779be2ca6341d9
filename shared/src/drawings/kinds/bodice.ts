import { allRound, alongCurve, flatDoubled, straightLine } from '../diagram/layers.js';
import type { GarmentDiagram } from '../diagram/model.js';
import { bodiceBack } from './bodice-back.js';
import { bodiceFront } from './bodice-front.js';
import { bodiceInside } from './bodice-inside.js';

export const bodice: GarmentDiagram = {
  kind: 'bodice',
  title: 'Bodice',
  leastScale: 0.34,
  views: [bodiceFront, bodiceBack, bodiceInside],
  lines: [
    allRound('bust', 'inside', [
      '~frontBust--~frontBustSide',
      '~bustSide{6}..{0}0,-154..{-6}bustSide',
      'frontBustSide--frontBust',
    ]),
    allRound('waist', 'inside', [
      '~frontWaist--~frontWaistSide',
      '~waistSide--waistSide',
      'frontWaistSide--frontWaist',
    ]),
    allRound('inner-waist-band', 'inside', '-244,-36--244,-36'),
    allRound(
      'neck',
      'inside',
      [
        '~frontNeck{0}..{-68}~frontNeckPoint',
        '~neck{28}..{0}neckBack..{-28}neck',
        'frontNeckPoint{68}..{0}frontNeck',
      ],
      { beside: -7 },
    ),
    alongCurve('side-seam', 'inside', 'frontUnderarm{94}..frontBustSide..{90}frontWaistSide', { beside: -8 }),
    allRound(
      'armscye',
      'inside',
      ['~frontTip{104}..~frontScye{88}..{52}~frontUnderarm', '~underarm{-44}..~scye{-88}..{-68}~tip'],
      { beside: 7 },
    ),
    alongCurve('shoulder-seam', 'front', '~tip{-18}..{-14}~neck', { beside: -11 }),
    straightLine('across-front', 'front', '~scye--scye'),
    straightLine('neck-to-waist-front', 'front', '-28,-334---28,-2'),
    straightLine('neck-to-hem-front', 'front', '30,-334--30,150'),
    straightLine('waist-to-hem-front', 'front', '-28,4---28,152'),
    straightLine('point-depth', 'front', '70,0--70,156'),
    alongCurve('sleeve-outer', 'front', '~tip{178}..{128}-232,-300..{94}-310,-50..{89}~wristOuter', {
      beside: -12,
    }),
    alongCurve('sleeve-under', 'front', '~underarm{116}..{97}-220,-44..{95}~wristInner', { beside: 10 }),
    flatDoubled('sleeve-widest', 'front', '172,-218--262,-250'),
    flatDoubled('elbow', 'front', '218,-52--310,-62'),
    allRound('cuff', 'front', 'wristInner--wristOuter', { beside: -18, sag: 10 }),
    straightLine('neck-to-waist-back', 'back', '-30,-402---30,-2'),
    straightLine('neck-to-hem-back', 'back', '28,-402--28,142'),
    straightLine('waist-to-hem-back', 'back', '-30,4---30,142'),
    straightLine('across-back', 'back', '~scye--scye'),
    alongCurve('underarm-to-underarm-back', 'back', '~underarm{10}..{0}0,-186..{-10}underarm'),
  ],
};
