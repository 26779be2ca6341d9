import { useQuery } from '@tanstack/react-query';
import { Navigate, Outlet, useLocation } from 'react-router-dom';
import { Failed, Waiting } from '../components/ui/states.js';
import { paths } from '../config/paths.js';
import { useAttendant } from './attendant.js';
import { sessionQuery } from '../features/sign-in/api/session.js';
import { SignInAgain } from '../features/sign-in/components/sign-in-again.js';
import { SessionContext } from '../lib/session.js';

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
      <SignInAgain session={session.data} />
    </SessionContext>
  );
}
