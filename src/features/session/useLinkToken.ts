import { useState } from 'react';

/**
 * The token of the mailed link. It rides in the fragment (or, from an older mail, the query): a fragment
 * reaches no server and no log. Read once, then wiped from the address bar.
 */
export function useLinkToken(): string {
  const [token] = useState(() => {
    const { hash, search, pathname } = window.location;
    const found = hash.startsWith('#token=')
      ? decodeURIComponent(hash.slice('#token='.length))
      : (new URLSearchParams(search).get('token') ?? '');
    if (found) window.history.replaceState(window.history.state, '', pathname);
    return found;
  });
  return token;
}
