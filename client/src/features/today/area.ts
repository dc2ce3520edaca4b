import type { AreaParts } from '../../lib/area';

export const today: AreaParts = {
  links: [],
  routes: [{ index: true, lazy: () => import('./pages/today-page') }],
};
