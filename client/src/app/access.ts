import { redirect, type LoaderFunction } from 'react-router-dom';
import { sessionQuery } from '../api/session';
import type { StaffRole } from '../lib/area';
import { areas } from './areas';
import { queryClient } from './query-client';

/** Thrown where a signed-in person has no business; the error boundary says so. */
export class NotAllowed extends Error {
  override readonly name = 'NotAllowed';
}

/** Lets the given roles through; others are asked to sign in, or told that this is not theirs. */
export function onlyFor(roles: readonly StaffRole[]): LoaderFunction {
  return async ({ request }) => {
    const { person, needsOwner } = await queryClient.ensureQueryData(sessionQuery);
    if (!person) {
      const { pathname, search } = new URL(request.url);
      return redirect(needsOwner ? '/first-owner' : `/sign-in?to=${encodeURIComponent(pathname + search)}`);
    }
    if (!roles.some((role) => role === person.role)) throw new NotAllowed();
    return null;
  };
}

export const onlyForStaff = onlyFor([...new Set(areas.flatMap(({ roles }) => roles))]);

/** Whoever is signed in. */
export const onlyForSignedIn: LoaderFunction = async ({ request }) => {
  const { person } = await queryClient.ensureQueryData(sessionQuery);
  if (person) return null;
  const { pathname, search } = new URL(request.url);
  return redirect(`/sign-in?to=${encodeURIComponent(pathname + search)}`);
};
