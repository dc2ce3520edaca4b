import { isLoopback } from '../config/environment.js';

/**
 * Whether an `Origin` header names the product itself. A browser leaves the header out of some requests, which the form
 * token then judges alone. On one's own machine, `localhost` and `127.0.0.1` are the same place.
 */
export function isOwnOrigin(origin: string | undefined, baseUrl: string): boolean {
  if (origin === undefined) return true;
  if (origin === baseUrl) return true;
  if (!URL.canParse(origin)) return false;
  const sent = new URL(origin);
  const own = new URL(baseUrl);
  return (
    isLoopback(own.hostname) && isLoopback(sent.hostname) && sent.port === own.port && sent.protocol === own.protocol
  );
}
