import type { LotRule } from './lot-rule.js';

/**
 * Orders what each period needs, no more.
 *
 * Source: common practice, no source.
 */
export const lotForLot: LotRule = (need) => need[0] ?? 0;
