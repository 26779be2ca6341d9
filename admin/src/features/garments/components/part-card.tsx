import type { Garment, Part } from '@ellwand/shared/records/garment';
import { useMutation, useQueryClient } from '@tanstack/react-query';
import { Link } from 'react-router-dom';
import { PrintSheet } from '../../../components/print-sheet.js';
import { Button, ButtonLink } from '../../../components/ui/button.js';
import { Refused } from '../../../components/ui/states.js';
import { paths } from '../../../config/paths.js';
import { dayText } from '../../../lib/moments.js';
import { useMay } from '../../../lib/session.js';
import { garmentQuery } from '../api/garment.js';
import { removePart } from '../api/parts.js';

/** One part: its number, its measuring sheets, and what can be done with it. */
export function PartCard({
  garment,
  part,
  locked,
}: {
  readonly garment: Garment;
  readonly part: Part;
  readonly locked: boolean;
}) {
  const mayMeasure = useMay('sheet:write');
  const queries = useQueryClient();
  const remove = useMutation({
    mutationFn: () => removePart(part.id, garment.version),
    onSuccess: (next) => queries.setQueryData(garmentQuery(garment.id).queryKey, next),
  });
  return (
    <li className="rounded-sm border border-hair bg-sheet p-4">
      <div className="flex items-baseline justify-between gap-3">
        <h3 className="text-body font-semibold">{part.name}</h3>
        <span className="figures text-label text-ink-3">
          {garment.record.ownNumber}
          {!part.wornTogether && part.suffix}
        </span>
      </div>
      {part.sheets.length === 0 && <p className="text-table text-ink-3">Not measured yet.</p>}
      <ul className="mt-1">
        {part.sheets.map((sheet) => (
          <li key={sheet.id} className="border-t border-hair py-2 first:border-t-0">
            <Link
              to={paths.sheet(sheet.id)}
              className="text-table font-medium text-indigo underline underline-offset-4"
            >
              Sheet of {dayText(sheet.measuredOn)}
            </Link>
            <p className="figures text-label text-ink-2">
              {sheet.state === 'complete' ? 'Complete' : 'Open'}
              {sheet.purpose === 'study' && ', for study'}, {sheet.pointsDone} of {sheet.pointsWanted} points
              {sheet.speaks && part.sheets.length > 1 && ', speaks for the part'}
            </p>
          </li>
        ))}
      </ul>
      <div className="mt-2 flex flex-wrap gap-2">
        {mayMeasure && !locked && (
          <ButtonLink height="dense" to={paths.newSheet(garment.id, part.id)}>
            New measuring sheet <span className="sr-only">for {part.name}</span>
          </ButtonLink>
        )}
        {part.sheets.length > 0 && (
          <ButtonLink height="dense" to={paths.partSheets(garment.id, part.id)}>
            Sheets over the years <span className="sr-only">of {part.name}</span>
          </ButtonLink>
        )}
        {!part.wornTogether && (
          <ButtonLink height="dense" to={paths.cutSheet(garment.id, part.id)}>
            Cut sheet <span className="sr-only">of {part.name}</span>
          </ButtonLink>
        )}
        {!locked && part.sheets.length === 0 && garment.parts.length > 1 && (
          <Button height="dense" tone="quiet" disabled={remove.isPending} onClick={() => remove.mutate()}>
            Remove <span className="sr-only">{part.name}</span>
          </Button>
        )}
      </div>
      <div className="mt-2">
        <PrintSheet
          path={`/workroom/parts/${part.id}/blank-sheet.pdf`}
          label="Blank sheet to print"
          of={part.name}
        />
      </div>
      <Refused error={remove.error} />
    </li>
  );
}
