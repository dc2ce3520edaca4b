import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { sql, type Kysely } from 'kysely';
import type { TodayUnitDto } from './today.dto.js';

export interface WaitingOrderRow {
  readonly number: string;
  readonly promisedOn: string;
  /** The open parcel. */
  readonly parcel: string | null;
  readonly packed: boolean;
  /** Codes of parts that are neither on the shelf nor to come. */
  readonly short: string[];
  /** Batches that it waits for, and the last day by which one is due. */
  readonly batches: string[];
  readonly batchDueOn: string | null;
  readonly review: string | null;
}

export interface BatchRow {
  readonly code: string;
  readonly part: string;
  readonly dueOn: string;
  readonly units: TodayUnitDto[];
}

/** Reads over all domains; most of what is here stands in nobody else's list. */
@Injectable()
export class TodayRepository {
  /** Paid orders that have not left, oldest promise first. */
  async waitingOrders(handle: Kysely<DB>): Promise<WaitingOrderRow[]> {
    const { rows } = await sql<WaitingOrderRow>`
      select o.number, o.promised_on as "promisedOn", s.number as parcel, coalesce(s.status = 'packed', false) as packed,
             (select r.what from payment_review r where r.order_id = o.id and r.settled_at is null limit 1) as review,
             coalesce(needs.short, '{}') as short, coalesce(needs.batches, '{}') as batches,
             needs.due_on as "batchDueOn"
      from sales_order o
      left join shipment s on s.order_id = o.id and s.status in ('packing', 'packed')
      cross join lateral (
        select array_agg(distinct p.code) filter (where claims.held < n.quantity) as short,
               array_agg(distinct claims.batch) filter (where claims.batch is not null) as batches,
               max(claims.due_on) as due_on
        from order_line l
        join order_line_need n on n.order_line_id = l.id
        join part p on p.id = n.part_id
        cross join lateral (
          select coalesce(sum(r.quantity), 0) as held, max(b.number) as batch, max(b.due_on) as due_on
          from reservation r left join batch b on b.id = r.batch_id
          where r.demand_id = n.demand_id and r.ended_at is null
        ) claims
        where l.order_id = o.id
      ) needs
      where exists (select 1 from payment p where p.order_id = o.id)
        and not exists (select 1 from order_cancellation c where c.order_id = o.id)
        and not exists (select 1 from shipment x where x.order_id = o.id and x.status = 'shipped')
      order by o.promised_on, o.id
      limit 200
    `.execute(handle);
    return rows;
  }

  /** Payments to look at that belong to no waiting order: paid twice, after a cancellation, or refused refunds. */
  async otherReviews(handle: Kysely<DB>) {
    return handle
      .selectFrom('payment_review as r')
      .leftJoin('sales_order as o', 'o.id', 'r.order_id')
      .select(['r.id', 'r.what', 'o.number as order'])
      .where('r.settled_at', 'is', null)
      .orderBy('r.created_at')
      .limit(50)
      .execute();
  }

  /** Held lots of which something lies on the shelf, longest first. */
  async heldLots(handle: Kysely<DB>) {
    return handle
      .selectFrom('lot as l')
      .innerJoin('part as p', 'p.id', 'l.part_id')
      .select(['l.code', 'p.code as part', 'l.note'])
      .where('l.status', '=', 'held')
      .where((where) =>
        where.exists(
          where
            .selectFrom('stock_balance as b')
            .select('b.lot_id')
            .whereRef('b.lot_id', '=', 'l.id')
            .where('b.quantity', '>', '0'),
        ),
      )
      .orderBy('l.created_at')
      .limit(50)
      .execute();
  }

  async openFaults(handle: Kysely<DB>) {
    return handle
      .selectFrom('nonconformity as n')
      .innerJoin('unit as u', 'u.id', 'n.unit_id')
      .innerJoin('batch as b', 'b.id', 'u.batch_id')
      .select(['n.number', 'n.what', 'u.serial', 'b.due_on as dueOn'])
      .where('n.closed_at', 'is', null)
      .orderBy('n.found_at')
      .limit(50)
      .execute();
  }

  /** Batches that are not picked yet and lack something on the shelf. */
  async shortBatches(handle: Kysely<DB>) {
    const { rows } = await sql<{ batch: string; dueOn: string; parts: string[] }>`
      select d.reference as batch, b.due_on as "dueOn", array_agg(distinct p.code) as parts
      from demand d
      join part p on p.id = d.part_id
      join batch b on b.number = d.reference and b.status in ('planned', 'picking')
      where d.kind = 'batch_line' and d.closed_at is null
        and d.quantity - d.taken > (
          select coalesce(sum(r.quantity), 0) from reservation r where r.demand_id = d.id and r.ended_at is null
        )
      group by d.reference, b.due_on order by b.due_on
      limit 50
    `.execute(handle);
    return rows;
  }

  async failedMails(handle: Kysely<DB>, waitingSince: Date): Promise<number> {
    const row = await handle
      .selectFrom('outbox_mail')
      .select(({ fn }) => fn.countAll<number>().as('count'))
      .where('sent_at', 'is', null)
      .where((where) => where.or([where('given_up_at', 'is not', null), where('created_at', '<', waitingSince)]))
      .executeTakeFirstOrThrow();
    return row.count;
  }

  /** Batches under way with how far each unit is. */
  async batches(handle: Kysely<DB>): Promise<BatchRow[]> {
    const { rows } = await sql<BatchRow>`
      select b.number as code, p.name as part, b.due_on as "dueOn",
             (select coalesce(json_agg(json_build_object(
                'serial', u.serial,
                'stepsDone', (select count(*) from unit_step us where us.unit_id = u.id),
                'stepsTotal', (select count(*) from batch_step bs where bs.batch_id = b.id),
                'verdict', case
                  when u.scrapped_at is not null then 'scrapped'
                  when exists (select 1 from nonconformity n where n.unit_id = u.id and n.closed_at is null) then 'rework'
                  when unit_is_sound(u.id) then 'passed'
                  when (select r.verdict from test_run r where r.unit_id = u.id and r.verdict is not null and r.voided_at is null
                        order by r.measured_at desc, r.sequence desc limit 1) = 'fail' then 'failed'
                  else 'open' end) order by u.place), '[]')
              from unit u where u.batch_id = b.id) as units
      from batch b join part p on p.id = b.part_id
      where b.status in ('picking', 'in_build')
      order by b.due_on, b.id
      limit 12
    `.execute(handle);
    return rows;
  }

  async figures(handle: Kysely<DB>, since: Date) {
    const { rows } = await sql<{ paid: number; paidMinor: number; shipped: number; finished: number }>`
      select (select count(*) from payment where received_at >= ${since}) as paid,
             (select coalesce(sum(amount_minor), 0)::int8 from payment where received_at >= ${since}) as "paidMinor",
             (select count(*) from shipment where shipped_at >= ${since}) as shipped,
             (select count(*) from unit where completed_at >= ${since}) as finished
    `.execute(handle);
    const [row] = rows;
    if (!row) throw new Error('the figures could not be read');
    return row;
  }
}
