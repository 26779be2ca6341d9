import { tapeTicks, type TapeTick } from '@ellwand/shared/drawings/tape';
import { type LengthUnit, lengthUnits } from '@ellwand/shared/units/format-length';

interface TapeProps {
  readonly lengthPx: number;
  /** The drawing's own scale: the tape is a real one. */
  readonly mmPerPx: number;
  readonly upright?: boolean;
}

/** As the look has it: 32 px, at every size of drawing. */
export const TAPE_BREADTH = 32;
const REACH: Readonly<Record<TapeTick['rank'], number>> = { minor: 6, middle: 10, major: 15 };

/** A tape beneath a drawing, ticks towards it. */
export function Tape(props: TapeProps) {
  return (
    <svg
      className="tape"
      width={props.lengthPx}
      height={TAPE_BREADTH}
      viewBox={`0 0 ${props.lengthPx} ${TAPE_BREADTH}`}
      aria-hidden="true"
    >
      <TapeMarks {...props} />
    </svg>
  );
}

/** A figure's width, and room beside it: one that the tape's end would cut is left out. */
const FIGURE_WIDTH = 7;

/** A tape as part of a drawing, its edge at x = 0 or y = 0; upright it stands to the left and counts upwards. */
export function TapeMarks(props: TapeProps) {
  const { lengthPx, upright = false } = props;
  const [width, height] = upright ? [TAPE_BREADTH, lengthPx] : [lengthPx, TAPE_BREADTH];
  return (
    <g transform={upright ? `translate(-${TAPE_BREADTH} 0)` : undefined}>
      <rect className="tape-cloth" width={width} height={height} />
      {lengthUnits.map((unit) => (
        <g key={unit} data-unit={unit}>
          <Ticks {...props} unit={unit} />
        </g>
      ))}
    </g>
  );
}

function Ticks({ unit, lengthPx, mmPerPx, upright = false }: TapeProps & { readonly unit: LengthUnit }) {
  const ticks = tapeTicks({ lengthPx, mmPerPx, unit });
  const line = ({ px, rank }: TapeTick) =>
    upright ? `M${TAPE_BREADTH} ${lengthPx - px}h-${REACH[rank]}` : `M${px} 0v${REACH[rank]}`;
  return (
    <>
      <path className="tape-ticks" d={ticks.map(line).join('')} />
      {ticks.map(({ px, label }) =>
        label === undefined || px + label.length * FIGURE_WIDTH > lengthPx ? null : (
          <text
            key={px}
            className="tape-figure"
            transform={
              upright
                ? `translate(11 ${lengthPx - px - 3}) rotate(-90)`
                : `translate(${px + 3} ${TAPE_BREADTH - 5})`
            }
          >
            {label}
          </text>
        ),
      )}
    </>
  );
}
