import { PublishedDocument } from '@ellwand/shared/records/published-garment';
import { queryOptions } from '@tanstack/react-query';
import { api } from '../../../lib/api-client.js';

/** The garment exactly as it would be published. */
export const previewQuery = (garmentId: string) =>
  queryOptions({
    queryKey: ['preview', garmentId],
    queryFn: ({ signal }) =>
      api.get(`/workroom/garments/${garmentId}/preview`, PublishedDocument, { signal }),
  });
