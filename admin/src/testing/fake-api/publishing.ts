import { pointIn } from '@ellwand/shared/protocols/protocol';
import { acceptedValues } from '@ellwand/shared/readings/accepted-value';
import { type Garment, numberOfPart, rightsStatements } from '@ellwand/shared/records/garment';
import { derivedViews, toReading } from '@ellwand/shared/records/measured';
import { toProtocol } from '@ellwand/shared/records/protocol';
import type { PublishedDocument, PublishedPart } from '@ellwand/shared/records/published-garment';
import type { Review } from '@ellwand/shared/records/publishing';
import { toMmString } from '@ellwand/shared/units/length';
import type { House } from './house.js';

/** What a curator is shown beside the record. */
export function reviewOf(house: House, garment: Garment): Review {
  const open = house.sheets.filter(({ garmentId, state }) => garmentId === garment.id && state === 'open');
  return {
    garmentId: garment.id,
    version: garment.version,
    nextVersion: (garment.publishedVersion ?? (garment.publicNumber ? 3 : 0)) + 1,
    changes: house.changes,
    readiness: open.map((sheet) => ({
      blocks: 'submit',
      sentence: `The sheet of the ${sheet.garment.partName.toLowerCase()} is not complete.`,
      href: `/workroom/sheets/${sheet.id}`,
    })),
    mayNotApprove: house.mayNotApprove,
    people: [
      { name: 'Wren Aldous', did: 'read the tape and edited the record' },
      { name: 'Imogen Sallow', did: 'held the tape' },
    ],
  };
}

function publishedPart(house: House, garment: Garment, part: Garment['parts'][number]): PublishedPart {
  const sheet = house.sheets.find(({ partId }) => partId === part.id);
  const readings = sheet?.readings ?? [];
  const nameOf = (pointId: string) =>
    pointIn({ ownPoints: sheet ? toProtocol(sheet.protocol).ownPoints : [] }, pointId)?.name ?? pointId;
  const values = [...acceptedValues(readings.map(toReading)).values()];
  return {
    number: numberOfPart(garment.record.ownNumber, part),
    kind: part.kind,
    name: part.name,
    wornTogether: part.wornTogether,
    measuredOn: sheet?.facts.measuredOn ?? null,
    support: sheet ? 'Flat on the table' : null,
    tape: sheet?.facts.tape ?? null,
    fasteningPair: null,
    measuredBy: [],
    peopleCount: 2,
    measurements: values.map(({ pointId, value, n, worn = null }) => ({
      pointId,
      worn,
      label: nameOf(pointId),
      valueMm: toMmString(value),
      uncertaintyMm: '2.1',
      rounds: n,
      spreadMm: '0',
      levelFoundBy: null,
      tapeLengths: null,
      halfMm: null,
      method: null,
      gapMm: null,
      depthMm: null,
      imageId: null,
    })),
    notTaken: readings.flatMap(({ pointId, worn, reason }) =>
      reason ? [{ pointId, label: nameOf(pointId), worn, reason }] : [],
    ),
    derived: sheet ? derivedViews(sheet.kind, readings) : [],
    protocol: sheet
      ? { version: sheet.protocolVersion, pointIds: sheet.protocol.points.map(({ pointId }) => pointId) }
      : null,
    ownPoints: sheet?.protocol.ownPoints ?? [],
    cutSheet: null,
  };
}

/** The public copy, near enough to look at: what is private is left out here too. */
export function publishedOf(house: House, garment: Garment): PublishedDocument {
  const {
    ownNumber,
    title,
    kind,
    wornBy,
    description,
    date,
    maker,
    label,
    place,
    materials,
    techniques,
    colours,
    fastenings,
  } = garment.record;
  const {
    lining,
    alterations,
    condition,
    wearer,
    references,
    otherNumbers,
    creditLine,
    rights,
    hazards,
    showHazards,
  } = garment.record;
  return {
    number: garment.publicNumber ?? ownNumber.toLowerCase().replaceAll('.', '-'),
    version: (garment.publishedVersion ?? 0) + 1,
    ownNumber,
    title,
    kind,
    wornBy,
    description,
    maker,
    label,
    place,
    materials,
    techniques,
    colours,
    fastenings,
    lining,
    alterations,
    condition,
    wearer,
    references,
    otherNumbers,
    creditLine,
    date: {
      edtf: date,
      display: date.endsWith('~') ? `about ${date.slice(0, -1)}` : date.replace('/', '–'),
      fromYear: 1880,
      toYear: 1890,
    },
    hazards: showHazards ? hazards : [],
    rights: { uri: rights, label: rightsStatements[rights] },
    parts: garment.parts.map((part) => publishedPart(house, garment, part)),
    images: garment.images
      .filter(({ hidden, state }) => !hidden && state === 'ready')
      .map(({ id, view, alt, caption, credit, widths }) => ({
        id,
        view,
        alt,
        caption,
        credit,
        widths,
        widthPx: 2100,
        heightPx: 2800,
      })),
    museum: 'Larkmoor House Museum of Dress',
    publishedAt: '2026-12-01T12:00:00.000Z',
  };
}
