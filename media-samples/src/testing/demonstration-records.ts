/** The demonstration's records as they lie in `demonstration/`, and their readings as the checks take them. */
import { readdirSync, readFileSync } from 'node:fs';
import type { CheckSheet } from '@ellwand/shared/checks/sheet-view';
import type { GarmentKind } from '@ellwand/shared/points/kinds';
import { pointIn, type Protocol } from '@ellwand/shared/protocols/protocol';
import { protocolFor, wornTogetherProtocol } from '@ellwand/shared/protocols/standard-protocols';
import type { LevelFoundBy, NotTakenReason, Reading } from '@ellwand/shared/readings/reading';
import { wholeValue } from '@ellwand/shared/readings/whole-value';
import type { supports } from '@ellwand/shared/records/sheet';
import type { GarmentRecordInput } from '@ellwand/shared/records/garment';
import { ProtocolView, toProtocol } from '@ellwand/shared/records/protocol';
import type { Role } from '@ellwand/shared/records/roles';
import { mm } from '@ellwand/shared/units/length';

/** Whole millimetres as keyed; or with tapes, level and further rounds; or why there is none. */
export type ReadingEntry =
  | string
  | {
      typed: string;
      tapeCount?: number;
      levelFoundBy?: LevelFoundBy;
      depth?: string;
      left?: string;
      rounds?: string[];
      note?: string;
    }
  | { notTaken: NotTakenReason };

type Support = (typeof supports)[number];

export interface SheetEntry {
  read: string;
  held: string | null;
  wrote: string;
  aloneBecause?: string;
  complete?: boolean;
  protocolVersion?: number;
  readings: Record<string, ReadingEntry>;
  support: Support;
  answers?: { checkId: string; reason: string }[];
}

export interface PartEntry {
  kind: GarmentKind;
  name: string;
  suffix: string;
  sheet: SheetEntry;
  earlierSheets?: SheetEntry[];
  /** Said of all parts laid together. */
  wornTogether?: true;
}

export interface GarmentEntry {
  record: GarmentRecordInput;
  madeBy: string;
  approvedBy: string;
  parts: PartEntry[];
  wornTogether?: SheetEntry;
  stage: string;
  returnReason?: string;
  withdrawal?: { notice: string; innerReason: string };
  draftBeside?: Partial<GarmentRecordInput>;
}

export interface House {
  museum: string;
  people: { key: string; name: string; email: string; roles: Role[] }[];
}

const folder = new URL('../../demonstration/', import.meta.url);

const contentOf = (path: string): unknown => JSON.parse(readFileSync(new URL(path, folder), 'utf8'));

export const house = contentOf('house.json') as House;

/** Versions that an administrator makes before the first sheet is taken by them. */
export const protocols: readonly ProtocolView[] = ProtocolView.extend({
  wornTogether: ProtocolView.shape.wornTogether.default(false),
})
  .array()
  .parse(contentOf('protocols.json'));

/** Every sheet of a garment with the part that it measures: those that speak, earlier ones, and of all laid together. */
export function sheetsOf({ parts, wornTogether }: GarmentEntry): PartEntry[] {
  const earlier = parts.flatMap((part) => (part.earlierSheets ?? []).map((sheet) => ({ ...part, sheet })));
  if (!wornTogether) return [...parts, ...earlier];
  const heading = {
    kind: 'dress',
    name: 'Laid together as worn',
    suffix: ' worn',
    wornTogether: true,
  } as const;
  return [...parts, ...earlier, { ...heading, sheet: wornTogether }];
}

/** The version that a part's sheet was taken by. */
export function protocolOf({ kind, wornTogether, sheet: { protocolVersion = 1 } }: PartEntry): Protocol {
  if (wornTogether) return wornTogetherProtocol;
  const made = protocols.find((each) => each.kind === kind && each.version === protocolVersion);
  return made ? toProtocol(made) : protocolFor(kind);
}

export const garments: readonly GarmentEntry[] = readdirSync(new URL('garments/', folder))
  .filter((file) => file.endsWith('.json'))
  .sort()
  .map((file) => contentOf(`garments/${file}`) as GarmentEntry);

/** The tape of every sheet, as the loader tells the API. */
const TAPE = mm(1500);

/** The readings of one point, worked out to whole values as the API does. */
function readingsOf(pointId: string, entry: ReadingEntry, protocol: Protocol): Reading[] {
  if (typeof entry === 'object' && 'notTaken' in entry) {
    return [{ id: pointId, pointId, round: 1, state: 'not-taken', notTakenReason: entry.notTaken }];
  }
  const said = typeof entry === 'string' ? { typed: entry } : entry;
  const { typed, tapeCount = 0, rounds = [], levelFoundBy, depth, note, left } = said;
  const how = pointIn(protocol, pointId)?.how ?? 'curve';
  const right = [typed, ...rounds].map((keyed, index) => ({
    keyed,
    round: index + 1,
    side: left && 'right',
  }));
  const all = [...right, ...(left ? [{ keyed: left, round: 1, side: 'left' }] : [])];
  return all.map(({ keyed, round, side }, index) => {
    const read = mm(keyed);
    return {
      id: `${pointId}-${index + 1}`,
      pointId,
      round,
      ...(side === 'left' || side === 'right' ? { worn: side } : {}),
      state: 'taken',
      typed: keyed,
      unit: 'mm',
      length: wholeValue({ read, how, tapeCount, tapeLength: TAPE }),
      ...(levelFoundBy ? { levelFoundBy } : {}),
      ...(depth ? { depthBelowWaist: mm(depth) } : {}),
      ...(note && index === 0 ? { note } : {}),
      ...(tapeCount > 0 ? { tapeLengths: { count: tapeCount, tape: TAPE, rest: read } } : {}),
    };
  });
}

const allReadings = (part: PartEntry): Reading[] =>
  Object.entries(part.sheet.readings).flatMap(([pointId, entry]) =>
    readingsOf(pointId, entry, protocolOf(part)),
  );

/** A part's sheet with those of the other parts of its garment, as the checks want it. */
export function checkSheetOf(garment: GarmentEntry, part: PartEntry): CheckSheet {
  const others = part.wornTogether ? [] : garment.parts.filter(({ suffix }) => suffix !== part.suffix);
  return {
    kind: part.kind,
    protocol: protocolOf(part),
    readings: allReadings(part),
    support: part.sheet.support,
    tapeLength: TAPE,
    otherPartsOfGarment: others.map((other) => ({ kind: other.kind, readings: allReadings(other) })),
  };
}
