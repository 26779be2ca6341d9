import type { NewReading, Sheet } from '@ellwand/shared/records/sheet';
import { mm } from '@ellwand/shared/units/length';
import { useQueryClient } from '@tanstack/react-query';
import { useCallback, useMemo, useState } from 'react';
import { useRemembered } from '../../../lib/remembered.js';
import { sheetQuery } from '../api/sheet.js';
import type { Draft } from './drafts.js';
import { keyedReading, notTakenReading, saysSomethingNew } from './keyed-reading.js';
import { isDone, rowKey, sheetRows, type SheetRow } from './rows.js';
import { sayNext, sayReading, useReadAloud } from './read-aloud.js';
import { sendStatus } from './send-status.js';
import { sheetPoints } from './sheet-points.js';
import { useDrafts, useOutbox, useOutboxView } from './use-outbox.js';
import { useKeypad } from './use-keypad.js';
import { useFindings } from './use-findings.js';
import { useHands } from './use-hands.js';
import { useLatest } from './use-latest.js';
import { usePlace } from './use-place.js';
import { useSittings } from './use-sittings.js';
import { useUndo } from './use-undo.js';

export const sheetUnits = ['mm', 'cm', 'in'] as const;
export type NotTakenReason = Extract<NewReading, { state: 'not-taken' }>['reason'];

