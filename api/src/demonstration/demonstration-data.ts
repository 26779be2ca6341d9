import { readdir, readFile } from 'node:fs/promises';
import { join } from 'node:path';
import { GarmentRecord, PartKind } from '@ellwand/shared/records/garment';
import { NewCutSheet } from '@ellwand/shared/records/cut-sheet';
import { imageViews } from '@ellwand/shared/records/image';
import { kindIds } from '@ellwand/shared/points/kinds';
import { NewProtocol } from '@ellwand/shared/records/protocol';
import { Role } from '@ellwand/shared/records/roles';
import { RecordStage } from '@ellwand/shared/records/record-moves';
import { LevelFoundBy, NotTakenReason, supports, TypedUnit } from '@ellwand/shared/records/sheet';
import { z } from 'zod';

/** Somebody of the invented staff, called by a short name in the other files. */
const DemonstrationPerson = z.strictObject({
  key: z.string(),
  name: z.string(),
  email: z.email().endsWith('@larkmoor.example'),
  roles: z.array(Role).min(1),
});

/** "612" in millimetres; or more to say; or why there is no reading. */
const DemonstrationReading = z.union([
  z.string(),
  z.strictObject({
    typed: z.string(),
    unit: TypedUnit.default('mm'),
    tapeCount: z.number().int().default(0),
    levelFoundBy: LevelFoundBy.nullable().default(null),
    /** How far below the waist, in the same unit. */
    depth: z.string().nullable().default(null),
    note: z.string().default(''),
    /** The same on the left, as worn: the rest is of the right then. */
    left: z.string().nullable().default(null),
    /** Further rounds, in the same unit. */
    rounds: z.array(z.string()).default([]),
  }),
  z.strictObject({ notTaken: NotTakenReason }),
]);
export type DemonstrationReading = z.output<typeof DemonstrationReading>;

const DemonstrationSheet = z.strictObject({
  read: z.string(),
  held: z.string().nullable(),
  wrote: z.string(),
  aloneBecause: z.string().default(''),
  measuredOn: z.iso.date(),
  place: z.string(),
  support: z.enum(supports),
  tape: z.string(),
  fasteningPair: z.string().default(''),
  note: z.string().default(''),
  /** The version of its protocol; later ones than the first are made before the first sheet that names them. */
  protocolVersion: z.number().int().default(1),
  complete: z.boolean().default(true),
  readings: z.record(z.string(), DemonstrationReading),
  /** Answers to the findings that the readings raise on purpose; any other finding stops the loading. */
  answers: z.array(z.strictObject({ checkId: z.string(), reason: z.string() })).default([]),
});
export type DemonstrationSheet = z.output<typeof DemonstrationSheet>;

export const DemonstrationGarment = z.strictObject({
  record: GarmentRecord,
  /** Who made the record. */
  madeBy: z.string(),
  /** Who approves and publishes. */
  approvedBy: z.string(),
  parts: z.array(
    z.strictObject({
      kind: PartKind,
      name: z.string(),
      suffix: z.string().default(''),
      sheet: DemonstrationSheet.nullable().default(null),
      /** Sheets from before, oldest first: the one above speaks for the part. */
      earlierSheets: z.array(DemonstrationSheet).default([]),
      cutSheet: NewCutSheet.nullable().default(null),
    }),
  ),
  /** The sheet of the parts laid together as worn. */
  wornTogether: DemonstrationSheet.nullable().default(null),
  stage: RecordStage,
  returnReason: z.string().nullable().default(null),
  withdrawal: z.strictObject({ notice: z.string(), innerReason: z.string() }).nullable().default(null),
  /** For a garment that is public and has an edited draft beside it: what the draft says differently. */
  draftBeside: GarmentRecord.partial().nullable().default(null),
});
export type DemonstrationGarment = z.output<typeof DemonstrationGarment>;

/** A later version of a protocol, as an administrator makes it. */
const DemonstrationProtocol = z.strictObject({
  kind: z.enum(kindIds),
  wornTogether: z.boolean().default(false),
  version: z.number().int().min(2),
  madeBy: z.string(),
  ...NewProtocol.shape,
});
export type DemonstrationProtocol = z.output<typeof DemonstrationProtocol>;

/** One entry of `media-samples/pictures/pictures.json`. */
const DemonstrationPicture = z.object({
  file: z.string(),
  number: z.string(),
  view: z.enum(imageViews),
  alt: z.string().min(1),
  caption: z.string().endsWith('Rendered; invented garment.'),
});
export type DemonstrationPicture = z.output<typeof DemonstrationPicture>;

export interface Demonstration {
  readonly museum: string;
  readonly people: readonly z.output<typeof DemonstrationPerson>[];
  readonly protocols: readonly DemonstrationProtocol[];
  readonly garments: readonly DemonstrationGarment[];
  readonly pictures: readonly DemonstrationPicture[];
  readonly picturesFolder: string;
}

/**
 * Reads the demonstration from `media-samples/`.
 * @throws Error that names the file and what is wrong in it
 */
export async function readDemonstration(mediaSamples: string): Promise<Demonstration> {
  const folder = join(mediaSamples, 'demonstration');
  const picturesFolder = join(mediaSamples, 'pictures');
  const house = await parsed(
    join(folder, 'house.json'),
    z.strictObject({ museum: z.string(), people: z.array(DemonstrationPerson) }),
  );
  const files = (await readdir(join(folder, 'garments'))).filter((file) => file.endsWith('.json')).sort();
  const garments = await Promise.all(
    files.map((file) => parsed(join(folder, 'garments', file), DemonstrationGarment)),
  );
  const protocols = await parsed(join(folder, 'protocols.json'), z.array(DemonstrationProtocol));
  const pictures = await parsed(join(picturesFolder, 'pictures.json'), z.array(DemonstrationPicture));
  return { ...house, protocols, garments, pictures, picturesFolder };
}

async function parsed<T extends z.ZodType>(file: string, schema: T): Promise<z.output<T>> {
  const result = schema.safeParse(JSON.parse(await readFile(file, 'utf8')));
  if (!result.success) throw new Error(`${file}:\n${z.prettifyError(result.error)}`);
  return result.data;
}
