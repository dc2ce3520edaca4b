import { useEffect, useState } from 'react';

/**
 * What a link from a mail carries behind `#`. It is taken out of the address bar at once, so that it stays in no history
 * and is not shown to whoever looks at the screen.
 */
export function useLinkToken(): string {
  const [token] = useState(() => location.hash.slice(1));
  useEffect(() => {
    if (location.hash) history.replaceState(history.state, '', location.pathname);
  }, []);
  return token;
}
