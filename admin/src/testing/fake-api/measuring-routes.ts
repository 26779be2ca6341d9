import { runChecks } from '@ellwand/shared/checks/registry';
import { toProtocol } from '@ellwand/shared/records/protocol';
import { derivedViews, toReading } from '@ellwand/shared/records/measured';
import {
  FindingAnswer,
  type NewReading,
  NewReadings,
  NewSheet,
  type Sheet,
  SheetFacts,
  type SheetFindings,
  type StoredReading,
} from '@ellwand/shared/records/sheet';
import { pointIn } from '@ellwand/shared/protocols/protocol';
import type { SheetPerson } from '@ellwand/shared/records/hands';
import { type NewTableNote, NewTableNotes } from '@ellwand/shared/records/table-note';
import { wholeValue } from '@ellwand/shared/readings/whole-value';
import { mm, toMmString } from '@ellwand/shared/units/length';
import { fromTyped } from '@ellwand/shared/units/parse-length';
import type { z } from 'zod';
import type { House } from './house.js';
import { Refusal, read } from './refuse.js';
import { json, matched, type Routes } from './router.js';
import { sheetFor, summaryOf } from './sheets.js';

const known = (house: House, id: string): Sheet => {
  const sheet = house.sheet(id);
  if (!sheet) throw new Refusal(404, 'sheet.unknown');
  return sheet;
};

function stored(house: House, sheet: Sheet, reading: NewReading): StoredReading {
  const { id, pointId, round, worn, replaces, note, readBy, heldBy, device, keyedAt } = reading;
  const base = {
    id,
    pointId,
    round,
    worn,
    replaces,
    note,
    readBy,
    heldBy,
    device,
    keyedAt,
    stands: true,
    recordedBy: house.signedIn!.id,
    receivedAt: new Date().toISOString(),
  };
  if (reading.state === 'not-taken') {
    return {
      ...base,
      state: 'not-taken',
      valueMm: null,
      typed: null,
      unit: null,
      tapeCount: 0,
      tapeLengthMm: null,
      gapTyped: null,
      gapMm: null,
      method: null,
      depthTyped: null,
      depthMm: null,
      levelFoundBy: null,
      reason: reading.reason,
    };
  }
  const parsed = fromTyped({ text: reading.typed, unit: reading.unit });
  if (!parsed.ok) throw new Refusal(422, 'reading.unreadable');
  const how = reading.method ?? pointIn(toProtocol(sheet.protocol), pointId)?.how ?? 'straight';
  const beside = (text: string | null) => {
    const length = text ? fromTyped({ text, unit: reading.unit }) : null;
    return length?.ok ? length.value.length : null;
  };
  const [gap, depth] = [beside(reading.gapTyped), beside(reading.depthTyped)];
  const { tapeLengthMm, tapeZeroMm } = sheet.facts;
  const value = wholeValue({
    read: parsed.value.length,
    how,
    tapeCount: reading.tapeCount,
    tapeLength: mm(tapeLengthMm),
    tapeZero: mm(tapeZeroMm),
    ...(gap === null ? {} : { gap }),
  });
  return {
    ...base,
    state: 'taken',
    valueMm: toMmString(value),
    typed: reading.typed,
    unit: reading.unit,
    tapeCount: reading.tapeCount,
    tapeLengthMm: reading.tapeCount > 0 ? tapeLengthMm : null,
    gapTyped: reading.gapTyped,
    gapMm: gap === null ? null : toMmString(gap),
    method: reading.method,
    depthTyped: reading.depthTyped,
    depthMm: depth === null ? null : toMmString(depth),
    levelFoundBy: reading.levelFoundBy,
    reason: null,
  };
}

function keep(house: House, sheet: Sheet, reading: NewReading) {
  const before = sheet.readings.find(({ id }) => id === reading.id);
  if (before) return { id: reading.id, outcome: 'already-kept', reading: before };
  const standing = sheet.readings.find(
    ({ pointId, round, worn, stands }) =>
      stands && pointId === reading.pointId && round === reading.round && worn === reading.worn,
  );
  if ((standing?.id ?? null) !== reading.replaces) {
    return { id: reading.id, outcome: 'conflict', detail: 'Another reading stands at this point.', standing };
  }
  if (standing) standing.stands = false;
  const fresh = stored(house, sheet, reading);
  sheet.readings.push(fresh);
  sheet.version += 1;
  return { id: reading.id, outcome: 'kept', reading: fresh };
}

export function findingsOf(house: House, sheet: Sheet): SheetFindings {
  const protocol = toProtocol(sheet.protocol);
  const found = runChecks({ kind: sheet.kind, protocol, readings: sheet.readings.map(toReading) });
  return {
    findings: found.map(({ key, checkId, severity, sentence, pointIds }) => {
      return {
        key,
        checkId,
        severity,
        sentence,
        pointIds: [...pointIds],
        answer: house.answers.get(`${sheet.id} ${key}`) ?? null,
      };
    }),
    derived: derivedViews(sheet.kind, sheet.readings),
  };
}

