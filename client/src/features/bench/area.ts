import type { AreaParts } from '../../lib/area';

export const bench: AreaParts = {
  links: [
    { label: 'Batches', to: '/bench/batches' },
    { label: 'Units', to: '/bench/units' },
    { label: 'Faults', to: '/bench/faults' },
  ],
  routes: [
    { index: true, lazy: () => import('./pages/queue-page') },
    { path: 'batches', lazy: () => import('./pages/batches-page') },
    { path: 'batches/new', lazy: () => import('./pages/plan-batch-page') },
    { path: 'batches/:number', lazy: () => import('./pages/batch-page') },
    { path: 'batches/:number/picking', lazy: () => import('./pages/picking-page') },
    { path: 'units', lazy: () => import('./pages/units-page') },
    { path: 'units/:serial', lazy: () => import('./pages/unit-page') },
    { path: 'faults', lazy: () => import('./pages/faults-page') },
    { path: 'faults/:number', lazy: () => import('./pages/fault-page') },
  ],
  fullScreenRoutes: [{ path: 'batches/:number/build', lazy: () => import('./pages/build-page') }],
};
