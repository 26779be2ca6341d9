import { type NewReading, ReadingResults } from '@ellwand/shared/records/sheet';
import type { z } from 'zod';
import { api } from '../../../lib/api-client.js';

export type ReadingResult = z.infer<typeof ReadingResults>['results'][number];

/** Idempotent by each reading's id: what was kept before is answered `already-kept`. */
export const sendReadings = (sheetId: string, readings: readonly NewReading[]) =>
  api.post(`/workroom/sheets/${sheetId}/readings`, ReadingResults, { body: { readings } });
