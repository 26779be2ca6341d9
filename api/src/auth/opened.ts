import type { Session } from '@ellwand/shared/records/session';
import type { UserRow } from '../users/user.entity';
import type { SessionTokens } from './session-cookies';

/** A session that has just begun or been renewed, and whose it is. */
export interface Opened {
  readonly user: Pick<UserRow, 'id' | 'name' | 'email' | 'roles'>;
  readonly tokens: SessionTokens;
}

/** What the browser is told of it; the tokens travel in cookies alone. */
export const sessionShown = ({ user, tokens }: Opened): Session => ({
  user: { id: user.id, name: user.name, email: user.email, roles: user.roles },
  accessEndsAt: tokens.accessEndsAt.toISOString(),
});