/** Everything a person does at the table, over what the sheet, the outbox and the typed boxes hold. */
export function useSheetDesk(shown: Sheet) {
  // What was just kept is in the cache before this screen is told of it; read there, it is never nowhere.
  const sheet = useQueryClient().getQueryData(sheetQuery(shown.id).queryKey) ?? shown;
  const points = useMemo(
    () => sheetPoints(sheet.protocol, sheet.facts.repeatPoints),
    [sheet.protocol, sheet.facts.repeatPoints],
  );
  const tape = useMemo(
    () => ({ length: mm(sheet.facts.tapeLengthMm), zero: mm(sheet.facts.tapeZeroMm) }),
    [sheet.facts],
  );
  const outbox = useOutbox(sheet.id);
  const view = useOutboxView(outbox);
  const [drafts, typed] = useDrafts(sheet.id);
  const [rounds, setRounds] = useState<Readonly<Record<string, number>>>({});
  const [sided, setSided] = useState<ReadonlySet<string>>(new Set());
  const rows = useMemo(
    () => sheetRows({ points, sheet, entries: view.entries, rounds, sided }),
    [points, sheet, view.entries, rounds, sided],
  );
  const [unit, setUnit] = useRemembered('sheet-unit', sheetUnits, 'mm');
  const [aloud, setAloud] = useReadAloud();
  const [pausing, setPausing] = useState<string | null>(null);
  const [mistakes, setMistakes] = useState<Readonly<Record<string, string>>>({});
  const findings = useFindings(sheet);
  const hands = useHands(sheet, outbox, view);
  const sittings = useSittings(sheet, outbox, view);
  const place = usePlace(sheet.id, rows);
  const undoing = useUndo({ outbox, view, putBack: (row, draft) => drafts.set(row, draft), go: place.go });
  const keypad = useKeypad();

  const draftOf = useCallback(
    (row: SheetRow): Draft =>
      typed[row.key] ?? {
        text: row.reading?.typed ?? '',
        unit: row.reading && row.reading.reason === null ? row.reading.unit : unit,
        count: row.reading && row.reading.tapeCount > 0 ? String(row.reading.tapeCount) : '',
        level: usualLevel(rows, row),
        gap: row.reading?.gapTyped ?? '',
        depth: row.reading?.depthTyped ?? '',
        doubled: row.reading?.doubled ?? false,
      },
    [rows, typed, unit],
  );
  const say = (key: string, sentence: string | null) =>
    setMistakes(({ [key]: _old, ...others }) =>
      sentence === null ? others : { ...others, [key]: sentence },
    );

  const type = (row: SheetRow, part: Partial<Draft>) => {
    say(row.key, null);
    drafts.set(row.key, { ...draftOf(row), ...part });
  };
  /** True unless something typed cannot be kept, which is then said beside the row. */
  const commit = (row: SheetRow): boolean => {
    const draft = typed[row.key];
    if (!draft) return true;
    if (!saysSomethingNew(draft, row)) {
      // A level chosen before its reading is not nothing: it waits with the row.
      if (draft.level === usualLevel(rows, row)) drafts.clear(row.key);
      return true;
    }
    const keyed = keyedReading({ row, readBy: hands.readBy, heldBy: hands.heldBy }, draft);
    if (!keyed.ok) {
      say(row.key, keyed.sentence);
      return false;
    }
    void outbox.add(keyed.reading, row.key);
    undoing.did(row, keyed.reading);
    if (aloud) sayReading(row.point.point.name, keyed.reading);
    return true;
  };
  const next = () => {
    if (!commit(place.current)) return;
    const at = rows.findIndex(({ key }) => key === place.current.key);
    const open = (row: SheetRow) => row.key !== place.current.key && !isDone(row);
    const target = rows.slice(at + 1).find(open) ?? rows.find(open) ?? rows[at + 1];
    if (!target) return;
    if (aloud) sayNext(target.point.point.name);
    place.go(target.key);
  };
  const step = (by: 1 | -1) => {
    if (!commit(place.current)) return;
    const target = rows[rows.findIndex(({ key }) => key === place.current.key) + by];
    if (target) place.go(target.key);
  };
  const setAside = (row: SheetRow, reason: NotTakenReason, note: string) => {
    say(row.key, null);
    const reading = notTakenReading({ row, readBy: hands.readBy, heldBy: hands.heldBy, note }, reason);
    void outbox.add(reading, row.key);
    undoing.did(row, reading);
  };
  const readAgain = ({ point, worn }: SheetRow) => {
    const own = rows.filter((row) => row.point.id === point.id && row.worn === worn);
    const last = Math.max(...own.map(({ round }) => round));
    setRounds((all) => ({ ...all, [point.id]: last + 1 }));
    place.go(rowKey(point.id, last + 1, worn));
  };
  /** Left and right are told apart from now on; what was read before keeps its row. */
  const tellSides = ({ point }: SheetRow) => {
    setSided((all) => new Set([...all, point.id]));
    place.go(rowKey(point.id, 1, 'right'));
  };

  const { current, focusAsked, turn, enter, go, turned } = place;
  const ways = useLatest({ type, commit, next, step, setAside, readAgain, tellSides, enter, go });
  const answer = (key: string, reason: string) => void outbox.say({ about: 'answer', key, reason });
  const received =
    sheet.readings
      .map(({ receivedAt }) => receivedAt)
      .toSorted()
      .at(-1) ?? null;
  const done = points.filter(({ id }) => rows.some((row) => row.point.id === id && isDone(row))).length;
  return {
    sheet,
    points,
    rows,
    tape,
    unit,
    setUnit,
    aloud,
    setAloud,
    hands,
    sittings,
    pausing,
    setPausing,
    undo: undoing.undo,
    canUndo: undoing.canUndo,
    outbox,
    view,
    mistakes,
    done,
    draftOf,
    answer,
    findings,
    current,
    focusAsked,
    turn,
    turned,
    ...ways,
    ...keypad,
    locked: sheet.state === 'complete',
    status: sendStatus(view, Object.keys(typed).length, received),
  };
}
export type SheetDesk = ReturnType<typeof useSheetDesk>;

/** The level a row begins with: its own reading’s, else the one found for the point’s first reading. */
function usualLevel(rows: readonly SheetRow[], row: SheetRow): Draft['level'] {
  if (row.reading) return row.reading.level;
  return (
    rows.find((other) => other.point.id === row.point.id && other.worn === row.worn && other.round === 1)
      ?.reading?.level ?? null
  );
}
