import type { LengthUnit } from '@ellwand/shared/units/format-length';
import { fromInchSteps } from '@ellwand/shared/units/fractions';
import { type Length, mm as millimetres, toMm } from '@ellwand/shared/units/length';

export interface TapeMark {
  readonly mm: number;
  readonly length: Length;
  /** 0 at every step, 1 half way to the figure, 2 where the figure stands. */
  readonly reach: 0 | 1 | 2;
}

interface TapeScale {
  /** In millimetres, or in quarters of an inch. */
  readonly step: number;
  readonly toFigure: number;
}

const byTens = (step: number): TapeScale => ({ step, toFigure: 10 });
const metric = [1, 2, 5, 10, 20, 50, 100, 200, 500].map(byTens);
/** An inch is halved and quartered before it is counted in tens. */
const inches: readonly TapeScale[] = [
  { step: 1, toFigure: 4 },
  { step: 2, toFigure: 4 },
  ...[4, 8, 20, 40, 80].map(byTens),
];

const LEAST_GAP_PX = 3.4;
const QUARTER_INCH_MM = 6.35;

/** The marks of a tape that shows the stretch from `start` to `end` (mm) on `width` pixels. */
export function tapeMarks(start: number, end: number, unit: LengthUnit, width: number): TapeMark[] {
  const scales = unit === 'in' ? inches : metric;
  const oneMm = unit === 'in' ? QUARTER_INCH_MM : 1;
  const wideEnough = ({ step }: TapeScale) => ((step * oneMm) / (end - start)) * width >= LEAST_GAP_PX;
  const { step, toFigure } = scales.find(wideEnough) ?? byTens(1000);
  const first = Math.ceil(start / (step * oneMm));
  const last = Math.floor(end / (step * oneMm));
  return Array.from({ length: Math.max(0, last - first + 1) }, (_, index) => {
    const count = first + index;
    const length = unit === 'in' ? fromInchSteps(count * step, 4) : millimetres(count * step);
    const reach = count % toFigure === 0 ? 2 : count % (toFigure / 2) === 0 ? 1 : 0;
    return { mm: toMm(length), length, reach };
  });
}
