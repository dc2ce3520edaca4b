import { sql } from 'kysely';
import type { Check, Violation } from './check.js';

/** Orders, payments, refunds, parcels. */
export const sellingChecks: readonly Check[] = [
  {
    name: 'paid-and-invoiced',
    promise: 'A paid order has exactly one invoice, and order, payment and invoice agree to the cent.',
    violations: () => sql<Violation>`
      with paid as (select order_id, sum(amount_minor) as amount, count(*) as payments from payment group by order_id),
      invoiced as (
        select oi.order_id, sum(i.gross_minor) as amount, count(*) as invoices
        from order_invoice oi join invoice i on i.id = oi.invoice_id and i.kind = 'invoice' group by oi.order_id
      )
      select format('Order %s: ordered %s, paid %s in %s, invoiced %s in %s.', o.number, o.gross_minor,
                    coalesce(p.amount, 0), coalesce(p.payments, 0), coalesce(v.amount, 0), coalesce(v.invoices, 0)) as what
      from sales_order o left join paid p on p.order_id = o.id left join invoiced v on v.order_id = o.id
      where (p.order_id is null) <> (v.order_id is null)
         or (p.order_id is not null and (p.amount <> o.gross_minor or v.amount <> o.gross_minor or v.invoices <> 1))`,
  },
  {
    name: 'orders-add-up',
    promise: 'An order is the sum of its lines and delivery.',
    violations: () => sql<Violation>`
      select format('Order %s says %s net, its lines and delivery %s.', o.number, o.net_minor,
                    o.delivery_net_minor + sum(l.net_minor)) as what
      from sales_order o join order_line l on l.order_id = o.id
      group by o.id having o.net_minor <> o.delivery_net_minor + sum(l.net_minor)`,
  },
  {
    name: 'refunds',
    promise: 'No more goes back than came in, and each refund has its credit note over the same amount.',
    violations: () => sql<Violation>`
      select format('Payment %s of %s: refunds of %s.', d.number, p.amount_minor, sum(r.amount_minor)) as what
      from payment p join document d on d.id = p.document_id
      join refund r on r.payment_document_id = p.document_id and r.status <> 'failed'
      group by d.number, p.amount_minor having sum(r.amount_minor) > p.amount_minor
      union all
      select format('A refund of %s stands beside credit note %s of %s.', r.amount_minor, i.number, i.gross_minor)
      from refund r join invoice i on i.id = r.credit_note_id
      where i.kind <> 'credit_note' or i.gross_minor <> r.amount_minor`,
  },
  {
    name: 'processor-clearing',
    promise: 'The clearing account of the card processor is payments less refunds and fees.',
    violations: () => sql<Violation>`
      select format('Account 1250 stands at %s; payments less refunds and fees are %s.', books.value, expected.value) as what
      from (select coalesce(sum(debit_minor - credit_minor), 0) as value from journal_line where account_code = '1250') books,
           (select (select coalesce(sum(amount_minor), 0) from payment)
                 - (select coalesce(sum(amount_minor), 0) from refund where status = 'sent')
                 - (select coalesce(sum(debit_minor - credit_minor), 0) from journal_line where account_code = '6100') as value) expected
      where books.value <> expected.value`,
  },
  {
    name: 'prepayments',
    promise: 'Customer prepayments are the net amounts invoiced for goods that have not left.',
    violations: () => sql<Violation>`
      select format('Account 2300 stands at %s; paid goods still here are worth %s.', books.value, expected.value) as what
      from (select coalesce(sum(credit_minor - debit_minor), 0) as value from journal_line where account_code = '2300') books,
           (select coalesce(sum(i.net_minor), 0) as value
            from invoice i join order_invoice oi on oi.invoice_id = i.id
            where i.kind = 'invoice'
              and not exists (select 1 from shipment s where s.order_id = oi.order_id and s.status = 'shipped')
              and not exists (select 1 from invoice c where c.credits_invoice_id = i.id)) expected
      where books.value <> expected.value`,
  },
  {
    name: 'shipped-is-packed',
    promise: 'A shipped order left with all that its lines need.',
    violations: () => sql<Violation>`
      select format('Order %s left with %s of %s where %s were needed.', o.number, trim_scale(coalesce(sum(i.quantity), 0)),
                    p.code, trim_scale(n.quantity)) as what
      from shipment s
      join sales_order o on o.id = s.order_id
      join order_line l on l.order_id = o.id
      join order_line_need n on n.order_line_id = l.id
      join part p on p.id = n.part_id
      left join packed_item i on i.shipment_id = s.id and i.order_line_need_id = n.id and i.taken_out_at is null
      where s.status = 'shipped'
      group by o.number, p.code, n.id, n.quantity having coalesce(sum(i.quantity), 0) <> n.quantity`,
  },
  {
    name: 'unpaid-orders',
    promise: 'An order that was not paid in time holds nothing.',
    violations: (now) => sql<Violation>`
      select format('Order %s of %s is unpaid and still holds goods.', o.number, o.placed_at) as what
      from sales_order o
      where o.placed_at < ${new Date(now.getTime() - 3 * 86_400_000)}
        and not exists (select 1 from payment p where p.order_id = o.id)
        and not exists (select 1 from payment_session s where s.order_id = o.id and s.status = 'waiting')
        and exists (
          select 1 from order_line l join order_line_need n on n.order_line_id = l.id
          join reservation r on r.demand_id = n.demand_id and r.ended_at is null
          where l.order_id = o.id
        )`,
  },
];
