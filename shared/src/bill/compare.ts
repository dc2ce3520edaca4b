import type { BillLine, NamedAlternate } from './bill-lines.js';

export type LineField = 'position' | 'part' | 'quantityPer' | 'scrapShare' | 'alternates';

export type LineChange =
  | { readonly kind: 'added'; readonly after: BillLine }
  | { readonly kind: 'removed'; readonly before: BillLine }
  | {
      readonly kind: 'changed';
      readonly before: BillLine;
      readonly after: BillLine;
      readonly fields: readonly LineField[];
    };

/**
 * Compares two revisions of a bill line by line. Lines belong together that share position and part, then part, then
 * position, each in the order written; so a renumbered bill does not read as all new, and an exchanged part reads as a
 * change. A line that stays as it is is not listed; numbers compare by value (1.0 equals 1), alternates without regard
 * to the order in which they are written.
 *
 * @param before lines of the earlier revision
 * @param after lines of the later revision
 * @returns changes and additions in the order of the later revision, removed lines after them
 * Source: common practice, no source.
 */
export function compareBills(before: readonly BillLine[], after: readonly BillLine[]): LineChange[] {
  const pairs = pairLines(before, after);
  const kept = new Set(pairs.values());
  const changes = after.map((line) => describe(pairs.get(line), line)).filter((change) => change !== undefined);
  const removed = before
    .filter((line) => !kept.has(line))
    .map((line): LineChange => ({ kind: 'removed', before: line }));
  return [...changes, ...removed];
}

const pairings: readonly ((line: BillLine) => string)[] = [
  (line) => JSON.stringify([line.position, line.part]),
  (line) => line.part,
  (line) => line.position,
];

/** Which earlier line each later line continues, by the rule of `compareBills`. Later line → earlier line. */
export function pairLines(before: readonly BillLine[], after: readonly BillLine[]): Map<BillLine, BillLine> {
  const pairs = new Map<BillLine, BillLine>();
  for (const keyOf of pairings) {
    const used = new Set(pairs.values());
    const open = new Map<string, BillLine[]>();
    for (const line of before) {
      if (!used.has(line)) open.set(keyOf(line), [...(open.get(keyOf(line)) ?? []), line]);
    }
    for (const line of after) {
      const earlier = pairs.has(line) ? undefined : open.get(keyOf(line))?.shift();
      if (earlier !== undefined) pairs.set(line, earlier);
    }
  }
  return pairs;
}

function describe(before: BillLine | undefined, after: BillLine): LineChange | undefined {
  if (before === undefined) return { kind: 'added', after };
  const fields = changedFields(before, after);
  return fields.length > 0 ? { kind: 'changed', before, after, fields } : undefined;
}

function changedFields(before: BillLine, after: BillLine): LineField[] {
  const fields: LineField[] = [];
  if (before.position !== after.position) fields.push('position');
  if (before.part !== after.part) fields.push('part');
  if (!before.quantityPer.equals(after.quantityPer)) fields.push('quantityPer');
  if (!before.scrapShare.equals(after.scrapShare)) fields.push('scrapShare');
  if (alternatesText(before.alternates) !== alternatesText(after.alternates)) fields.push('alternates');
  return fields;
}

function alternatesText(alternates: readonly NamedAlternate[]): string {
  const rows = alternates.map(({ part, factor, priority }) => JSON.stringify([part, factor.toFixed(), priority]));
  return rows.toSorted().join();
}
