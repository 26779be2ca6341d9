import { Repeatability, type RepeatabilitySource } from '@ellwand/shared/records/repeatability';
import { queryOptions } from '@tanstack/react-query';
import { api } from '../../../lib/api-client.js';

export const repeatabilityQuery = (from: RepeatabilitySource) =>
  queryOptions({
    queryKey: ['repeatability', from],
    queryFn: ({ signal }) => api.get(`/workroom/repeatability?from=${from}`, Repeatability, { signal }),
  });
