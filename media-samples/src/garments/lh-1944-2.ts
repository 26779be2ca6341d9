import { manTorso } from '../bodices/coat-body';
import { armholeRim, cutAway, inArmhole, type Armhole } from '../bodices/openings';
import { dye } from '../cloths/cloth';
import { lining, metal, patternedSilk, thread, whiteCotton } from '../cloths/cloths';
import { layShawl } from '../collars/shawl';
import { wovenSprig } from '../motifs/motifs';
import { bell, ease, mix } from '../renderer/numbers';
import { seededNoise } from '../renderer/noise';
import type { Layer } from '../renderer/scene';
import { sewButtons } from '../trims/buttons';
import { sewCord } from '../trims/sewn';
import { closeUp, hung, type Garment } from './garment';

const noise = seededNoise(1847);
const cream = dye('#d9ccb0');
const sprigged = patternedSilk(wovenSprig(cream, dye('#7f8460'), dye('#a8736c'), 3.4), 0.2, 0.42);
const backCotton = whiteCotton(dye('#cfc3a9'), 0.1, 0.4);
const inside = lining(dye('#d5c8ad'));
const form = manTorso(-0.5);
const BREAK = 117;
const RADIUS = 15;

const armhole: Armhole = { theta: 1.62, y: 129, wide: 0.46, high: 10.6 };
const edge = (y: number): number => (y < BREAK ? 0 : 0.6 * Math.pow((y - BREAK) / 28, 0.85));
/** Longer in front, to a blunt point; level behind. */
const lower = (theta: number): number =>
  100.5 - 6.5 * Math.exp(-theta * theta * 5) + 0.8 * bell(Math.abs(theta), 1.2, 0.5);

const folds = (theta: number, y: number): number =>
  0.5 +
  0.2 * noise.layers(theta * 2.2 + 4, y * 0.14, 3) +
  0.16 * bell(y, 107, 4) * Math.sin(y * 1.6 + 3 * Math.abs(theta)) * ease(0.4, 1, Math.abs(theta));

const fronts: Layer = (u, v, lift, p) => {
  const side = u < 0.5 ? -1 : 1;
  const across = side < 0 ? 1 - u * 2 : u * 2 - 1;
  const y0 = mix(145, 98, v);
  const open = edge(y0);
  const theta = side * mix(open, 1.72, across);
  const y = mix(145, lower(theta), v);
  const lap =
    0.28 * ease(BREAK + 1, BREAK - 6, y) * ease(-0.19, -0.15, theta) * ease(0.9, 0.3, Math.abs(theta));
  form(y, theta, folds(theta, y) + lap + lift, p);
  p.u = theta * RADIUS;
  p.v = y;
};
const back: Layer = (u, v, lift, p) => {
  const theta = mix(1.66, 2 * Math.PI - 1.66, u);
  const turned = theta > Math.PI ? theta - 2 * Math.PI : theta;
  const y = mix(146.4, lower(turned), v);
  form(y, turned, folds(turned, y) - 0.1 - 0.14 * bell(Math.abs(turned), Math.PI, 0.012) + lift, p);
  p.u = (theta - Math.PI) * RADIUS + 100;
  p.v = y;
};
const openFront = (u: number, v: number): boolean => inArmhole(armhole, u / RADIUS, v);
const openBack = (u: number, v: number): boolean =>
  inArmhole(armhole, Math.PI - Math.abs(u - 100) / RADIUS, v);

export const lh1944n2: Garment = {
  number: 'LH.1944.2',
  kind: 'waistcoat',
  build(scene) {
    scene.layHalves({ cloth: cutAway(sprigged, openFront), across: 900, along: 520 }, fronts);
    scene.layHalves(
      { cloth: cutAway(inside, openFront), across: 400, along: 200 },
      (u, v, lift, p) => fronts(u, v * 0.995, lift, p),
      -0.4,
    );
    scene.layLayer({ cloth: cutAway(backCotton, openBack), across: 500, along: 400 }, back);
    scene.layLayer({ cloth: cutAway(inside, openBack), across: 300, along: 200 }, (u, v, lift, p) =>
      back(u, v * 0.995, lift - 0.4, p),
    );
    const onForm: Layer = (u, v, lift, p) => form(v, u, folds(u, v) + lift, p);
    for (const side of [1, -1] as const)
      sewCord(
        scene,
        onForm,
        sprigged,
        { line: armholeRim(armhole, side), points: 360, length: 46 },
        0.18,
        0.9,
      );
    layShawl(
      scene,
      {
        form,
        breakY: BREAK + 0.2,
        shoulderY: 145,
        backY: 147.2,
        edge: (y) => edge(y) - 0.012,
        width: 5.6,
        widthBehind: 4.2,
        lift: 0.75,
      },
      sprigged,
    );
    sewButtons(scene, onForm, (t) => [0.02 + 0.02 * (1 - t), mix(115, 99.4, t)], {
      count: 6,
      radius: 0.62,
      cloth: thread(dye('#b9a67f')),
      lift: 0.35,
      height: 0.5,
    });
    for (const side of [1, -1] as const) {
      // A welted pocket each side.
      scene.lay({ cloth: sprigged, across: 120, along: 30 }, (u, v, p) => {
        onForm(
          side * mix(0.5, 1.12, u),
          mix(107.4, 105.2, v) + 0.9 * u,
          0.12 + 0.24 * ease(0, 0.15, v) * ease(1, 0.85, v),
          p,
        );
        p.u = u * 9;
        p.v = mix(107.4, 105.2, v);
      });
    }
    scene.lay({ cloth: metal(dye('#8d8676')), across: 20, along: 12 }, (u, v, p) => {
      form(mix(105, 103.6, v), Math.PI + mix(-0.08, 0.08, u), 0.9, p);
    });
  },
  pictures: [
    {
      view: 'front',
      name: 'front',
      shot: hung(22, { lookAt: [0, 121], span: 66, aspect: 0.8, reach: 46 }, { exposure: 0.9 }),
      alt: "A man's waistcoat of 1845 to 1850 in cream silk woven with small sprigs: a shawl collar, six buttons and two welted pockets.",
      caption: 'Front. Rendered; invented garment.',
    },
    {
      view: 'detail',
      name: 'detail-sprig',
      shot: closeUp(12, { lookAt: [3, 112], span: 20, aspect: 1.33 }, { exposure: 0.9 }),
      alt: 'A close view of the buttons and the woven sprigs on a cream ground of small lozenges.',
      caption: 'Woven sprigs and buttons. Rendered; invented garment.',
      fineness: 1.3,
    },
  ],
};
