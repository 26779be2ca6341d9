import { pointsOf } from '@ellwand/shared/protocols/protocol';
import { shownUncertainty } from '@ellwand/shared/readings/uncertainty';
import { notTakenBySide, valuesBySide } from '@ellwand/shared/readings/values-by-side';
import type { Garment, Part } from '@ellwand/shared/records/garment';
import { toReading } from '@ellwand/shared/records/measured';
import type { PartSheets, SheetOfPart } from '@ellwand/shared/records/part-sheets';
import { toProtocol } from '@ellwand/shared/records/protocol';
import type { Sheet } from '@ellwand/shared/records/sheet';
import { toMmString } from '@ellwand/shared/units/length';
import type { House } from './house.js';

/** Every sheet of a part, oldest first. */
const sheetsOf = (house: House, partId: string): readonly Sheet[] =>
  house.sheets
    .filter((sheet) => sheet.partId === partId)
    .toSorted((one, other) => one.facts.measuredOn.localeCompare(other.facts.measuredOn));

const maySpeak = ({ state, facts }: Sheet) => state === 'complete' && facts.purpose === 'record';

/** The sheet that speaks for a part, as the API finds it. */
export function speakingSheet(house: House, partId: string): Sheet | undefined {
  const candidates = sheetsOf(house, partId).filter(maySpeak);
  return candidates.find(({ id }) => id === house.choices.get(partId)?.sheetId) ?? candidates.at(-1);
}

export function partSheetsOf(house: House, garment: Garment, part: Part): PartSheets {
  const sheets = sheetsOf(house, part.id);
  const speaking = speakingSheet(house, part.id);
  const choice = house.choices.get(part.id);
  const newest = sheets.filter(maySpeak).at(-1);
  const points = sheets
    .toReversed()
    .flatMap(({ protocol }) => pointsOf(toProtocol(protocol)))
    .map(({ id, name, how }) => ({ pointId: id, label: name, how }));
  return {
    partId: part.id,
    garmentId: garment.id,
    version: garment.version,
    ownNumber: garment.record.ownNumber,
    title: garment.record.title,
    partName: part.name,
    partSuffix: part.suffix,
    kind: part.kind,
    wornTogether: part.wornTogether,
    points: [...new Map(points.map((point) => [point.pointId, point])).values()],
    speaking: speaking ? { sheetId: speaking.id } : null,
    chosen: choice && choice.sheetId === speaking?.id ? choice : null,
    published:
      newest && garment.isPublic ? { sheetId: newest.id, version: garment.publishedVersion ?? 1 } : null,
    sheets: sheets.map(toSheetOfPart),
  };
}

function toSheetOfPart({
  id,
  state,
  protocolVersion,
  protocol,
  facts,
  readings,
  tableNotes,
}: Sheet): SheetOfPart {
  const asked = toProtocol(protocol);
  const read = readings.map(toReading);
  const pointIds = asked.points.map(({ pointId }) => pointId);
  return {
    id,
    state,
    purpose: facts.purpose,
    measuredOn: facts.measuredOn,
    protocolVersion,
    people: facts.people,
    note: facts.note,
    remarks: tableNotes.flatMap((note) =>
      note.about === 'described' && (note.thing === 'condition' || note.thing === 'remark')
        ? [{ id: note.id, thing: note.thing, text: note.text, byName: note.byName, saidAt: note.saidAt }]
        : [],
    ),
    values: pointIds.flatMap((pointId) =>
      valuesBySide(read, pointId, asked.ownPoints).map(({ worn, accepted, rounds }) => ({
        pointId,
        worn,
        valueMm: toMmString(accepted.value),
        uncertaintyMm: toMmString(shownUncertainty(accepted.uncertaintyMm)),
        rounds: accepted.n,
        tapeJoins: accepted.tapeJoins,
        method: rounds.some(({ method }) => method === 'flat-doubled') ? ('flat-doubled' as const) : null,
      })),
    ),
    notTaken: pointIds.flatMap((pointId) =>
      notTakenBySide(read, pointId).map((left) => ({ pointId, ...left })),
    ),
  };
}
