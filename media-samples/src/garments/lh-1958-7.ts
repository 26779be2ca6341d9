import { layBelt } from '../accessories/belt';
import { dye } from '../cloths/cloth';
import { lining, ribbon, woolTwill } from '../cloths/cloths';
import { loft } from '../renderer/loft';
import { clamp, ease, mix } from '../renderer/numbers';
import { seededNoise } from '../renderer/noise';
import type { Layer } from '../renderer/scene';
import { gathered, knifePleats, laySkirt, skirtLayer } from '../skirts/skirt';
import { sewBand } from '../trims/sewn';
import { standing, type Garment } from './garment';

const noise = seededNoise(1877);
const olive = woolTwill(dye('#6c6a45'), 13);
const inside = lining(dye('#b9ab8c'));
const trim = ribbon(dye('#4b4a30'));

/** The natural form: close before, drawn back, its fullness low and carried into a train. */
const form = loft([
  { y: 101, half: 11.2, front: 8.7, back: 8.9 },
  { y: 97, half: 14, front: 10.6, back: 13 },
  { y: 90, half: 16.8, front: 12.4, back: 17 },
  { y: 76, half: 18.6, front: 13.8, back: 19.6 },
  { y: 54, half: 20.4, front: 15.8, back: 25 },
  { y: 34, half: 23, front: 18, back: 36 },
  { y: 18, half: 26.4, front: 20.6, back: 52 },
  { y: 6, half: 30, front: 23.4, back: 72 },
  { y: 0.6, half: 32.4, front: 25, back: 88 },
]);

const under = gathered(noise, { folds: 22, depth: 2.6, gathers: 54, gatherDepth: 0.7, power: 1.3 });

/** The front is wrinkled across and tied back at the sides. */
const HALF = 1.75;
const tied: Layer = (u, v, lift, p) => {
  const theta = (u - 0.5) * 2 * HALF;
  const aside = Math.abs(theta) / HALF;
  const y = mix(100.4, 33 + 14 * Math.pow(clamp(aside), 1.6), v);
  const swing = y - 20 * Math.pow(aside, 1.7) * (0.3 + 0.7 * v);
  const at = (101 - swing) / mix(8.6, 5, ease(0.5, 1, aside)) + 0.4 * noise.at(theta * 1.5 + 2, swing * 0.06);
  const off =
    (1 + (noise.fold(at, 12) - 0.3) * (0.5 + 1.5 * ease(0, 0.4, v)) * (0.55 + 0.6 * aside) + 0.9 * v) *
    (0.12 + 0.88 * ease(0, 0.05, v));
  form(y, theta, off + lift - 0.6 * ease(0.95, 1, aside), p);
  p.u = theta * 20;
  p.v = v * 66;
};

export const lh1958n7: Garment = {
  number: 'LH.1958.7',
  kind: 'skirt',
  build(scene) {
    const behind = (theta: number): number => ease(1.2, 2.4, Math.abs(theta));
    const folds = (u: number, theta: number, y: number, s: number): number =>
      under(u, theta, y, s) * (0.4 + 0.9 * behind(theta));
    laySkirt(
      scene,
      { form, upper: () => 100.6, hem: () => 2, clothWidth: 300, folds },
      olive,
      inside,
      1400,
      640,
    );
    scene.layLayer({ cloth: olive, across: 900, along: 520 }, tied);
    sewBand(scene, tied, trim, {
      from: 0.955,
      to: 1.003,
      lift: 0.35,
      across: 800,
      closed: false,
      width: 2.6,
      length: 76,
    });
    const pleats = knifePleats(104, 1.25, noise);
    const flounce = skirtLayer({
      form,
      upper: () => 19,
      hem: () => 0.6,
      clothWidth: 520,
      folds: (u, theta, y, v) => 0.5 + folds(u, theta, y, 1 - y / 101) * 0.85 + pleats(u, v) + 0.7 * v * v,
    });
    scene.layLayer({ cloth: olive, across: 2400, along: 110, closed: true }, flounce);
    sewBand(scene, flounce, trim, { from: 0.06, to: 0.12, lift: 0.4, across: 1400, width: 1.4, length: 300 });
    sewBand(scene, flounce, olive, {
      from: -0.05,
      to: 0.05,
      lift: 0.35,
      across: 1400,
      width: 2.4,
      length: 300,
    });
    layBelt(scene, noise, { upper: 102.6, lower: 99.6, half: 11.5, front: 9.2, back: 9.4 }, olive);
    // The inside of the waistband, seen over its upper edge.
    scene.lay({ cloth: inside, across: 300, along: 20, closed: true }, (u, v, p) =>
      form(mix(102.4, 100.4, v), (u - 0.5) * 2 * Math.PI, 0, p),
    );
  },
  pictures: [
    {
      view: 'side',
      name: 'side',
      shot: standing(64, { lookAt: [-22, 47], span: 118, aspect: 1.12, reach: 100 }, { exposure: 0.95 }),
      alt: 'An olive wool skirt of about 1877 from the side: the front drawn across in folds and tied back, a pleated flounce, and a long train behind.',
      caption: 'Side, with the train. Rendered; invented garment.',
    },
  ],
};
