import type { AreaParts } from '../../lib/area';

export const shelf: AreaParts = { links: [], routes: [] };
