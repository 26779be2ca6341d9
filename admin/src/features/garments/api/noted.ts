import { NotedList, type Settlement } from '@ellwand/shared/records/noted';
import { queryOptions } from '@tanstack/react-query';
import { api } from '../../../lib/api-client.js';

export const notedQuery = (garmentId: string) =>
  queryOptions({
    queryKey: ['noted-at-table', garmentId],
    queryFn: ({ signal }) => api.get(`/workroom/garments/${garmentId}/noted-at-table`, NotedList, { signal }),
  });

export const settleNote = (noteId: string, how: Settlement) =>
  api.post(`/workroom/table-notes/${noteId}/settle`, NotedList, { body: { how } });
