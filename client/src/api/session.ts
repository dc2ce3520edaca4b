import { queryOptions, useQuery, useQueryClient } from '@tanstack/react-query';
import { setShopZone } from '../lib/format-time';
import { answer, api, type Dto } from './client';
import { rememberToken } from './send';

export type Role = Dto<'Role'>;
export type Person = Dto<'PersonDto'>;
export type Session = Dto<'SessionDto'>;

function keepInMind(session: Session): Session {
  rememberToken(session.csrfToken);
  if (session.shop) setShopZone(session.shop.timeZone);
  return session;
}

export const sessionQuery = queryOptions({
  queryKey: ['session'],
  queryFn: async ({ signal }): Promise<Session> => keepInMind(await answer(api.GET('/api/session', { signal }))),
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
