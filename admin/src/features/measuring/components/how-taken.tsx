import type { Draft } from '../model/drafts.js';
import type { SheetRow } from '../model/rows.js';
import type { SheetDesk } from '../model/use-sheet-desk.js';

interface HowTakenProps {
  readonly desk: SheetDesk;
  readonly row: SheetRow;
  readonly draft: Draft;
  readonly id: string;
  readonly label: string;
  /** Asked for by hand, before anything stands in its box. */
  readonly gapAsked: boolean;
}

/** What is out of the usual about one reading: a gap taken off, read flat and doubled, how deep the level lay. */
export function HowTaken({ desk, row, draft, id, label, gapAsked }: HowTakenProps) {
  const asksDepth = row.point.point.group === 'hip' && row.point.point.levelRecorded;
  const showsGap = gapAsked || draft.gap !== '';
  if (row.covered || (!asksDepth && !showsGap && !draft.doubled)) return null;
  return (
    <div className="mt-1 ml-[2.375rem] flex flex-wrap items-center gap-x-5 gap-y-2 text-table">
      {draft.doubled && (
        <label className="flex min-h-11 items-center gap-2">
          <input
            type="checkbox"
            checked
            disabled={desk.locked}
            onChange={() => desk.type(row, { doubled: false })}
            className="size-6 accent-indigo"
          />
          Read flat, doubled<span className="sr-only">: {label}</span>
        </label>
      )}
      {showsGap && (
        <SmallBox
          id={`gap-${id}`}
          label="Gap crossed, taken off"
          row={label}
          unit={draft.unit}
          value={draft.gap}
          disabled={desk.locked}
          onChange={(gap) => desk.type(row, { gap })}
        />
      )}
      {asksDepth && (
        <SmallBox
          id={`depth-${id}`}
          label="Depth below the waist"
          row={label}
          unit={draft.unit}
          value={draft.depth}
          disabled={desk.locked}
          onChange={(depth) => desk.type(row, { depth })}
        />
      )}
    </div>
  );
}

interface SmallBoxProps {
  readonly id: string;
  readonly label: string;
  readonly row: string;
  readonly unit: string;
  readonly value: string;
  readonly disabled: boolean;
  readonly onChange: (text: string) => void;
}

function SmallBox({ id, label, row, unit, value, disabled, onChange }: SmallBoxProps) {
  return (
    <span className="flex items-center gap-2">
      <label htmlFor={id} className="text-label text-ink-2">
        {label}
        <span className="sr-only"> for {row}</span>
      </label>
      <input
        id={id}
        type="text"
        inputMode="decimal"
        autoComplete="off"
        disabled={disabled}
        value={value}
        onChange={(event) => onChange(event.target.value)}
        className="box min-h-11 w-20 py-1 text-right"
      />
      <span aria-hidden="true" className="text-label text-ink-2">
        {unit}
      </span>
    </span>
  );
}
