import { describedLabels } from '@ellwand/shared/records/table-note';
import type { PartSheets, SheetOfPart } from '@ellwand/shared/records/part-sheets';
import { type SheetCell, sheetRows } from '@ellwand/shared/records/sheet-differences';
import { notTakenReasons } from '@ellwand/shared/readings/reading';
import { wornSideLabels } from '@ellwand/shared/readings/worn-side';
import { readMm } from '@ellwand/shared/units/format-length';
import { fromMmString } from '@ellwand/shared/units/length';
import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { paths } from '../../../config/paths.js';
import { dayText } from '../../../lib/moments.js';
import { changeText, peopleText, standingText } from '../model/words.js';

const rowHead =
  'sticky left-0 z-10 w-28 min-w-28 bg-paper py-2 pr-3 text-left align-top font-normal sm:w-48 sm:min-w-48 print:static';
const cell = 'min-w-36 border-l border-hair px-3 py-2 align-top print:min-w-0';

/** Sheets as columns, oldest first; points as rows, each value held against the one before it. */
export function SheetsTable({ shown }: { readonly shown: PartSheets }) {
  const { sheets, partName } = shown;
  return (
    <div
      role="region"
      aria-label="Sheets beside one another"
      // The table is wider than a phone: whoever has no pointer scrolls it by its keys.
      tabIndex={0}
      className="relative overflow-x-auto print:overflow-visible"
    >
      <table className="border-collapse text-table">
        <caption className="sr-only">
          Sheets of {partName}, oldest first. A change is told against the sheet before, where it is more than
          two careful readings may differ.
        </caption>
        <thead>
          <tr className="border-b border-ink">
            <th scope="col" className={`${rowHead} text-label text-ink-3`}>
              mm
            </th>
            {sheets.map((sheet) => (
              <SheetHead key={sheet.id} sheet={sheet} shown={shown} />
            ))}
          </tr>
        </thead>
        <tbody>
          <About title="Measured by" sheets={sheets} tell={(sheet) => peopleText(sheet)} />
          <About
            title="Condition and treatment"
            sheets={sheets}
            tell={(sheet) => <Remarks sheet={sheet} />}
          />
        </tbody>
        <tbody>
          {sheetRows(shown).map(({ pointId, label, worn, cells }) => (
            <tr key={`${pointId} ${worn}`} className="break-inside-avoid border-b border-hair">
              <th scope="row" className={rowHead}>
                {label}
                {worn && <span className="block text-label text-ink-3">{wornSideLabels[worn]}</span>}
              </th>
              {cells.map((each) => (
                <ValueCell key={each.sheetId} told={each} />
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}

function SheetHead({ sheet, shown }: { readonly sheet: SheetOfPart; readonly shown: PartSheets }) {
  const { id, measuredOn } = sheet;
  const { published, speaking } = shown;
  return (
    <th scope="col" className={`${cell} text-left font-normal`}>
      <Link to={paths.sheet(id)} className="font-semibold text-indigo underline underline-offset-4">
        {dayText(measuredOn)}
      </Link>
      <span className="mt-1 block text-label text-ink-2">{standingText(sheet)}</span>
      {speaking?.sheetId === id && <Mark>Speaks for the part</Mark>}
      {published?.sheetId === id && <Mark>Public, version {published.version}</Mark>}
    </th>
  );
}

function Mark({ children }: { readonly children: ReactNode }) {
  return <span className="block text-label font-medium text-indigo">{children}</span>;
}

function About({
  title,
  sheets,
  tell,
}: {
  readonly title: string;
  readonly sheets: readonly SheetOfPart[];
  readonly tell: (sheet: SheetOfPart) => ReactNode;
}) {
  return (
    <tr className="border-b border-hair">
      <th scope="row" className={`${rowHead} text-label text-ink-2`}>
        {title}
      </th>
      {sheets.map((sheet) => (
        <td key={sheet.id} className={`${cell} max-w-72 text-label text-ink-2`}>
          {tell(sheet)}
        </td>
      ))}
    </tr>
  );
}

function Remarks({ sheet: { note, remarks } }: { readonly sheet: SheetOfPart }) {
  if (note === '' && remarks.length === 0) return <span className="text-ink-3">Nothing noted</span>;
  return (
    <div className="space-y-1 whitespace-pre-line">
      {note && <p>{note}</p>}
      {remarks.map(({ id, thing, text, byName }) => (
        <p key={id}>
          {describedLabels[thing]}, {byName}: {text}
        </p>
      ))}
    </div>
  );
}

function ValueCell({ told: { value, notTaken, change } }: { readonly told: SheetCell }) {
  if (!value) {
    return (
      <td className={`${cell} text-label text-ink-3`}>
        {notTaken ? notTakenReasons[notTaken] : <span className="sr-only">Not on this sheet</span>}
      </td>
    );
  }
  return (
    <td className={`${cell} ${change === null ? '' : 'bg-madder-tint'}`}>
      <span className="figures font-medium">{readMm(fromMmString(value.valueMm)).replace(' mm', '')}</span>
      <span className="figures text-label text-ink-3"> ± {value.uncertaintyMm}</span>
      {value.method && <span className="block text-label text-ink-3">flat and doubled</span>}
      {change !== null && (
        <span className="figures block text-label font-medium text-madder">{changeText(change)}</span>
      )}
    </td>
  );
}
