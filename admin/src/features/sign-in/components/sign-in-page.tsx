import { useQueryClient } from '@tanstack/react-query';
import { useNavigate, useSearchParams } from 'react-router-dom';
import { safeNext } from '../../../config/paths.js';
import { sessionQuery } from '../api/session.js';
import { Doorway } from './doorway.js';
import { SignInForm } from './sign-in-form.js';

export function SignInPage() {
  const queries = useQueryClient();
  const navigate = useNavigate();
  const [search] = useSearchParams();
  return (
    <Doorway
      title="Sign in"
      lead="For the museum’s staff. An administrator invites new colleagues by e-mail."
    >
      <SignInForm
        onSignedIn={(session) => {
          queries.setQueryData(sessionQuery.queryKey, session);
          void navigate(safeNext(search.get('next')), { replace: true });
        }}
      />
    </Doorway>
  );
}
