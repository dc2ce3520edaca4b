import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { sql, type Kysely, type RawBuilder } from 'kysely';
import { containing, countOf, paged, sorted } from '../platform/paging/page.js';
import type { OrderDeskQuery, OrderState } from './order-desk.dto.js';

/** Where an order is: the first that holds. */
const state: RawBuilder<OrderState> = sql<OrderState>`case
  when exists (select 1 from order_cancellation c where c.order_id = o.id) then 'cancelled'
  when exists (select 1 from shipment s where s.order_id = o.id and s.status = 'shipped') then 'shipped'
  when exists (select 1 from payment_review r where r.order_id = o.id and r.settled_at is null) then 'review'
  when exists (select 1 from payment p where p.order_id = o.id) then coalesce(
    (select s.status from shipment s where s.order_id = o.id and s.status in ('packing', 'packed')),
    (select case when bool_or(claims.held < n.quantity) then 'short'
                 when bool_or(claims.on_batch > 0) then 'building' else 'ready' end
     from order_line l
     join order_line_need n on n.order_line_id = l.id
     cross join lateral (
       select coalesce(sum(r.quantity), 0) as held,
              coalesce(sum(r.quantity) filter (where r.supply = 'batch'), 0) as on_batch
       from reservation r where r.demand_id = n.demand_id and r.ended_at is null
     ) claims
     where l.order_id = o.id))
  when exists (select 1 from payment_session s where s.order_id = o.id and s.status in ('opening', 'open', 'waiting'))
    then 'paying'
  else 'unpaid' end`;

const sortColumns = {
  placedAt: 'desk.placed_at',
  promisedOn: 'desk.promised_on',
  number: 'desk.number',
  recipient: 'desk.recipient',
  gross: 'desk.gross_minor',
};

export interface DeskNeedRow {
  readonly lineId: number;
  readonly part: string;
  readonly partName: string;
  readonly measure: string;
  readonly bag: string | null;
  readonly quantity: string;
  readonly fromShelf: string;
  readonly fromBatches: string;
  readonly batches: string[];
}

/** Orders as the staff see them. */
@Injectable()
export class OrderDeskRepository {
  async findPage(handle: Kysely<DB>, query: OrderDeskQuery) {
    let found = this.desk(handle);
    if (query.q) {
      const pattern = containing(query.q);
      found = found.where(sql<boolean>`(desk.number || ' ' || desk.recipient || ' ' || desk.email) ilike ${pattern}`);
    }
    if (query.state) found = found.where('desk.state', '=', query.state);
    const items = await paged(
      sorted(found.selectAll(), query.sort, sortColumns, '-placedAt', 'desk.id'),
      query,
    ).execute();
    return { items, total: await countOf(found) };
  }

  async find(handle: Kysely<DB>, number: string) {
    return this.desk(handle).selectAll().where('desk.number', '=', number).executeTakeFirst();
  }

  async lines(handle: Kysely<DB>, orderId: number) {
    return handle
      .selectFrom('order_line as l')
      .innerJoin('part as p', 'p.id', 'l.part_id')
      .select(['l.id', 'l.title', 'p.code as part', 'l.form', 'l.quantity', 'l.net_minor as net'])
      .where('l.order_id', '=', orderId)
      .orderBy('l.position')
      .execute();
  }

  async needs(handle: Kysely<DB>, orderId: number): Promise<DeskNeedRow[]> {
    const { rows } = await sql<DeskNeedRow>`
      select n.order_line_id as "lineId", p.code as part, p.name as "partName", p.measure, n.bag,
             n.quantity::text as quantity,
             coalesce(sum(r.quantity) filter (where r.supply = 'shelf'), 0)::text as "fromShelf",
             coalesce(sum(r.quantity) filter (where r.supply = 'batch'), 0)::text as "fromBatches",
             coalesce(array_agg(distinct b.number) filter (where b.number is not null), '{}') as batches
      from order_line l
      join order_line_need n on n.order_line_id = l.id
      join part p on p.id = n.part_id
      left join reservation r on r.demand_id = n.demand_id and r.ended_at is null
      left join batch b on b.id = r.batch_id
      where l.order_id = ${orderId}
      group by n.id, p.id
      order by n.bag, n.id
    `.execute(handle);
    return rows;
  }

  /** Everything that happened to an order, oldest first. */
  async documents(handle: Kysely<DB>, orderId: number) {
    const { rows } = await sql<{ id: number; kind: string; number: string; at: Date; note: string | null }>`
      select d.id, d.kind, d.number, d.occurred_at as at, null as note
      from payment p join document d on d.id = p.document_id where p.order_id = ${orderId}
      union all
      select d.id, d.kind, i.number, d.occurred_at, i.reason
      from order_invoice oi join invoice i on i.id = oi.invoice_id join document d on d.id = i.document_id
      where oi.order_id = ${orderId}
      union all
      select d.id, d.kind, s.number, d.occurred_at, concat_ws(' ', s.carrier, s.tracking_code)
      from shipment s join document d on d.id = s.document_id where s.order_id = ${orderId}
      union all
      select d.id, d.kind, d.number, d.occurred_at, c.reason
      from order_cancellation c join document d on d.id = c.document_id where c.order_id = ${orderId}
      union all
      select d.id, d.kind, d.number, coalesce(r.settled_at, d.occurred_at), r.status
      from refund r join document d on d.id = r.document_id where r.order_id = ${orderId}
      order by 1
    `.execute(handle);
    return rows;
  }

  async reviews(handle: Kysely<DB>, orderId: number) {
    return handle
      .selectFrom('payment_review')
      .select(['id', 'what', 'created_at as createdAt', 'resolution'])
      .where('order_id', '=', orderId)
      .orderBy('id')
      .execute();
  }

  private desk(handle: Kysely<DB>) {
    return handle.selectFrom((from) =>
      from
        .selectFrom('sales_order as o')
        .selectAll('o')
        .select([
          state.as('state'),
          sql<string | null>`(select s.number from shipment s where s.order_id = o.id and s.status <> 'dissolved'
                                order by s.id desc limit 1)`.as('parcel'),
        ])
        .as('desk'),
    );
  }
}
