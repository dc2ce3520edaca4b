import type { AreaParts } from '../../lib/area';

export const designs: AreaParts = {
  links: [
    { label: 'Bills', to: '/designs/bills' },
    { label: 'Kits', to: '/designs/kits' },
    { label: 'Where used', to: '/designs/where-used' },
    { label: 'Import', to: '/shelf/imports/bill', roles: ['owner'] },
  ],
  routes: [
    { index: true, lazy: () => import('./pages/queue-page') },
    { path: 'bills', lazy: () => import('./pages/bills-page') },
    { path: 'bills/new', lazy: () => import('./pages/start-bill-page') },
    { path: 'bills/:code', lazy: () => import('./pages/bill-page') },
    { path: 'bills/:code/compare', lazy: () => import('./pages/compare-page') },
    { path: 'bills/:code/revisions/:number/edit', lazy: () => import('./pages/edit-bill-page') },
    { path: 'kits', lazy: () => import('./pages/kits-page') },
    { path: 'kits/:code', lazy: () => import('./pages/kit-page') },
    { path: 'where-used', lazy: () => import('./pages/where-used-page') },
  ],
};
