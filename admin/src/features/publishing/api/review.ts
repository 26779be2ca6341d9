import { Review } from '@ellwand/shared/records/publishing';
import { queryOptions } from '@tanstack/react-query';
import { api } from '../../../lib/api-client.js';

export const reviewQuery = (garmentId: string) =>
  queryOptions({
    queryKey: ['review', garmentId],
    queryFn: ({ signal }) => api.get(`/workroom/garments/${garmentId}/review`, Review, { signal }),
  });
