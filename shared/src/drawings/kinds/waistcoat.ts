import { allRound, alongCurve, cloth, piece, seam, stitching, straightLine } from '../diagram/layers.js';
import { type GarmentDiagram, type View } from '../diagram/model.js';
import { waistcoat as waistcoatOutline } from '../silhouettes/coats.js';

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
    stitching('0,504!--42,538{-34}..{-22}186,460'),
    seam('118,250{96}..{90}110,392'),
  ],
};

const back: View = {
  name: 'back',
  caption: 'Back',
  anchors: {
    neckBack: [0, 8],
    tip: [146, 36],
    scye: [132, 140],
    underarm: [202, 232],
    hemBack: [0, 472],
  },
  layers: [
    cloth(
      'neckBack!{0}..{-30}66,-6!{22}..{26}tip!{114}..scye..{44}underarm!{92}..{82}188,470!{178}..{180}hemBack!',
    ),
    seam('0,0--0,480', 'once'),
    stitching('0,16!{0}..{-30}72,0'),
    stitching('150,44!{114}..140,142..{44}206,226'),
    seam('206,344--30,360'),
    seam('206,378--30,388'),
    piece('-30,356--30,356--30,392---30,392---30,356', 'once'),
    seam('-20,364--20,364--20,384---20,384---20,364', 'once', 'all'),
    seam('-20,374--30,374', 'once', 'all'),
  ],
};

/** A man's waistcoat of about 1845, shawl-collared, strapped behind. */
export const waistcoat: GarmentDiagram = {
  kind: 'waistcoat',
  title: 'Waistcoat',
  leastScale: 0.36,
  views: [front, back],
  lines: [
    allRound('waistcoat-chest', 'front', '-201,240--201,240', { sag: 10 }),
    allRound('waist', 'front', '~waistSide--waistSide', { sag: 10 }),
    alongCurve('side-seam', 'front', 'underarm{92}..{87}waistSide', { beside: 12 }),
    alongCurve('shoulder-seam', 'front', '~tip--~neck', { beside: 12 }),
    straightLine('waistcoat-front', 'front', '-68,6---68,526'),
    allRound('armscye', 'back', '~tip{66}..~scye..{136}~underarm', { beside: -11 }),
    straightLine('across-back', 'back', '~scye--scye'),
    alongCurve('underarm-to-underarm-back', 'back', '~underarm{6}..{0}0,246..{-6}underarm'),
    straightLine('waistcoat-back', 'back', '-46,2---46,470'),
  ],
};
