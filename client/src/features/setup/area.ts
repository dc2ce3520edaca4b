import type { AreaParts } from '../../lib/area';

export const setup: AreaParts = { links: [], routes: [] };
