import { Sheet, type SheetFacts } from '@ellwand/shared/records/sheet';
import { api } from '../../../lib/api-client.js';

/** The client gives the id: a repeated request, after a lost answer, opens one sheet. */
export const openSheet = (partId: string, id: string, facts: SheetFacts) =>
  api.post(`/workroom/parts/${partId}/sheets`, Sheet, { body: { id, facts } });
