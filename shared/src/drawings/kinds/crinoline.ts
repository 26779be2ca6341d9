import { allRound, alongCurve, cloth, piece, seam, straightLine } from '../diagram/layers.js';
import type { GarmentDiagram, View } from '../diagram/model.js';
import { crinoline as crinolineOutline } from '../silhouettes/legs.js';

const front: View = { name: 'front', caption: 'Front', anchors: {}, layers: crinolineOutline.layers };

/** Side on, the cage is deeper behind than before: its base is no circle. */
const side: View = {
  name: 'side',
  caption: 'From the side, front at the left',
  anchors: { waistFront: [-96, 0], waistBack: [100, 0], baseFront: [-330, 940], baseBack: [560, 950] },
  layers: [
    cloth(
      'waistFront!{112}..{102}-220,420..{98}baseFront!{14}..{0}80,1000..{-10}baseBack!{-104}..{-118}380,400..{-142}waistBack!--waistFront',
      'once',
    ),
    ...[150, 270, 390, 510, 630, 750, 860].map((y, index) =>
      seam(`-500,${y - 20}{14}..{0}60,${y + 24 + index * 4}..{-12}700,${y - 30}`, 'once'),
    ),
    seam('-40,0{98}..{92}-120,1010', 'once'),
    seam('6,0{80}..{84}90,1010', 'once'),
    seam('56,0{62}..{76}320,1000', 'once'),
    piece('-98,-36!--102,-36!--102,4!---98,4!---98,-36', 'once'),
  ],
};

/** A cage of about 1860. */
export const crinoline: GarmentDiagram = {
  kind: 'crinoline',
  title: 'Crinoline',
  leastScale: 0.22,
  views: [front, side],
  lines: [
    allRound('waistband', 'front', '-118,-18--118,-18', { sag: 8 }),
    allRound('crinoline-top-hoop-round', 'front', '-208,134{5}..{0}0,156..{-5}208,134', { beside: -14 }),
    allRound('crinoline-middle-hoop-round', 'front', '-352,484{9}..{0}0,534..{-9}352,484', { beside: -14 }),
    allRound('crinoline-base-round', 'front', '-468,930{14}..{0}0,1000..{-14}468,930', { beside: -16 }),
    straightLine('crinoline-base-width', 'front', '-468,930--468,930'),
    straightLine('crinoline-front-length', 'front', '0,6--0,994'),
    straightLine('crinoline-base-depth', 'side', 'baseFront--baseBack'),
    alongCurve('crinoline-back-length', 'side', 'waistBack{38}..{62}380,400..{76}baseBack', { beside: 13 }),
  ],
};
