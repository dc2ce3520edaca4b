import type { AreaParts } from '../../lib/area';

export const bench: AreaParts = { links: [], routes: [] };
