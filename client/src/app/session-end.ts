import { useEffect, useState } from 'react';
import { onSessionEnd } from '../api/send';
import { sessionQuery, type Person } from '../api/session';
import { queryClient } from './query-client';

interface EndedSession {
  person: Person;
  /** True once the same person is signed in again. */
  settle: (signedIn: boolean) => void;
}

/**
 * Listens for a session that ended while a page was open. All requests that were refused wait for one answer; those of
 * somebody who never was signed in are refused at once.
 */
export function useSessionEnd(): EndedSession | undefined {
  const [ended, setEnded] = useState<EndedSession>();
  useEffect(() => {
    let waiting: Promise<boolean> | undefined;
    onSessionEnd(() => {
      const person = queryClient.getQueryData(sessionQuery.queryKey)?.person;
      if (!person) return Promise.resolve(false);
      waiting ??= new Promise<boolean>((resolve) => {
        setEnded({
          person,
          settle: (signedIn) => {
            waiting = undefined;
            setEnded(undefined);
            resolve(signedIn);
          },
        });
      });
      return waiting;
    });
    return () => onSessionEnd(undefined);
  }, []);
  return ended;
}
