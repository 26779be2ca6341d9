import { Sheet, type SheetFacts } from '@ellwand/shared/records/sheet';
import { api } from '../../../lib/api-client.js';

export const saveFacts = (sheetId: string, version: number, body: SheetFacts) =>
  api.put(`/workroom/sheets/${sheetId}/facts`, Sheet, { body, version });
