import type { RouteObject } from 'react-router-dom';

/** Pages for whoever comes, signed in or not. The links in mails lead to the last four. */
export const accountRoutes: readonly RouteObject[] = [
  { path: 'sign-in', lazy: () => import('./pages/sign-in-page') },
  { path: 'sign-up', lazy: () => import('./pages/sign-up-page') },
  { path: 'forgotten-password', lazy: () => import('./pages/forgotten-password-page') },
  { path: 'first-owner', lazy: () => import('./pages/first-owner-page') },
  { path: 'welcome', lazy: () => import('./pages/welcome-page') },
  { path: 'join', lazy: () => import('./pages/join-page') },
  { path: 'new-password', lazy: () => import('./pages/new-password-page') },
  { path: 'new-address', lazy: () => import('./pages/new-address-page') },
];

/** Pages for whoever is signed in, of any role. */
export const ownAccountRoutes: readonly RouteObject[] = [
  { path: 'profile', lazy: () => import('./pages/profile-page') },
];
