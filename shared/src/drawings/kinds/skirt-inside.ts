import { cloth, fold, lining, piece, pieceLining, seam, stitching } from '../diagram/layers.js';
import type { View } from '../diagram/model.js';

const HEM_FACING = '0,1286{0}..{-12}200,1262..{-46}352,1166..{-96}392,1064';

/** Turned inside out, back up, the placket parted: band, tapes, pocket and hem facing are in sight. */
export const skirtInside: View = {
  name: 'inside',
  caption: 'Turned inside out, back up',
  anchors: {
    bandTop: [140, -38],
    waistSide: [143, 0],
    placket: [30, 2],
    placketTop: [32, -36],
    placketEnd: [0, 262],
    hip: [200, 176],
    corner: [438, 1216],
    hemBack: [0, 1392],
  },
  layers: [
    pieceLining('0,-24!{0}..{-4}bandTop!--waistSide!{178}..{180}0,12!'),
    lining('0,8!--waistSide!--100,300!--0,300!'),
    lining(
      'placketEnd!{-90}..{-82}placket!{0}..{-3}waistSide!{54}..{76}hip..{74}262,560..{66}334,900..{84}corner{96}..{128}404,1312' +
        '..{180}hemBack!',
    ),
    seam('placketEnd--0,1400', 'once'),
    stitching('6,270--6,1290'),
    seam('96,2{66}..{77}152,300{77}..{62}270,820..{56}352,1150'),
    stitching('102,2{66}..{77}159,300{77}..{62}277,818..{56}358,1146'),
    fold('40,4{88}..{84}56,260'),
    fold('52,4{84}..{80}84,330'),
    fold('64,4{80}..{77}104,240'),
    fold('60,560{84}..{80}120,1180'),
    fold('160,620{76}..{66}246,980'),
    seam(HEM_FACING),
    stitching('0,1380{0}..{-12}216,1355..{-52}396,1300..{-82}429,1210'),
    // Tapes that draw the fullness back, tied behind.
    piece('140,470!{178}..{170}22,486!--22,496!{-10}..{-2}140,480!', 'both'),
    seam('22,490{200}..{110}-14,520{110}..{70}-8,570', 'once', 'all'),
    seam('-22,490{-20}..{70}12,522{70}..{100}16,566', 'once', 'all'),
    // The pocket hangs free inside the right-hand seam.
    cloth(
      '-148,250!{96}..{96}-166,330{100}..-158,470{60}..{0}-118,494{0}..{-80}-86,450{-84}..{-110}-140,256!---148,250!',
      'once',
    ),
    seam('-148,256{98}..{96}-156,320', 'once', 'last'),
    piece('placketTop!{0}..{-3}bandTop!--waistSide!{178}..{176}placket!', 'both'),
    seam('-32,-24---18,-24{0}..{180}-18,-16---30,-16', 'once', 'all'),
    seam('32,-20--20,-20', 'once', 'all'),
  ],
};
