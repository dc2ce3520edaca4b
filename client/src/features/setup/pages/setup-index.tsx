import type { ReactElement } from 'react';
import { Navigate } from 'react-router-dom';
import { usePerson } from '../../../api/session';

/** The owner begins with the shop, the accountant with what they may read here. */
export function Component(): ReactElement {
  return <Navigate replace to={usePerson()?.role === 'owner' ? '/setup/shop' : '/setup/audit'} />;
}
