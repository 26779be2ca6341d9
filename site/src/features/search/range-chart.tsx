import type { SearchAnswer } from '@ellwand/shared/records/published-garment';
import { figureText, type LengthUnit, lengthUnits } from '@ellwand/shared/units/format-length';
import { fromMmString, toMm } from '@ellwand/shared/units/length';
import { tapeMarks } from './tape-marks';

type Range = SearchAnswer['ranges'][number];

const WIDTH = 240;
const BARS = 44;
const TAPE = 26;

/**
 * How many garments have which measure, standing on a tape that runs through the same millimetres. It only
 * shows what the number boxes say, so it is hidden from assistive technology.
 */
export function RangeChart({ range, fromMm, toMm: untilMm }: ChartBounds & { readonly range: Range }) {
  const bins = range.bins.map((bin) => ({
    from: toMm(fromMmString(bin.fromMm)),
    to: toMm(fromMmString(bin.toMm)),
    count: bin.count,
  }));
  const start = bins[0]?.from;
  const end = bins.at(-1)?.to;
  if (start === undefined || end === undefined || end <= start) return null;
  const most = Math.max(...bins.map(({ count }) => count), 1);
  const x = (mm: number) => Math.round(((mm - start) / (end - start)) * WIDTH * 10) / 10;
  return (
    <svg className="range-chart" viewBox={`0 0 ${WIDTH} ${BARS + TAPE}`} aria-hidden="true">
      {bins.map((bin) => {
        const height = bin.count === 0 ? 0 : Math.max(3, (bin.count / most) * (BARS - 4));
        const inside = bin.to > (fromMm ?? -Infinity) && bin.from < (untilMm ?? Infinity);
        return (
          <rect
            key={bin.from}
            className={inside ? 'range-bar' : 'range-bar range-bar-out'}
            x={x(bin.from) + 0.5}
            y={BARS - height}
            width={Math.max(1, x(bin.to) - x(bin.from) - 1)}
            height={height}
          />
        );
      })}
      <rect className="tape-cloth" x="0" y={BARS} width={WIDTH} height={TAPE} />
      {lengthUnits.map((unit) => (
        <TapeMarks key={unit} unit={unit} start={start} end={end} x={x} />
      ))}
    </svg>
  );
}

export interface ChartBounds {
  readonly fromMm: number | null;
  readonly toMm: number | null;
}

interface TapeMarksProps {
  readonly unit: LengthUnit;
  readonly start: number;
  readonly end: number;
  readonly x: (mm: number) => number;
}

function TapeMarks({ unit, start, end, x }: TapeMarksProps) {
  const marks = tapeMarks(start, end, unit, WIDTH);
  const ticks = marks.map(({ mm, reach }) => `M${x(mm)} ${BARS}v${[5, 8, 11][reach]}`).join('');
  return (
    <g data-unit={unit}>
      <path className="tape-ticks" d={ticks} />
      {marks
        .filter(({ reach, mm }) => reach === 2 && x(mm) > 12 && x(mm) < WIDTH - 12)
        .map(({ mm, length }) => (
          <text key={mm} className="tape-figure" x={x(mm)} y={BARS + TAPE - 4} textAnchor="middle">
            {figureText(length, unit, { places: 0 })}
          </text>
        ))}
    </g>
  );
}
