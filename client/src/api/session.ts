import { queryOptions, useQuery, useQueryClient } from '@tanstack/react-query';
import { setShopZone } from '../lib/format-time';
import { request } from './request';
import { rememberToken } from './send';

export type Role = 'owner' | 'assembler' | 'accountant' | 'customer';

export interface Person {
  id: number;
  name: string;
  email: string;
  role: Role;
}

export interface Session {
  /** Sent back with every change; a new one comes with signing in and out. */
  csrfToken: string;
  /** Null for a visitor. */
  person: Person | null;
  /** Null until the shop is set up. */
  shop: { name: string; timeZone: string; currency: string } | null;
  /** True until the first owner is made. */
  needsOwner: boolean;
}

function keepInMind(session: Session): Session {
  rememberToken(session.csrfToken);
  if (session.shop) setShopZone(session.shop.timeZone);
  return session;
}

export const sessionQuery = queryOptions({
  queryKey: ['session'],
  queryFn: async ({ signal }): Promise<Session> =>
    keepInMind(await request<Session>('GET', '/api/session', { signal })),
  staleTime: 60_000,
});

/** Who is signed in; `null` for nobody, `undefined` while it is not yet known. */
export function usePerson(): Person | null | undefined {
  return useQuery(sessionQuery).data?.person;
}

/**
 * Goes on with the session that an answer brought: after signing in, or after choosing a password.
 * What another person had loaded before is forgotten.
 */
export function useAdoptSession(): (session: Session) => void {
  const queries = useQueryClient();
  return (session) => {
    const before = queries.getQueryData(sessionQuery.queryKey)?.person;
    if (before?.id !== session.person?.id)
      queries.removeQueries({ predicate: ({ queryKey }) => queryKey[0] !== 'session' });
    queries.setQueryData(sessionQuery.queryKey, keepInMind(session));
  };
}
