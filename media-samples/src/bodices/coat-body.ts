import { loft, type Loft } from '../renderer/loft';

/** A man's figure of the nineteenth century in a coat, from the hips to the neck, asked by height. `full` widens it. */
export const manTorso = (full = 0): Loft =>
  loft([
    { y: 74, half: 17.6 + full, front: 12.6 + full, back: 12.8 + full },
    { y: 90, half: 17.4 + full, front: 12.8 + full, back: 13 + full },
    { y: 97, half: 16.2 + full, front: 12.5 + full, back: 12.2 + full },
    { y: 101, half: 15.2 + full, front: 12.2 + full, back: 11.2 + full },
    { y: 105, half: 14.2 + full, front: 11.7 + full, back: 10.2 + full },
    { y: 110, half: 14.9 + full, front: 12.4 + full, back: 10.4 + full },
    { y: 118, half: 17.7 + full, front: 14.1 + full, back: 12 + full },
    { y: 126, half: 19.2 + full, front: 14.7 + full, back: 12.9 + full },
    { y: 132, half: 19.5 + full * 0.7, front: 13.7 + full, back: 13.2 + full * 0.7, cz: -0.4 },
    {
      y: 138,
      half: 18.4 + full * 0.4,
      front: 10.9 + full * 0.6,
      back: 12.1 + full * 0.4,
      cz: -1,
      square: 2.1,
    },
    { y: 142, half: 15, front: 8.5, back: 9.6, cz: -1.8, square: 2.1 },
    { y: 145, half: 10.5, front: 7, back: 7.6, cz: -2 },
    { y: 147, half: 7.8, front: 6.6, back: 6.7, cz: -1.8 },
    { y: 152, half: 7.2, front: 6.8, back: 6.6, cz: -2 },
  ]);
