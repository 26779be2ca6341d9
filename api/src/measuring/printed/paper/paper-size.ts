import { z } from 'zod';

/** The two papers that offices print on: ISO 216 A4, and ANSI/ASME Y14.1 size A (Letter), 8.5 × 11 inches. */
export const Paper = z.enum(['a4', 'letter']);
export type Paper = z.infer<typeof Paper>;

/** PDF's unit is a 72nd of an inch; an inch is 25.4 mm exactly. */
export const points = (millimetres: number): number => (millimetres * 72) / 25.4;

export interface Sides {
  readonly width: number;
  readonly height: number;
}

export const sidesOf: Readonly<Record<Paper, Sides>> = {
  a4: { width: points(210), height: points(297) },
  letter: { width: 8.5 * 72, height: 11 * 72 },
};

/** Room for a thumb, and for printers that leave a margin of their own. */
export const margin = points(15);
