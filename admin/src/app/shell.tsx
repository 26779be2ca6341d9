import { useQueryClient } from '@tanstack/react-query';
import { NavLink, Outlet, useNavigate } from 'react-router-dom';
import { Button } from '../components/ui/button.js';
import { NewerNotice } from './newer-notice.js';
import { TrayLink } from './tray-link.js';
import { paths } from '../config/paths.js';
import { sessionQuery, signOut } from '../features/sign-in/api/session.js';
import { referenceOf } from '../lib/query-client.js';
import { useMay, useSession } from '../lib/session.js';
import { referenceKeys } from '../offline/reference.js';

const linkLook = ({ isActive }: { isActive: boolean }) =>
  `inline-flex min-h-12 items-center border-b-2 whitespace-nowrap text-table ${isActive ? 'border-indigo font-medium text-ink' : 'border-transparent text-ink-2 hover:text-ink'}`;

/** The office's frame. The measuring sheet has its own, for nothing there may distract. */
export function Shell() {
  const { user } = useSession();
  const reviews = useMay('record:review');
  const manages = useMay('user:manage');
  const audits = useMay('audit:read');
  return (
    <>
      <a
        href="#main"
        className="sr-only focus:not-sr-only focus:absolute focus:left-4 focus:top-2 focus:z-30 focus:bg-sheet focus:px-3 focus:py-2"
      >
        Skip to the content
      </a>
      <NewerNotice />
      <header className="border-b border-hair bg-sheet print:hidden">
        <div className="mx-auto flex max-w-page flex-wrap items-center gap-x-8 px-4 sm:px-6">
          <NavLink to={paths.garments()} className="title flex min-h-12 items-center text-title-25">
            Ellwand Workroom
          </NavLink>
          <div className="ml-auto flex items-center gap-3 text-table sm:order-last">
            <TrayLink />
            <span className="hidden text-ink-2 sm:inline">{user.name}</span>
            <SignOut />
          </div>
          <nav aria-label="Workroom" className="flex w-full gap-5 overflow-x-auto sm:w-auto sm:gap-6">
            <NavLink to={paths.garments()} end className={linkLook}>
              Garments
            </NavLink>
            {reviews && (
              <NavLink to={paths.reviewQueue()} className={linkLook}>
                Review
              </NavLink>
            )}
            <NavLink to={paths.protocols()} className={linkLook}>
              Protocols
            </NavLink>
            <NavLink to={paths.repeatability()} className={linkLook}>
              Repeatability
            </NavLink>
            {manages && (
              <NavLink to={paths.people()} className={linkLook}>
                People
              </NavLink>
            )}
            {audits && (
              <NavLink to={paths.audit()} className={linkLook}>
                Audit trail
              </NavLink>
            )}
          </nav>
        </div>
      </header>
      <main id="main">
        <Outlet />
      </main>
    </>
  );
}

function SignOut() {
  const queries = useQueryClient();
  const navigate = useNavigate();
  const leave = async () => {
    // Whatever the server says, this screen shows nothing more.
    await signOut().catch(() => undefined);
    await referenceOf(queries).forget(referenceKeys.session);
    queries.clear();
    queries.setQueryData(sessionQuery.queryKey, null);
    void navigate(paths.signIn(), { replace: true });
  };
  return (
    <Button tone="quiet" height="dense" className="px-2" onClick={() => void leave()}>
      Sign out
    </Button>
  );
}
