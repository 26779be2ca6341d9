import type { DerivedView } from '@ellwand/shared/records/sheet';
import { formatBoth, formatLength } from '@ellwand/shared/units/format-length';
import { mm } from '@ellwand/shared/units/length';
import { Empty, Failed, Waiting } from '../../../components/ui/states.js';
import type { SheetDesk } from '../model/use-sheet-desk.js';

/** What follows from the readings, with its formula and the figures that were put in. Never typed. */
export function DerivedPanel({
  desk,
  onPoint,
}: {
  readonly desk: SheetDesk;
  readonly onPoint: (pointId: string) => void;
}) {
  const { findings } = desk;
  if (findings.isPending)
    return (
      <div className="p-4">
        <Waiting label="Working it out" rows={3} />
      </div>
    );
  if (!findings.data)
    return (
      <div className="p-4">
        <Failed error={findings.error} onRetry={findings.refetch} />
      </div>
    );
  const { derived } = findings.data;
  return (
    <div className="p-4">
      <h2 className="title mb-3 text-title-25">Worked out from the readings</h2>
      {derived.length === 0 && (
        <Empty title="Nothing follows yet">Neck to waist, for one, needs neck to hem and waist to hem.</Empty>
      )}
      <ul className="divide-y divide-hair">
        {derived.map((value) => (
          <li key={value.id} className="grid gap-x-6 gap-y-1 py-3 sm:grid-cols-[minmax(0,1fr)_auto]">
            <div>
              <p className="text-body font-medium">{value.label}</p>
              <p className="text-table text-ink-2">{value.formula}</p>
              <p className="figures text-table text-ink">{value.worked}</p>
              <ul className="mt-1 flex flex-wrap gap-x-4">
                {value.trace.map((entry, index) => (
                  <li key={`${entry.pointId} ${index}`}>
                    <TraceFigure entry={entry} onPoint={onPoint} />
                  </li>
                ))}
              </ul>
            </div>
            <p className="figures text-value sm:text-right">
              {value.valueMm === null ? value.ratio : formatBoth(mm(value.valueMm))}
              {value.uncertaintyMm !== null && (
                <span className="block text-label text-ink-3">± {value.uncertaintyMm} mm</span>
              )}
            </p>
          </li>
        ))}
      </ul>
    </div>
  );
}

/** A figure that was put in: a way to its point, unless it was read on another sheet. */
function TraceFigure({
  entry: { pointId, label, valueMm, elsewhere },
  onPoint,
}: {
  readonly entry: DerivedView['trace'][number];
  readonly onPoint: (pointId: string) => void;
}) {
  const figure = `${label}: ${formatLength(mm(valueMm), 'mm')}`;
  if (elsewhere)
    return <span className="figures inline-flex min-h-11 items-center text-table">{figure}</span>;
  return (
    <button
      type="button"
      onClick={() => onPoint(pointId)}
      className="figures min-h-11 text-table text-indigo underline underline-offset-4"
    >
      {figure}
    </button>
  );
}
