import { may, type Permission } from '@ellwand/shared/records/roles';
import { createContext, useContext } from 'react';
import type { Session } from '@ellwand/shared/records/session';
import type { z } from 'zod';

export type SessionShown = z.infer<typeof Session>;

export const SessionContext = createContext<SessionShown | null>(null);

/** Who is signed in. Only for screens behind the door, where somebody always is. */
export function useSession(): SessionShown {
  const session = useContext(SessionContext);
  if (!session) throw new Error('expected a signed-in person around this screen, got nobody');
  return session;
}

export function useMay(permission: Permission): boolean {
  return may(useSession().user.roles, permission);
}
