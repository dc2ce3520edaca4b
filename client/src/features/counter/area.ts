import type { AreaParts } from '../../lib/area';

export const counter: AreaParts = { links: [], routes: [] };
