import { levelLabels, notTakenReasons } from '@ellwand/shared/readings/reading';
import { LevelFoundBy } from '@ellwand/shared/records/sheet';
import { formatLength, unitLabels } from '@ellwand/shared/units/format-length';
import { replaceEqualDeep } from '@tanstack/react-query';
import { type KeyboardEvent, memo, useState } from 'react';
import { FieldError } from '../../../components/ui/field.js';
import type { Draft } from '../model/drafts.js';
import type { RowState } from '../model/row-state.js';
import { draftValue } from '../model/draft-value.js';
import { type Again, howOf, type SheetRow } from '../model/rows.js';
import type { SheetDesk } from '../model/use-sheet-desk.js';
import { DecisionCard } from './decision-card.js';
import { HowTaken } from './how-taken.js';
import { rowLabel } from './row-label.js';
import { RowMenu } from './row-menu.js';

const ids = (row: SheetRow) => {
  const base = row.key.replaceAll(':', '-');
  return {
    row: `row-${base}`,
    count: `count-${base}`,
    rest: `reading-${base}`,
    level: `level-${base}`,
    error: `error-${base}`,
    says: `says-${base}`,
  };
};
/** The box that takes the focus when a row's turn comes. */
export const firstBoxId = (row: SheetRow) =>
  row.point.point.takesTapeLengths ? ids(row).count : ids(row).rest;

const tones: Readonly<Record<RowState['tone'], string>> = {
  open: 'bg-well text-ink-2',
  good: 'bg-verdigris-tint text-verdigris',
  look: 'bg-weld-tint text-weld-text',
  decide: 'bg-madder-tint text-madder',
  aside: 'bg-well text-ink-2 italic',
};

interface ReadingRowProps {
  readonly desk: SheetDesk;
  readonly row: SheetRow;
  readonly current: boolean;
  readonly draft: Draft;
  readonly state: RowState;
  readonly mistake: string | undefined;
  readonly again: Again;
}

/** One point in one round: its letter, its name, its boxes, its state. Drawn anew only when something of it changes. */
export const ReadingRow = memo(RowOfReading, looksTheSame);

const same = <T,>(one: T, other: T) => replaceEqualDeep(one, other) === one;

/** A hand types into one row; the other twenty-five stay as they are. What the desk can do never changes. */
function looksTheSame(one: ReadingRowProps, other: ReadingRowProps): boolean {
  if (other.row.decision) return false;
  const { desk: before } = one;
  const { desk: after } = other;
  return (
    one.current === other.current &&
    one.mistake === other.mistake &&
    before.locked === after.locked &&
    // Somebody else who signs in over the page keeps things in a name of their own.
    before.outbox === after.outbox &&
    before.keypad === after.keypad &&
    same(before.tape, after.tape) &&
    same([one.row, one.draft, one.state, one.again], [other.row, other.draft, other.state, other.again])
  );
}

function RowOfReading({ desk, row, current, draft, state, mistake, again }: ReadingRowProps) {
  const id = ids(row);
  const [gapAsked, setGapAsked] = useState(false);
  const leave = (event: { relatedTarget: EventTarget | null; currentTarget: Element }) => {
    if (!event.currentTarget.contains(event.relatedTarget as Node | null)) desk.commit(row);
  };
  return (
    <li
      id={id.row}
      aria-current={current ? 'step' : undefined}
      onBlur={leave}
      // Also where it is the current row already: the focus may have been elsewhere for a moment in between.
      onFocus={() => desk.enter(row.key)}
      className={`border-b border-l-4 border-b-hair px-3 py-1.5 ${current ? 'border-l-weld bg-weld-tint' : 'border-l-transparent'}`}
    >
      <div className="grid min-h-[3.125rem] grid-cols-[1.625rem_minmax(0,1fr)_auto_auto] items-center gap-x-3 xl:grid-cols-[1.625rem_minmax(0,1fr)_auto_auto_7rem_auto]">
        <span className={`letter max-xl:row-span-2 ${current ? 'letter-lit' : ''}`} aria-hidden="true">
          {row.point.letter}
        </span>
        <div className="min-w-0 max-xl:self-end">
          <label htmlFor={id.rest} className="block text-body font-medium leading-5">
            {rowLabel(row)}
            <span className="sr-only">, {unitLabels[draft.unit]}</span>
          </label>
          <p id={id.says} className="text-label text-ink-2">
            {says(row, state)}
          </p>
        </div>
        {row.point.point.levelRecorded && !row.covered ? (
          <LevelBox desk={desk} row={row} level={draft.level} id={id.level} />
        ) : (
          <span className="max-xl:hidden" />
        )}
        <Boxes desk={desk} row={row} draft={draft} id={id} mistake={mistake} />
        <span
          className={`rounded-sm px-2 py-1 text-center text-label font-medium max-xl:col-start-2 max-xl:row-start-2 max-xl:w-fit max-xl:self-start max-xl:py-0 ${tones[state.tone]}`}
        >
          {state.word}
        </span>
        <div className="max-xl:col-start-4 max-xl:row-span-2 max-xl:row-start-1">
          {!desk.locked && <RowMenu desk={desk} row={row} again={again} onGap={() => setGapAsked(true)} />}
        </div>
      </div>
      <HowTaken
        desk={desk}
        row={row}
        draft={draft}
        id={row.key.replaceAll(':', '-')}
        label={rowLabel(row)}
        gapAsked={gapAsked}
      />
      {mistake && <FieldError id={id.error}>{mistake}</FieldError>}
      {row.decision && <DecisionCard desk={desk} row={row} entry={row.decision} />}
    </li>
  );
}

