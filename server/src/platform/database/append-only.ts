import { sql } from 'kysely';
import type { Database } from './database.js';

/**
 * Tables whose rows are never changed or removed: the server's database role may only read and add.
 * A module that brings such a table adds it here; the grants in `db/grants.sql` must agree, or the server does not start.
 */
export const appendOnlyTables = [
  'audit_entry',
  'batch_cost',
  'batch_issue',
  'document',
  'file_chunk',
  'file_object',
  'import_run',
  'invoice',
  'invoice_charge',
  'invoice_line',
  'invoice_vat',
  'journal_entry',
  'journal_line',
  'lot_status_change',
  'order_cancellation',
  'order_invoice',
  'payment',
  'payment_event',
  'reading',
  'receipt',
  'rework',
  'stock_move',
] as const;

/** Tables that the server only reads: triggers keep them, or migrations write them. */
export const readOnlyTables = ['account', 'cost_pool', 'posting_rule', 'stock_balance'] as const;

/** The server must not start: what its database role may do is not what the product promises. */
export class PrivilegeFault extends Error {
  override readonly name = 'PrivilegeFault';
}

/** @throws PrivilegeFault when the server's role could rewrite a table that is append-only, or lacks one of them */
export async function refuseRewritableLedgers(
  database: Database,
  tables: readonly string[] = [...appendOnlyTables, ...readOnlyTables],
): Promise<void> {
  const { rows } = await sql<{ table_name: string; missing: boolean; rewritable: boolean }>`
    select name as table_name,
      to_regclass(name) is null as missing,
      coalesce(
        has_any_column_privilege(to_regclass(name), 'update')
          or has_table_privilege(to_regclass(name), 'delete')
          or has_table_privilege(to_regclass(name), 'truncate'),
        false
      ) as rewritable
    from unnest(${sql.val([...tables])}::text[]) as name
  `.execute(database.handle);
  const missing = rows.filter((row) => row.missing).map((row) => row.table_name);
  if (missing.length > 0) {
    throw new PrivilegeFault(`The database lacks ${missing.join(', ')}: run the migrations first.`);
  }
  const rewritable = rows.filter((row) => row.rewritable).map((row) => row.table_name);
  if (rewritable.length > 0) {
    throw new PrivilegeFault(
      `The database role in DATABASE_URL could change or delete rows of ${rewritable.join(', ')}. ` +
        'Use the role emberlot_server, and run the migrations to set its grants.',
    );
  }
}
