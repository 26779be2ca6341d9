import { Injectable } from '@nestjs/common';
import { NewReading, type SheetFacts } from '@ellwand/shared/records/sheet';
import { v7 as uuidv7 } from 'uuid';
import type { Actor } from '../common/actor';
import { FindingsService } from '../measuring/findings/findings.service';
import { ReadingsService } from '../measuring/readings/readings.service';
import { SheetsService } from '../measuring/sheets/sheets.service';
import type { DemonstrationReading, DemonstrationSheet } from './demonstration-data';

export type Staff = ReadonlyMap<string, Actor>;

/** The person of that short name. @throws Error where the house has nobody of that name */
export function staffMember(staff: Staff, key: string): Actor {
  const actor = staff.get(key);
  if (!actor) throw new Error(`The demonstration has nobody called “${key}”`);
  return actor;
}

/** Fills a measuring sheet through the same doors as the table does. */
@Injectable()
export class DemonstrationSheets {
  constructor(
    private readonly sheets: SheetsService,
    private readonly readings: ReadingsService,
    private readonly findings: FindingsService,
  ) {}

  async fill(partId: string, data: DemonstrationSheet, staff: Staff): Promise<void> {
    const reader = staffMember(staff, data.read);
    const writer = staffMember(staff, data.wrote);
    const sheet = await this.sheets.open(partId, { id: uuidv7(), facts: factsOf(data, staff) }, writer);
    if (sheet.protocolVersion !== data.protocolVersion)
      throw new Error(`Expected a sheet by version ${data.protocolVersion}, got ${sheet.protocolVersion}`);
    const keyedAt = `${data.measuredOn}T10:00:00.000Z`;
    const batch = Object.entries(data.readings).flatMap(([pointId, reading]) =>
      readingsOf(pointId, reading, reader.id, keyedAt),
    );
    const { results, sheetVersion } = await this.readings.takeIn(sheet.id, batch, writer);
    const refused = results.find((result) => result.outcome !== 'kept');
    if (refused)
      throw new Error(
        `${sheet.garment.ownNumber}, ${sheet.garment.partName}: ${refused.detail ?? refused.outcome}`,
      );
    if (!data.complete) return;
    await this.answer(sheet.id, data, writer);
    await this.sheets.complete(sheet.id, sheetVersion, writer);
  }

  /** The demonstration is coherent: only the findings that it means to show are there, and they have answers. */
  private async answer(sheetId: string, data: DemonstrationSheet, writer: Actor): Promise<void> {
    const { findings } = await this.findings.read(sheetId);
    for (const finding of findings.filter(({ severity }) => severity !== 'note')) {
      const answer = data.answers.find(({ checkId }) => checkId === finding.checkId);
      if (!answer)
        throw new Error(`A finding that was not meant to be there (${finding.checkId}): ${finding.sentence}`);
      await this.findings.answer(sheetId, finding.key, answer.reason, writer);
    }
  }
}

function factsOf(data: DemonstrationSheet, staff: Staff): SheetFacts {
  const { aloneBecause, measuredOn, place, support, tape, fasteningPair, note } = data;
  const holder =
    data.held === null ? [] : [{ userId: staffMember(staff, data.held).id, duty: 'held' as const }];
  return {
    people: [
      { userId: staffMember(staff, data.read).id, duty: 'read' },
      ...holder,
      { userId: staffMember(staff, data.wrote).id, duty: 'wrote' },
    ],
    aloneBecause,
    measuredOn,
    place,
    support,
    tape,
    tapeLengthMm: '1500',
    tapeZeroMm: '0',
    fasteningPair,
    note,
    repeatPoints: Object.entries(data.readings).flatMap(([pointId, reading]) =>
      isReadAgain(reading) ? [pointId] : [],
    ),
    purpose: 'record',
  };
}

function isReadAgain(reading: DemonstrationReading): boolean {
  return typeof reading === 'object' && 'rounds' in reading && reading.rounds.length > 0;
}

function readingsOf(
  pointId: string,
  data: DemonstrationReading,
  readBy: string,
  keyedAt: string,
): NewReading[] {
  const base = { pointId, readBy, device: 'Table tablet', keyedAt };
  if (typeof data === 'string') return readingsOf(pointId, plain(data), readBy, keyedAt);
  if ('notTaken' in data)
    return [NewReading.parse({ ...base, id: uuidv7(), round: 1, state: 'not-taken', reason: data.notTaken })];
  const { unit, tapeCount, levelFoundBy, depth, note, left } = data;
  const of = (worn: 'left' | 'right' | null) => (typed: string, index: number) =>
    NewReading.parse({
      ...base,
      id: uuidv7(),
      round: index + 1,
      worn,
      note: index === 0 ? note : '',
      state: 'taken',
      typed,
      unit,
      tapeCount,
      levelFoundBy,
      depthTyped: depth,
    });
  if (left === null) return [data.typed, ...data.rounds].map(of(null));
  return [...[data.typed, ...data.rounds].map(of('right')), ...[left].map(of('left'))];
}

function plain(typed: string): Exclude<DemonstrationReading, string | { notTaken: unknown }> {
  return {
    typed,
    unit: 'mm',
    tapeCount: 0,
    levelFoundBy: null,
    depth: null,
    note: '',
    left: null,
    rounds: [],
  };
}
