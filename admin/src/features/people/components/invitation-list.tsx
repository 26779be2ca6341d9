import { roleLabels } from '@ellwand/shared/records/roles';
import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { Button } from '../../../components/ui/button.js';
import { Failed, Refused, Waiting } from '../../../components/ui/states.js';
import { momentText } from '../../../lib/moments.js';
import { invitationsQuery, withdrawInvitation } from '../api/invitations.js';

/** Invitations that nobody has taken up yet. */
export function InvitationList() {
  const invitations = useQuery(invitationsQuery);
  const queries = useQueryClient();
  const withdraw = useMutation({
    mutationFn: withdrawInvitation,
    onSettled: () => queries.invalidateQueries({ queryKey: invitationsQuery.queryKey }),
  });
  const open = invitations.data?.filter(({ state }) => state === 'open' || state === 'expired') ?? [];
  return (
    <section aria-labelledby="invitations-title">
      <h2 id="invitations-title" className="title text-title-25">
        Open invitations
      </h2>
      {invitations.isPending && <Waiting label="Fetching the invitations" rows={2} />}
      {invitations.isError && <Failed error={invitations.error} onRetry={() => void invitations.refetch()} />}
      {invitations.data && open.length === 0 && (
        <p className="mt-1 text-table text-ink-2">Everybody who was invited has come in.</p>
      )}
      <ul className="mt-1 divide-y divide-hair">
        {open.map(({ id, name, email, roles, state, expiresAt }) => (
          <li key={id} className="flex flex-wrap items-center justify-between gap-3 py-2 text-table">
            <div>
              <p className="font-medium">{name}</p>
              <p className="text-label text-ink-3">
                {email}, {roles.map((role) => roleLabels[role]).join(', ')}.{' '}
                {state === 'expired' ? 'Ran out' : 'Runs out'} {momentText(expiresAt)}
              </p>
            </div>
            <Button height="dense" disabled={withdraw.isPending} onClick={() => withdraw.mutate(id)}>
              Take back <span className="sr-only">the invitation of {name}</span>
            </Button>
          </li>
        ))}
      </ul>
      <Refused error={withdraw.error} />
    </section>
  );
}
