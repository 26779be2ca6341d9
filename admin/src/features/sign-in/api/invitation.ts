import { type AcceptInvitation, InvitationShown, Session } from '@ellwand/shared/records/session';
import { queryOptions } from '@tanstack/react-query';
import { api } from '../../../lib/api-client.js';

/** The token travels in the body: an address with it would stand in every log on the way. */
export const invitationQuery = (token: string) =>
  queryOptions({
    queryKey: ['invitation', token],
    staleTime: Infinity,
    queryFn: ({ signal }) =>
      api.post('/invitations/look-up', InvitationShown, { body: { token }, signal, sessionless: true }),
  });

export const acceptInvitation = (body: AcceptInvitation) =>
  api.post('/invitations/accept', Session, { body, sessionless: true });
