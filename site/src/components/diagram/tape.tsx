import { tapeTicks, type TapeTick } from '@ellwand/shared/drawings/tape';
import { type LengthUnit, lengthUnits } from '@ellwand/shared/units/format-length';

interface TapeProps {
  readonly lengthPx: number;
  /** The drawing's own scale: the tape is a real one. */
  readonly mmPerPx: number;
  readonly upright?: boolean;
}

const BREADTH = 32;
const REACH: Readonly<Record<TapeTick['rank'], number>> = { minor: 6, middle: 10, major: 15 };

/** A tape along the edge of a drawing, ticks towards it; upright it counts from the bottom. */
export function Tape({ lengthPx, mmPerPx, upright = false }: TapeProps) {
  const [width, height] = upright ? [BREADTH, lengthPx] : [lengthPx, BREADTH];
  return (
    <svg className="tape" width={width} height={height} viewBox={`0 0 ${width} ${height}`} aria-hidden="true">
      <rect className="tape-cloth" width={width} height={height} />
      {lengthUnits.map((unit) => (
        <g key={unit} data-unit={unit}>
          <Ticks unit={unit} lengthPx={lengthPx} mmPerPx={mmPerPx} upright={upright} />
        </g>
      ))}
    </svg>
  );
}

function Ticks({ unit, lengthPx, mmPerPx, upright = false }: TapeProps & { readonly unit: LengthUnit }) {
  const ticks = tapeTicks({ lengthPx, mmPerPx, unit });
  const line = ({ px, rank }: TapeTick) =>
    upright ? `M${BREADTH} ${lengthPx - px}h-${REACH[rank]}` : `M${px} 0v${REACH[rank]}`;
  return (
    <>
      <path className="tape-ticks" d={ticks.map(line).join('')} />
      {ticks.map(({ px, label }) =>
        label === undefined ? null : (
          <text
            key={px}
            className="tape-figure"
            transform={upright ? `translate(11 ${lengthPx - px - 3}) rotate(-90)` : `translate(${px + 3} ${BREADTH - 5})`}
          >
            {label}
          </text>
        ),
      )}
    </>
  );
}
