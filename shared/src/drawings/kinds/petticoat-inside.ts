import { buttons, fold, lining, piece, pieceLining, row, seam, stitching } from '../diagram/layers.js';
import type { View } from '../diagram/model.js';
import { PETTICOAT_EDGE } from '../silhouettes/legs.js';

/** Turned inside out, back up, the placket parted: the seams of its widths, the backs of the tucks. */
export const petticoatInside: View = {
  name: 'inside',
  caption: 'Turned inside out, back up',
  anchors: {
    bandTop: [138, -36],
    waistSide: [140, 0],
    placket: [28, 2],
    placketTop: [30, -33],
    placketEnd: [0, 250],
    hip: [208, 170],
    hemSide: [424, 940],
    hemBack: [0, 990],
    band: [139, -17],
    bandEnd: [29, -15],
    seamAtTuck: [212, 690],
  },
  layers: [
    // The front lies beneath, seen through the opening.
    pieceLining('0,-22!{0}..{-4}bandTop!--waistSide!{178}..{180}0,13!'),
    lining('0,10!--waistSide!--100,290!--0,290!'),
    fold('10,16{89}..{90}12,240'),
    lining(
      `placketEnd!{-90}..{-82}placket!{0}..{-3}waistSide!{38}..{72}238,230..{79}hemSide!${PETTICOAT_EDGE}..{180}hemBack!`,
    ),
    // The placket is slit into the middle of a width: narrow hems, and a bar that keeps it from tearing.
    stitching('6,240{-88}..{-82}36,4'),
    seam('-9,252--9,252', 'once', 'all'),
    seam('-9,257--9,257', 'once', 'all'),
    // The seams of the widths, selvedge to selvedge, gathered away at the top.
    seam('98,4{62}..{82}152,280..{82}seamAtTuck..{82}262,1010'),
    stitching('105,4{62}..{82}160,280..{82}220,690..{82}270,1010'),
    ...[
      [40, 86, 52, 88, 330],
      [52, 82, 76, 85, 520],
      [64, 78, 104, 84, 280],
      [76, 72, 124, 82, 430],
      [110, 50, 206, 77, 300],
      [122, 42, 248, 77, 520],
    ].map(([x, leaving, toX, arriving, toY]) => fold(`${x},4{${leaving}}..{${arriving}}${toX},${toY}`)),
    // Three tucks lie outside; inside, only the lines of their stitching.
    stitching('0,760{0}..{-8}400,728'),
    stitching('0,790{0}..{-8}410,758'),
    stitching('0,820{0}..{-8}420,788'),
    // The embroidered edge is sewn on; its seam is felled down.
    seam('0,930{0}..{-8}424,894'),
    stitching('0,940{0}..{-8}424,905'),
    buttons([...row(5, [34, 960], [190, 950]), ...row(5, [230, 947], [386, 922])], 4, 'both'),
    piece('placketTop!{0}..{-3}bandTop!--waistSide!{178}..{176}placket!--placketTop!', 'both'),
    stitching('34,-27{0}..{-3}136,-30', 'both', 'last'),
    stitching('34,-4{0}..{-3}137,-6', 'both', 'last'),
    // Buttonhole in the end that lies on top, the button's threads in the other.
    seam('34,-15--48,-15', 'once', 'all'),
    buttons([[-40, -15]], 2),
  ],
};
