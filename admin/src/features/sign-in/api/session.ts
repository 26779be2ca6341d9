import { type SignIn, Session } from '@ellwand/shared/records/session';
import { queryOptions } from '@tanstack/react-query';
import { api } from '../../../lib/api-client.js';
import { isProblem } from '../../../lib/problem-error.js';
import type { SessionShown } from '../../../lib/session.js';
import { refreshSession } from '../../../lib/session-gate.js';

/** Who is signed in, or null. Asked once at the start; a refresh token alone is enough to go on. */
export const sessionQuery = queryOptions({
  queryKey: ['session'],
  staleTime: Infinity,
  queryFn: async ({ signal }): Promise<SessionShown | null> => {
    const ask = () => api.get('/session', Session, { signal, sessionless: true });
    const asked = Date.now();
    try {
      return await ask();
    } catch (error) {
      if (!isProblem(error) || error.status !== 401) throw error;
      return (await refreshSession(asked)) ? ask() : null;
    }
  },
});

export const signIn = (body: SignIn) => api.post('/session', Session, { body, sessionless: true });

export const signOut = () => api.deleteQuietly('/session', { sessionless: true });
