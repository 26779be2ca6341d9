import type { Invitation } from '@ellwand/shared/records/session';
import type { InvitationRow } from './invitation.entity';

/** Where an invitation stands at a moment. */
export function invitationState(row: InvitationRow, now: Date): Invitation['state'] {
  if (row.acceptedAt) return 'accepted';
  if (row.withdrawnAt) return 'withdrawn';
  return row.expiresAt > now ? 'open' : 'expired';
}

export const invitationView = (row: InvitationRow, invitedBy: string, now: Date): Invitation => ({
  id: row.id,
  email: row.email,
  name: row.name,
  roles: row.roles,
  invitedBy,
  createdAt: row.createdAt.toISOString(),
  expiresAt: row.expiresAt.toISOString(),
  state: invitationState(row, now),
});
