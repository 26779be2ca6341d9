import { buttons, fold, lining, piece, row, seam, stitching } from '../diagram/layers.js';
import type { View } from '../diagram/model.js';

/** Panels that are cut in at the waist: each seam bends towards it. Where they stand at top, waist and bottom. */
const seams: readonly (readonly [number, number, number, number, number])[] = [
  [50, -136, 44, 52, 152],
  [96, -150, 84, 96, 150],
  [144, -166, 130, 142, 146],
  [196, -192, 180, 196, 166],
  [246, -204, 228, 244, 194],
];

const eyelets = row(10, [15, -108], [16, 140]);

/** Of the busk: each stands for a loop of the wearer's right front, or a stud of its left. */
const rivets = row(5, [306, -116], [306, 176]);

/** Opened at the busk and laid out, lining up: laced behind, edge to edge, which is here the middle. */
export const corsetInside: View = {
  name: 'inside',
  caption: 'Inside, opened at the busk',
  anchors: {
    laceTop: [3, -124],
    laceBottom: [4, 156],
    side: [122, -158],
    bust: [236, -204],
    buskTop: [314, -152],
    buskWaist: [314, 0],
    buskBottom: [314, 222],
    bottomSide: [144, 146],
  },
  layers: [
    lining(
      'laceTop!{-4}..{-10}side..{-22}bust..{34}buskTop!--buskBottom!{206}..{190}bottomSide..{180}laceBottom!--laceTop!',
      'both',
    ),
    ...seams.flatMap(([top, topY, waist, bottom, bottomY]) => [
      seam(`${top},${topY - 14}{97}..{90}${waist},0{90}..{83}${bottom},${bottomY + 20}`, 'both', 'last'),
      // Each casing holds a bone beside its seam.
      ...[-7, 7].map((beside) =>
        stitching(
          `${top + beside},${topY - 14}{97}..{90}${waist + beside},0{90}..{83}${bottom + beside},${bottomY + 24}`,
          'both',
          'last',
        ),
      ),
    ]),
    // Bones either side of the eyelets.
    stitching('7,-140--8,170', 'both', 'last'),
    seam('24,-140--25,170', 'both', 'last'),
    // The waist tape lies over the casings and takes the strain.
    piece('26,-9!--286,-9!--286,9!--26,9!--26,-9!', 'both'),
    stitching('29,-5--284,-5', 'both', 'last'),
    stitching('29,5--284,5', 'both', 'last'),
    stitching('6,-114{-2}..{-10}122,-149..{-22}236,-195..{34}312,-142', 'both', 'cloth'),
    stitching('8,147{0}..{10}144,137..{26}312,211', 'both', 'cloth'),
    // The busk in its casing, loops at one edge, studs riveted in at the other.
    seam('288,-190--288,230', 'both', 'cloth'),
    stitching('298,-190--298,230', 'both', 'cloth'),
    ...rivets.map(([, y]) => seam(`-314,${y - 6}{180}..-325,${y}..{0}-314,${y + 6}`, 'once', 'all')),
    buttons(rivets, 2.6, 'both'),
    ...eyelets.map(([x, y]) => fold(`${-x},${y.toFixed(1)}--${x},${y.toFixed(1)}`, 'once', 'all')),
    buttons(eyelets, 3, 'both'),
  ],
};
