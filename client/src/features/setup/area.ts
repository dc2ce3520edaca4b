import { redirect } from 'react-router-dom';
import type { AreaParts } from '../../lib/area';

export const setup: AreaParts = {
  links: [
    { label: 'People', to: '/setup/people', roles: ['owner'] },
    { label: 'Audit', to: '/setup/audit' },
  ],
  routes: [
    { index: true, loader: () => redirect('/setup/audit') },
    { path: 'people', lazy: () => import('./pages/people-page') },
    { path: 'people/invite', lazy: () => import('./pages/invite-page') },
    { path: 'audit', lazy: () => import('./pages/audit-page') },
  ],
};
