import { execFile } from 'node:child_process';
import { join } from 'node:path';
import { promisify } from 'node:util';
import { createDatabase } from '@emberlot/db/database';
import { sql } from 'kysely';
import { root } from '../../../server/scripts/root.mjs';
import type { Product } from '../product.js';

export interface ControlTotals {
  /** Gross of all invoices. */
  readonly invoiced: number;
  readonly paid: number;
  /** What payments brought onto the processor's clearing account. */
  readonly throughClearing: number;
  /** Value of what left the shelf in parcels. */
  readonly issuedAtCost: number;
  readonly costOfSales: number;
  readonly debit: number;
  readonly credit: number;
  /** Value of all moves. */
  readonly shelf: number;
  readonly stockAccounts: number;
}

/** Sums in minor units, each from the rows of its own documents. */
export async function controlTotals(product: Product): Promise<ControlTotals> {
  const handle = createDatabase(product.databaseUrl, { applicationName: 'rehearsal' });
  const { rows } = await sql<ControlTotals>`
    select (select sum(gross_minor) from invoice where kind = 'invoice')::bigint as invoiced,
           (select sum(amount_minor) from payment)::bigint as paid,
           (select sum(debit_minor) from journal_line where account_code = '1250')::bigint as "throughClearing",
           (select -sum(value_minor) from stock_move where reason = 'dispatch')::bigint as "issuedAtCost",
           (select sum(debit_minor - credit_minor) from journal_line where account_code = '5000')::bigint as "costOfSales",
           (select sum(debit_minor) from journal_line)::bigint as debit,
           (select sum(credit_minor) from journal_line)::bigint as credit,
           (select sum(value_minor) from stock_move)::bigint as shelf,
           (select sum(l.debit_minor - l.credit_minor) from journal_line l join account a on a.code = l.account_code
            where a.is_stock)::bigint as "stockAccounts"`.execute(handle);
  await handle.destroy();
  const [totals] = rows;
  if (!totals) throw new Error('The database answered no totals');
  return totals;
}

/** How many documents and entries there are. */
export async function counted(product: Product): Promise<unknown> {
  const handle = createDatabase(product.databaseUrl, { applicationName: 'rehearsal' });
  const { rows } = await sql`
    select (select count(*) from payment) as payments, (select count(*) from invoice) as invoices,
           (select count(*) from journal_entry) as entries, (select count(*) from stock_move) as moves,
           (select count(*) from outbox_mail) as mails, (select count(*) from document) as documents`.execute(handle);
  await handle.destroy();
  return rows;
}

/** What the program behind `npm run doctor` prints about the product's database; it ends with 1 on a violation. */
export async function doctorReport(product: Product): Promise<string> {
  const program = join(root, 'server/dist/doctor.js');
  const run = promisify(execFile)(process.execPath, [program], {
    env: { ...process.env, DATABASE_URL: product.databaseUrl },
  });
  return (await run).stdout;
}
