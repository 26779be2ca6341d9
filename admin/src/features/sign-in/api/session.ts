import { type SignIn, Session } from '@ellwand/shared/records/session';
import { queryOptions } from '@tanstack/react-query';
import { api } from '../../../lib/api-client.js';
import { referenceOf } from '../../../lib/query-client.js';
import { isProblem } from '../../../lib/problem-error.js';
import type { SessionShown } from '../../../lib/session.js';
import { referenceKeys } from '../../../offline/reference.js';
import { refreshSession } from '../../../lib/session-gate.js';

/** Who is signed in, or null. Asked once at the start; a refresh token alone is enough to go on. */
export const sessionQuery = queryOptions({
  queryKey: ['session'],
  staleTime: Infinity,
  queryFn: async ({ signal, client }): Promise<SessionShown | null> => {
    const reference = referenceOf(client);
    const ask = () => api.get('/session', Session, { signal, sessionless: true });
    const asked = Date.now();
    try {
      // Without a network whoever was signed in last goes on keying; what they key waits for them.
      return await reference.through(referenceKeys.session, Session, ask);
    } catch (error) {
      if (!isProblem(error) || error.status !== 401) throw error;
      if (await refreshSession(asked)) return reference.through(referenceKeys.session, Session, ask);
      await reference.forget(referenceKeys.session);
      return null;
    }
  },
});

export const signIn = (body: SignIn) => api.post('/session', Session, { body, sessionless: true });

export const signOut = () => api.deleteQuietly('/session', { sessionless: true });
