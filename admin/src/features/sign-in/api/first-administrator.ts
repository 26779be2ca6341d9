import { type FirstAdministrator, Session } from '@ellwand/shared/records/session';
import { api } from '../../../lib/api-client.js';

export const makeFirstAdministrator = (body: FirstAdministrator) =>
  api.post('/first-administrator', Session, { body, sessionless: true });
