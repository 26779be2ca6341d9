import type { Cloth, Rgb } from '../cloths/cloth';
import { patternedSilk } from '../cloths/cloths';
import { fringe } from '../cloths/lace';
import { stripes } from '../motifs/motifs';
import { loft } from '../renderer/loft';
import { bell, clamp, ease, mix } from '../renderer/numbers';
import { seededNoise } from '../renderer/noise';
import type { Layer, Scene } from '../renderer/scene';
import { knifePleats, skirtLayer } from '../skirts/skirt';
import { round, sewBand, sewFrill } from '../trims/sewn';

/** The cloths of LH.1966.30's skirt. */
export interface SkirtCloths {
  silk: Cloth;
  velvet: Cloth;
  teal: Rgb;
  ecru: Rgb;
}

const noise = seededNoise(1885);

/** Stripes of écru on teal, in groups. */
const stripedPanel = (teal: Rgb, ecru: Rgb): Cloth =>
  patternedSilk(
    stripes(teal, 3.4, [
      { from: 0.46, to: 0.56, colour: ecru },
      { from: 0.6, to: 0.64, colour: ecru },
      { from: 0.68, to: 0.8, colour: ecru },
      { from: 0.84, to: 0.88, colour: ecru },
      { from: 0.92, to: 1, colour: ecru },
    ]),
    0.5,
    0.28,
  );

/** The shelf of 1885: narrow before, thrown out level behind and carried on to a short train. */
const form = loft([
  { y: 103, half: 11.6, front: 8.6, back: 8.8 },
  { y: 99, half: 13.6, front: 10.2, back: 17 },
  { y: 95, half: 16.2, front: 11.6, back: 29 },
  { y: 90, half: 18.3, front: 12.6, back: 36 },
  { y: 82, half: 19.8, front: 13.6, back: 39 },
  { y: 68, half: 21.6, front: 15.5, back: 40.5 },
  { y: 48, half: 24.6, front: 18.5, back: 43 },
  { y: 28, half: 28, front: 21.5, back: 47 },
  { y: 14, half: 30.5, front: 23.5, back: 51 },
  { y: 6, half: 32.5, front: 24.6, back: 56 },
  { y: 0.6, half: 34, front: 25.4, back: 62 },
]);

function underFolds(u: number, theta: number, y: number): number {
  const down = 1 - y / 103;
  const behind = ease(1.5, 2.4, Math.abs(theta));
  const c = Math.cos(u * 2 * Math.PI) * 1.4 + 5;
  const n = Math.sin(u * 2 * Math.PI) * 1.4 + 8;
  const at = (u * 26 + 0.6 * noise.at(c, n + down) + 26) % 26;
  const depth =
    (0.25 + (2.4 + 2.2 * behind) * Math.pow(Math.max(0, down), 1.1)) * (1 - 0.45 * ease(26, 6, y));
  return depth * (noise.fold(at, 3) - 0.5) + 0.5 * noise.at(c * 2, n * 2 + down * 5) * down;
}

function layUnderskirt(scene: Scene, { silk, velvet, teal, ecru }: SkirtCloths): void {
  const panelSilk = stripedPanel(teal, ecru);
  const cut = { form, upper: () => 99, clothWidth: 210 };
  const panel = skirtLayer({ ...cut, hem: () => 5, folds: underFolds });
  scene.layLayer({ cloth: panelSilk, across: 1200, along: 420, closed: true }, panel);
  const pleats = knifePleats(130, 1.15, noise);
  for (const [upper, hem, off] of [
    [18, 8.4, 1.3],
    [10, 0.5, 2.2],
  ] as const) {
    const flounce = skirtLayer({
      form,
      upper: () => upper,
      hem: () => hem,
      clothWidth: 420,
      folds: (u, theta, y, v) => off + 0.8 * underFolds(u, theta, y) + pleats(u, v) + 0.7 * v * v,
    });
    scene.layLayer({ cloth: silk, across: 2600, along: 60, closed: true }, flounce);
  }
  for (const [upper, hem, off] of [
    [19.6, 17, 1.7],
    [11.4, 8.8, 3],
  ] as const)
    scene.layLayer(
      { cloth: velvet, across: 1200, along: 26, closed: true },
      skirtLayer({
        form,
        upper: () => upper,
        hem: () => hem,
        clothWidth: 210,
        folds: (u, theta, y, v) => off + 0.5 * Math.sin(v * Math.PI) + 0.85 * underFolds(u, theta, y),
      }),
    );
}

/** How far round each way the apron reaches. */
const APRON = 1.66;

