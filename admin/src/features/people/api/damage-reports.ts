import { DamageReports } from '@ellwand/shared/records/noted';
import { Colleagues } from '@ellwand/shared/records/session';
import { queryOptions } from '@tanstack/react-query';
import { api } from '../../../lib/api-client.js';

const address = '/workroom/settings/damage-reports';

export const damageReportsQuery = queryOptions({
  queryKey: ['settings', 'damage-reports'],
  queryFn: ({ signal }) => api.get(address, DamageReports, { signal }),
});

export const setDamageReports = (body: DamageReports) => api.put(address, DamageReports, { body });

/** Everybody who works here now and may be told. */
export const tellableQuery = queryOptions({
  queryKey: ['settings', 'damage-reports', 'people'],
  queryFn: async ({ signal }) => (await api.get('/workroom/colleagues', Colleagues, { signal })).items,
});
