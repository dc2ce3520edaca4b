import { queryOptions, useQuery } from '@tanstack/react-query';
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
  csrfToken: string;
  person: Person | null;
  shop?: { name: string; timeZone: string; currency: string };
  /** True until the first owner has signed up. */
  needsOwner?: boolean;
}

export const sessionQuery = queryOptions({
  queryKey: ['session'],
  queryFn: async ({ signal }): Promise<Session> => {
    const session = await request<Session>('GET', '/api/session', { signal });
    rememberToken(session.csrfToken);
    if (session.shop) setShopZone(session.shop.timeZone);
    return session;
  },
  staleTime: 60_000,
});

/** Who is signed in; `null` for nobody, `undefined` while it is not yet known. */
export function usePerson(): Person | null | undefined {
  return useQuery(sessionQuery).data?.person;
}
