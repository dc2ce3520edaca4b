import { redirect, type RouteObject } from 'react-router-dom';
import { accountRoutes, ownAccountRoutes } from '../features/account/routes';
import { shopRoutes } from '../features/shop/routes';
import { unitPageRoutes } from '../features/unit-page/routes';
import { onlyFor, onlyForSignedIn, onlyForStaff } from './access';
import { areas } from './areas';
import { NotFound, RootFault, RouteFault } from './faults';
import { PageLoading, Root } from './root';

const staff: RouteObject = {
  id: 'staff',
  loader: onlyForStaff,
  lazy: () => import('./shell/staff-shell'),
  children: [
    {
      // A fault inside a page leaves the shell standing.
      ErrorBoundary: RouteFault,
      children: areas.map(({ path, roles, routes }) => ({
        path,
        loader: onlyFor(roles),
        ErrorBoundary: RouteFault,
        children: [...routes, notFound()],
      })),
    },
  ],
};

const fullScreen: RouteObject = {
  lazy: () => import('./shell/bench-shell'),
  ErrorBoundary: RootFault,
  children: areas
    .filter(({ fullScreenRoutes }) => fullScreenRoutes)
    .map(({ path, roles, fullScreenRoutes = [] }) => ({
      path,
      loader: onlyFor(roles),
      children: [...fullScreenRoutes],
    })),
};

const shop: RouteObject = {
  lazy: () => import('./shell/shop-shell'),
  children: [{ ErrorBoundary: RouteFault, children: [...shopRoutes, ...unitPageRoutes, ...accountRoutes, notFound()] }],
};

const own: RouteObject = {
  loader: onlyForSignedIn,
  lazy: () => import('./shell/own-shell'),
  children: [{ ErrorBoundary: RouteFault, children: [...ownAccountRoutes] }],
};

function notFound(): RouteObject {
  return {
    path: '*',
    Component: NotFound,
  };
}

export const routes: RouteObject[] = [
  {
    Component: Root,
    ErrorBoundary: RootFault,
    HydrateFallback: PageLoading,
    children: [staff, fullScreen, own, { path: '/staff', loader: () => redirect('/today') }, shop],
  },
];
