import type { RouteObject } from 'react-router-dom';

const front = () => import('./pages/front-page');
const plain = () => import('./pages/plain-page');

/** The storefront's pages, inside its own shell. An id tells a page that serves several routes which one it is. */
export const shopRoutes: readonly RouteObject[] = [
  { index: true, lazy: front },
  { path: 'irons', id: 'irons', lazy: front },
  { path: 'kits', id: 'kits', lazy: front },
  { path: 'spares', id: 'spares', lazy: front },
  { path: 'products/:slug', lazy: () => import('./pages/product-page') },
  { path: 'basket', lazy: () => import('./pages/basket-page') },
  { path: 'checkout', lazy: () => import('./pages/checkout-page') },
  { path: 'orders/:number', lazy: () => import('./pages/order-page') },
  { path: 'own-orders', lazy: () => import('./pages/own-orders-page') },
  { path: 'terms', id: 'terms', lazy: plain },
  { path: 'privacy', id: 'privacy', lazy: plain },
  { path: 'withdrawal', id: 'withdrawal', lazy: plain },
];
