import { billLimit } from '@emberlot/shared/limits/bills';
import { lowLevelCodes } from '@emberlot/shared/bill/low-level-codes';
import { attempt } from '@emberlot/shared/errors/arithmetic-error';
import { checkContent, type Parts } from './bill-content.js';
import type { BillEdge } from './bill-content.repository.js';
import type { BillContentDto } from './bill.dto.js';
import { billsOfEdges } from './bill-loops.js';

export type SectionKey = 'lines' | 'steps' | 'testPlan';

export type SectionItem<Key extends SectionKey> = BillContentDto[Key][number];

/** One row of a table: whose bill it belongs to, and what it says. */
export interface TableRow<Key extends SectionKey> {
  readonly owner: string;
  readonly item: SectionItem<Key>;
}

export interface TableFault {
  /** Which row, from 0. */
  readonly row: number;
  /** The field of the item, or `owner`. */
  readonly field: string;
  readonly sentence: string;
}

/** Bills that one table may hold. */
const mostBills = 2_000;

const mostItems: Readonly<Record<SectionKey, number>> = {
  lines: billLimit.lines,
  steps: billLimit.steps,
  testPlan: billLimit.characteristics,
};

/** The rows of each bill, with their places in the table. */
export function rowsByOwner<Key extends SectionKey>(rows: readonly TableRow<Key>[]): ReadonlyMap<string, number[]> {
  const places = new Map<string, number[]>();
  rows.forEach(({ owner }, row) => {
    const own = places.get(owner) ?? [];
    own.push(row);
    places.set(owner, own);
  });
  return places;
}

/** Faults within each bill: unknown parts, what an edit would refuse, and what stands twice. */
export function faultsOfRows<Key extends SectionKey>(
  key: Key,
  rows: readonly TableRow<Key>[],
  parts: Parts,
): TableFault[] {
  const owners = rowsByOwner(rows);
  if (owners.size > mostBills) {
    const sentence = `The table holds ${owners.size} bills; at most ${mostBills} are taken in at once.`;
    return [{ row: 0, field: 'owner', sentence }];
  }
  return [...owners].flatMap(([code, places]) => {
    const [first = 0] = places;
    const owner = parts.get(code);
    if (!owner) return [{ row: first, field: 'owner', sentence: `There is no part ${code}. Take in the parts first.` }];
    if (places.length > mostItems[key]) {
      const sentence = `${code} has ${places.length} rows; at most ${mostItems[key]} are kept.`;
      return [{ row: first, field: 'owner', sentence }];
    }
    const items = places.flatMap((row) => rows[row]?.item ?? []);
    const content = { lines: [], steps: [], testPlan: [], [key]: items } as BillContentDto;
    return checkContent(owner, content, parts).faults.map(({ pointer, detail }) => {
      const [, , index = '0', field = 'owner'] = pointer.split('/');
      return { row: places[Number(index)] ?? first, field, sentence: detail };
    });
  });
}

/** The same component twice in one bill, where no position tells the two apart. */
export function repeatedComponents(rows: readonly TableRow<'lines'>[], placed: readonly boolean[]): TableFault[] {
  const seen = new Map<string, number>();
  return rows.flatMap(({ owner, item }, row) => {
    const key = JSON.stringify([owner, item.part]);
    const before = seen.get(key);
    if (before === undefined) seen.set(key, row);
    if (before === undefined || (placed[before] && placed[row])) return [];
    const sentence = `${item.part} stands in the bill of ${owner} already. Add the quantities up, or give both a position.`;
    return [{ row, field: 'part', sentence }];
  });
}

/**
 * Loops that the rows would close, one fault each, named by their way round.
 *
 * @param edges what contains what outside of the table
 */
export function loopFaults(rows: readonly TableRow<'lines'>[], edges: readonly BillEdge[]): TableFault[] {
  const faults: TableFault[] = [];
  const left = new Set(rows.map((_, row) => row));
  for (;;) {
    const own = [...left].flatMap((row) => edgesOf(rows[row]));
    const codes = attempt(() => lowLevelCodes(billsOfEdges([...edges, ...own])));
    if (codes.ok) return faults;
    const way = String(codes.fault.details['cycle']).split(' → ');
    const guilty = [...left].filter((row) =>
      edgesOf(rows[row]).some(({ parent, component }) =>
        way.some((code, place) => code === parent && way[place + 1] === component),
      ),
    );
    const [row] = guilty;
    if (row === undefined) return faults;
    faults.push({ row, field: 'part', sentence: `A bill may not contain itself: ${way.join(' contains ')}.` });
    for (const each of guilty) left.delete(each);
  }
}

function edgesOf(row: TableRow<'lines'> | undefined): BillEdge[] {
  if (!row) return [];
  return [row.item.part, ...row.item.alternates].map((component) => ({ parent: row.owner, component }));
}
