import type { RouteObject } from 'react-router-dom';

export type StaffRole = 'owner' | 'assembler' | 'accountant';

export interface AreaLink {
  label: string;
  /** Whole address: `/shelf/parts`. */
  to: string;
  /** Only these roles see it; everybody who may enter the area otherwise. */
  roles?: readonly StaffRole[];
}

/** What a feature gives to the shell. Pages are lazy: `{ path: 'parts', lazy: () => import('./pages/parts-page') }`. */
export interface AreaParts {
  links: readonly AreaLink[];
  /** Below the area's own path, inside the staff shell. */
  routes: readonly RouteObject[];
  /** Below the area's own path, without the staff shell: the bench's full screens. */
  fullScreenRoutes?: readonly RouteObject[];
}
