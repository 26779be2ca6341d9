import { Colleagues } from '@ellwand/shared/records/session';
import { queryOptions } from '@tanstack/react-query';
import { api } from '../../../lib/api-client.js';
import { referenceOf } from '../../../lib/query-client.js';
import { referenceKeys } from '../../../offline/reference.js';

/** Whoever may be named on a sheet. */
export const colleaguesQuery = queryOptions({
  queryKey: ['colleagues'],
  queryFn: async ({ signal, client }) => {
    const ask = () => api.get('/workroom/colleagues', Colleagues, { signal });
    return (await referenceOf(client).through(referenceKeys.colleagues, Colleagues, ask)).items;
  },
});
