import type { RouteObject } from 'react-router-dom';

/** What the code on a unit's label opens. */
export const unitPageRoutes: readonly RouteObject[] = [
  { path: 'u/:token', lazy: () => import('./pages/public-unit-page') },
];
