import { lazy, Suspense, type ReactElement } from 'react';
import { usePerson } from '../../api/session';
import { isStaff } from '../areas';

const StaffShell = lazy(() => import('./staff-shell').then(({ Component: shell }) => ({ default: shell })));
const ShopShell = lazy(() => import('./shop-shell').then(({ Component: shell }) => ({ default: shell })));

/** One's own pages stand in the frame one works in. */
export function Component(): ReactElement | null {
  const person = usePerson();
  if (!person) return null;
  return <Suspense>{isStaff(person.role) ? <StaffShell /> : <ShopShell />}</Suspense>;
}
