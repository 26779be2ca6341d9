/** Protocols as they travel and are kept: lengths as decimal strings, own points with their diagram line. */
import { z } from 'zod';
import { groupLabels, type PointGroup } from '../points/groups.js';
import { type GarmentKind, kindIds } from '../points/kinds.js';
import { handlingSteps, type MeasuringHow, PRACTICE } from '../points/point.js';
import { houseTolerance } from '../points/tolerance.js';
import type { OwnPoint, Protocol } from '../protocols/protocol.js';
import { fromMmString, mm, toMmString } from '../units/length.js';
import { LengthMm, line, Moment, prose } from './common.js';

export const viewNames = ['front', 'back', 'inside', 'side', 'below'] as const;
const howIds = ['round', 'straight', 'curve', 'flat-doubled'] as const satisfies readonly MeasuringHow[];
const groupIds = Object.keys(groupLabels) as [PointGroup, ...PointGroup[]];

/** An own point's id tells it from the catalogue's: `own-…`. */
export const OwnPointId = z
  .string()
  .regex(/^own-[a-z0-9]+(-[a-z0-9]+)*$/, 'own- and small letters')
  .max(60);

/** Places of the line, in the view's millimetres. */
const Place = z.tuple([z.number().min(-5000).max(5000), z.number().min(-5000).max(5000)]);

export const OwnPointView = z.strictObject({
  id: OwnPointId,
  group: z.enum(groupIds),
  name: line(80),
  definition: line(400),
  from: line(200),
  to: line(200),
  side: z.enum(['inside', 'outside']),
  how: z.enum(howIds),
  handlingStep: z.enum(handlingSteps),
  /** Where readings usually fall; null where nobody can say yet. */
  range: z.strictObject({ fromMm: LengthMm, toMm: LengthMm }).nullable(),
  watchFor: prose(400).default(''),
  takesTapeLengths: z.boolean().default(false),
  levelRecorded: z.boolean().default(false),
  paired: z.boolean().default(false),
  line: z.strictObject({ view: z.enum(viewNames), along: z.array(Place).min(2).max(12) }),
});
export type OwnPointView = z.infer<typeof OwnPointView>;

export const ProtocolPointView = z.strictObject({
  pointId: z.string().max(60),
  required: z.boolean(),
  rounds: z.number().int().min(1).max(4).default(1),
});

/** A protocol as it stands in a sheet and in the list of versions. */
export const ProtocolView = z.object({
  kind: z.enum(kindIds),
  version: z.number().int().min(1),
  wornTogether: z.boolean(),
  points: z.array(ProtocolPointView),
  ownPoints: z.array(OwnPointView),
});
export type ProtocolView = z.infer<typeof ProtocolView>;

/** A kept version: who made it, when, and why. The house's first version has nobody. */
export const ProtocolVersion = ProtocolView.extend({
  note: z.string(),
  madeBy: z.string().nullable(),
  madeAt: Moment.nullable(),
});
export type ProtocolVersion = z.infer<typeof ProtocolVersion>;

const anyLength = { from: mm(0), to: mm(100_000), basis: 'The museum has not said what is usual here.' };

function toOwnPoint(view: OwnPointView, kind: GarmentKind, wornTogether: boolean): OwnPoint {
  const { range, ...facts } = view;
  return {
    ...facts,
    kinds: [kind],
    softRange: range
      ? { from: fromMmString(range.fromMm), to: fromMmString(range.toMm), basis: PRACTICE }
      : anyLength,
    softRangeByKind: {},
    tolerance: houseTolerance,
    wornTogether,
  };
}

/** The domain's protocol. */
export function toProtocol({ kind, version, wornTogether, points, ownPoints }: ProtocolView): Protocol {
  const own = ownPoints.map((view) => toOwnPoint(view, kind, wornTogether));
  return { kind, version, wornTogether, points, ownPoints: own };
}

function toOwnPointView(point: OwnPoint): OwnPointView {
  const { id, group, name, definition, from, to, side, how, handlingStep, softRange } = point;
  const { watchFor, takesTapeLengths, levelRecorded, paired } = point;
  const isKnown = softRange.basis !== anyLength.basis;
  const range = isKnown ? { fromMm: toMmString(softRange.from), toMm: toMmString(softRange.to) } : null;
  const along = point.line.along.map(([x, y]): [number, number] => [x, y]);
  return {
    ...{ id, group, name, definition, from, to, side, how, handlingStep, range },
    ...{ watchFor, takesTapeLengths, levelRecorded, paired },
    line: { view: point.line.view, along },
  };
}

/** A protocol as it travels. */
export function toProtocolView({ kind, version, wornTogether, points, ownPoints }: Protocol): ProtocolView {
  return {
    kind,
    version,
    wornTogether,
    points: points.map((point) => ({ ...point })),
    ownPoints: ownPoints.map(toOwnPointView),
  };
}

/** `POST /workroom/protocols/:kind`: a new version. Whoever made it says why, for whoever wonders years from now. */
export const NewProtocol = z.strictObject({
  points: z.array(ProtocolPointView).max(100),
  ownPoints: z.array(OwnPointView).max(100),
  note: prose(400).refine((text) => text !== '', 'Say why there is a new version'),
});
export type NewProtocol = z.infer<typeof NewProtocol>;
export type NewProtocolInput = z.input<typeof NewProtocol>;

/** `GET /workroom/protocols`: what every kind is measured by now, and how many versions there have been. */
export const ProtocolList = z.object({
  items: z.array(ProtocolVersion.extend({ versions: z.number().int() })),
});
export type ProtocolList = z.infer<typeof ProtocolList>;

/** `GET /workroom/protocols/:kind`: every version, the newest first. `version` is the newest one's. */
export const ProtocolHistory = z.object({
  kind: z.enum(kindIds),
  wornTogether: z.boolean(),
  version: z.number().int(),
  versions: z.array(ProtocolVersion),
});
export type ProtocolHistory = z.infer<typeof ProtocolHistory>;

/** The answer to a new version, with what might be thought over. */
export const ProtocolMade = ProtocolVersion.extend({ warnings: z.array(z.string()) });
export type ProtocolMade = z.infer<typeof ProtocolMade>;
