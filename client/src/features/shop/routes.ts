import type { RouteObject } from 'react-router-dom';

/** The storefront's pages, inside its own shell. */
export const shopRoutes: readonly RouteObject[] = [{ index: true, lazy: () => import('./pages/front-page') }];
