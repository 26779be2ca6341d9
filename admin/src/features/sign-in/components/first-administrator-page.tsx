import { FirstAdministrator } from '@ellwand/shared/records/session';
import { zodResolver } from '@hookform/resolvers/zod';
import { useQueryClient } from '@tanstack/react-query';
import { useForm } from 'react-hook-form';
import { useNavigate } from 'react-router-dom';
import { Button } from '../../../components/ui/button.js';
import { ErrorSummary } from '../../../components/ui/error-summary.js';
import { TextField } from '../../../components/ui/field.js';
import { paths } from '../../../config/paths.js';
import { mistakesOf, showProblem } from '../../../lib/form-mistakes.js';
import { makeFirstAdministrator } from '../api/first-administrator.js';
import { sessionQuery } from '../api/session.js';
import { useToken } from '../use-token.js';
import { Doorway } from './doorway.js';

const boxes = new Set(['name', 'email', 'password']);

export function FirstAdministratorPage() {
  const token = useToken();
  const queries = useQueryClient();
  const navigate = useNavigate();
  const form = useForm<FirstAdministrator>({
    resolver: zodResolver(FirstAdministrator),
    defaultValues: { token, name: '', email: '', password: '' },
    shouldFocusError: false,
  });
  const { errors, isSubmitting, submitCount } = form.formState;
  const submit = form.handleSubmit(async (values) => {
    try {
      queries.setQueryData(sessionQuery.queryKey, await makeFirstAdministrator(values));
      void navigate(paths.people(), { replace: true });
    } catch (error) {
      showProblem(error, form.setError, { known: (name) => boxes.has(name) });
    }
  });
  const { token: tokenError, ...shown } = errors;
  const mistakes = [
    ...(tokenError
      ? [{ message: 'The address is not complete. Copy the whole line that was printed at the start.' }]
      : []),
    ...mistakesOf(shown),
  ];
  return (
    <Doorway
      title="The first administrator"
      lead="The house is empty. Whoever opens it invites everybody else."
    >
      <form noValidate onSubmit={(event) => void submit(event)} className="space-y-5">
        <ErrorSummary mistakes={mistakes} attempt={isSubmitting ? 0 : submitCount} />
        <TextField
          id="name"
          label="Your name"
          autoComplete="name"
          error={errors.name?.message}
          {...form.register('name')}
        />
        <TextField
          id="email"
          label="E-mail address"
          inputMode="email"
          autoComplete="username"
          error={errors.email?.message}
          {...form.register('email')}
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
          Open the house
        </Button>
      </form>
    </Doorway>
  );
}
