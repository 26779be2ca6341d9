import { loft, type Loft, type Station } from '../renderer/loft';

/** What a period's stays and fashion made of the figure. Heights and half-widths in cm, on a figure of about 165 cm. */
export interface Figure {
  waistY?: number;
  /** Half the width, depth before and depth behind of the waist. */
  waist?: readonly [number, number, number];
  /** Added to the front of the bust (a pouched front) and to its width. */
  bustFront?: number;
  bustHalf?: number;
  bustY?: number;
  /** Added to the width across the shoulders. */
  shoulder?: number;
  /** The hips under the bodice: [height below the waist, half, front, back]. */
  hips?: readonly (readonly [number, number, number, number])[];
}

/** A woman's figure from hip to neck, as a loft asked by height. */
export function torso(figure: Figure = {}): Loft {
  const {
    waistY = 102.5,
    waist = [10.9, 8.7, 8.7],
    bustFront = 0,
    bustHalf = 0,
    bustY = 121.5,
    shoulder = 0,
  } = figure;
  const rise = bustY - waistY;
  const between = (t: number): number => waistY + rise * t;
  const [half, front, back] = waist;
  const stations: Station[] = [
    ...(figure.hips ?? []).map(([below, h, f, b]) => ({ y: waistY - below, half: h, front: f, back: b })),
    { y: waistY, half, front, back },
    { y: between(0.29), half: half + 0.9, front: front + 1 + bustFront * 0.3, back: back + 0.1 },
    { y: between(0.66), half: 14.2 + bustHalf, front: 12.5 + bustFront * 0.9, back: 9.3, cz: 0.1 },
    { y: bustY, half: 16 + bustHalf, front: 14.3 + bustFront, back: 9.8, cz: 0.1 },
    {
      y: 128,
      half: 16.9 + bustHalf * 0.6 + shoulder * 0.4,
      front: 12.3 + bustFront * 0.45,
      back: 10.2,
      cz: -0.2,
    },
    { y: 133.5, half: 16.4 + shoulder, front: 9.6, back: 10, cz: -0.8, square: 2.15 },
    { y: 137.2, half: 14 + shoulder * 0.9, front: 7.2, back: 8.6, cz: -1.4, square: 2.1 },
    { y: 139.6, half: 10.2 + shoulder * 0.3, front: 5.9, back: 6.8, cz: -1.6 },
    { y: 141.4, half: 7, front: 5.6, back: 5.7, cz: -1.5 },
    { y: 143, half: 6.15, front: 5.6, back: 5.3, cz: -1.2 },
    { y: 149, half: 5.7, front: 5.2, back: 5.2, cz: -1.2 },
  ];
  return loft(stations);
}
