import { allRound, alongCurve, buttons, cloth, flatDoubled, fold, row, seam } from '../diagram/layers.js';
import type { GarmentDiagram, View } from '../diagram/model.js';
import { openedFall } from './trousers-inside.js';
import { breeches as breechesOutline, trousers as trousersOutline } from '../silhouettes/legs.js';

/** Along the middle of the opened band, from the button to the end of its hole. */
const WAISTBAND = '~bandEnd..~bandSide..{0}bandBack..bandSide..bandEnd';

const creases = [
  fold('8,322{30}..{18}78,338'),
  fold('8,340{44}..{36}62,382'),
  fold('210,120{120}..{140}160,170'),
] as const;

const trousersFront: View = {
  name: 'front',
  caption: 'Front',
  anchors: {
    fork: [0, 322],
    hemOuter: [178, 1046],
    hemInner: [70, 1054],
    kneeOuter: [201, 640],
    kneeInner: [69, 640],
  },
  layers: [
    ...trousersOutline.layers,
    ...creases,
    fold('134,380{90}..{92}124,1040'),
    seam('-7,2---7,44', 'once'),
    buttons([[0, 22]], 6),
    buttons(
      [
        [74, 22],
        [150, 20],
      ],
      5,
      'both',
    ),
  ],
};

const lacing = row(4, [0, -30], [0, -2]).map(([, y]) =>
  fold(`-9,${y.toFixed(1)}--9,${(y + 8).toFixed(1)}`, 'both', 'all'),
);

const backAbove = [
  seam('8,8{8}..{10}204,36'),
  seam('0,6--0,350', 'once'),
  ...lacing,
  fold('20,12{78}..{84}38,150'),
  fold('42,16{80}..{86}62,120'),
  fold('10,338{36}..{18}84,362'),
  fold('8,352{48}..{38}62,402'),
  buttons(
    [
      [66, -14],
      [150, -8],
    ],
    5,
    'both',
  ),
] as const;

const trousersBack: View = {
  name: 'back',
  caption: 'Back',
  anchors: {},
  layers: [
    cloth(
      '0,6!--12,-38!{6}..{12}188,-6!--194,40!{78}..{91}236,250..{97}200,640..{92}178,1046!{174}..70,1054!{-92}..{-116}0,334!',
    ),
    ...backAbove,
    fold('134,400{90}..{92}124,1040'),
  ],
};

const trousersInside = openedFall({
  waistHalf: 190,
  fallHalf: 116,
  fallFoot: 232,
  leg: '{80}..{90}232,240..{96}200,640..{92}178,1046!{174}..70,1054!{-92}..{-112}0,322!',
  fork: [0, 322],
  legLayers: [fold('134,430{90}..{92}124,1040')],
});

/** A man's trousers with a fall front. */
export const trousers: GarmentDiagram = {
  kind: 'trousers',
  title: 'Trousers',
  leastScale: 0.24,
  views: [trousersFront, trousersBack, trousersInside],
  lines: [
    allRound('trouser-waistband', 'inside', WAISTBAND),
    alongCurve('outside-leg', 'front', '190,-4--194,42{78}..{91}232,240..{96}200,640..{92}hemOuter', {
      beside: 16,
    }),
    alongCurve('inside-leg', 'front', '~fork{112}..{92}~hemInner', { beside: -10 }),
    flatDoubled('trouser-knee', 'front', 'kneeInner--kneeOuter'),
    flatDoubled('leg-hem', 'front', 'hemInner--hemOuter', { beside: -18 }),
    flatDoubled('seat', 'front', '-233,250--233,250'),
  ],
};

const breechesFront: View = {
  name: 'front',
  caption: 'Front',
  anchors: { fork: [0, 332], hemOuter: [176, 632], hemInner: [74, 638] },
  layers: [
    ...breechesOutline.layers,
    ...creases,
    seam('-7,2---7,44', 'once'),
    buttons([[0, 22]], 6),
    seam('146,420{86}..{84}156,570'),
  ],
};

const breechesBack: View = {
  name: 'back',
  caption: 'Back',
  anchors: {},
  layers: [
    cloth(
      '0,6!--12,-38!{6}..{12}184,-6!--188,40!{74}..{92}250,230..{107}178,566!--176,632!--74,638!--72,572!{-84}..{-120}0,346!',
    ),
    ...backAbove,
    fold('64,20{82}..{88}78,180'),
    fold('88,24{84}..{90}98,150'),
    seam('60,574{-4}..{-4}190,566'),
  ],
};

const breechesInside = openedFall({
  waistHalf: 184,
  fallHalf: 102,
  fallFoot: 220,
  leg: '{78}..{92}246,220..{106}178,566!--176,632!--74,638!--72,572!{-84}..{-118}0,332!',
  fork: [0, 332],
  legLayers: [seam('60,574{-4}..{-4}190,566'), seam('146,420{86}..{84}156,570')],
});

/** A man's breeches to below the knee. */
export const breeches: GarmentDiagram = {
  kind: 'breeches',
  title: 'Breeches',
  leastScale: 0.24,
  views: [breechesFront, breechesBack, breechesInside],
  lines: [
    allRound('trouser-waistband', 'inside', WAISTBAND),
    alongCurve('outside-leg', 'front', '184,-4--188,40{74}..{92}246,220..{106}178,566!--hemOuter', {
      beside: 16,
    }),
    alongCurve('inside-leg', 'front', '~fork{118}..{84}-72,572!--~hemInner', { beside: -10 }),
    flatDoubled('trouser-knee', 'front', '70,530--190,524'),
    flatDoubled('leg-hem', 'front', 'hemInner--hemOuter', { beside: -18 }),
    flatDoubled('seat', 'front', '-246,240--246,240'),
  ],
};
