import { dutyLabels } from '@ellwand/shared/records/hands';
import { type Sheet, type SheetFactsInput, supportLabels } from '@ellwand/shared/records/sheet';
import { useQueryClient } from '@tanstack/react-query';
import { PrintSheet } from '../../../components/print-sheet.js';
import { dayText } from '../../../lib/moments.js';
import { isProblem } from '../../../lib/problem-error.js';
import { saveFacts } from '../api/save-facts.js';
import { sheetQuery } from '../api/sheet.js';
import type { SheetPoint } from '../model/sheet-points.js';
import { FactsForm } from './facts-form.js';
import { PrepareButton } from './prepare-button.js';

const typedFacts = ({ people, ...facts }: Sheet['facts']): SheetFactsInput => ({
  ...facts,
  people: people.map(({ userId, duty }) => ({ userId, duty })),
});

/** The facts of an open sheet can be changed while it is worked on: people may swap places. */
export function FactsPanel({
  sheet,
  points,
}: {
  readonly sheet: Sheet;
  readonly points: readonly SheetPoint[];
}) {
  const queries = useQueryClient();
  const print = (
    <PrintSheet
      path={`/workroom/sheets/${sheet.id}/sheet.pdf`}
      label="This sheet to print"
      of={sheet.garment.partName}
      height="table"
    />
  );
  if (sheet.state === 'complete')
    return (
      <div className="p-4">
        {print}
        <FactsShown sheet={sheet} />
      </div>
    );
  return (
    <div className="space-y-6 p-4">
      <PrepareButton sheetId={sheet.id} />
      {print}
      <FactsForm
        facts={typedFacts(sheet.facts)}
        verb="Save the facts"
        points={points}
        onSave={async (facts) => {
          try {
            queries.setQueryData(
              sheetQuery(sheet.id).queryKey,
              await saveFacts(sheet.id, sheet.version, facts),
            );
          } catch (error) {
            // The sheet has moved on under this form; what was typed stays, and the next save meets the new version.
            if (isProblem(error) && error.status === 412)
              await queries.invalidateQueries({ queryKey: sheetQuery(sheet.id).queryKey });
            throw error;
          }
        }}
      />
    </div>
  );
}

function FactsShown({ sheet: { facts } }: { readonly sheet: Sheet }) {
  const rows = [
    ...facts.people.map(({ name, duty }) => [dutyLabels[duty], name] as const),
    ['Alone, because', facts.aloneBecause] as const,
    ['Measured on', dayText(facts.measuredOn)] as const,
    ['Place', facts.place] as const,
    ['How the garment lay', supportLabels[facts.support]] as const,
    ['Tape', `${facts.tape}, ${facts.tapeLengthMm} mm`] as const,
    ['Tape at nothing', `${facts.tapeZeroMm} mm`] as const,
    ['Fastening pair', facts.fasteningPair] as const,
    ['Note', facts.note] as const,
  ];
  return (
    <dl className="mt-4 text-table">
      {rows
        .filter(([, value]) => value !== '')
        .map(([label, value]) => (
          <div
            key={`${label} ${value}`}
            className="grid gap-x-6 border-b border-hair py-2 sm:grid-cols-[16rem_minmax(0,1fr)]"
          >
            <dt className="text-ink-3">{label}</dt>
            <dd className="whitespace-pre-line">{value}</dd>
          </div>
        ))}
    </dl>
  );
}
