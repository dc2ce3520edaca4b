import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { sql, type Kysely } from 'kysely';
import { containing, countOf, paged, sorted } from '../platform/paging/page.js';
import type { PageQuery } from '../platform/paging/page-query.dto.js';
import type { JournalQuery } from './books.dto.js';

export interface JournalLineRow {
  readonly entryId: number;
  readonly account: string;
  readonly accountName: string;
  readonly debit: number;
  readonly credit: number;
}

export interface AccountSumRow {
  readonly account: string;
  readonly name: string;
  readonly kind: string;
  readonly debit: number;
  readonly credit: number;
}

const journalSort = { day: 'e.day', document: 'd.number', event: 'e.event' };
const paymentSort = { receivedAt: 'p.received_at', order: 'o.number', amount: 'p.amount_minor' };

/** Reads what everybody posted; the accountant's lists. */
@Injectable()
export class BooksRepository {
  async entries(handle: Kysely<DB>, query: JournalQuery) {
    let found = handle.selectFrom('journal_entry as e').innerJoin('document as d', 'd.id', 'e.document_id');
    if (query.q) {
      const pattern = containing(query.q);
      found = found.where((where) =>
        where.or([where('e.narrative', 'ilike', pattern), where('d.number', 'ilike', pattern)]),
      );
    }
    if (query.from) found = found.where('e.day', '>=', query.from);
    if (query.to) found = found.where('e.day', '<=', query.to);
    if (query.document) found = found.where('d.number', '=', query.document.toUpperCase());
    const { account } = query;
    if (account !== undefined) {
      found = found.where((where) =>
        where.exists(
          where
            .selectFrom('journal_line as l')
            .select('l.id')
            .whereRef('l.entry_id', '=', 'e.id')
            .where('l.account_code', '=', account),
        ),
      );
    }
    const rows = found.select([
      'e.id',
      'e.day',
      'e.event',
      'd.number as document',
      'd.kind as documentKind',
      'e.narrative',
    ]);
    const items = await paged(sorted(rows, query.sort, journalSort, '-day', 'e.id'), query).execute();
    return { items, total: await countOf(found) };
  }

  async linesOf(handle: Kysely<DB>, entryIds: readonly number[]): Promise<JournalLineRow[]> {
    if (entryIds.length === 0) return [];
    return handle
      .selectFrom('journal_line as l')
      .innerJoin('account as a', 'a.code', 'l.account_code')
      .select([
        'l.entry_id as entryId',
        'l.account_code as account',
        'a.name as accountName',
        'l.debit_minor as debit',
        'l.credit_minor as credit',
      ])
      .where('l.entry_id', 'in', [...entryIds])
      .orderBy('l.id')
      .execute();
  }

  /** Accounts that were ever used come with their sums in the period, the others with zeros. */
  async accountSums(handle: Kysely<DB>, from: string | undefined, to: string): Promise<AccountSumRow[]> {
    const { rows } = await sql<AccountSumRow>`
      select a.code as account, a.name, a.kind,
             coalesce(sum(l.debit_minor), 0)::int8 as debit, coalesce(sum(l.credit_minor), 0)::int8 as credit
      from account a
      left join (
        journal_line l join journal_entry e on e.id = l.entry_id
          and e.day >= ${from ?? '0001-01-01'} and e.day <= ${to}
      ) on l.account_code = a.code
      group by a.code order by a.code
    `.execute(handle);
    return rows;
  }

  async postingRules(handle: Kysely<DB>) {
    return handle
      .selectFrom('posting_rule as r')
      .innerJoin('account as d', 'd.code', 'r.debit_account_code')
      .innerJoin('account as c', 'c.code', 'r.credit_account_code')
      .select([
        'r.event',
        'r.component',
        'r.sentence',
        'd.code as debitAccount',
        'd.name as debitName',
        'c.code as creditAccount',
        'c.name as creditName',
      ])
      .orderBy('r.event')
      .orderBy('r.component')
      .execute();
  }

  async payments(handle: Kysely<DB>, query: PageQuery) {
    let found = handle
      .selectFrom('payment as p')
      .innerJoin('sales_order as o', 'o.id', 'p.order_id')
      .innerJoin('document as d', 'd.id', 'p.document_id')
      .leftJoin('refund as r', 'r.payment_document_id', 'p.document_id');
    if (query.q) {
      const pattern = containing(query.q);
      found = found.where((where) =>
        where.or([
          where('o.number', 'ilike', pattern),
          where('d.number', 'ilike', pattern),
          where('p.provider_payment_id', 'ilike', pattern),
        ]),
      );
    }
    const rows = found.select([
      'd.number as document',
      'p.document_id as documentId',
      'p.received_at as receivedAt',
      'o.number as order',
      'p.provider_payment_id as providerPaymentId',
      'p.amount_minor as amount',
      'p.currency',
      sql<string | null>`(select i.number from order_invoice oi join invoice i on i.id = oi.invoice_id
                          where oi.order_id = o.id and i.kind = 'invoice' limit 1)`.as('invoice'),
      sql<number>`case when r.status = 'sent' then r.amount_minor else 0 end`.as('refunded'),
      'r.status as refundState',
    ]);
    const items = await paged(sorted(rows, query.sort, paymentSort, '-receivedAt', 'p.document_id'), query).execute();
    return { items, total: await countOf(found) };
  }

  async balanceOf(handle: Kysely<DB>, account: string): Promise<number> {
    const row = await handle
      .selectFrom('journal_line')
      .select(sql<number>`coalesce(sum(debit_minor - credit_minor), 0)::int8`.as('balance'))
      .where('account_code', '=', account)
      .executeTakeFirstOrThrow();
    return row.balance;
  }
}