function says(row: SheetRow, state: RowState): string {
  const { reading } = row;
  if (state.sentence) return state.sentence;
  if (reading?.reason) return notTakenReasons[reading.reason];
  if (
    reading &&
    reading.value !== null &&
    (reading.unit !== 'mm' || reading.tapeCount > 0 || reading.gapTyped !== '' || isDoubled(row))
  ) {
    const doubled = isDoubled(row) ? 'doubled, ' : '';
    const gap = reading.gapTyped === '' ? '' : `, less a gap of ${reading.gapTyped} ${reading.unit}`;
    return `${doubled}${formatLength(reading.value, 'mm')}${gap}`;
  }
  if (row.point.point.how === 'flat-doubled') return 'the half, as it lies flat';
  return reading?.note ?? '';
}

const isDoubled = (row: SheetRow): boolean => howOf(row, row.reading?.doubled ?? false) === 'flat-doubled';

interface BoxesProps {
  readonly desk: SheetDesk;
  readonly row: SheetRow;
  readonly draft: Draft;
  readonly id: ReturnType<typeof ids>;
  readonly mistake: string | undefined;
}

function Boxes({ desk, row, draft, id, mistake }: BoxesProps) {
  if (row.covered)
    return <span className="h-12 w-36 rounded-sm border border-hair bg-well" aria-hidden="true" />;
  const takesTapes = row.point.point.takesTapeLengths;
  const onKeyDown = (event: KeyboardEvent<HTMLInputElement>) => {
    const inCount = event.currentTarget.id === id.count;
    if (event.key === 'Enter') {
      event.preventDefault();
      if (inCount) document.getElementById(id.rest)?.focus();
      else desk.next();
    } else if (event.key === 'ArrowDown' || event.key === 'ArrowUp') {
      event.preventDefault();
      desk.step(event.key === 'ArrowDown' ? 1 : -1);
    }
  };
  const common = {
    onKeyDown,
    disabled: desk.locked,
    autoComplete: 'off',
    type: 'text',
    'aria-invalid': mistake ? (true as const) : undefined,
    'aria-describedby': mistake ? `${id.says} ${id.error}` : id.says,
  };
  return (
    <div
      className={`flex flex-wrap items-center gap-2 ${takesTapes ? 'max-xl:col-span-2 max-xl:col-start-2 max-xl:row-start-3 max-xl:mt-1' : 'max-xl:col-start-3 max-xl:row-span-2 max-xl:row-start-1'}`}
    >
      {takesTapes && (
        <>
          <input
            {...common}
            id={id.count}
            aria-label={`${rowLabel(row)}, whole tapes`}
            inputMode={desk.keypad ? 'none' : 'numeric'}
            value={draft.count}
            onFocus={() => desk.setBox('count')}
            onChange={(event) => desk.type(row, { count: event.target.value })}
            className="box reading-box w-12 text-center"
          />
          <span className="figures whitespace-nowrap text-table text-ink-2">
            × {formatLength(desk.tape.length, 'mm')} +
          </span>
        </>
      )}
      <div className="flex">
        <input
          {...common}
          id={id.rest}
          inputMode={desk.keypad ? 'none' : draft.unit === 'in' ? 'text' : 'decimal'}
          value={draft.text}
          onFocus={(event) => {
            desk.setBox('text');
            event.currentTarget.select();
          }}
          onChange={(event) => desk.type(row, { text: event.target.value })}
          className="box reading-box w-24 rounded-r-none border-r-0 text-right"
        />
        <span
          className="grid h-12 w-11 place-items-center rounded-r-sm border border-rule bg-well text-table text-ink-2"
          aria-hidden="true"
        >
          {draft.unit}
        </span>
      </div>
      {takesTapes && <TapeSum desk={desk} row={row} />}
    </div>
  );
}

/** What the tapes and the rest come to, while they are keyed. */
function TapeSum({ desk, row }: { readonly desk: SheetDesk; readonly row: SheetRow }) {
  const draft = desk.draftOf(row);
  const value = draftValue(desk.sheet, row, draft);
  if (value === null || !(Number(draft.count) > 0)) return null;
  return (
    <output className="figures whitespace-nowrap text-table font-medium max-sm:sr-only">
      = {formatLength(value, 'mm')}
    </output>
  );
}

function LevelBox({
  desk,
  row,
  level,
  id,
}: {
  readonly desk: SheetDesk;
  readonly row: SheetRow;
  readonly level: Draft['level'];
  readonly id: string;
}) {
  return (
    <div className="flex flex-wrap items-center gap-x-3 max-xl:col-span-3 max-xl:col-start-2 max-xl:row-start-4 max-xl:mt-1">
      <label htmlFor={id} className="text-label text-ink-2">
        Level found <span className="sr-only">for {rowLabel(row)}</span>
      </label>
      <select
        id={id}
        value={level ?? ''}
        disabled={desk.locked}
        onChange={(event) =>
          desk.type(row, { level: LevelFoundBy.options.find((one) => one === event.target.value) ?? null })
        }
        className="box min-h-11 w-auto py-1 text-table"
      >
        <option value="">not said yet</option>
        {LevelFoundBy.options.map((value) => (
          <option key={value} value={value}>
            {levelLabels[value]}
          </option>
        ))}
      </select>
    </div>
  );
}
