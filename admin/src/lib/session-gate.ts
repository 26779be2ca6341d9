/**
 * What happens when the access token has ended. One refresh under a Web Lock, so that two tabs do not both spend
 * the rotating refresh token; when that fails, whoever waits is held here until somebody has signed in again.
 * A request that met a closed session is therefore late, not lost, and so is what was typed.
 */
const LOCK = 'ellwand-session-refresh';

type Listener = (open: boolean) => void;

let waiting: { promise: Promise<void>; signedIn: () => void; givenUp: (error: Error) => void } | null = null;
let lastRefresh = 0;
const listeners = new Set<Listener>();

function tell(open: boolean) {
  for (const listener of listeners) listener(open);
}

/** Whether somebody must sign in again before the waiting requests go on. */
export function onSignInNeeded(listener: Listener): () => void {
  listeners.add(listener);
  listener(waiting !== null);
  return () => listeners.delete(listener);
}

export function waitForSignIn(): Promise<void> {
  if (!waiting) {
    let signedIn: () => void = () => undefined;
    let givenUp: (error: Error) => void = () => undefined;
    const promise = new Promise<void>((resolve, reject) => {
      signedIn = resolve;
      givenUp = reject;
    });
    waiting = { promise, signedIn, givenUp };
    tell(true);
  }
  return waiting.promise;
}

export function signedInAgain(): void {
  waiting?.signedIn();
  waiting = null;
  tell(false);
}

/** The person chose to leave: what waited is refused. */
export function gaveUpSigningIn(): void {
  waiting?.givenUp(new Error('Not signed in'));
  waiting = null;
  tell(false);
}

async function locked<T>(work: () => Promise<T>): Promise<T> {
  return 'locks' in navigator ? navigator.locks.request(LOCK, work) : work();
}

/**
 * True when the session goes on. `since` is when the refused request was sent: where another request refreshed in
 * the meantime, its success is this one's too.
 */
export function refreshSession(since: number): Promise<boolean> {
  return locked(async () => {
    if (lastRefresh > since) return true;
    try {
      const answer = await fetch('/api/v1/session/refresh', { method: 'POST', credentials: 'same-origin' });
      if (answer.ok) lastRefresh = Date.now();
      return answer.ok;
    } catch {
      return false;
    }
  });
}
