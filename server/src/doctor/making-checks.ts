import { sql } from 'kysely';
import type { Check, Violation } from './check.js';

/** Batches, units and their test runs. */
export const makingChecks: readonly Check[] = [
  {
    name: 'packed-units-are-sound',
    promise: 'What is packed passed its last complete run, against the plan of its own revision.',
    violations: () => sql<Violation>`
      select format('Unit %s is in parcel %s without a valid pass.', u.serial, s.number) as what
      from packed_item i join shipment s on s.id = i.shipment_id join unit u on u.id = i.unit_id
      where i.taken_out_at is null and s.status in ('packing', 'packed') and not unit_is_sound(u.id)`,
  },
  {
    name: 'shipped-units-were-sound',
    promise: 'What was shipped had passed its last complete run before it left.',
    violations: () => sql<Violation>`
      select format('Unit %s left in parcel %s without a valid pass.', u.serial, s.number) as what
      from packed_item i
      join shipment s on s.id = i.shipment_id and s.status = 'shipped'
      join unit u on u.id = i.unit_id
      left join lateral (
        select r.verdict, r.revision_id, r.voided_at from test_run r
        where r.unit_id = u.id and r.measured_at <= s.shipped_at
        order by r.measured_at desc, r.sequence desc limit 1
      ) last on true
      where i.taken_out_at is null
        and not coalesce(last.verdict = 'pass' and last.revision_id = u.revision_id
                         and (last.voided_at is null or last.voided_at > s.shipped_at), false)`,
  },
  {
    name: 'units-finished-once',
    promise: 'A finished unit is a lot of one of its own part.',
    violations: () => sql<Violation>`
      select format('Unit %s and its lot %s do not belong together.', u.serial, l.code) as what
      from unit u join lot l on l.id = u.lot_id
      where l.part_id <> u.part_id or l.kind <> 'unit' or u.scrapped_at < u.completed_at`,
  },
  {
    name: 'runs-and-readings',
    promise: 'A run passes when the last reading of each characteristic of its plan is within its limits.',
    violations: () => sql<Violation>`
      with last_reading as (
        select distinct on (g.run_id, g.characteristic_id) g.run_id, g.characteristic_id, g.verdict
        from reading g order by g.run_id, g.characteristic_id, g.measured_at desc, g.id desc
      ), judged as (
        select r.id, r.verdict, u.serial, r.sequence,
               count(*) filter (where lr.verdict is null) as missing,
               count(*) filter (where lr.verdict = 'outside') as outside
        from test_run r
        join unit u on u.id = r.unit_id
        join characteristic c on c.revision_id = r.revision_id
        left join last_reading lr on lr.run_id = r.id and lr.characteristic_id = c.id
        where r.verdict is not null
        group by r.id, r.verdict, u.serial, r.sequence
      )
      select format('Run %s of unit %s says %s with %s outside and %s missing.', sequence, serial, verdict, outside, missing)
        as what
      from judged where (verdict = 'pass') <> (outside = 0 and missing = 0)`,
  },
  {
    name: 'work-in-progress',
    promise: 'Work in progress equals what batches hold, and a finished batch holds nothing.',
    violations: () => sql<Violation>`
      with held as (
        select batch_id, sum(value_minor) as value from batch_cost where component <> 'labour' group by batch_id
      )
      select format('Batch %s is %s but still holds %s.', b.number, b.status, h.value) as what
      from batch b join held h on h.batch_id = b.id where b.status in ('done', 'withdrawn') and h.value <> 0
      union all
      select format('Account 1320 stands at %s, batches hold %s.', books.value, batches.value)
      from (select coalesce(sum(debit_minor - credit_minor), 0) as value from journal_line where account_code = '1320') books,
           (select coalesce(sum(value), 0) as value from held) batches
      where books.value <> batches.value`,
  },
];
