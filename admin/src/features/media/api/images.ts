import { Images } from '@ellwand/shared/records/image';
import { queryOptions } from '@tanstack/react-query';
import { api } from '../../../lib/api-client.js';

/** How often to ask while smaller forms are made. */
const POLL_MS = 1000;

/** The garment's pictures in their order; asked again by itself while any of them is still in the making. */
export const imagesQuery = (garmentId: string) =>
  queryOptions({
    queryKey: ['images', garmentId],
    queryFn: async ({ signal }) => {
      const { items } = await api.get(`/workroom/garments/${garmentId}/images`, Images, { signal });
      return items.toSorted((first, second) => first.position - second.position);
    },
    refetchInterval: (query) =>
      query.state.data?.some(({ state }) => state === 'received' || state === 'making') ? POLL_MS : false,
  });
