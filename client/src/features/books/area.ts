import type { AreaParts } from '../../lib/area';

export const books: AreaParts = { links: [], routes: [] };
