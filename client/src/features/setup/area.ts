import type { AreaParts } from '../../lib/area';

export const setup: AreaParts = {
  links: [
    { label: 'Shop', to: '/setup/shop', roles: ['owner'] },
    { label: 'People', to: '/setup/people', roles: ['owner'] },
    { label: 'Calendar', to: '/setup/calendar', roles: ['owner'] },
    { label: 'VAT', to: '/setup/vat', roles: ['owner'] },
    { label: 'Delivery', to: '/setup/delivery', roles: ['owner'] },
    { label: 'Mails', to: '/setup/mails', roles: ['owner'] },
    { label: 'Audit', to: '/setup/audit' },
  ],
  routes: [
    { index: true, lazy: () => import('./pages/setup-index') },
    { path: 'shop', lazy: () => import('./pages/shop-page') },
    { path: 'people', lazy: () => import('./pages/people-page') },
    { path: 'people/invite', lazy: () => import('./pages/invite-page') },
    { path: 'calendar', lazy: () => import('./pages/calendar-page') },
    { path: 'vat', lazy: () => import('./pages/taxes-page') },
    { path: 'delivery', lazy: () => import('./pages/delivery-page') },
    { path: 'mails', lazy: () => import('./pages/mails-page') },
    { path: 'audit', lazy: () => import('./pages/audit-page') },
  ],
};
