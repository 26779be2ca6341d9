import { buttons, cloth, edge, lining, piece, pieceLining, seam, stitching } from '../diagram/layers.js';
import type { Layer, View } from '../diagram/model.js';

export interface OpenedFall {
  /** Half the waistband, and how far down its side the bearers are cut. */
  readonly waistHalf: number;
  /** Half the width of the fall, and its lower end. */
  readonly fallHalf: number;
  readonly fallFoot: number;
  /** The right leg's outline from the side of the waistband down and up again to the fork. */
  readonly leg: string;
  readonly fork: readonly [number, number];
  readonly legLayers: readonly Layer[];
}

/**
 * Front up, the fall dropped and the bearers folded out: one looks into the seat, and the whole waistband lies in
 * sight from its button to the end of the hole.
 */
export function openedFall({ waistHalf, fallHalf, fallFoot, leg, fork, legLayers }: OpenedFall): View {
  const side = waistHalf + 4;
  const end = waistHalf * 2 - 6;
  const foot = fallFoot + (fallFoot - 46);
  return {
    name: 'inside',
    caption: 'Opened at the front, the fall dropped',
    anchors: {
      back: [0, -34],
      backFoot: [0, 10],
      side: [side, -2],
      sideFoot: [side, 42],
      end: [end, -34],
      endFoot: [end + 6, 12],
      bandBack: [0, -12],
      bandSide: [side, 20],
      bandEnd: [end - 8, -12],
      bearerFoot: [side + 14, 190],
    },
    layers: [
      // The inside of the back: seat seam, lining of the band, gathers beneath it.
      lining(`0,-10!--${side},30!--${side + 34},240!--0,${fallFoot + 40}!`),
      seam(`0,-34--0,${fallFoot + 40}`, 'once', 'last'),
      stitching(`6,14--6,${fallFoot + 40}`, 'both', 'last'),
      stitching('60,12{84}..{88}72,130', 'both', 'last'),
      stitching('88,16{82}..{88}104,110', 'both', 'last'),
      // The legs, front up.
      cloth(
        `${side + 10},110!${leg}--${fork[0]},${fork[1]}!--0,${fallFoot}!--${fallHalf},${fallFoot}!--${fallHalf + 4},180!--${side + 10},110!`,
      ),
      seam(`0,${fallFoot}--0,${fork[1] + 8}`, 'once'),
      ...legLayers,
      // The bearers, folded out at the side seams: a pocket hangs in each.
      lining(`${side},34!--${end},6!--${end + 2},60!{118}..{160}bearerFoot!--${side},34!`, 'both'),
      seam(`${side + 30},50--${end - 6},20`, 'both', 'last'),
      piece(
        `${side + 26},60!--${side + 96},46!{92}..{88}${side + 92},150{120}..{180}${side + 62},170{180}..{-96}${side + 26},60!`,
        'both',
      ),
      stitching(`${side + 34},68--${side + 88},57`, 'both', 'last'),
      // The waistband, lined, in one sweep.
      pieceLining(`back!{0}..side..end!--endFoot!..sideFoot..{180}backFoot!`),
      stitching(`0,3{0}..${side},35..${end + 4},5`),
      edge(`0,-34--0,10`, 'once'),
      seam(`-12,-30--12,-18`, 'once', 'all'),
      seam(`-12,-18--12,-30`, 'once', 'all'),
      seam(`-12,-14--12,-2`, 'once', 'all'),
      seam(`-12,-2--12,-14`, 'once', 'all'),
      buttons(
        [
          [-14, -24],
          [-14, -6],
          [14, -24],
          [14, -6],
        ],
        2.6,
      ),
      // Left over right: the hole in the wearer's left, at the viewer's right.
      seam(`${end - 26},-8--${end - 8},-12`, 'once', 'all'),
      buttons([[-end + 16, -11]], 2),
      // The fall, its lining up.
      pieceLining(`0,${fallFoot}!--${fallHalf},${fallFoot}!--${fallHalf - 4},${foot}!--0,${foot + 4}!`),
      stitching(`0,${foot - 14}--${fallHalf - 4},${foot - 18}`, 'both', 'last'),
      stitching(`${fallHalf - 14},${fallFoot}--${fallHalf - 18},${foot}`, 'both', 'last'),
      seam(`${fallHalf - 22},${foot - 24}--${fallHalf - 12},${foot - 8}`, 'both', 'last'),
    ],
  };
}
