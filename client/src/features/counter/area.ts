import type { AreaParts } from '../../lib/area';

export const counter: AreaParts = {
  links: [
    { label: 'Orders', to: '/counter/orders' },
    { label: 'Parcels', to: '/counter/parcels' },
  ],
  routes: [
    { index: true, lazy: () => import('./pages/queue-page') },
    { path: 'orders', lazy: () => import('./pages/orders-page') },
    { path: 'orders/:code', lazy: () => import('./pages/order-page') },
    { path: 'parcels', lazy: () => import('./pages/parcels-page') },
    { path: 'parcels/:code', lazy: () => import('./pages/parcel-page') },
  ],
};
