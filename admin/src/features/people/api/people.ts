import { People, Person, type PersonChange } from '@ellwand/shared/records/session';
import { keepPreviousData, queryOptions } from '@tanstack/react-query';
import { api, queryString } from '../../../lib/api-client.js';

export const peopleQuery = (page: number, size: number) =>
  queryOptions({
    queryKey: ['people', page, size],
    placeholderData: keepPreviousData,
    queryFn: ({ signal }) => api.get(`/workroom/users${queryString({ page, size })}`, People, { signal }),
  });

export const changePerson = (id: string, version: number, body: PersonChange) =>
  api.patch(`/workroom/users/${id}`, Person, { body, version });
