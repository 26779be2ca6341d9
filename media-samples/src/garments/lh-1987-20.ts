import { layBelt } from '../accessories/belt';
import { dye } from '../cloths/cloth';
import { thread, whiteCotton } from '../cloths/cloths';
import { eyeletEdging } from '../cloths/lace';
import { loft } from '../renderer/loft';
import { bell, mix } from '../renderer/numbers';
import { seededNoise } from '../renderer/noise';
import { gathered, laySkirt, tuck } from '../skirts/skirt';
import { sewButton } from '../trims/buttons';
import { round, sewBand, sewFrill } from '../trims/sewn';
import { closeUp, standing, type Garment } from './garment';

const noise = seededNoise(1862);
const cotton = whiteCotton(dye('#eeeae0'), 0.4, 0.34);

/** Cut to go over a cage: nearly flat in front, sloping out behind. */
const form = loft([
  { y: 100, half: 11.6, front: 9, back: 9.2 },
  { y: 96, half: 17.4, front: 13.4, back: 18 },
  { y: 88, half: 26, front: 20, back: 29 },
  { y: 72, half: 36.4, front: 29, back: 42 },
  { y: 46, half: 46.4, front: 38, back: 54 },
  { y: 20, half: 52.4, front: 43.6, back: 62 },
  { y: 4, half: 55, front: 46, back: 65.4 },
]);
const folds = gathered(noise, { folds: 28, depth: 3.4, gathers: 88, gatherDepth: 1.3 });
const TUCKS = [0.6, 0.625, 0.65, 0.675, 0.7, 0.78, 0.805, 0.83];

export const lh1987n20: Garment = {
  number: 'LH.1987.20',
  kind: 'petticoat',
  build(scene) {
    const skirt = laySkirt(
      scene,
      {
        form,
        upper: () => 99.6,
        hem: () => 13,
        clothWidth: 330,
        folds: (u, theta, y, s) =>
          folds(u, theta, y, s) + TUCKS.reduce((sum, at) => sum + tuck(s, at, 0.4, 0.014), 0),
      },
      cotton,
      cotton,
      1700,
      800,
    );
    sewBand(scene, skirt, cotton, {
      from: 0.985,
      to: 1.003,
      lift: 0.4,
      across: 1400,
      width: 1.6,
      length: 330,
    });
    sewFrill(scene, skirt, eyeletEdging({ repeat: 4.6, depth: 11.5, colour: dye('#ebe7dc') }), {
      line: round(0.99),
      points: 2000,
      closed: true,
      length: 460,
      depth: 11,
      motifDepth: 11.5,
      way: 1,
      gathers: 66,
      stand: 0.7,
      flare: 1.4,
      lift: 0.1,
      down: 70,
    });
    const band = { upper: 102, lower: 98.8, half: 11.9, front: 9.4, back: 9.6 };
    layBelt(scene, noise, band, cotton);
    scene.lay({ cloth: cotton, across: 240, along: 20, closed: true }, (u, v, p) =>
      form(mix(101.8, 96, v), (u - 0.5) * 2 * Math.PI, -0.2 + 0.1 * bell(v, 0, 0.2), p),
    );
    sewButton(scene, [0.6, 100.4, 9.95], [0, 0, 1], 0.7, thread(dye('#e4ddcb')), 0.35, 36);
  },
  pictures: [
    {
      view: 'front',
      name: 'front',
      shot: standing(28, { lookAt: [0, 48], span: 118, aspect: 1.06, reach: 92 }, { exposure: 0.73 }),
      alt: 'A white cotton petticoat of about 1862, made to go over a cage: gathered into a narrow buttoned band, with two groups of tucks and a deep gathered edge worked with eyelets.',
      caption: 'Front. Rendered; invented garment.',
    },
    {
      view: 'detail',
      name: 'detail-hem',
      shot: closeUp(22, { lookAt: [2, 11], span: 36, aspect: 1.33, pitch: 6 }, { exposure: 0.73 }),
      alt: 'A close view of the hem: tucks above a scalloped edge worked with sprays of eyelets.',
      caption: 'Tucks and eyelet edging. Rendered; invented garment.',
      fineness: 1.2,
    },
  ],
};
