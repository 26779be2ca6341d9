import { roleLabels } from '@ellwand/shared/records/roles';
import { AcceptInvitation } from '@ellwand/shared/records/session';
import { zodResolver } from '@hookform/resolvers/zod';
import { useQuery, useQueryClient } from '@tanstack/react-query';
import { useForm } from 'react-hook-form';
import { Link, useNavigate } from 'react-router-dom';
import type { z } from 'zod';
import { Button } from '../../../components/ui/button.js';
import { ErrorSummary } from '../../../components/ui/error-summary.js';
import { TextField } from '../../../components/ui/field.js';
import { Failed, Waiting } from '../../../components/ui/states.js';
import { paths } from '../../../config/paths.js';
import { mistakesOf, showProblem } from '../../../lib/form-mistakes.js';
import { isProblem } from '../../../lib/problem-error.js';
import { acceptInvitation, invitationQuery } from '../api/invitation.js';
import { sessionQuery } from '../api/session.js';
import { useToken } from '../use-token.js';
import { Doorway } from './doorway.js';

export function InvitationPage() {
  const token = useToken();
  const invitation = useQuery({ ...invitationQuery(token), enabled: token !== '' });
  if (token === '' || isProblem(invitation.error)) return <InvitationClosed />;
  if (invitation.isError) {
    return (
      <Doorway title="Your invitation">
        <Failed error={invitation.error} onRetry={() => void invitation.refetch()} />
      </Doorway>
    );
  }
  if (invitation.isPending) {
    return (
      <Doorway title="Your invitation">
        <Waiting label="Opening the invitation" rows={3} />
      </Doorway>
    );
  }
  const { name, email, roles, museum } = invitation.data;
  return (
    <Doorway
      title={`Welcome to ${museum}`}
      lead={`You are invited as ${roles.map((role) => roleLabels[role].toLowerCase()).join(' and ')}. You will sign in with ${email}.`}
    >
      <AcceptForm token={token} name={name} />
    </Doorway>
  );
}

function InvitationClosed() {
  return (
    <Doorway title="This invitation cannot be used">
      <p className="text-table">
        The link has been used, has run out, or was not copied whole. Ask the administrator who invited you
        for a new one.
      </p>
      <p className="mt-4 text-table">
        <Link className="text-indigo underline" to={paths.signIn()}>
          Sign in
        </Link>{' '}
        if you have set your password already.
      </p>
    </Doorway>
  );
}

function AcceptForm({ token, name }: { readonly token: string; readonly name: string }) {
  const queries = useQueryClient();
  const navigate = useNavigate();
  const form = useForm<z.input<typeof AcceptInvitation>, unknown, AcceptInvitation>({
    resolver: zodResolver(AcceptInvitation),
    defaultValues: { token, name, password: '' },
    shouldFocusError: false,
  });
  const { errors, isSubmitting, submitCount } = form.formState;
  const submit = form.handleSubmit(async (values) => {
    try {
      queries.setQueryData(sessionQuery.queryKey, await acceptInvitation(values));
      void navigate(paths.garments(), { replace: true });
    } catch (error) {
      showProblem(error, form.setError);
    }
  });
  return (
    <form noValidate onSubmit={(event) => void submit(event)} className="space-y-5">
      <ErrorSummary mistakes={mistakesOf(errors)} attempt={isSubmitting ? 0 : submitCount} />
      <TextField
        id="name"
        label="Your name"
        hint="As it should stand on measuring sheets."
        autoComplete="name"
        error={errors.name?.message}
        {...form.register('name')}
      />
      <TextField
        id="password"
        label="New password"
        hint="At least 12 characters. Three or four words that do not belong together are easy to keep."
        type="password"
        autoComplete="new-password"
        error={errors.password?.message}
        {...form.register('password')}
      />
      <Button type="submit" tone="action" height="table" className="w-full" disabled={isSubmitting}>
        Set the password and go in
      </Button>
    </form>
  );
}
