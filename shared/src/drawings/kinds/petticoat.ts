import {
  allRound,
  alongCurve,
  buttons,
  cloth,
  fold,
  piece,
  row,
  seam,
  stitching,
  straightLine,
} from '../diagram/layers.js';
import type { GarmentDiagram, View } from '../diagram/model.js';
import { PETTICOAT_EDGE, petticoat as petticoatOutline } from '../silhouettes/legs.js';
import { petticoatInside } from './petticoat-inside.js';

const eyelets = [...row(5, [34, 956], [190, 946]), ...row(5, [230, 943], [386, 918])];

const openwork = [buttons(eyelets, 4, 'both'), stitching('0,940{0}..{-8}420,905')] as const;

const front: View = {
  name: 'front',
  caption: 'Front',
  anchors: { waistSide: [129, 0], hemSide: [424, 940] },
  layers: [
    ...petticoatOutline.layers,
    fold('14,8{88}..{89}26,640'),
    fold('48,6{80}..{85}96,300'),
    fold('84,4{60}..{80}180,620'),
    fold('112,2{46}..{76}224,260'),
    ...openwork,
  ],
};

const back: View = {
  name: 'back',
  caption: 'Back',
  anchors: { waistSide: [129, 0], hemBack: [0, 990] },
  layers: [
    cloth(`0,4!--129,0!{36}..{72}236,230..{79}424,940!${PETTICOAT_EDGE}..{180}0,990!`),
    ...[
      [12, 88, 24, 88, 380],
      [22, 85, 54, 86, 640],
      [34, 81, 82, 83, 300],
      [46, 76, 122, 82, 560],
      [60, 70, 140, 79, 260],
      [76, 62, 190, 79, 600],
      [94, 54, 214, 77, 380],
      [112, 44, 240, 76, 520],
    ].map(([x, leaving, toX, arriving, toY]) => fold(`${x},4{${leaving}}..{${arriving}}${toX},${toY}`)),
    seam('0,4--0,250', 'once'),
    seam('7,4--7,250', 'once'),
    seam('164,430{82}..{80}262,1000'),
    seam('0,760{0}..{-8}400,728'),
    seam('0,790{0}..{-8}410,758'),
    seam('0,820{0}..{-8}420,788'),
    ...openwork,
    piece('0,-32!{0}..{-3}127,-34!--129,0!{178}..{180}0,6!'),
    seam('7,-32--7,6', 'once', 'last'),
    buttons([[2, -14]], 3.4),
  ],
};

/** A white cotton petticoat of about 1862. */
export const petticoat: GarmentDiagram = {
  kind: 'petticoat',
  title: 'Petticoat',
  leastScale: 0.24,
  views: [front, back, petticoatInside],
  lines: [
    allRound('waistband', 'inside', ['~bandEnd--~band', 'band--bandEnd']),
    allRound('hip', 'inside', '~hip--hip', { sag: 16 }),
    allRound('hem', 'inside', '~hemSide{14}..{0}hemBack..{-14}hemSide', { beside: -18 }),
    straightLine('hem-depth', 'inside', '-90,937---90,986'),
    straightLine('cloth-width', 'inside', '~seamAtTuck--seamAtTuck'),
    straightLine('waist-to-hem-front', 'front', '0,10--0,986'),
    alongCurve('waist-to-hem-side', 'front', 'waistSide{36}..{72}236,230..{79}hemSide', { beside: 13 }),
    straightLine('waist-to-hem-back', 'back', '26,8--26,982'),
    straightLine('opening', 'back', '-26,6---26,250'),
  ],
};
