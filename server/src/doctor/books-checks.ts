import { sql } from 'kysely';
import { appendOnlyTables } from '../platform/database/append-only.js';
import type { Check, Violation } from './check.js';

/** Invoices, the journal, mail, and what the server's role may do. */
export const booksChecks: readonly Check[] = [
  {
    name: 'invoice-numbers',
    promise: 'Each series counts without a gap or a repetition, in the order of issue.',
    violations: () => sql<Violation>`
      select format('Series %s of %s has %s numbers from %s to %s.', series, year, count(*), min(sequence), max(sequence)) as what
      from invoice group by series, year having min(sequence) <> 1 or max(sequence) <> count(*)
      union all
      select format('%s was issued before its predecessor.', number)
      from (select number, issued_at, lag(issued_at) over (partition by series, year order by sequence) as previous
            from invoice) i where issued_at < previous`,
  },
  {
    name: 'invoices-add-up',
    promise: 'Lines, charges and VAT of an invoice add up to its totals; credit notes never exceed their invoice.',
    violations: () => sql<Violation>`
      select format('%s: %s net and %s VAT, its parts say %s and %s.', i.number, i.net_minor, i.vat_minor, parts.net, parts.vat)
        as what
      from invoice i cross join lateral (
        select coalesce((select sum(net_minor) from invoice_line where invoice_id = i.id), 0)
             + coalesce((select sum(case kind when 'charge' then amount_minor else -amount_minor end)
                         from invoice_charge where invoice_id = i.id), 0) as net,
               coalesce((select sum(vat_minor) from invoice_vat where invoice_id = i.id), 0) as vat
      ) parts
      where parts.net <> i.net_minor or parts.vat <> i.vat_minor or i.net_minor + i.vat_minor <> i.gross_minor
      union all
      select format('Credit notes of %s are %s over %s.', i.number, sum(c.gross_minor), i.gross_minor)
      from invoice i join invoice c on c.credits_invoice_id = i.id
      group by i.number, i.gross_minor having sum(c.gross_minor) > i.gross_minor`,
  },
  {
    name: 'invoices-are-posted',
    promise: 'VAT on sales is the VAT of invoices less that of credit notes.',
    violations: () => sql<Violation>`
      select format('Account 2200 stands at %s; invoices less credit notes say %s.', books.value, expected.value) as what
      from (select coalesce(sum(credit_minor - debit_minor), 0) as value from journal_line where account_code = '2200') books,
           (select coalesce(sum(case kind when 'invoice' then vat_minor else -vat_minor end), 0) as value from invoice) expected
      where books.value <> expected.value`,
  },
  {
    name: 'entries-balance',
    promise: 'Every entry balances and has two lines or more.',
    violations: () => sql<Violation>`
      select format('Entry %s of document %s: debit %s, credit %s.', e.id, d.number,
                    coalesce(sum(l.debit_minor), 0), coalesce(sum(l.credit_minor), 0)) as what
      from journal_entry e join document d on d.id = e.document_id left join journal_line l on l.entry_id = e.id
      group by e.id, d.number
      having coalesce(sum(l.debit_minor), 0) <> coalesce(sum(l.credit_minor), 0) or count(l.id) < 2`,
  },
  {
    name: 'closed-months',
    promise: 'Nothing was posted into a month after it was closed.',
    violations: () => sql<Violation>`
      select format('Entry %s was posted at %s into %s, closed at %s.', e.id, e.posted_at, p.month, p.closed_at) as what
      from period p join journal_entry e on date_trunc('month', e.day)::date = p.month
      where p.closed_at is not null and e.posted_at > p.closed_at`,
  },
  {
    name: 'mail',
    promise: 'Mail leaves within a quarter of an hour.',
    violations: (now) => sql<Violation>`
      select format('A mail waits since %s.', min(created_at)) as what
      from outbox_mail where sent_at is null and created_at < ${new Date(now.getTime() - 15 * 60_000)}
      having count(*) > 0`,
  },
  {
    name: 'ledgers-are-append-only',
    promise: 'The role of the server cannot change or delete what was written.',
    violations: () => sql<Violation>`
      select format('The role emberlot_server may change or delete rows of %s.', name) as what
      from unnest(${sql.val([...appendOnlyTables])}::text[]) as name
      where has_any_column_privilege('emberlot_server', to_regclass(name), 'update')
         or has_table_privilege('emberlot_server', to_regclass(name), 'delete')
         or has_table_privilege('emberlot_server', to_regclass(name), 'truncate')`,
  },
];
