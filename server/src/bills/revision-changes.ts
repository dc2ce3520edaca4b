import { compareBills } from '@emberlot/shared/bill/compare';
import { arithmeticLine } from './bill-arithmetic.js';
import type { BillRevision, RevisionLine } from './bill-revision.js';

export interface Change<Item> {
  readonly kind: 'added' | 'removed' | 'changed';
  readonly before: Item | null;
  readonly after: Item | null;
  readonly fields: string[];
}

/** Line by line as the arithmetic pairs them; marks and notes, which it does not know, are looked at beside it. */
export function lineChanges(before: BillRevision, after: BillRevision): Change<RevisionLine>[] {
  const earlier = byPosition(before);
  const later = byPosition(after);
  const changes = compareBills(before.lines.map(arithmeticLine), after.lines.map(arithmeticLine));
  const told = changes.map((change): Change<RevisionLine> => {
    const was = 'before' in change ? (earlier.get(change.before.position) ?? null) : null;
    const is = 'after' in change ? (later.get(change.after.position) ?? null) : null;
    const words = was && is ? wordsChanged(was, is) : [];
    return {
      kind: change.kind,
      before: was,
      after: is,
      fields: 'fields' in change ? [...change.fields, ...words] : [],
    };
  });
  const seen = new Set(told.map(({ after }) => after?.position));
  const words = after.lines.flatMap((line): Change<RevisionLine>[] => {
    const was = seen.has(line.position) ? undefined : earlier.get(String(line.position));
    const fields = was ? wordsChanged(was, line) : [];
    return was && fields.length > 0 ? [{ kind: 'changed', before: was, after: line, fields }] : [];
  });
  return [...told, ...words];
}

/** Entries that are told apart by a name; a renamed one reads as removed and added. */
export function namedChanges<Item extends object>(
  before: readonly Item[],
  after: readonly Item[],
  nameOf: (item: Item) => string,
): Change<Item>[] {
  const earlier = numbered(before, nameOf);
  const later = numbered(after, nameOf);
  const changes = [...later].flatMap(([name, item]): Change<Item>[] => {
    const was = earlier.get(name);
    if (!was) return [{ kind: 'added', before: null, after: item, fields: [] }];
    const fields = differing(was, item);
    return fields.length > 0 ? [{ kind: 'changed', before: was, after: item, fields }] : [];
  });
  const gone = [...earlier].filter(([name]) => !later.has(name));
  return [
    ...changes,
    ...gone.map(([, item]): Change<Item> => ({ kind: 'removed', before: item, after: null, fields: [] })),
  ];
}

/** The second of two of one name is told apart from the first. */
function numbered<Item>(items: readonly Item[], nameOf: (item: Item) => string): Map<string, Item> {
  const count = new Map<string, number>();
  return new Map(
    items.map((item) => {
      const name = nameOf(item);
      const number = (count.get(name) ?? 0) + 1;
      count.set(name, number);
      return [JSON.stringify([name, number]), item];
    }),
  );
}

function differing<Item extends object>(before: Item, after: Item): string[] {
  const values = new Map<string, unknown>(Object.entries(before));
  return Object.entries(after).flatMap(([field, value]) =>
    field !== 'id' && values.get(field) !== value ? [field] : [],
  );
}

function wordsChanged(before: RevisionLine, after: RevisionLine): string[] {
  return (['marks', 'note'] as const).filter((field) => before[field] !== after[field]);
}

function byPosition(revision: BillRevision): ReadonlyMap<string, RevisionLine> {
  return new Map(revision.lines.map((line) => [String(line.position), line]));
}
