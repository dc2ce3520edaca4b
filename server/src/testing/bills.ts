import type { Kysely } from 'kysely';
import type { DB } from '@emberlot/db/database.types';
import type { PartRow } from './shelf.js';

export interface BillOf {
  readonly lines?: readonly {
    readonly part: PartRow;
    readonly quantity: string;
    readonly scrap?: string;
    readonly alternates?: readonly PartRow[];
  }[];
  readonly steps?: readonly { readonly title: string; readonly minutes: string; readonly caution?: string }[];
  readonly plan?: readonly {
    readonly name: string;
    readonly unit?: string;
    readonly lower?: string;
    readonly upper?: string;
    readonly digits?: number;
  }[];
}

const at = new Date('2027-03-01T08:00:00Z');

/** A released bill; what has no unit in the plan is answered by yes or no. @returns the revision's id */
export async function addBill(handle: Kysely<DB>, part: PartRow, bill: BillOf): Promise<number> {
  const { id } = await handle
    .insertInto('bill_revision')
    .values({ part_id: part.id, number: 1, created_at: at })
    .returning('id')
    .executeTakeFirstOrThrow();
  for (const [index, line] of (bill.lines ?? []).entries()) {
    const row = await handle
      .insertInto('bill_line')
      .values({
        revision_id: id,
        position: index + 1,
        part_id: line.part.id,
        quantity_per: line.quantity,
        scrap_percent: line.scrap ?? '0',
      })
      .returning('id')
      .executeTakeFirstOrThrow();
    for (const [priority, alternate] of (line.alternates ?? []).entries()) {
      await handle
        .insertInto('bill_line_alternate')
        .values({ line_id: row.id, priority: priority + 1, part_id: alternate.id })
        .execute();
    }
  }
  for (const [index, step] of (bill.steps ?? []).entries()) {
    await handle
      .insertInto('build_step')
      .values({ revision_id: id, position: index + 1, ...step })
      .execute();
  }
  for (const [index, { name, unit, lower, upper, digits }] of (bill.plan ?? []).entries()) {
    await handle
      .insertInto('characteristic')
      .values({
        revision_id: id,
        position: index + 1,
        name,
        kind: unit === undefined ? 'yes_no' : 'numeric',
        unit: unit ?? null,
        lower_limit: lower ?? null,
        upper_limit: upper ?? null,
        digits: unit === undefined ? null : (digits ?? 0),
      })
      .execute();
  }
  await handle.updateTable('bill_revision').set({ status: 'released', released_at: at }).where('id', '=', id).execute();
  return id;
}
