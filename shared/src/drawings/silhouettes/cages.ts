import { cloth, piece, seam } from '../diagram/layers.js';
import type { Layer } from '../diagram/model.js';
import { edgeAt, nearHalf, type Hoop } from '../geometry/hoops.js';
import { silhouette } from './silhouette.js';

/** A hoop between an edge, at the height `y`, and its mirror image. */
const hoopAt = (edge: string, y: number, depth: number): Hoop => {
  const [x] = edgeAt(edge, y);
  return { left: [-x, y], right: [x, y], depth };
};

const CRINOLINE_EDGE = '118,-4{42}..{72}330,400..{82}468,931';

/** Of a crinoline, the hoop at a height: the lower, the more of its oval is seen from above. */
export const crinolineHoop = (y: number): Hoop => hoopAt(CRINOLINE_EDGE, y, 16 + y * 0.054);

/** Closer together towards the foot, where the skirt must not fall in. */
export const crinolineHoops = [134, 250, 366, 484, 590, 690, 780, 860, 930].map(crinolineHoop);

/** A tape on which the hoops hang: its two edges, `width` apart at the foot. */
export const tape = (path: (beside: number) => string, width: number): Layer[] => [
  seam(path(0)),
  seam(path(width)),
];

const crinolineOutline = cloth(
  '0,0!--118,-4!{42}..{72}330,400..{82}468,930!{90}..433,956..331,978..179,992..{180}0,997!',
);
const crinolineBand = piece('0,-30!{0}..{-6}118,-36!--120,-4!{176}..{180}0,4!');

export const crinolineLayers = { outline: crinolineOutline, band: crinolineBand };

/** A cage of about 1860: steels on tapes. */
export const crinoline = silhouette(
  crinolineOutline,
  ...[134, 366, 590, 780].map((y) => seam(nearHalf(crinolineHoop(y)), 'once', 'all')),
  seam('44,0{76}..{85}128,1010'),
  seam('86,0{54}..{78}302,1000'),
  crinolineBand,
);

const BUSTLE_EDGE = '96,-4{44}..{84}168,120..{94}172,290..{150}120,372';

export const bustleSteels = [62, 116, 170, 224, 278, 326].map((y) => hoopAt(BUSTLE_EDGE, y, 26));

const bustleTies = seam('112,-14{10}..{80}214,70{80}..{60}226,190', 'both', 'all');
const bustleOutline = cloth('0,0!--96,-4!{44}..{84}168,120..{94}172,290..{150}120,372..{180}0,386!');
const bustleBand = piece('0,-28!{0}..{-4}116,-33!--117,-4!{176}..{180}0,2!');

export const bustleLayers = { ties: bustleTies, outline: bustleOutline, band: bustleBand };

/** A bustle of the 1880s: steels on a band that ties in front, seen from behind. */
export const bustle = silhouette(
  bustleTies,
  bustleOutline,
  ...bustleSteels.filter((_, index) => index < 5).map((steel) => seam(nearHalf(steel), 'once', 'all')),
  seam('46,0{82}..{90}70,400'),
  bustleBand,
);
