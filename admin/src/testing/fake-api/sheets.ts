import type { Garment } from '@ellwand/shared/records/garment';
import { protocolFor, wornTogetherProtocol } from '@ellwand/shared/protocols/standard-protocols';
import { toProtocolView } from '@ellwand/shared/records/protocol';
import type { Sheet, SheetSummary, StoredReading } from '@ellwand/shared/records/sheet';
import type { z } from 'zod';
import { idOf, staff } from './people.js';

const at = '2026-12-01T09:12:00.000Z';

export function reading(
  number: number,
  pointId: string,
  valueMm: string,
  more: Partial<StoredReading> = {},
): StoredReading {
  return {
    id: idOf(number),
    pointId,
    round: 1,
    state: 'taken',
    valueMm,
    typed: valueMm,
    unit: 'mm',
    tapeCount: 0,
    tapeLengthMm: null,
    worn: null,
    gapTyped: null,
    gapMm: null,
    method: null,
    depthTyped: null,
    depthMm: null,
    heldBy: null,
    levelFoundBy: null,
    reason: null,
    replaces: null,
    stands: true,
    note: '',
    readBy: staff.recorder.id,
    recordedBy: staff.recorder.id,
    device: 'Tablet 7c1d',
    keyedAt: at,
    receivedAt: at,
    ...more,
  };
}

export function summaryOf(sheet: Sheet, speaks = false): z.infer<typeof SheetSummary> {
  const standing = new Set(sheet.readings.filter(({ stands }) => stands).map(({ pointId }) => pointId));
  return {
    id: sheet.id,
    partId: sheet.partId,
    state: sheet.state,
    purpose: sheet.facts.purpose,
    speaks,
    measuredOn: sheet.facts.measuredOn,
    pointsDone: standing.size,
    pointsWanted: sheet.protocol.points.length,
  };
}

export function sheetFor(garment: Garment, partIndex: number, id: string): Sheet {
  const part = garment.parts[partIndex]!;
  const { ownNumber, title, date, maker, handling, hazards } = garment.record;
  return {
    id,
    version: 1,
    partId: part.id,
    garmentId: garment.id,
    garmentVersion: garment.version,
    kind: part.kind,
    protocolVersion: 1,
    protocol: toProtocolView(part.wornTogether ? wornTogetherProtocol : protocolFor(part.kind)),
    newestProtocolVersion: 1,
    wornTogether: part.wornTogether,
    state: 'open',
    facts: {
      people: [
        { userId: staff.recorder.id, name: staff.recorder.name, duty: 'read' },
        { userId: staff.curator.id, name: staff.curator.name, duty: 'held' },
      ],
      aloneBecause: '',
      measuredOn: '2026-12-01',
      place: 'Textile room, long table',
      support: 'flat',
      tape: 'White tape, no. 2',
      tapeLengthMm: '1500',
      tapeZeroMm: '0',
      fasteningPair: 'Waist tape, first hook to its eye',
      note: '',
      repeatPoints: [],
      purpose: 'record',
    },
    garment: {
      ownNumber,
      title,
      date,
      maker,
      partName: part.name,
      partSuffix: part.suffix,
      firstImageId: garment.images[0]?.id ?? null,
      handling,
      hazards,
    },
    readings: [],
    tableNotes: [],
  };
}

/** Two sheets of the first garment: the bodice half done, the skirt untouched. */
export function sampleSheets([first]: readonly Garment[]): Sheet[] {
  const bodice: Sheet = {
    ...sheetFor(first!, 0, idOf(2001)),
    readings: [
      reading(3001, 'bust', '880', { levelFoundBy: 'dart-tips' }),
      reading(3002, 'waist', '612', { levelFoundBy: 'seam' }),
      reading(3003, 'inner-waist-band', '631'),
      reading(3004, 'neck', '372'),
      reading(3005, 'side-seam', '0', {
        state: 'not-taken',
        valueMm: null,
        typed: null,
        unit: null,
        reason: 'too-fragile',
      }),
    ],
  };
  return [bodice, sheetFor(first!, 1, idOf(2002))];
}

export const bodiceSheetId = idOf(2001);
export const skirtSheetId = idOf(2002);
