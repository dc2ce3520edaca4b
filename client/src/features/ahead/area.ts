import type { AreaParts } from '../../lib/area';

export const ahead: AreaParts = { links: [], routes: [] };
