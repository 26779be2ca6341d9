import { useEffect, useState } from 'react';
import { useLocation } from 'react-router-dom';

/**
 * The secret of an invitation's link, from behind the `#`, where no server sees it. It is taken out of the
 * address bar at once, so that it stands neither in the history nor over anybody's shoulder.
 */
export function useToken(): string {
  const { hash } = useLocation();
  const [token] = useState(() => hash.replace(/^#/, ''));
  useEffect(() => {
    if (window.location.hash) window.history.replaceState(window.history.state, '', window.location.pathname);
  }, []);
  return token;
}
