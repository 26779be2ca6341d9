import { CutSheet, type NewCutSheet } from '@ellwand/shared/records/cut-sheet';
import { queryOptions } from '@tanstack/react-query';
import { z } from 'zod';
import { api } from '../../../lib/api-client.js';
import type { ProblemError } from '../../../lib/problem-error.js';

const address = (partId: string) => `/workroom/parts/${partId}/cut-sheet`;

export const cutSheetQuery = (partId: string) =>
  queryOptions({
    queryKey: ['cut-sheet', partId],
    queryFn: ({ signal }) => api.get(address(partId), CutSheet, { signal }),
  });

export const saveCutSheet = (partId: string, version: number, body: NewCutSheet) =>
  api.put(address(partId), CutSheet, { body, version });

const Stale = z.object({ changedBy: z.string().nullish(), changedAt: z.string().nullish() });

/** What a 412 says of whoever wrote in between. */
export function writtenBetween(error: ProblemError): z.infer<typeof Stale> {
  const stale = Stale.safeParse(error.problem);
  return stale.success ? stale.data : {};
}
