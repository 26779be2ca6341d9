import { Colleagues } from '@ellwand/shared/records/session';
import { queryOptions } from '@tanstack/react-query';
import { api } from '../../../lib/api-client.js';

/** Whoever may be named on a sheet. */
export const colleaguesQuery = queryOptions({
  queryKey: ['colleagues'],
  queryFn: async ({ signal }) => (await api.get('/workroom/colleagues', Colleagues, { signal })).items,
});
