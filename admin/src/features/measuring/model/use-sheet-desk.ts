import type { HandlingStep } from '@ellwand/shared/points/point';
import type { NewReading, Sheet } from '@ellwand/shared/records/sheet';
import { mm } from '@ellwand/shared/units/length';
import { useQueryClient } from '@tanstack/react-query';
import { useCallback, useMemo, useState } from 'react';
import { useRemembered } from '../../../lib/remembered.js';
import { useSession } from '../../../lib/session.js';
import { sheetQuery } from '../api/sheet.js';
import type { Draft } from './drafts.js';
import { keyedReading, notTakenReading, saysSomethingNew } from './keyed-reading.js';
import { isDone, sheetRows, type SheetRow } from './rows.js';
import { sayReading, useReadAloud } from './read-aloud.js';
import { sendStatus } from './send-status.js';
import { sheetPoints } from './sheet-points.js';
import { useDrafts, useOutbox, useOutboxView } from './use-outbox.js';
import { useKeypad } from './use-keypad.js';
import { useFindings } from './use-findings.js';
import { useTurning } from './use-turning.js';

export const sheetUnits = ['mm', 'cm', 'in'] as const;
export type NotTakenReason = Extract<NewReading, { state: 'not-taken' }>['reason'];

/** Everything a person does at the table, over what the sheet, the outbox and the typed boxes hold. */
export function useSheetDesk(shown: Sheet) {
  // What was just kept is in the cache before this screen is told of it; read there, it is never nowhere.
  const sheet = useQueryClient().getQueryData(sheetQuery(shown.id).queryKey) ?? shown;
  const points = useMemo(() => sheetPoints(sheet.protocol), [sheet.protocol]);
  const tape = useMemo(
    () => ({ length: mm(sheet.facts.tapeLengthMm), zero: mm(sheet.facts.tapeZeroMm) }),
    [sheet.facts],
  );
  const outbox = useOutbox(sheet.id);
  const view = useOutboxView(outbox);
  const [drafts, typed] = useDrafts(sheet.id);
  const [rounds, setRounds] = useState<Readonly<Record<string, number>>>({});
  const rows = useMemo(
    () => sheetRows({ points, stored: sheet.readings, entries: view.entries, tape, rounds }),
    [points, sheet.readings, view.entries, tape, rounds],
  );
  const [unit, setUnit] = useRemembered('sheet-unit', sheetUnits, 'mm');
  const [aloud, setAloud] = useReadAloud();
  const [mistakes, setMistakes] = useState<Readonly<Record<string, string>>>({});
  const findings = useFindings(sheet);
  const reader = useReader(sheet);
  const place = usePlace(sheet.id, rows);
  const keypad = useKeypad();

  const draftOf = useCallback(
    (row: SheetRow): Draft =>
      typed[row.key] ?? {
        text: row.reading?.typed ?? '',
        unit: row.reading && row.reading.reason === null ? row.reading.unit : unit,
        count: row.reading && row.reading.tapeCount > 0 ? String(row.reading.tapeCount) : '',
        level: usualLevel(rows, row),
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
    const keyed = keyedReading({ row, readBy: reader.readBy }, draft);
    if (!keyed.ok) {
      say(row.key, keyed.sentence);
      return false;
    }
    void outbox.add(keyed.reading, row.key);
    if (aloud) sayReading(row.point.point.name, keyed.reading);
    return true;
  };
  const next = () => {
    if (!commit(place.current)) return;
    const at = rows.findIndex(({ key }) => key === place.current.key);
    const open = (row: SheetRow) => row.key !== place.current.key && !isDone(row);
    const target = rows.slice(at + 1).find(open) ?? rows.find(open) ?? rows[at + 1];
    if (target) place.go(target.key);
  };
  const step = (by: 1 | -1) => {
    if (!commit(place.current)) return;
    const target = rows[rows.findIndex(({ key }) => key === place.current.key) + by];
    if (target) place.go(target.key);
  };
  const setAside = (row: SheetRow, reason: NotTakenReason, note: string) => {
    say(row.key, null);
    void outbox.add(notTakenReading({ row, readBy: reader.readBy, note }, reason), row.key);
  };
  const readAgain = (pointId: string) => {
    const last = Math.max(...rows.filter(({ point }) => point.id === pointId).map(({ round }) => round));
    setRounds((all) => ({ ...all, [pointId]: last + 1 }));
    place.go(`${pointId}:${last + 1}`);
  };

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
    reader,
    outbox,
    view,
    mistakes,
    done,
    draftOf,
    type,
    commit,
    next,
    step,
    setAside,
    readAgain,
    answer,
    findings,
    ...place,
    ...keypad,
    locked: sheet.state === 'complete',
    status: sendStatus(view, Object.keys(typed).length, received),
  };
}
export type SheetDesk = ReturnType<typeof useSheetDesk>;

/** The level a row begins with: its own reading’s, else the one found for the point’s first reading. */
function usualLevel(rows: readonly SheetRow[], row: SheetRow): Draft['level'] {
  if (row.reading) return row.reading.level;
  return rows.find(({ point, round }) => point.id === row.point.id && round === 1)?.reading?.level ?? null;
}

/** Who reads the tape just now: one of those the sheet names, else whoever is signed in. */
function useReader(sheet: Sheet) {
  const { user } = useSession();
  const named = sheet.facts.people.filter(({ duty }) => duty === 'read');
  const readers =
    named.length > 0
      ? named.map(({ userId, name }) => ({ userId, name }))
      : [{ userId: user.id, name: user.name }];
  const [chosen, setReadBy] = useState<string | null>(null);
  const readBy = readers.find(({ userId }) => userId === chosen)?.userId ?? readers[0]!.userId;
  return { readers, readBy, setReadBy };
}

/** Where the work is: the current row, and the turning of the garment between steps. */
function usePlace(sheetId: string, rows: readonly SheetRow[]) {
  const [key, setKey] = useState(() => (rows.find((row) => !isDone(row)) ?? rows[0]!).key);
  const [focusAsked, setFocusAsked] = useState({ key, times: 0 });
  const current = rows.find((row) => row.key === key) ?? rows[0]!;
  const turning = useTurning(sheetId);
  const stepOf = (rowKey: string): HandlingStep | undefined =>
    rows.find((row) => row.key === rowKey)?.point.step ??
    rows.find((row) => rowKey.startsWith(`${row.point.id}:`))?.point.step;

  /** Makes a row the current one; where the garment must be turned first, that is said, once. */
  const enter = (to: string): boolean => {
    setKey(to);
    const step = stepOf(to);
    return step === undefined || turning.mayGo(step, to);
  };
  const focus = (to: string) => setFocusAsked(({ times }) => ({ key: to, times: times + 1 }));
  const go = (to: string) => {
    if (enter(to)) focus(to);
  };
  const turned = () => {
    const to = turning.done();
    if (to) focus(to);
  };
  return { current, enter, go, focusAsked, turn: turning.asked, turned };
}
