import { allRound, alongCurve, cloth, piece, seam, stitching, straightLine } from '../diagram/layers.js';
import type { GarmentDiagram, View } from '../diagram/model.js';
import { nearHalf } from '../geometry/hoops.js';
import { bustleLayers, bustleSteels, tape } from '../silhouettes/cages.js';

const STEEL = 7;

const behind: View = {
  name: 'back',
  caption: 'From behind',
  anchors: {},
  layers: [
    bustleLayers.ties,
    bustleLayers.outline,
    ...bustleSteels.flatMap((steel) => [
      seam(nearHalf(steel), 'once', 'cloth'),
      seam(nearHalf(steel, STEEL), 'once', 'cloth'),
    ]),
    ...tape((beside) => `${44 + beside / 2},0{78}..{92}${72 + beside},400`, 9),
    stitching('0,374{0}..{-8}124,360', 'both', 'last'),
    bustleLayers.band,
    stitching('0,-22{0}..{-4}112,-27', 'both', 'last'),
    stitching('0,-4{0}..{-4}112,-9', 'both', 'last'),
  ],
};

const side: View = {
  name: 'side',
  caption: 'From the side',
  anchors: { top: [0, 0], foot: [0, 384] },
  layers: [
    cloth('top!{14}..{84}176,110..{96}190,220..{130}120,340..{170}foot!--top', 'once'),
    // Each steel is a half hoop, its ends held together by laces before it.
    ...[66, 120, 174, 228, 282, 330].flatMap((y) =>
      [0, STEEL].map((lower) => seam(`0,${y + lower}{16}..{-14}230,${y + lower}`, 'once')),
    ),
    ...[0, 9].map((beside) =>
      seam(`${40 + beside / 2},-10{52}..{92}${112 + beside},180{92}..{134}${50 + beside},400`, 'once'),
    ),
    stitching('9,4--9,384', 'once'),
    piece('-64,-28!--6,-30!--8,2!---64,0!---64,-28', 'once'),
    stitching('-60,-22--4,-24', 'once', 'last'),
    seam('-64,-14{176}..{100}-150,60', 'once', 'all'),
  ],
};

/** A wire bustle of about 1885. */
export const bustle: GarmentDiagram = {
  kind: 'bustle',
  title: 'Bustle',
  leastScale: 0.5,
  views: [behind, side],
  lines: [
    allRound('bustle-band', 'back', '-116,-17--116,-17', { sag: 6 }),
    straightLine('bustle-width', 'back', '-178,212--178,212'),
    straightLine('bustle-depth', 'side', '0,208--191,208'),
    alongCurve('bustle-length', 'side', 'top{14}..{84}176,110..{96}190,220..{130}120,340..{170}foot', {
      beside: 13,
    }),
  ],
};
