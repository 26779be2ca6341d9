import { ReadingResults, type StoredReading } from '@ellwand/shared/records/sheet';
import { type StoredTableNote, TableNoteResults } from '@ellwand/shared/records/table-note';
import type { z } from 'zod';
import { api } from '../lib/api-client.js';
import type { Operation, OperationOf } from './operation.js';
import type { Deliver, Outcome } from './outbox.js';
import type { PictureBytes } from './store.js';
import { sendPicture } from './send-picture.js';

/** What the API has kept just now, told before it leaves the outbox, so that it is never nowhere. */
export interface Arrived {
  readonly sheetId: string;
  readonly sheetVersion: number;
  readonly readings: readonly StoredReading[];
  readonly notes: readonly StoredTableNote[];
}

export interface DeliveryWays {
  readonly arrived: (arrived: Arrived) => void;
  readonly pictureBytes: (id: string) => Promise<PictureBytes | undefined>;
  readonly pictureArrived: (garmentId: string) => void;
}

type Results = z.infer<typeof ReadingResults> | TableNoteResults;

const isKept = (outcome: string): boolean => outcome === 'kept' || outcome === 'already-kept';

function outcomesOf({ results }: Results): Outcome[] {
  return results.map((result) => {
    const kept = isKept(result.outcome);
    const standing = 'standing' in result && result.standing ? { standing: result.standing } : {};
    return { id: result.id, kept, ...(kept || !result.detail ? {} : { why: result.detail }), ...standing };
  });
}

const only = <Kind extends Operation['kind']>(batch: readonly Operation[], kind: Kind) =>
  batch.filter((operation): operation is OperationOf<Kind> => operation.kind === kind);

/** How each kind of operation goes to the API. */
export function deliveryTo(ways: DeliveryWays): Deliver {
  return async (batch) => {
    const [first] = batch;
    if (!first) return [];
    if (first.kind === 'reading') return sendReadings(ways, first.sheetId, only(batch, 'reading'));
    if (first.kind === 'note') return sendNotes(ways, first.sheetId, only(batch, 'note'));
    return [await sendOnePicture(ways, first)];
  };
}

async function sendReadings(
  { arrived }: DeliveryWays,
  sheetId: string,
  operations: readonly OperationOf<'reading'>[],
): Promise<readonly Outcome[]> {
  const body = { readings: operations.map(({ reading }) => reading) };
  const answer = await api.post(`/workroom/sheets/${sheetId}/readings`, ReadingResults, { body });
  const kept = answer.results.filter(({ outcome }) => isKept(outcome));
  const readings = kept.flatMap(({ reading }) => reading ?? []);
  arrived({ sheetId, sheetVersion: answer.sheetVersion, readings, notes: [] });
  return outcomesOf(answer);
}

async function sendNotes(
  { arrived }: DeliveryWays,
  sheetId: string,
  operations: readonly OperationOf<'note'>[],
): Promise<readonly Outcome[]> {
  const body = { notes: operations.map(({ note }) => note) };
  const answer = await api.post(`/workroom/sheets/${sheetId}/table-notes`, TableNoteResults, { body });
  const notes = answer.results.flatMap(({ note }) => note ?? []);
  arrived({ sheetId, sheetVersion: answer.sheetVersion, readings: [], notes });
  return outcomesOf(answer);
}

async function sendOnePicture(
  { pictureBytes, pictureArrived }: DeliveryWays,
  { id, picture }: OperationOf<'picture'>,
): Promise<Outcome> {
  const bytes = await pictureBytes(id);
  if (!bytes) return { id, kept: false, why: 'The picture itself is not on this tablet any more.' };
  // A broken upload says nothing about whether it arrived; its id makes sending it again harmless.
  await sendPicture(picture, bytes);
  pictureArrived(picture.garmentId);
  return { id, kept: true };
}
