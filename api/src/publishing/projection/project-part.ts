import { numberOfPart } from '@ellwand/shared/records/garment';
import { roundsRead } from '@ellwand/shared/cut-sheet/rounds-read';
import { wholeFromHalf } from '@ellwand/shared/derivations/whole-from-half';
import { type Protocol, pointsOf, protocolPointIds } from '@ellwand/shared/protocols/protocol';
import { protocolFor, wornTogetherProtocol } from '@ellwand/shared/protocols/standard-protocols';
import type { Image } from '@ellwand/shared/records/image';
import { toProtocol, toProtocolView } from '@ellwand/shared/records/protocol';
import { derivedViews, toReading } from '@ellwand/shared/records/measured';
import type { PublishedPart } from '@ellwand/shared/records/published-garment';
import type { SnapshotPart, SnapshotSheet } from '../snapshot';
import { projectCutSheet } from './project-cut-sheet';
import { type Measured, projectMeasurements, projectNotTaken } from './project-measurements';

interface PartContext {
  readonly ownNumber: string;
  readonly showPeople: boolean;
  readonly pictures: readonly Image[];
  /** Every part of the garment: what lies between two of them is worked out from both. */
  readonly parts: readonly SnapshotPart[];
}

/** A part as the public reads it. A part without a complete sheet is shown, and says that it is not measured. */
export function projectPart(part: SnapshotPart, context: PartContext): PublishedPart {
  const heading = headingOf(part, context);
  const { sheet } = part;
  const readings = (sheet?.readings ?? []).map(toReading);
  const cutSheet = projectCutSheet(part.cutSheet, roundsRead(readings), context.pictures);
  if (!sheet) return { ...heading, ...unmeasured, cutSheet };
  const protocol = protocolOf(part, sheet);
  const asked = pointsOf(protocol);
  const measured = { readings, ownPoints: protocol.ownPoints };
  return {
    ...heading,
    measuredOn: sheet.measuredOn,
    support: sheet.support,
    tape: sheet.tape,
    fasteningPair: sheet.fasteningPair || null,
    measuredBy: context.showPeople ? namesOf(sheet) : [],
    peopleCount: new Set(sheet.people.map((person) => person.userId)).size,
    measurements: asked.flatMap((point) => projectMeasurements(point, measured, context.pictures)),
    notTaken: asked.flatMap((point) => projectNotTaken(point, readings)),
    derived: derivedOf(part, sheet, measured.ownPoints, context.parts),
    ...projectProtocol(protocol),
    cutSheet,
  };
}

/** Revisions frozen before sheets carried their protocol were taken by the house's first. */
function protocolOf({ kind, wornTogether }: SnapshotPart, { protocol }: SnapshotSheet): Protocol {
  if (protocol) return toProtocol(protocol);
  return wornTogether ? wornTogetherProtocol : protocolFor(kind);
}

function headingOf(
  { suffix, kind, name, wornTogether = false }: SnapshotPart,
  { ownNumber }: PartContext,
): Pick<PublishedPart, 'number' | 'kind' | 'name' | 'wornTogether'> {
  return { number: numberOfPart(ownNumber, { suffix, wornTogether }), kind, name, wornTogether };
}

/** A half is shown beside its measurement already; it is not told twice. */
function derivedOf(
  part: SnapshotPart,
  sheet: SnapshotSheet,
  ownPoints: Measured['ownPoints'],
  parts: readonly SnapshotPart[],
): PublishedPart['derived'] {
  const others = part.wornTogether
    ? []
    : parts.filter(({ id, wornTogether }) => id !== part.id && !wornTogether);
  const otherParts = others.flatMap(({ kind, name, sheet: theirs }) =>
    theirs ? [{ kind, name, readings: theirs.readings }] : [],
  );
  return derivedViews(part.kind, sheet.readings, { ownPoints, otherParts }).filter(
    ({ id }) => !id.startsWith(`${wholeFromHalf.id}:`),
  );
}

const unmeasured = {
  measuredOn: null,
  support: null,
  tape: null,
  fasteningPair: null,
  measuredBy: [],
  peopleCount: 0,
  measurements: [],
  notTaken: [],
  derived: [],
  protocol: null,
  ownPoints: [],
};

function projectProtocol(protocol: Protocol): Pick<PublishedPart, 'protocol' | 'ownPoints'> {
  const { version } = protocol;
  return {
    protocol: { version, pointIds: [...protocolPointIds(protocol)] },
    ownPoints: toProtocolView(protocol).ownPoints,
  };
}

function namesOf(sheet: SnapshotSheet): string[] {
  return [...new Set(sheet.people.map((person) => person.name))];
}
