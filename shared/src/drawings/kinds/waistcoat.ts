import {
  allRound,
  alongCurve,
  cloth,
  fold,
  piece,
  row,
  seam,
  stitching,
  straightLine,
} from '../diagram/layers.js';
import type { GarmentDiagram, View } from '../diagram/model.js';
import { waistcoat as waistcoatOutline } from '../silhouettes/coats.js';
import { waistcoatInside } from './waistcoat-inside.js';

const front: View = {
  name: 'front',
  caption: 'Front',
  anchors: {
    neck: [68, 0],
    tip: [146, 36],
    underarm: [202, 232],
    waistSide: [195, 366],
  },
  layers: [
    ...waistcoatOutline.layers,
    stitching('-8,500--42,538{-34}..{-22}186,460', 'once', 'cloth'),
    stitching('0,504!---42,538{214}..{202}-186,460', 'once', 'cloth'),
    stitching('-2,268--0,510', 'once', 'cloth'),
    seam('118,262{96}..{90}110,392'),
    stitching('138,40{108}..133,130..{46}196,224', 'both', 'cloth'),
    seam('58,300--112,292--113,307--60,315--58,300', 'once', 'all'),
    ...row(6, [2, 280], [2, 490]).map(([, y]) => fold(`8,${y}--18,${y}`, 'once')),
    fold('176,250{110}..{96}158,330'),
    fold('184,300{100}..{92}172,400'),
  ],
};

const back: View = {
  name: 'back',
  caption: 'Back',
  anchors: {
    neckBack: [0, 8],
    neck: [66, -6],
    tip: [146, 36],
    scye: [128, 140],
    underarm: [202, 232],
    waistSide: [192, 366],
    hemSide: [188, 470],
    hemBack: [0, 460],
  },
  layers: [
    cloth(
      'neckBack!{0}..{-30}neck!{22}..{26}tip!{114}..scye..{44}underarm!{94}..waistSide..{88}hemSide!{184}..{180}hemBack!',
    ),
    seam('0,0--0,480', 'once'),
    seam('neck!{24}..{28}152,52'),
    stitching('0,17{0}..{-30}74,2'),
    stitching('154,46{114}..136,142..{44}206,224'),
    // Side bodies curve in to the waist.
    seam('164,200{122}..{96}122,300{92}..{86}126,480'),
    fold('26,392{96}..{92}18,446'),
    fold('46,398{92}..{90}44,440'),
    fold('60,340{-80}..{-84}66,290'),
    fold('34,338{-86}..{-88}36,300'),
    stitching('0,451{0}..{4}192,461'),
    // The straps: sewn in at the side bodies, drawn up by the buckle.
    piece('124,352!{180}..{176}18,360!--18,388!{4}..{0}124,382!--124,352!', 'both'),
    stitching('118,357--118,377--102,377--102,358--118,357', 'both', 'all'),
    piece('18,360!---50,362!{176}..{184}-58,374!{-4}..{-8}-50,387!--18,388!--18,360!', 'once'),
    piece('-18,353!--18,353!--18,395!---18,395!---18,353!', 'once'),
    piece('-9,362!--9,362!--9,386!---9,386!---9,362!', 'once'),
    seam('-9,370--12,370', 'once', 'all'),
    seam('-9,378--12,378', 'once', 'all'),
  ],
};

/** A man's waistcoat of about 1845, shawl-collared, strapped behind. */
export const waistcoat: GarmentDiagram = {
  kind: 'waistcoat',
  title: 'Waistcoat',
  leastScale: 0.45,
  views: [front, back, waistcoatInside],
  lines: [
    allRound('waistcoat-chest', 'inside', [
      '~frontChest---238,254',
      '-175,254--175,254',
      '238,254--frontChest',
    ]),
    allRound('waist', 'inside', [
      '~frontWaist--~frontWaistSide',
      '~waistSide--waistSide',
      'frontWaistSide--frontWaist',
    ]),
    alongCurve('side-seam', 'inside', 'frontUnderarm{88}..{87}frontWaistSide', { beside: -9 }),
    allRound(
      'armscye',
      'inside',
      ['~frontTip{114}..~frontScye{88}..{46}~frontUnderarm', '~underarm{-44}..~scye{-88}..{-66}~tip'],
      { beside: 7 },
    ),
    alongCurve('shoulder-seam', 'front', '~tip--~neck', { beside: 12 }),
    straightLine('waistcoat-front', 'front', '-68,6---68,526'),
    straightLine('across-back', 'back', '~scye--scye'),
    alongCurve('underarm-to-underarm-back', 'back', '~underarm{6}..{0}0,248..{-6}underarm'),
    straightLine('waistcoat-back', 'back', '-40,4---40,460'),
  ],
};
