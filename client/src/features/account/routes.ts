import type { RouteObject } from 'react-router-dom';

/** Pages for whoever comes, signed in or not. */
export const accountRoutes: readonly RouteObject[] = [{ path: 'sign-in', lazy: () => import('./pages/sign-in-page') }];
