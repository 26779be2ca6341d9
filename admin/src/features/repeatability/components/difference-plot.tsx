import type { RepeatabilityPoint } from '@ellwand/shared/records/repeatability';
import { figure, signed } from '../model/figures.js';
import { PLOT, plotOf, type Scale } from '../model/plot.js';

const right = PLOT.width - PLOT.right;
const foot = PLOT.height - PLOT.bottom;

/** Each later reading less the first, against the mean of the two. The table beside it says the same in figures. */
export function DifferencePlot({ point }: { readonly point: RepeatabilityPoint }) {
  const plot = plotOf(point);
  if (!plot) return null;
  const { label, limitsMm, meanDifferenceMm } = point;
  return (
    <svg
      viewBox={`0 0 ${PLOT.width} ${PLOT.height}`}
      role="img"
      aria-label={`${label}: difference of two readings against their mean, in millimetres`}
      className="figures w-full max-w-lg fill-ink-2 text-[15px] lg:text-[13px]"
    >
      <YAxis scale={plot.y} />
      <XAxis scale={plot.x} />
      {limitsMm && (
        <>
          <Level at={plot.y.at(limitsMm.upper)} className="stroke-madder" dashed />
          <Level at={plot.y.at(limitsMm.lower)} className="stroke-madder" dashed />
        </>
      )}
      {meanDifferenceMm !== null && (
        <Level at={plot.y.at(meanDifferenceMm)} className="stroke-indigo" strokeWidth={1.5} />
      )}
      {plot.dots.map(({ x, y }, index) => (
        <circle key={index} cx={x} cy={y} r={4} className="fill-ink" fillOpacity={0.55} />
      ))}
    </svg>
  );
}

function Level({
  at,
  className,
  dashed = false,
  strokeWidth = 1,
}: {
  readonly at: number;
  readonly className: string;
  readonly dashed?: boolean;
  readonly strokeWidth?: number;
}) {
  return (
    <line
      x1={PLOT.left}
      x2={right}
      y1={at}
      y2={at}
      className={className}
      strokeWidth={strokeWidth}
      strokeDasharray={dashed ? '5 4' : undefined}
    />
  );
}

function YAxis({ scale }: { readonly scale: Scale }) {
  return (
    <g>
      {scale.ticks.map((tick) => (
        <g key={tick}>
          <Level at={scale.at(tick)} className={tick === 0 ? 'stroke-rule' : 'stroke-hair'} />
          <text x={PLOT.left - 6} y={scale.at(tick) + 4} textAnchor="end">
            {signed(tick, 0)}
          </text>
        </g>
      ))}
      <text x={-(PLOT.top + foot) / 2} y={12} transform="rotate(-90)" textAnchor="middle">
        Difference, mm
      </text>
    </g>
  );
}

function XAxis({ scale }: { readonly scale: Scale }) {
  return (
    <g>
      <line x1={PLOT.left} x2={right} y1={foot} y2={foot} className="stroke-rule" strokeWidth={1} />
      {scale.ticks.map((tick) => (
        <text key={tick} x={scale.at(tick)} y={foot + 20} textAnchor="middle">
          {figure(tick, 0)}
        </text>
      ))}
      <text x={(PLOT.left + right) / 2} y={PLOT.height - 6} textAnchor="middle">
        Mean of the two readings, mm
      </text>
    </g>
  );
}
