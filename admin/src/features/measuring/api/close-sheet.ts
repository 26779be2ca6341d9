import { Sheet } from '@ellwand/shared/records/sheet';
import { api } from '../../../lib/api-client.js';

export const completeSheet = (id: string, version: number) =>
  api.post(`/workroom/sheets/${id}/complete`, Sheet, { version, body: {} });

export const reopenSheet = (id: string, version: number) =>
  api.post(`/workroom/sheets/${id}/reopen`, Sheet, { version, body: {} });
