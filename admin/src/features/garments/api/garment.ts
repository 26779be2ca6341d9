import { Garment } from '@ellwand/shared/records/garment';
import { queryOptions } from '@tanstack/react-query';
import { api } from '../../../lib/api-client.js';

export const garmentQuery = (id: string) =>
  queryOptions({
    queryKey: ['garment', id],
    queryFn: ({ signal }) => api.get(`/workroom/garments/${id}`, Garment, { signal }),
  });
