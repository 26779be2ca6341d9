import { useQuery } from '@tanstack/react-query';
import { lazy, Suspense, useEffect, useState } from 'react';
import { Navigate, Outlet, useLocation } from 'react-router-dom';
import { Failed, Waiting } from '../components/ui/states.js';
import { paths } from '../config/paths.js';
import { useAttendant } from './attendant.js';
import { sessionQuery } from '../features/sign-in/api/session.js';
import { onSignInNeeded } from '../lib/session-gate.js';
import { SessionContext, type SessionShown } from '../lib/session.js';

/** Fetched when it is wanted, which is seldom; the tablet has it for where there is no network. */
const SignInAgain = lazy(async () => ({
  default: (await import('../features/sign-in/components/sign-in-again.js')).SignInAgain,
}));

/** Lets in whoever is signed in; sends everybody else to sign in, and remembers where they were going. */
export function Door() {
  const session = useQuery(sessionQuery);
  const { pathname, search } = useLocation();
  useAttendant(session.data?.user.id ?? null);
  if (session.isPending) {
    return (
      <main className="mx-auto max-w-page p-6">
        <h1 className="sr-only">Ellwand Workroom</h1>
        <Waiting label="Opening the Workroom" />
      </main>
    );
  }
  if (session.isError) {
    return (
      <main className="mx-auto max-w-page p-6">
        <h1 className="title mb-4 text-title-34">Ellwand Workroom</h1>
        <Failed error={session.error} onRetry={() => void session.refetch()} />
      </main>
    );
  }
  if (!session.data) return <Navigate to={paths.signIn(pathname + search)} replace />;
  return (
    <SessionContext value={session.data}>
      <Outlet />
      <OverThePage session={session.data} />
    </SessionContext>
  );
}

/** Where the session has ended, the sign-in over the page, which stays as it is. */
function OverThePage({ session }: { readonly session: SessionShown }) {
  const [needed, setNeeded] = useState(false);
  useEffect(() => onSignInNeeded(setNeeded), []);
  if (!needed) return null;
  return (
    <Suspense fallback={null}>
      <SignInAgain session={session} />
    </Suspense>
  );
}
