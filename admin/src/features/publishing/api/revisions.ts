import { Revisions } from '@ellwand/shared/records/publishing';
import { queryOptions } from '@tanstack/react-query';
import { api } from '../../../lib/api-client.js';

export const revisionsQuery = (garmentId: string) =>
  queryOptions({
    queryKey: ['revisions', garmentId],
    queryFn: async ({ signal }) =>
      (await api.get(`/workroom/garments/${garmentId}/revisions`, Revisions, { signal })).items,
  });
