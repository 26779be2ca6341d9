import { SignIn } from '@ellwand/shared/records/session';
import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { Button } from '../../../components/ui/button.js';
import { ErrorSummary } from '../../../components/ui/error-summary.js';
import { TextField } from '../../../components/ui/field.js';
import { mistakesOf } from '../../../lib/form-mistakes.js';
import type { SessionShown } from '../../../lib/session.js';
import { signIn } from '../api/session.js';
import { signInSentence } from '../sign-in-sentence.js';

/** Address and password. Pasting and password managers are welcome. */
export function SignInForm({
  email = '',
  onSignedIn,
}: {
  readonly email?: string;
  readonly onSignedIn: (session: SessionShown) => void;
}) {
  const form = useForm({
    resolver: zodResolver(SignIn),
    defaultValues: { email, password: '' },
    shouldFocusError: false,
  });
  const { errors, isSubmitting, submitCount } = form.formState;
  const submit = form.handleSubmit(async (values) => {
    try {
      onSignedIn(await signIn(values));
    } catch (error) {
      form.setError('root.server', { message: signInSentence(error) });
    }
  });
  return (
    <form noValidate onSubmit={(event) => void submit(event)} className="space-y-5">
      <ErrorSummary mistakes={mistakesOf(errors)} attempt={isSubmitting ? 0 : submitCount} />
      <TextField
        id="email"
        label="E-mail address"
        autoComplete="username"
        inputMode="email"
        spellCheck={false}
        autoCapitalize="none"
        error={errors.email?.message}
        {...form.register('email')}
      />
      <TextField
        id="password"
        label="Password"
        type="password"
        autoComplete="current-password"
        error={errors.password?.message}
        {...form.register('password')}
      />
      <Button type="submit" tone="action" height="table" className="w-full" disabled={isSubmitting}>
        {isSubmitting ? 'Signing in' : 'Sign in'}
      </Button>
    </form>
  );
}
