import { PartSheets, type SpeakingSheet } from '@ellwand/shared/records/part-sheets';
import { queryOptions } from '@tanstack/react-query';
import { api } from '../../../lib/api-client.js';

export const partSheetsQuery = (partId: string) =>
  queryOptions({
    queryKey: ['part-sheets', partId],
    queryFn: ({ signal }) => api.get(`/workroom/parts/${partId}/sheets`, PartSheets, { signal }),
  });

/** `garmentVersion` is the one that was seen: somebody else may have written in between. */
export const chooseSheet = (partId: string, garmentVersion: number, body: SpeakingSheet) =>
  api.put(`/workroom/parts/${partId}/speaking-sheet`, PartSheets, { body, version: garmentVersion });
