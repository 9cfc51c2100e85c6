import { useEffect, useState } from 'react';

/**
 * The token of the mailed link. It rides in the fragment, which reaches no server and no log.
 * Read once, then wiped from the address bar.
 */
export function useLinkToken(): string {
  const [token] = useState(() => window.location.hash.slice(1));
  useEffect(() => {
    if (token) window.history.replaceState(window.history.state, '', window.location.pathname);
  }, [token]);
  return token;
}
