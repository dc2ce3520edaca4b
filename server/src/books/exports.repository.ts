import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { sql, type Kysely } from 'kysely';

/** What is exported of a period, in the order it was written. */
@Injectable()
export class ExportsRepository {
  async invoices(handle: Kysely<DB>, from: string, to: string) {
    return handle
      .selectFrom('invoice as i')
      .leftJoin('invoice as c', 'c.id', 'i.credits_invoice_id')
      .innerJoin('invoice_vat as v', 'v.invoice_id', 'i.id')
      .select([
        'i.id',
        'i.kind',
        'i.number',
        'i.issued_on as issuedOn',
        'i.tax_point as taxPoint',
        'c.number as creditsNumber',
        'i.reference',
        sql<string>`i.buyer ->> 'name'`.as('buyer'),
        sql<string>`i.buyer ->> 'countryCode'`.as('country'),
        'i.vat_treatment as treatment',
        'v.vat_category as category',
        'v.vat_rate as rate',
        'v.taxable_minor as taxable',
        'v.vat_minor as vat',
        'i.gross_minor as gross',
        'i.currency',
      ])
      .where('i.issued_on', '>=', from)
      .where('i.issued_on', '<=', to)
      .orderBy('i.id')
      .orderBy('v.vat_rate')
      .execute();
  }

  async lines(handle: Kysely<DB>, from: string, to: string) {
    return handle
      .selectFrom('journal_line as l')
      .innerJoin('journal_entry as e', 'e.id', 'l.entry_id')
      .innerJoin('document as d', 'd.id', 'e.document_id')
      .innerJoin('account as a', 'a.code', 'l.account_code')
      .select([
        'e.id as entry',
        'e.day',
        'e.event',
        'd.number as document',
        'e.narrative',
        'l.account_code as account',
        'a.name as accountName',
        'l.debit_minor as debit',
        'l.credit_minor as credit',
      ])
      .where('e.day', '>=', from)
      .where('e.day', '<=', to)
      .orderBy('e.id')
      .orderBy('l.id')
      .execute();
  }

  /** Worked out by the database from the documents, not from the files. */
  async totals(handle: Kysely<DB>, from: string, to: string) {
    const { rows } = await sql<{
      invoices: number;
      creditNotes: number;
      net: number;
      vat: number;
      gross: number;
      entries: number;
      lines: number;
      debit: number;
      credit: number;
    }>`
      select i.invoices, i."creditNotes", i.net, i.vat, i.gross, j.entries, j.lines, j.debit, j.credit
      from (
        select count(*) filter (where kind = 'invoice') as invoices,
               count(*) filter (where kind = 'credit_note') as "creditNotes",
               coalesce(sum(case kind when 'invoice' then net_minor else -net_minor end), 0)::int8 as net,
               coalesce(sum(case kind when 'invoice' then vat_minor else -vat_minor end), 0)::int8 as vat,
               coalesce(sum(case kind when 'invoice' then gross_minor else -gross_minor end), 0)::int8 as gross
        from invoice where issued_on between ${from} and ${to}
      ) i cross join (
        select count(distinct e.id) as entries, count(l.id) as lines,
               coalesce(sum(l.debit_minor), 0)::int8 as debit, coalesce(sum(l.credit_minor), 0)::int8 as credit
        from journal_entry e join journal_line l on l.entry_id = e.id where e.day between ${from} and ${to}
      ) j
    `.execute(handle);
    const [row] = rows;
    if (!row) throw new Error('the totals could not be read');
    return row;
  }
}
