import { NewInvitation } from '@ellwand/shared/records/session';
import { zodResolver } from '@hookform/resolvers/zod';
import { useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { Controller, useForm } from 'react-hook-form';
import type { z } from 'zod';
import { Button } from '../../../components/ui/button.js';
import { ErrorSummary } from '../../../components/ui/error-summary.js';
import { TextField } from '../../../components/ui/field.js';
import { mistakesOf, showProblem } from '../../../lib/form-mistakes.js';
import { invitationsQuery, invite } from '../api/invitations.js';
import { RoleTicks } from './role-ticks.js';

type Inviting = z.infer<typeof NewInvitation>;
const nobody: Inviting = { email: '', name: '', roles: [] };

export function InviteForm() {
  const queries = useQueryClient();
  const [sentTo, setSentTo] = useState<string | null>(null);
  const form = useForm<Inviting>({
    resolver: zodResolver(NewInvitation),
    defaultValues: nobody,
    shouldFocusError: false,
  });
  const { errors, isSubmitting, submitCount } = form.formState;
  const submit = form.handleSubmit(async (values) => {
    try {
      const invitation = await invite(values);
      setSentTo(invitation.email);
      form.reset(nobody);
      await queries.invalidateQueries({ queryKey: invitationsQuery.queryKey });
    } catch (error) {
      showProblem(error, form.setError);
    }
  });
  return (
    <form
      noValidate
      onSubmit={(event) => void submit(event)}
      className="space-y-5 rounded-sm border border-hair bg-sheet p-5"
      aria-labelledby="invite-title"
    >
      <h2 id="invite-title" className="title text-title-25">
        Invite a colleague
      </h2>
      <ErrorSummary mistakes={mistakesOf(errors)} attempt={isSubmitting ? 0 : submitCount} />
      <TextField
        id="name"
        label="Name"
        autoComplete="off"
        error={errors.name?.message}
        {...form.register('name')}
      />
      <TextField
        id="email"
        label="E-mail address"
        inputMode="email"
        autoComplete="off"
        error={errors.email?.message}
        {...form.register('email')}
      />
      <Controller
        control={form.control}
        name="roles"
        render={({ field, fieldState }) => (
          <RoleTicks
            id="roles"
            chosen={field.value}
            onChange={field.onChange}
            error={fieldState.error?.message}
          />
        )}
      />
      <Button type="submit" tone="action" disabled={isSubmitting}>
        Send the invitation
      </Button>
      <p role="status" className="text-table text-ink-2">
        {sentTo ? `An invitation is on its way to ${sentTo}.` : ''}
      </p>
    </form>
  );
}
