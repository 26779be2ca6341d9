import { Garment, type GarmentRecord } from '@ellwand/shared/records/garment';
import { z } from 'zod';
import { api } from '../../../lib/api-client.js';
import type { ProblemError } from '../../../lib/problem-error.js';

export const saveRecord = (id: string, version: number, body: GarmentRecord) =>
  api.put(`/workroom/garments/${id}/record`, Garment, { body, version });

const Stale = z.object({
  current: z.number().int(),
  changedBy: z.string().nullish(),
  changedAt: z.string().nullish(),
});

/** What a 412 says of the version that came in between; the screen asks for the record itself. */
export function staleOf(error: ProblemError): z.infer<typeof Stale> | null {
  const stale = Stale.safeParse(error.problem);
  return stale.success ? stale.data : null;
}
