import { buttons, fold, lining, piece, row, seam, stitching } from '../diagram/layers.js';
import type { View } from '../diagram/model.js';

/** Panels that are cut in at the waist: each seam bends towards it. Where they stand at top, waist and bottom. */
const seams: readonly (readonly [number, number, number, number, number])[] = [
  [58, -136, 48, 60, 152],
  [104, -150, 88, 104, 150],
  [152, -166, 132, 150, 146],
  [204, -192, 178, 204, 166],
  [252, -204, 222, 250, 194],
];

/** Opened at the busk and laid out, lining up: laced behind, which is here the middle. */
export const corsetInside: View = {
  name: 'inside',
  caption: 'Inside, opened at the busk',
  anchors: {
    laceTop: [18, -124],
    laceBottom: [20, 156],
    laceWaist: [17, 0],
    side: [128, -158],
    bust: [236, -204],
    buskTop: [318, -152],
    buskWaist: [288, 0],
    buskBottom: [318, 222],
    bottomSide: [150, 146],
  },
  layers: [
    lining(
      'laceTop!{-4}..{-10}side..{-22}bust..{34}buskTop!{112}..{90}buskWaist..{70}buskBottom!{206}..{190}bottomSide..{180}laceBottom!' +
        '{-91}..{-91}laceTop!',
      'both',
    ),
    ...seams.flatMap(([top, topY, waist, bottom, bottomY]) => [
      seam(`${top},${topY - 14}{98}..{90}${waist},0{90}..{82}${bottom},${bottomY + 20}`, 'both', 'last'),
      // Each casing holds a bone beside its seam.
      stitching(
        `${top + 9},${topY - 14}{98}..{90}${waist + 9},0{90}..{82}${bottom + 9},${bottomY + 20}`,
        'both',
        'last',
      ),
    ]),
    // The busk's facing, with its studs at one edge and its loops at the other.
    seam('306,-150{112}..{90}274,0{90}..{70}304,222', 'both', 'last'),
    buttons(
      row(5, [304, -116], [306, 176]).map(([x, y]): [number, number] => [-(x - Math.abs(y) * 0.04 - 8), y]),
      3.6,
    ),
    ...row(5, [0, -116], [0, 176]).map(([, y]) => {
      const x = 292 + Math.abs(y) * 0.12;
      return seam(
        `${x},${y - 4}--${x + 9},${y - 4}{0}..{180}${x + 9},${y + 4}--${x},${y + 4}`,
        'once',
        'all',
      );
    }),
    // The waist tape lies over the seams and takes the strain.
    piece('20,-8!--286,-8!--286,8!--20,8!--20,-8!', 'both'),
    stitching('22,-114{-2}..{-10}128,-149..{-22}236,-195..{34}312,-146', 'both', 'last'),
    stitching('24,147{0}..{10}150,137..{26}314,210', 'both', 'last'),
    ...row(9, [0, -108], [0, 116]).map(([, y]) => fold(`-26,${y}--26,${y + 28}`, 'both', 'all')),
    buttons(row(10, [27, -110], [28, 142]), 3, 'both'),
  ],
};
