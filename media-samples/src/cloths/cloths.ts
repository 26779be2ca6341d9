import { seededNoise } from '../renderer/noise';
import { colourOf, dye, plain, type Cloth, type Colouring, type Rgb } from './cloth';
import { cottonCrease, crepePebble, silkCrinkle, slubbed, velvetBrush, woolNap } from './relief';

const noise = seededNoise(23);

/** Crisp silk with a strong lustre. `crinkle` about 0.6 for skirts and half that where it is fitted over a lining. */
export const silkTaffeta = (colouring: Colouring, crinkle = 0.6): Cloth =>
  plain({
    colour: colourOf(colouring),
    gloss: 1.15,
    tightness: 9,
    relief: silkCrinkle(crinkle),
    weave: { kind: 'plain', threads: 30, depth: 0.12 },
    slub: slubbed(0.05),
  });

/** Ribbed silk: the light breaks on its cords. */
export function silkFaille(colouring: Colouring, crinkle = 0.5): Cloth {
  return {
    ...silkTaffeta(colouring, crinkle),
    gloss: 0.85,
    tightness: 7,
    weave: { kind: 'rib', threads: 16, depth: 0.4 },
  };
}

/** Figured or printed silk keeps less lustre, so that its pattern reads. */
export const patternedSilk = (colouring: Colouring, crinkle = 0.5, gloss = 0.4): Cloth => ({
  ...silkTaffeta(colouring, crinkle),
  gloss,
  tightness: 8,
});

/** Shot silk: one colour of warp and another of weft, so that creases flash. */
export const shotSilk = (warp: Rgb, weft: Rgb, crinkle = 0.5): Cloth => ({
  ...silkTaffeta(warp, crinkle),
  flash: weft,
});

export const silkVelvet = (colour: Rgb): Cloth =>
  plain({ colour: colourOf(colour), gloss: 0.05, pile: 0.95, relief: velvetBrush(0.22), slub: slubbed(0.1) });

export const silkCrepe = (colouring: Colouring): Cloth =>
  plain({
    colour: colourOf(colouring),
    gloss: 0.34,
    tightness: 5,
    relief: crepePebble(0.09),
    slub: slubbed(0.03),
    through: 0.1,
  });

/** Satin, smooth and bright. */
export const sateen = (colouring: Colouring): Cloth =>
  plain({
    colour: colourOf(colouring),
    gloss: 0.55,
    tightness: 8,
    relief: cottonCrease(0.12),
    weave: { kind: 'satin', threads: 26, depth: 0.16 },
    slub: slubbed(0.06),
  });

/** Broadcloth: fulled wool with a nap that hides its threads. */
export function broadcloth(colour: Rgb): Cloth {
  return plain({
    colour: (u, v, out) => {
      const n = 1 + 0.1 * noise.at(u * 5, v * 5) + 0.08 * noise.at(u * 13, v * 13);
      for (let i = 0; i < 3; i++) out[i] = colour[i]! * n;
    },
    gloss: 0.22,
    tightness: 5,
    pile: 0.3,
    relief: woolNap(0.35),
    slub: slubbed(0.08),
  });
}

/** Wool whose twill shows: suiting, serge, challis when fine. */
export const woolTwill = (colouring: Colouring, threads = 12): Cloth =>
  plain({
    colour: colourOf(colouring),
    gloss: 0.16,
    tightness: 5,
    pile: 0.14,
    relief: woolNap(0.3),
    weave: { kind: 'twill', threads, depth: 0.3 },
    slub: slubbed(0.1),
  });

export const printedCotton = (colouring: Colouring): Cloth =>
  plain({
    colour: colourOf(colouring),
    gloss: 0.1,
    relief: cottonCrease(0.4),
    weave: { kind: 'plain', threads: 22, depth: 0.24 },
    slub: slubbed(0.05),
    through: 0.15,
  });

/** White cotton or linen; `through` about 0.3 for shirting and 0.6 for muslin. */
export const whiteCotton = (colouring: Colouring = dye('#f0ebe0'), through = 0.4, crease = 0.32): Cloth => ({
  ...printedCotton(colouring),
  gloss: 0.06,
  relief: cottonCrease(crease),
  through,
});

/** The inside: a pale lining that catches the light of the room. */
export const lining = (colour: Rgb = dye('#c9baa0')): Cloth =>
  plain({
    colour: colourOf(colour),
    gloss: 0.04,
    openness: 1.7,
    weave: { kind: 'twill', threads: 14, depth: 0.2 },
    slub: slubbed(0.08),
  });

export const ribbon = (colour: Rgb): Cloth =>
  plain({
    colour: colourOf(colour),
    gloss: 0.8,
    tightness: 8,
    weave: { kind: 'rib', threads: 12, depth: 0.3 },
    slub: slubbed(0.03),
  });

/** Metal of buttons, buckles, hooks and clasps: `u` from the middle (0) to the rim (1), `v` an angle. */
export function metal(colour: Rgb, chased = 0): Cloth {
  return plain({
    colour: (u, v, out) => {
      const worn = u > 0.85 ? 0.6 : 1 - chased * 0.3 + chased * 0.35 * Math.sin(v * 8) * (u > 0.35 ? 1 : 0);
      for (let i = 0; i < 3; i++) out[i] = colour[i]! * worn;
    },
    gloss: 1.5,
    tightness: 16,
  });
}

/** Polished black: jet, glass, japanned hooks. Darker would lose its form. */
export const jet = (colour: Rgb = dye('#2c2a2e')): Cloth =>
  plain({ colour: colourOf(colour), gloss: 2.4, tightness: 26 });

/** Covered or bone buttons, cord, thread. */
export const thread = (colour: Rgb): Cloth =>
  plain({
    colour: (u, v, out) => {
      const twist = 0.82 + 0.2 * Math.sin(v * 24 + u * 4);
      for (let i = 0; i < 3; i++) out[i] = colour[i]! * twist;
    },
    gloss: 0.4,
    tightness: 8,
  });
