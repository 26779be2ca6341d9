import type { Garment, GarmentRecordInput } from '@ellwand/shared/records/garment';
import type { Sheet, SheetFactsInput } from '@ellwand/shared/records/sheet';
import { protocolFor } from '@ellwand/shared/protocols/standard-protocols';
import { v7 as uuidv7 } from 'uuid';
import type { z } from 'zod';
import type { Agent } from '../harness/house';
import type { TestPerson } from '../harness/people';

export type SheetShown = z.output<typeof Sheet>;

/** An invented dress of a bodice and a skirt. Private fields carry words that must never be found in public. */
export const silkDress: GarmentRecordInput = {
  ownNumber: 'LH.1966.30',
  title: 'Day dress of teal silk',
  kind: 'dress',
  wornBy: 'woman',
  description: 'A bodice and a draped skirt with a striped panel.',
  date: '1885~',
  maker: 'Madame Verrault, Larkmoor',
  label: { transcription: 'Mme Verrault, Robes', where: 'waist tape' },
  place: 'Larkmoor',
  materials: ['silk', 'velvet'],
  colours: ['teal'],
  fastenings: 'Fifteen buttons at the front.',
  hazards: [{ id: 'weighted-silk', standing: 'suspected', note: 'Splits along the folds.' }],
  handling: 'PRIVATE-HANDLING two people lift the skirt',
  provenance: 'PRIVATE-PROVENANCE from the attic of the east wing',
  storeLocation: 'PRIVATE-STORE bay 4',
  creditLine: 'Larkmoor House Museum of Dress',
};

export async function makeDress(recorder: Agent, record: GarmentRecordInput = silkDress): Promise<Garment> {
  const parts = [
    { kind: 'bodice', name: 'Bodice', suffix: '.1' },
    { kind: 'skirt', name: 'Skirt', suffix: '.2' },
  ];
  const answer = await recorder.post('/api/v1/workroom/garments').send({ record, parts });
  if (answer.status !== 201) throw new Error(`no garment was made: ${answer.text}`);
  return answer.body as Garment;
}

export function factsWith(
  reader: TestPerson,
  holder: TestPerson,
  more: Partial<SheetFactsInput> = {},
): SheetFactsInput {
  return {
    people: [
      { userId: reader.id, duty: 'read' },
      { userId: holder.id, duty: 'held' },
      { userId: reader.id, duty: 'wrote' },
    ],
    measuredOn: '2026-11-20',
    place: 'Measuring table, Larkmoor House',
    support: 'flat',
    tape: 'Fibreglass tape 3',
    ...more,
  };
}

export async function openSheet(
  recorder: Agent,
  partId: string,
  facts: SheetFactsInput,
): Promise<SheetShown> {
  const answer = await recorder.post(`/api/v1/workroom/parts/${partId}/sheets`).send({ facts });
  if (answer.status !== 201) throw new Error(`no sheet was opened: ${answer.text}`);
  return answer.body as SheetShown;
}

/** A reading as the table would send it. */
export function reading(pointId: string, typed: string, readBy: string, more: Record<string, unknown> = {}) {
  return {
    id: uuidv7(),
    pointId,
    round: 1,
    state: 'taken',
    typed,
    unit: 'mm',
    readBy,
    device: 'tablet 1',
    keyedAt: '2026-11-20T09:30:00.000Z',
    ...more,
  };
}

export function notTaken(pointId: string, reason: string, readBy: string) {
  const { id, round, device, keyedAt } = reading(pointId, '', readBy);
  return { id, pointId, round, state: 'not-taken', reason, readBy, device, keyedAt };
}

/** A bodice and a skirt whose readings agree with one another. */
const soundReadings: Readonly<Record<string, string>> = {
  bust: '872',
  waist: '612',
  'inner-waist-band': '598',
  neck: '352',
  'side-seam': '192',
  armscye: '424',
  'hem-depth': '95',
  'across-front': '322',
  'shoulder-seam': '102',
  'neck-to-hem-front': '468',
  'waist-to-hem-front': '118',
  'neck-to-hem-back': '512',
  'waist-to-hem-back': '124',
  'sleeve-outer': '588',
  'sleeve-under': '438',
  'sleeve-widest': '372',
  elbow: '302',
  cuff: '228',
  'across-back': '312',
  'underarm-to-underarm-back': '392',
  'point-depth': '62',
  waistband: '618',
  'high-hip': '862',
  hip: '982',
  'waist-to-hem-side': '1042',
  'cloth-width': '532',
  opening: '262',
};
const skirtReadings: Readonly<Record<string, string>> = {
  ...soundReadings,
  'waist-to-hem-front': '1020',
  'waist-to-hem-back': '1184',
  'hem-depth': '94',
};

/** Reads every point of the sheet's protocol, the hem in three tapes and a rest. */
export function soundSheet(sheet: Pick<SheetShown, 'kind'>, readBy: string) {
  const values = sheet.kind === 'skirt' ? skirtReadings : soundReadings;
  return protocolFor(sheet.kind).points.map(({ pointId }) =>
    pointId === 'hem'
      ? reading('hem', '742', readBy, { tapeCount: 3 })
      : values[pointId] === undefined
        ? notTaken(pointId, 'not-applicable', readBy)
        : reading(pointId, values[pointId], readBy, pointId === 'hip' ? { depthTyped: '200' } : {}),
  );
}