/** The apron: cloth hung from both sides, its folds swinging lower in front. v runs to a rounded edge. */
const apron: Layer = (u, v, lift, p) => {
  const theta = (u - 0.5) * 2 * APRON;
  const aside = (theta + 0.12) / APRON;
  const y = mix(102.5, 31 + 50 * Math.pow(clamp(Math.abs(aside)), 1.8), v);
  const swing = y - 52 * Math.pow(Math.abs(aside), 1.55) * (1 - 0.15 * v);
  const at =
    (102 - swing) / 8.2 +
    0.5 * noise.at(theta * 1.4 + 3, swing * 0.04) +
    0.25 * noise.at(theta * 3.3, swing * 0.12);
  const depth =
    (0.5 + 3.6 * ease(0.1, 0.7, v)) *
    (0.5 + 0.75 * Math.pow(Math.abs(aside), 0.8)) *
    (1 - 0.55 * ease(0.94, 1, v)) *
    (1 - 0.55 * ease(0.74, 1, Math.abs(aside)));
  const fold = noise.fold(at, 11);
  let off =
    (1.7 + 1.1 * depth * fold + 0.6 * noise.at(theta * 2, y * 0.05) * v + 1.6 * v) *
    (0.1 + 0.9 * ease(0, 0.06, v));
  off += 0.5 * ease(0.72, 1, Math.abs(aside)) * Math.sin(y * 1.25 + 2 * noise.at(theta * 3, y * 0.1));
  form(y, theta, off + lift, p);
  p.y -= 0.4 * depth * (fold - 0.5);
  p.u = theta * 26;
  p.v = v * 75;
};

function layApron(scene: Scene, { silk, velvet, teal, ecru }: SkirtCloths): void {
  scene.layLayer({ cloth: silk, across: 880, along: 600 }, apron);
  sewBand(scene, apron, velvet, {
    from: 0.955,
    to: 1.004,
    lift: 0.4,
    across: 900,
    closed: false,
    width: 4,
    length: 130,
  });
  const depth = 5.6;
  sewFrill(scene, apron, fringe(teal, ecru, depth), {
    line: round(1),
    points: 900,
    length: 150,
    depth,
    way: 1,
    gathers: 14,
    stand: 0.25,
    flare: 0.1,
    lift: 0.3,
    fall: 0.85,
  });
}

/** The back drapery: a puff tied in twice below the shelf, then falling free over the train. */
const puff: Layer = (u, v, lift, p) => {
  const theta = mix(1.22, 2 * Math.PI - 1.22, u);
  const aside = Math.abs(u - 0.5) * 2;
  const y = mix(102, mix(13, 52, Math.pow(aside, 1.5)), v);
  const free = 1 - Math.pow(aside, 3);
  const swell = bell(y, 88, 9) * 5.5 + bell(y, 66, 8.5) * 6;
  const tied = -2.6 * bell(y, 77, 3.2) - 1.2 * bell(y, 54, 4);
  const low = ease(60, 25, y);
  const at = u * 15 + 0.7 * noise.at(u * 5, y * 0.035) + 0.28 * noise.at(u * 11, y * 0.1);
  const depth = 1.3 + 2 * bell(y, 77, 6.5) + 1.9 * bell(y, 100, 8) + 3.6 * low + 1.8 * bell(y, 54, 6.5);
  const fine =
    (noise.fold(u * 44 + 1.5 * noise.at(u * 9, y * 0.06), 21) - 0.5) *
    (bell(y, 77, 4.5) + 0.9 * bell(y, 54, 4.5) + 0.8 * bell(y, 101, 5));
  const inwards = 1 - 0.8 * ease(0.8, 0.98, aside);
  let off =
    4.6 -
    1.6 * ease(0.965, 1, aside) +
    (swell + tied) * (0.1 + 0.9 * free) +
    depth * inwards * (noise.fold(at, 5) - 0.45) * (0.4 + 0.6 * free);
  off +=
    0.35 * (noise.fold(Math.abs(u - 0.5) * 7 + y * 0.13 + 0.7 * noise.at(u * 4, y * 0.08), 8) - 0.5) * swell;
  off += low * 2.4 * free + fine * inwards;
  off = mix(0.6, off, ease(0.99, 0.66, aside)) * (0.15 + 0.85 * ease(0, 0.05, v));
  form(y, theta, off + lift, p);
  p.y -= swell * 0.25 * free;
  p.u = u * 150;
  p.v = v * 95;
};

/** Lays the skirt: a striped panel over pleated flounces, the puff behind and the apron before. */
export function layBustleSkirt(scene: Scene, cloths: SkirtCloths): void {
  layUnderskirt(scene, cloths);
  scene.layLayer({ cloth: cloths.silk, across: 1150, along: 660 }, puff);
  sewBand(scene, puff, cloths.velvet, {
    from: 0.965,
    to: 1.003,
    lift: 0.4,
    across: 1000,
    closed: false,
    width: 4,
    length: 150,
  });
  layApron(scene, cloths);
}
