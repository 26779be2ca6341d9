/** The unit that the tape beside a drawing is divided in. */
export type TapeUnit = 'mm' | 'cm' | 'in';

export interface TapeRequest {
  readonly lengthPx: number;
  /** The drawing's scale: millimetres of the garment to one pixel. */
  readonly mmPerPx: number;
  readonly unit: TapeUnit;
}

export interface TapeTick {
  /** From the tape's beginning. */
  readonly px: number;
  readonly rank: 'minor' | 'middle' | 'major';
  /** Beside some of the major ticks; the first names the unit. */
  readonly label?: string;
}

/** Ticks closer than this run into a grey: 1 mm ticks are dropped below 2.4 px to the millimetre. */
const LEAST_TICK_PX = 2.4;
const LEAST_LABEL_PX = 44;
/** Room that a label of a few figures takes after its tick. */
const LABEL_ROOM_PX = 30;

/** International yard and pound agreement of 1959: exact by definition. */
const MM_PER_INCH = 25.4;

/** Divisions from fine to coarse, counted in the smallest of them; each is a whole multiple of the one before. */
const DIVISIONS: Readonly<
  Record<
    TapeUnit,
    { readonly smallestMm: number; readonly counts: readonly number[]; readonly perLabel: number }
  >
> = {
  mm: { smallestMm: 1, counts: [1, 5, 10, 50, 100, 500, 1000, 5000], perLabel: 1 },
  cm: { smallestMm: 1, counts: [1, 5, 10, 50, 100, 500, 1000, 5000], perLabel: 10 },
  in: { smallestMm: MM_PER_INCH / 8, counts: [1, 4, 8, 48, 96, 288, 864], perLabel: 8 },
};

/**
 * Ticks of a true tape: 1, 5 and 10 mm, or 1/8, 1/2 and 1 in; coarser where the drawing's scale leaves no room.
 * @throws RangeError unless length and scale are above 0
 */
export function tapeTicks({ lengthPx, mmPerPx, unit }: TapeRequest): TapeTick[] {
  if (!(lengthPx > 0) || !(mmPerPx > 0)) {
    throw new RangeError(
      `A tape needs a length and a scale above 0, got ${lengthPx} px at ${mmPerPx} mm/px.`,
    );
  }
  const { smallestMm, counts, perLabel } = DIVISIONS[unit];
  const pxPerCount = smallestMm / mmPerPx;
  const finest = Math.max(
    0,
    counts.findIndex((count) => count * pxPerCount >= LEAST_TICK_PX),
  );
  const [minor, middle, major] = [0, 1, 2].map((coarser) => counts[finest + coarser] ?? Infinity) as [
    number,
    number,
    number,
  ];
  const labelled = counts.find((count) => count >= major && count * pxPerCount >= LEAST_LABEL_PX);
  const ticks: TapeTick[] = [];
  for (let count = 0; count * pxPerCount <= lengthPx; count += minor) {
    const px = Math.round(count * pxPerCount * 100) / 100;
    const rank = count % major === 0 ? 'major' : count % middle === 0 ? 'middle' : 'minor';
    const hasLabel = labelled !== undefined && count % labelled === 0 && px + LABEL_ROOM_PX <= lengthPx;
    const figure = String(count / perLabel);
    ticks.push({ px, rank, ...(hasLabel ? { label: count === 0 ? `0 ${unit}` : figure } : {}) });
  }
  return ticks;
}
