const ownPlaces =
  /^\/(today|shelf|designs|ahead|bench|counter|books|setup|profile|basket|checkout|orders|units|u|products|irons|kits|spares)(\/|$|\?|#)/;

/**
 * Where to go after signing in: only places of this site, judged after the browser has normalised the address.
 * @returns a path with query and fragment, or undefined if it leads elsewhere
 */
export function safeReturnPath(wanted: string | null | undefined): string | undefined {
  if (!wanted || !URL.canParse(wanted, location.origin)) return undefined;
  const address = new URL(wanted, location.origin);
  const path = address.pathname + address.search + address.hash;
  if (address.origin !== location.origin || !wanted.startsWith('/') || path.startsWith('//')) return undefined;
  return ownPlaces.test(path) ? path : undefined;
}