function keepNote(house: House, sheet: Sheet, note: NewTableNote) {
  const before = sheet.tableNotes.find(({ id }) => id === note.id);
  if (before) return { id: note.id, outcome: 'already-kept', note: before };
  const by = house.signedIn!;
  const stored = { ...note, by: by.id, byName: by.name, receivedAt: new Date().toISOString() };
  sheet.tableNotes.push(stored);
  sheet.version += 1;
  if (note.about === 'hands') nameHands(house, sheet, note.people);
  if (note.about === 'answer')
    house.answers.set(`${sheet.id} ${note.key}`, { reason: note.reason, by: by.name, at: stored.receivedAt });
  return { id: note.id, outcome: 'kept', note: stored };
}

function nameHands(house: House, sheet: Sheet, people: readonly z.infer<typeof SheetPerson>[]): void {
  for (const { userId, duty } of people) {
    if (sheet.facts.people.some((one) => one.userId === userId && one.duty === duty)) continue;
    const name = house.people.find(({ id }) => id === userId)?.name ?? '';
    sheet.facts.people.push({ userId, duty, name });
  }
}

function refreshSummaries(house: House, sheet: Sheet): void {
  const part = house.garment(sheet.garmentId)?.parts.find(({ id }) => id === sheet.partId);
  if (part) part.sheets = [...part.sheets.filter(({ id }) => id !== sheet.id), summaryOf(sheet)];
}

/** Sheets, readings and findings, over the same checks and derivations that the API runs. */
export const measuringRoutes: Routes = {
  'POST /workroom/parts/:id/sheets': ({ house, params, body }) => {
    const { id, facts } = read(NewSheet, body);
    const again = id === undefined ? undefined : house.sheet(id);
    if (again) return json(again, 201);
    const garment = house.garments.find(({ parts }) => parts.some((part) => part.id === params.id));
    if (!garment) throw new Refusal(404, 'part.unknown');
    const sheet = sheetFor(
      garment,
      garment.parts.findIndex((part) => part.id === params.id),
      id ?? house.newId(),
    );
    house.sheets.push(sheet);
    setFacts(house, sheet, facts);
    refreshSummaries(house, sheet);
    return json(sheet, 201);
  },
  'GET /workroom/sheets/:id': ({ house, params }) => json(known(house, params.id)),
  'PUT /workroom/sheets/:id/facts': ({ house, params, body, version }) => {
    const sheet = known(house, params.id);
    matched(sheet.version, version);
    setFacts(house, sheet, read(SheetFacts, body));
    sheet.version += 1;
    return json(sheet);
  },
  'POST /workroom/sheets/:id/readings': ({ house, params, body }) => {
    const sheet = known(house, params.id);
    const { readings } = read(NewReadings, body);
    const results = readings.map((reading) => keep(house, sheet, reading));
    refreshSummaries(house, sheet);
    return json({ sheetVersion: sheet.version, results });
  },
  'POST /workroom/sheets/:id/table-notes': ({ house, params, body }) => {
    const sheet = known(house, params.id);
    const { notes } = read(NewTableNotes, body);
    const results = notes.map((note) => keepNote(house, sheet, note));
    return json({ sheetVersion: sheet.version, results });
  },
  'GET /workroom/sheets/:id/findings': ({ house, params }) =>
    json(findingsOf(house, known(house, params.id))),
  'POST /workroom/sheets/:id/findings/answers': ({ house, params, body }) => {
    const { key, reason } = read(FindingAnswer, body);
    house.answers.set(`${params.id} ${key}`, {
      reason,
      by: house.signedIn!.name,
      at: new Date().toISOString(),
    });
    return json(findingsOf(house, known(house, params.id)));
  },
  'POST /workroom/sheets/:id/complete': ({ house, params, version }) => {
    const sheet = known(house, params.id);
    matched(sheet.version, version);
    const { findings } = findingsOf(house, sheet);
    const stops = findings.filter(({ severity, answer }) => severity === 'stop' && !answer);
    if (stops.length > 0)
      throw new Refusal(409, 'sheet.open-stops', { findings: stops }, 'A stop is not answered yet.');
    sheet.state = 'complete';
    sheet.version += 1;
    refreshSummaries(house, sheet);
    return json(sheet);
  },
  'POST /workroom/sheets/:id/reopen': ({ house, params }) => {
    const sheet = known(house, params.id);
    sheet.state = 'open';
    sheet.version += 1;
    return json(sheet);
  },
};

function setFacts(
  house: House,
  sheet: Sheet,
  { people, ...facts }: ReturnType<typeof SheetFacts.parse>,
): void {
  const nameOf = (userId: string) => house.people.find(({ id }) => id === userId)?.name ?? '';
  sheet.facts = { ...facts, people: people.map((one) => ({ ...one, name: nameOf(one.userId) })) };
}
