import type { AreaParts } from '../../lib/area';

export const designs: AreaParts = { links: [], routes: [] };
