import { type FindingAnswer, SheetFindings } from '@ellwand/shared/records/sheet';
import { queryOptions } from '@tanstack/react-query';
import type { z } from 'zod';
import { api } from '../../../lib/api-client.js';

export const findingsQuery = (sheetId: string) =>
  queryOptions({
    queryKey: ['findings', sheetId],
    queryFn: ({ signal }) => api.get(`/workroom/sheets/${sheetId}/findings`, SheetFindings, { signal }),
  });

export const answerFinding = (sheetId: string, body: z.infer<typeof FindingAnswer>) =>
  api.post(`/workroom/sheets/${sheetId}/findings/answers`, SheetFindings, { body });
