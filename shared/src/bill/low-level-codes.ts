import { ArithmeticError } from '../errors/arithmetic-error.js';
import type { Bills, PartKey } from './bill-lines.js';

/**
 * Gives every part its low-level code: the length of the longest path from any part that is in no bill.
 * Working through parts in this order meets each one only after everything that asks for it.
 * Named alternates count as components, since any of them may be asked for.
 *
 * @param bills all bills that matter
 * @returns code by part, in ascending order of code; 0 for parts in no bill
 * @throws ArithmeticError `bill_cycle`; its detail `cycle` is the way round, the first part repeated at the end
 * Source: common practice, no source (longest path in an acyclic graph by removal of parts without parents).
 */
export function lowLevelCodes(bills: Bills): ReadonlyMap<PartKey, number> {
  const components = componentSets(bills);
  const waiting = countParents(components);
  const codes = new Map<PartKey, number>();
  const ready = [...waiting].filter(([, parents]) => parents === 0).map(([part]) => part);
  for (const part of ready) codes.set(part, 0);

  for (const part of ready) {
    const next = (codes.get(part) ?? 0) + 1;
    for (const component of components.get(part) ?? []) {
      codes.set(component, Math.max(codes.get(component) ?? 0, next));
      const left = (waiting.get(component) ?? 0) - 1;
      waiting.set(component, left);
      if (left === 0) ready.push(component);
    }
  }
  if (ready.length < waiting.size) throw cycleFault(components, new Set(ready));
  return new Map([...codes].toSorted(([, a], [, b]) => a - b));
}

function componentSets(bills: Bills): Map<PartKey, Set<PartKey>> {
  const sets = new Map<PartKey, Set<PartKey>>();
  for (const [part, lines] of bills) {
    sets.set(part, new Set(lines.flatMap((line) => [line.part, ...line.alternates.map((a) => a.part)])));
  }
  return sets;
}

function countParents(components: ReadonlyMap<PartKey, ReadonlySet<PartKey>>): Map<PartKey, number> {
  const count = new Map<PartKey, number>();
  for (const [part, set] of components) {
    if (!count.has(part)) count.set(part, 0);
    for (const component of set) count.set(component, (count.get(component) ?? 0) + 1);
  }
  return count;
}

/** Every part left over has a parent left over; walking upward must come back to a part already met. */
function cycleFault(components: ReadonlyMap<PartKey, ReadonlySet<PartKey>>, done: Set<PartKey>): ArithmeticError {
  const parentOf = new Map<PartKey, PartKey>();
  for (const [part, set] of components) {
    if (done.has(part)) continue;
    for (const component of set) if (!parentOf.has(component)) parentOf.set(component, part);
  }
  const upward: PartKey[] = [];
  let part = [...components.keys()].find((key) => !done.has(key));
  while (part !== undefined && !upward.includes(part)) {
    upward.push(part);
    part = parentOf.get(part);
  }
  const cycle = part === undefined ? upward : upward.slice(upward.indexOf(part)).toReversed();
  const order = [...components.keys()];
  const first = cycle.indexOf(cycle.toSorted((a, b) => order.indexOf(a) - order.indexOf(b))[0] ?? '');
  const rotated = [...cycle.slice(first), ...cycle.slice(0, first)];
  return new ArithmeticError('bill_cycle', { cycle: [...rotated, ...rotated.slice(0, 1)].join(' → ') });
}
