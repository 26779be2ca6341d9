import { GarmentPage } from '@ellwand/shared/records/garment';
import type { RecordStage } from '@ellwand/shared/records/record-moves';
import { keepPreviousData, queryOptions } from '@tanstack/react-query';
import { api, queryString } from '../../../lib/api-client.js';

export interface GarmentListAsked {
  readonly q?: string;
  readonly stage?: RecordStage;
  readonly sort?: string;
  readonly page?: number;
  readonly size?: number;
}

export const garmentListQuery = (asked: GarmentListAsked) =>
  queryOptions({
    queryKey: ['garments', asked],
    placeholderData: keepPreviousData,
    queryFn: ({ signal }) =>
      api.get(`/workroom/garments${queryString({ ...asked })}`, GarmentPage, { signal }),
  });
