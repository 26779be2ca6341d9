import { Garment } from '@ellwand/shared/records/garment';
import { api } from '../../../lib/api-client.js';

/** Into review. 409 `record.not-ready` says in sentences what is missing. */
export const submitGarment = (id: string, version: number) =>
  api.post(`/workroom/garments/${id}/submit`, Garment, { version, body: {} });

/** A published or withdrawn record becomes a draft again; what the public sees stays as it is. */
export const reviseGarment = (id: string, version: number) =>
  api.post(`/workroom/garments/${id}/revise`, Garment, { version, body: {} });
