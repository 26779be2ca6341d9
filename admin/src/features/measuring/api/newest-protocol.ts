import { Sheet } from '@ellwand/shared/records/sheet';
import { api } from '../../../lib/api-client.js';

/** Moves a sheet on which nothing has been read to the newest version of its protocol. */
export const takeNewestProtocol = (id: string, version: number) =>
  api.post(`/workroom/sheets/${id}/newest-protocol`, Sheet, { version, body: {} });
