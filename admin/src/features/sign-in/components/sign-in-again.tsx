import { useQueryClient } from '@tanstack/react-query';
import { Button } from '../../../components/ui/button.js';
import { Question } from '../../../components/ui/dialog.js';
import { gaveUpSigningIn, signedInAgain } from '../../../lib/session-gate.js';
import type { SessionShown } from '../../../lib/session.js';
import { sessionQuery } from '../api/session.js';
import { SignInForm } from './sign-in-form.js';

/**
 * The session ended while somebody worked. They sign in over the page they are on: the place and all that was
 * typed stay as they were, and what waited to be sent is sent.
 */
export function SignInAgain({ session }: { readonly session: SessionShown }) {
  const queries = useQueryClient();

  const goOn = (next: SessionShown) => {
    // Somebody else sits down: what the first person was shown is not theirs.
    if (next.user.id !== session.user.id) queries.removeQueries();
    queries.setQueryData(sessionQuery.queryKey, next);
    signedInAgain();
  };
  const leave = () => {
    gaveUpSigningIn();
    queries.setQueryData(sessionQuery.queryKey, null);
  };
  return (
    <Question
      open
      onClose={() => undefined}
      title="Sign in again"
      actions={
        <Button tone="quiet" onClick={leave}>
          Leave the Workroom
        </Button>
      }
    >
      <p className="text-ink-2">Your time here ran out. Everything on this page stays as it is.</p>
      <SignInForm email={session.user.email} onSignedIn={goOn} />
    </Question>
  );
}
