import {
  allRound,
  alongCurve,
  cloth,
  fold,
  piece,
  seam,
  stitching,
  straightLine,
} from '../diagram/layers.js';
import type { GarmentDiagram, Layer, View } from '../diagram/model.js';
import { edgeAt, farHalf, nearHalf, type Hoop } from '../geometry/hoops.js';
import { crinolineHoop, crinolineHoops, crinolineLayers, tape } from '../silhouettes/cages.js';

/** Covered steels: both edges of the near half. */
const steels = (hoops: readonly Hoop[]): Layer[] =>
  hoops.flatMap((hoop) => [seam(nearHalf(hoop), 'once', 'all'), seam(nearHalf(hoop, -8), 'once')]);

const behind = (hoops: readonly Hoop[]): Layer[] => hoops.map((hoop) => fold(farHalf(hoop), 'once', 'all'));

const front: View = {
  name: 'front',
  caption: 'Front',
  anchors: {},
  layers: [
    crinolineLayers.outline,
    ...behind(crinolineHoops),
    fold('18,0{86}..{88}52,880'),
    fold('70,0{62}..{79}230,860'),
    ...steels(crinolineHoops),
    // Tapes, to which the hoops are fixed by brass eyelets or caught by hand.
    ...tape((beside) => `${34 + beside / 3},0{78}..{85}${110 + beside},1010`, 12),
    ...tape((beside) => `${84 + beside / 3},0{54}..{78}${296 + beside},1000`, 12),
    crinolineLayers.band,
    stitching('0,-24{0}..{-6}116,-30', 'both', 'last'),
    seam('0,-32--0,6', 'once', 'last'),
  ],
};

const FRONT_EDGE = '-96,0{112}..{102}-220,420..{98}-330,941';
const BACK_EDGE = '100,0{38}..{62}380,400..{76}560,951';

const sideHoops = [134, 250, 366, 484, 590, 690, 780, 860, 940].map((y): Hoop => ({
  left: edgeAt(FRONT_EDGE, y),
  right: edgeAt(BACK_EDGE, y + 10),
  depth: 16 + y * 0.044,
}));

const BASE = nearHalf({ left: [-330, 940], right: [560, 950], depth: 57.4 });

/** Side on, the cage is deeper behind than before: its base is no circle. */
const side: View = {
  name: 'side',
  caption: 'From the side, front at the left',
  anchors: { waistFront: [-96, 0], waistBack: [100, 0], baseFront: [-330, 940], baseBack: [560, 950] },
  layers: [
    cloth(
      `waistFront!{112}..{102}-220,420..{98}${BASE}!{-104}..{-118}380,400..{-142}waistBack!--waistFront`,
      'once',
    ),
    ...behind(sideHoops),
    ...steels(sideHoops),
    ...[
      [-46, 100, -140, 93],
      [8, 82, 96, 84],
      [54, 62, 330, 76],
    ].flatMap(([x = 0, leaving, foot = 0, arriving]) =>
      [0, 12].map((beside) =>
        seam(`${x + beside / 3},0{${leaving}}..{${arriving}}${foot + beside},1010`, 'once'),
      ),
    ),
    piece('-98,-36!--102,-36!--102,4!---98,4!---98,-36', 'once'),
    stitching('-92,-30--98,-30', 'once', 'last'),
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
    allRound('crinoline-top-hoop-round', 'front', nearHalf(crinolineHoop(134)), { beside: -9 }),
    allRound('crinoline-middle-hoop-round', 'front', nearHalf(crinolineHoop(484)), { beside: -9 }),
    allRound('crinoline-base-round', 'front', nearHalf(crinolineHoop(930)), { beside: -14 }),
    straightLine('crinoline-base-width', 'front', '-468,930--468,930'),
    alongCurve('crinoline-front-length', 'front', '0,6--0,990'),
    straightLine('crinoline-base-depth', 'side', 'baseFront--baseBack'),
    alongCurve('crinoline-back-length', 'side', 'waistBack{38}..{62}380,400..{76}baseBack', { beside: 13 }),
  ],
};
