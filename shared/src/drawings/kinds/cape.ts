import { allRound, cloth, fold, piece, seam, stitching, straightLine } from '../diagram/layers.js';
import type { GarmentDiagram, View } from '../diagram/model.js';
import { cape as capeOutline } from '../silhouettes/coats.js';

const front: View = {
  name: 'front',
  caption: 'Front',
  anchors: { neck: [64, 0], neckFront: [0, 42], hemSide: [420, 526], hemFront: [0, 590] },
  layers: [
    ...capeOutline.layers,
    seam('12,50--12,600', 'once'),
    stitching('0,572!{0}..{-23}410,508'),
    fold('70,90{82}..{82}116,560'),
    fold('160,190{70}..{70}278,540'),
    fold('214,240{66}..{66}340,530'),
  ],
};

const back: View = {
  name: 'back',
  caption: 'Back',
  anchors: { neckBack: [0, 10], hemBack: [0, 604] },
  layers: [
    cloth('neckBack!{0}..{-24}64,-4!{28}..{56}232,122..{66}420,526!{156}..{180}hemBack!'),
    seam('0,10--0,610', 'once'),
    seam('96,-4{50}..{62}166,96'),
    fold('26,110{85}..{85}64,600'),
    fold('84,130{77}..{77}178,590'),
    fold('150,180{70}..{70}276,560'),
    fold('214,230{66}..{66}350,540'),
    stitching('0,586!{0}..{-23}412,508'),
    piece('neckBack!{0}..{-24}64,-4!{-76}..72,-68!{186}..{180}0,-76!'),
  ],
};

export const cape: GarmentDiagram = {
  kind: 'cape',
  title: 'Cape',
  leastScale: 0.24,
  views: [front, back],
  lines: [
    allRound('cape-neck', 'front', '~neck{62}..{0}neckFront..{-62}neck', { beside: -9 }),
    allRound('cape-sweep', 'front', '~hemSide{24}..{0}hemFront..{-24}hemSide', { beside: -16 }),
    straightLine('cape-back-length', 'back', '0,12--0,602'),
  ],
};
