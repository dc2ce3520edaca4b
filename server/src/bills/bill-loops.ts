import type { Bills } from '@emberlot/shared/bill/bill-lines';
import { lowLevelCodes } from '@emberlot/shared/bill/low-level-codes';
import { attempt } from '@emberlot/shared/errors/arithmetic-error';
import { Decimal } from '@emberlot/shared/measure/decimal';
import type { BillEdge } from './bill-content.repository.js';

/**
 * The way round that a bill would close, if it does.
 *
 * @param edges what contains what, without the bill in question
 * @returns codes, the first repeated at the end: `['A', 'B', 'A']`
 */
export function loopThrough(
  owner: string,
  components: readonly string[],
  edges: readonly BillEdge[],
): readonly string[] | undefined {
  const own = components.map((component) => ({ parent: owner, component }));
  const codes = attempt(() => lowLevelCodes(billsOfEdges([...own, ...edges])));
  if (codes.ok) return undefined;
  const way = String(codes.fault.details['cycle']).split(' → ').slice(0, -1);
  const from = way.indexOf(owner);
  return [...way.slice(from), ...way.slice(0, from), owner];
}

/** What contains what, as the arithmetic reads bills; quantities play no role. */
export function billsOfEdges(edges: readonly BillEdge[]): Bills {
  const sets = new Map<string, Set<string>>();
  for (const { parent, component } of edges) {
    const own = sets.get(parent);
    if (own) own.add(component);
    else sets.set(parent, new Set([component]));
  }
  return new Map([...sets].map(([parent, set]) => [parent, [...set].map(line)]));
}

function line(part: string) {
  return { position: part, part, quantityPer: new Decimal(1), scrapShare: new Decimal(0), alternates: [] };
}
