import { Invitation, type NewInvitation } from '@ellwand/shared/records/session';
import { queryOptions } from '@tanstack/react-query';
import { z } from 'zod';
import { api } from '../../../lib/api-client.js';

export const invitationsQuery = queryOptions({
  queryKey: ['invitations'],
  queryFn: async ({ signal }) =>
    (await api.get('/workroom/invitations', z.object({ items: z.array(Invitation) }), { signal })).items,
});

export const invite = (body: z.infer<typeof NewInvitation>) =>
  api.post('/workroom/invitations', Invitation, { body });

export const withdrawInvitation = (id: string) => api.deleteQuietly(`/workroom/invitations/${id}`);
