import { buttons, fold, lining, piece, pieceLining, row, seam, stitching } from '../diagram/layers.js';
import type { View } from '../diagram/model.js';

const HEM =
  '{156}..{190}366,950!{150}..{192}294,962!{150}..{190}222,972!{150}..{188}148,980!{150}..{186}74,984!{152}..{180}hemBack!';

/** Gathers at the band: where each begins, and where it runs out. */
const gathers: readonly (readonly [number, number, number, number])[] = [
  [34, 86, 60, 360],
  [46, 80, 96, 560],
  [58, 74, 120, 300],
  [70, 68, 168, 600],
  [84, 58, 190, 320],
  [100, 50, 236, 640],
  [114, 44, 238, 300],
];

/** Turned inside out, back up, the placket parted: the gathered band, the backs of the tucks, the hem. */
export const petticoatInside: View = {
  name: 'inside',
  caption: 'Turned inside out, back up',
  anchors: {
    bandTop: [127, -34],
    waistSide: [129, 0],
    placket: [24, 3],
    placketTop: [25, -33],
    placketEnd: [0, 250],
    hip: [204, 170],
    hemSide: [424, 940],
    hemBack: [0, 990],
  },
  layers: [
    pieceLining('0,-26!{0}..{-4}bandTop!--waistSide!{178}..{180}0,10!'),
    lining('0,6!--waistSide!--96,270!--0,270!'),
    lining(`placketEnd!{-90}..{-82}placket!{0}..{-3}waistSide!{36}..{72}236,230..{79}hemSide!${HEM}`),
    ...gathers.map(([x, leaving, toX, toY]) => fold(`${x},6{${leaving}}..{84}${toX},${toY}`)),
    seam('placketEnd--0,1000', 'once'),
    stitching('7,258--7,760'),
    seam('164,430{82}..{80}262,1000'),
    stitching('171,428{82}..{80}269,1000'),
    // Tucks are stitched through: from within their stitching shows, and not the fold.
    ...[760, 790, 820].map((y) => stitching(`0,${y}{0}..{-8}430,${y - 36}`)),
    stitching('0,930{0}..{-8}426,895'),
    buttons([...row(5, [34, 956], [190, 946]), ...row(5, [230, 943], [386, 918])], 4, 'both'),
    // The placket's edges are turned in once and hemmed down.
    stitching('31,8{98}..{94}8,246'),
    piece('placketTop!{0}..{-3}bandTop!--waistSide!{178}..{176}placket!', 'both'),
    seam('-25,-19---12,-19{0}..{180}-12,-11---24,-11', 'once', 'all'),
    buttons([[32, -15]], 3.4),
  ],
};
