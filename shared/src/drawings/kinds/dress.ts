import { allRound, alongCurve, flatDoubled, straightLine } from '../diagram/layers.js';
import type { GarmentDiagram } from '../diagram/model.js';
import { dressBack } from './dress-back.js';
import { dressFront } from './dress-front.js';
import { dressInside } from './dress-inside.js';

const SLEEVE_OUTER =
  '~tip{198}..{180}-284,-352..{122}-396,-262..{88}~puffOuter..{68}-394,-40..{90}~wristOuter';
const SLEEVE_UNDER = '~underarm{76}..{44}~puffInner..{30}-258,-92..{84}-330,-20..{88}~wristInner';

export const dress: GarmentDiagram = {
  kind: 'dress',
  title: 'Dress',
  leastScale: 0.26,
  views: [dressFront, dressBack, dressInside],
  lines: [
    allRound('bust', 'inside', '~bustSide--bustSide', { sag: 14 }),
    allRound('under-bust', 'inside', '~underBustSide--underBustSide', { sag: 12 }),
    allRound('waist', 'inside', '~waistSide--waistSide', { sag: 14 }),
    allRound('inner-waist-band', 'inside', ['-22,-36---131,-39', '131,-39--22,-36']),
    allRound('neck', 'inside', ['~neckOpen{194}..{228}~neck', 'neck{132}..{166}neckOpen'], { beside: 7 }),
    allRound('armscye', 'inside', 'tip{128}..scye{88}..{48}underarm', { beside: -8 }),
    alongCurve('side-seam', 'inside', '~underarm{76}..~bustSide..~underBustSide..{76}~waistSide', {
      beside: -10,
    }),
    allRound('high-hip', 'inside', '-216,86--216,86', { sag: 14 }),
    allRound('hip', 'inside', '-252,200--252,200', { sag: 18 }),
    allRound('hem', 'inside', '~hemSide{12}..{0}hemBack..{-12}hemSide', { beside: -16 }),
    straightLine('hem-depth', 'inside', '-90,884---90,1022'),
    straightLine('cloth-width', 'inside', '4,720--194,720'),
    alongCurve('shoulder-seam', 'front', '~neck--~tip', { beside: 12 }),
    straightLine('across-front', 'front', '~scye--scye'),
    straightLine('neck-to-waist-front', 'front', '-26,-298---26,-2'),
    straightLine('point-depth', 'front', '64,0--64,52'),
    straightLine('neck-to-hem-front', 'front', '28,-298--28,1020'),
    straightLine('waist-to-hem-front', 'front', '-26,4---26,1020'),
    alongCurve('sleeve-outer', 'front', SLEEVE_OUTER, { beside: -13 }),
    alongCurve('sleeve-under', 'front', SLEEVE_UNDER, { beside: -10 }),
    flatDoubled('sleeve-widest', 'front', 'puffInner--424,-156'),
    flatDoubled('elbow', 'front', '328,-28--396,-48'),
    allRound('cuff', 'front', 'wristInner--wristOuter', { beside: -16, sag: 10 }),
    straightLine('neck-to-waist-back', 'back', '-28,-316---28,2'),
    straightLine('neck-to-hem-back', 'back', '28,-316--28,1024'),
    straightLine('waist-to-hem-back', 'back', '-28,8---28,1024'),
    alongCurve('waist-to-hem-side', 'back', 'waistSide{24}..{58}214,84..{80}330,560..{83}hemSide', {
      beside: 14,
    }),
    straightLine('across-back', 'back', '~scye--scye'),
    alongCurve('underarm-to-underarm-back', 'back', '~underarm{8}..{0}0,-176..{-8}underarm'),
    // Of a bodice and skirt laid together as worn; the dress in one lends its drawing.
    straightLine('worn-neck-to-hem-front', 'front', '70,-296--70,1016'),
    straightLine('worn-neck-to-hem-back', 'back', '70,-316--70,1020'),
    straightLine('opening', 'back', '-62,-314---62,246'),
  ],
};
