import { sql } from 'kysely';
import type { Check, Violation } from './check.js';

/** The stock ledger, its balances and claims. */
export const stockChecks: readonly Check[] = [
  {
    name: 'balances',
    promise: 'What lies of a lot in a bin is the sum of its moves, and never below zero.',
    violations: () => sql<Violation>`
      with moved as (
        select lot_id, bin_id, owner_customer_id, sum(quantity) as quantity
        from stock_move group by lot_id, bin_id, owner_customer_id
      )
      select format('Lot %s in bin %s: the shelf says %s, its moves say %s.', l.code, bin.code,
                    trim_scale(coalesce(b.quantity, 0)), trim_scale(coalesce(m.quantity, 0))) as what
      from stock_balance b
      full join moved m on m.lot_id = b.lot_id and m.bin_id = b.bin_id
        and m.owner_customer_id is not distinct from b.owner_customer_id
      join lot l on l.id = coalesce(b.lot_id, m.lot_id)
      join bin on bin.id = coalesce(b.bin_id, m.bin_id)
      where coalesce(b.quantity, 0) <> coalesce(m.quantity, 0) or coalesce(b.quantity, 0) < 0`,
  },
  {
    name: 'cost-pools',
    promise: 'Quantity and value over which cost is averaged are the sums of the moves; nothing held is worth nothing.',
    violations: () => sql<Violation>`
      with moved as (
        select m.part_id, case when p.traced = 'single' then m.lot_id end as lot_id,
               sum(m.quantity) as quantity, sum(m.value_minor) as value_minor
        from stock_move m join part p on p.id = m.part_id
        where m.owner_customer_id is null
        group by 1, 2
      )
      select format('Part %s%s: kept %s worth %s, moves say %s worth %s.', p.code, coalesce(' lot ' || l.code, ''),
                    trim_scale(coalesce(c.quantity, 0)), coalesce(c.value_minor, 0),
                    trim_scale(coalesce(m.quantity, 0)), coalesce(m.value_minor, 0)) as what
      from cost_pool c
      full join moved m on m.part_id = c.part_id and m.lot_id is not distinct from c.lot_id
      join part p on p.id = coalesce(c.part_id, m.part_id)
      left join lot l on l.id = coalesce(c.lot_id, m.lot_id)
      where coalesce(c.quantity, 0) <> coalesce(m.quantity, 0)
         or coalesce(c.value_minor, 0) <> coalesce(m.value_minor, 0)
         or (coalesce(c.quantity, 0) = 0 and coalesce(c.value_minor, 0) <> 0)`,
  },
  {
    name: 'stock-accounts',
    promise: 'Each stock account equals the value of what it stands for on the shelf.',
    violations: () => sql<Violation>`
      with shelf as (
        select case when p.traced = 'single' then '1330' else '1310' end as account, sum(c.value_minor) as value
        from cost_pool c join part p on p.id = c.part_id group by 1
      ), books as (
        select a.code as account, coalesce(sum(l.debit_minor - l.credit_minor), 0) as value
        from account a left join journal_line l on l.account_code = a.code where a.is_stock group by a.code
      )
      select format('Account %s stands at %s, the shelf is worth %s.', b.account, b.value, coalesce(s.value, 0)) as what
      from books b left join shelf s on s.account = b.account
      where b.value <> coalesce(s.value, 0)`,
  },
  {
    name: 'moves-and-entries',
    promise: 'What a document moved is what it posted to the stock accounts.',
    violations: () => sql<Violation>`
      with moved as (
        select document_id, sum(value_minor) as value from stock_move group by document_id
      ), posted as (
        select e.document_id, sum(l.debit_minor - l.credit_minor) as value
        from journal_entry e join journal_line l on l.entry_id = e.id join account a on a.code = l.account_code and a.is_stock
        group by e.document_id
      )
      select format('Document %s moved %s and posted %s.', d.number, coalesce(m.value, 0), coalesce(p.value, 0)) as what
      from moved m full join posted p on p.document_id = m.document_id
      join document d on d.id = coalesce(m.document_id, p.document_id)
      where coalesce(m.value, 0) <> coalesce(p.value, 0)`,
  },
  {
    name: 'units-in-one-place',
    promise: 'A unit lies in one place at most.',
    violations: () => sql<Violation>`
      select format('Unit %s lies %s times on the shelf.', u.serial, trim_scale(sum(b.quantity))) as what
      from unit u join stock_balance b on b.lot_id = u.lot_id and b.quantity > 0
      group by u.serial having sum(b.quantity) > 1 or count(*) > 1`,
  },
  {
    name: 'claims',
    promise: 'A demand claims no more than it still needs, and claims that ran out are given up.',
    violations: (now) => sql<Violation>`
      select format('Demand of %s for %s claims %s and needs %s.', d.reference, p.code,
                    trim_scale(sum(r.quantity)), trim_scale(d.quantity - d.taken)) as what
      from demand d join reservation r on r.demand_id = d.id and r.ended_at is null join part p on p.id = d.part_id
      group by d.id, d.reference, p.code, d.quantity, d.taken
      having sum(r.quantity) > d.quantity - d.taken
      union all
      select format('A claim of %s on %s ran out at %s and was not given up.', d.reference, p.code, r.expires_at)
      from reservation r join demand d on d.id = r.demand_id join part p on p.id = r.part_id
      where r.ended_at is null and r.expires_at < ${new Date(now.getTime() - 15 * 60_000)}`,
  },
  {
    name: 'bills-without-loops',
    promise: 'No bill contains itself, at any depth.',
    violations: () => sql<Violation>`
      with recursive edge (parent, child) as (
        select r.part_id, l.part_id from bill_line l join bill_revision r on r.id = l.revision_id where r.status <> 'superseded'
        union
        select r.part_id, a.part_id from bill_line_alternate a join bill_line l on l.id = a.line_id
          join bill_revision r on r.id = l.revision_id where r.status <> 'superseded'
      ), below (top, part_id) as (
        select parent, child from edge
        union
        select below.top, edge.child from below join edge on edge.parent = below.part_id
      )
      select format('The bill of %s contains itself.', p.code) as what
      from below join part p on p.id = below.top where below.top = below.part_id`,
  },
];
