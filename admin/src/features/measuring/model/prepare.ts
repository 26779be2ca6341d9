import type { Sheet } from '@ellwand/shared/records/sheet';
import type { QueryClient } from '@tanstack/react-query';
import { z } from 'zod';
import { staffPicture } from '../../../config/paths.js';
import type { Offline } from '../../../offline/offline.js';
import { referenceKeys } from '../../../offline/reference.js';
import { colleaguesQuery } from '../api/colleagues.js';
import { findingsQuery } from '../api/findings.js';
import { sheetQuery } from '../api/sheet.js';

export const Prepared = z.object({
  points: z.number(),
  readings: z.number(),
  hazards: z.number(),
  picture: z.boolean(),
  /** Whether the browser has promised not to clear it when room is short. */
  promised: z.boolean(),
  freeMegabytes: z.number().nullable(),
});
export type Prepared = z.infer<typeof Prepared>;

/** Fetches all that the table needs and keeps it on this device. Rejects where the museum does not answer. */
export async function prepareSheet(
  queries: QueryClient,
  offline: Offline,
  sheetId: string,
): Promise<Prepared> {
  const sheet = await queries.fetchQuery({ ...sheetQuery(sheetId), staleTime: 0 });
  await Promise.all([
    queries.fetchQuery({ ...findingsQuery(sheetId), staleTime: 0 }),
    queries.fetchQuery({ ...colleaguesQuery, staleTime: 0 }),
    offline.reference.keep(referenceKeys.sheet(sheetId), sheet),
  ]);
  const prepared: Prepared = {
    points: sheet.protocol.points.length,
    readings: sheet.readings.filter(({ stands }) => stands).length,
    hazards: sheet.garment.hazards.length,
    picture: await keepPicture(offline, sheet),
    promised: await askToLast(),
    freeMegabytes: await freeRoom(),
  };
  await offline.reference.keep(referenceKeys.prepared(sheetId), prepared);
  return prepared;
}

async function keepPicture({ reference }: Offline, { garment: { firstImageId } }: Sheet): Promise<boolean> {
  if (!firstImageId) return false;
  const answer = await fetch(staffPicture(firstImageId, 320), { credentials: 'same-origin' });
  if (!answer.ok) return false;
  const type = answer.headers.get('Content-Type') ?? 'image/jpeg';
  await reference.keep(referenceKeys.picture(firstImageId), { bytes: await answer.arrayBuffer(), type });
  return true;
}

async function askToLast(): Promise<boolean> {
  return (await navigator.storage?.persist?.().catch(() => false)) ?? false;
}

async function freeRoom(): Promise<number | null> {
  const estimate = await navigator.storage?.estimate?.().catch(() => null);
  if (!estimate?.quota) return null;
  return Math.floor((estimate.quota - (estimate.usage ?? 0)) / 1_000_000);
}
