import {
  allRound,
  alongCurve,
  cloth,
  flatDoubled,
  fold,
  seam,
  stitching,
  straightLine,
} from '../diagram/layers.js';
import type { GarmentDiagram, View } from '../diagram/model.js';
import { chemise as chemiseOutline } from '../silhouettes/body-linen.js';

const front: View = {
  name: 'front',
  caption: 'Front',
  anchors: { neck: [122, -4], neckFront: [0, 82], hemSide: [296, 960], hemFront: [0, 990], tip: [172, 10] },
  layers: [
    ...chemiseOutline.layers,
    fold('38,94{84}..{87}56,280'),
    fold('0,100--0,250', 'once'),
    stitching('0,978{0}..{-10}292,948'),
    stitching('296,100{112}..{112}264,182', 'both', 'all'),
  ],
};

const back: View = {
  name: 'back',
  caption: 'Back',
  anchors: { neckBack: [0, 36] },
  layers: [
    cloth('neckBack!{0}..{-32}122,-4!{14}..172,10!{98}..190,160!{86}..{81}296,960!{168}..{180}0,992!'),
    cloth('172,10!{22}..{44}300,96!{112}..262,196!{198}..{196}190,160!--172,10!', 'both'),
    seam('0,50{0}..{-32}132,8'),
    fold('0,54--0,220', 'once'),
    fold('20,52{87}..{88}28,250'),
    fold('44,48{84}..{87}60,210'),
    fold('68,40{82}..{86}90,240'),
    seam('196,330{92}..{96}130,1000'),
    stitching('0,980{0}..{-10}292,948'),
    stitching('296,100{112}..{112}264,182', 'both', 'all'),
  ],
};

export const chemise: GarmentDiagram = {
  kind: 'chemise',
  title: 'Chemise',
  leastScale: 0.28,
  views: [front, back],
  lines: [
    allRound('neck', 'front', '~neck{54}..{0}neckFront..{-54}neck', { beside: 9 }),
    allRound('hem', 'front', '~hemSide{11}..{0}hemFront..{-11}hemSide', { beside: -16 }),
    flatDoubled('shirt-body', 'front', '-208,300--208,300'),
    straightLine('shirt-front', 'front', '-146,8---146,972'),
    alongCurve('sleeve-outer', 'front', 'tip{22}..{44}300,96', { beside: 13 }),
    straightLine('shirt-back', 'back', '-146,8---146,974'),
    straightLine('cloth-width', 'back', '-250,640--250,640'),
  ],
};
