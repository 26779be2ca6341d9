import type { CutSheetBody } from '@ellwand/shared/records/cut-sheet';
import type { GarmentRecord } from '@ellwand/shared/records/garment';
import type { Image } from '@ellwand/shared/records/image';
import type { GarmentKind } from '@ellwand/shared/points/kinds';
import type { SheetPerson } from '@ellwand/shared/records/hands';
import type { ProtocolView } from '@ellwand/shared/records/protocol';
import type { StoredReading } from '@ellwand/shared/records/sheet';
import type { z } from 'zod';

/** The sheet that speaks for a part when a garment is published: the one that was chosen, else the newest complete one. */
export interface SnapshotSheet {
  readonly id: string;
  readonly protocolVersion: number;
  /** The protocol it was taken by; revisions frozen before sheets carried theirs have none. */
  readonly protocol?: ProtocolView;
  readonly measuredOn: string;
  readonly support: string;
  readonly tape: string;
  readonly tapeLengthMm: string;
  readonly fasteningPair: string;
  readonly people: readonly (z.infer<typeof SheetPerson> & { readonly name: string })[];
  readonly readings: readonly StoredReading[];
  /** Why this one of several; null where the newest speaks by itself, absent from before one could be chosen. */
  readonly chosen?: { readonly because: string; readonly by: string; readonly at: string } | null;
}

export interface SnapshotPart {
  readonly id: string;
  readonly suffix: string;
  readonly kind: GarmentKind;
  readonly name: string;
  /** Said of the parts laid together as worn. */
  readonly wornTogether?: boolean;
  readonly sheet: SnapshotSheet | null;
  /** How it is cut; revisions frozen before cut sheets have none. */
  readonly cutSheet?: CutSheetBody | null;
}

/** A garment frozen when it was sent to review: record, parts with their sheets, pictures, and who edited. */
export interface Snapshot {
  readonly garmentId: string;
  readonly record: GarmentRecord;
  readonly parts: readonly SnapshotPart[];
  readonly images: readonly Image[];
  readonly editedBy: readonly string[];
}
