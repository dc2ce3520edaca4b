import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { sql, type Kysely } from 'kysely';

/** What happened to an order, read from the documents beside it. */
export interface OrderFacts {
  readonly paidAt: Date | null;
  readonly waitingForBank: boolean;
  readonly pageOpenUntil: Date | null;
  readonly cancelledAt: Date | null;
  readonly packedAt: Date | null;
  readonly shippedAt: Date | null;
  readonly trackingCode: string | null;
  readonly carrier: string | null;
  readonly refundedAt: Date | null;
}

const facts = [
  sql<Date | null>`(select min(p.received_at) from payment p where p.order_id = o.id)`.as('paidAt'),
  sql<boolean>`exists (select 1 from payment_session s where s.order_id = o.id and s.status = 'waiting')`.as(
    'waitingForBank',
  ),
  sql<Date | null>`(select max(s.expires_at) from payment_session s
                    where s.order_id = o.id and s.status in ('opening', 'open'))`.as('pageOpenUntil'),
  sql<Date | null>`(select d.occurred_at from order_cancellation c join document d on d.id = c.document_id
                    where c.order_id = o.id)`.as('cancelledAt'),
  sql<Date | null>`(select max(s.packed_at) from shipment s where s.order_id = o.id and s.status in ('packed', 'shipped'))`.as(
    'packedAt',
  ),
  sql<Date | null>`(select max(s.shipped_at) from shipment s where s.order_id = o.id)`.as('shippedAt'),
  sql<string | null>`(select max(s.tracking_code) from shipment s where s.order_id = o.id and s.status = 'shipped')`.as(
    'trackingCode',
  ),
  sql<string | null>`(select max(s.carrier) from shipment s where s.order_id = o.id and s.status = 'shipped')`.as(
    'carrier',
  ),
  sql<Date | null>`(select max(r.settled_at) from refund r where r.order_id = o.id and r.status = 'sent')`.as(
    'refundedAt',
  ),
];

@Injectable()
export class BuyerOrdersRepository {
  /** By its number, if the token opens it or it belongs to the customer; the filter is part of the query. */
  async find(handle: Kysely<DB>, number: string, access: { tokenSha256: Buffer | null; customerId: number | null }) {
    return handle
      .selectFrom('sales_order as o')
      .innerJoin('country as c', 'c.code', 'o.country_code')
      .selectAll('o')
      .select(['c.name as country_name', ...facts])
      .where('o.number', '=', number)
      .where((where) =>
        where.or([
          where('o.customer_id', '=', access.customerId ?? -1),
          where('o.guest_token_sha256', '=', access.tokenSha256 ?? Buffer.alloc(1)),
        ]),
      )
      .executeTakeFirst();
  }

  async ofCustomer(handle: Kysely<DB>, customerId: number) {
    return handle
      .selectFrom('sales_order as o')
      .select(['o.number', 'o.placed_at', 'o.gross_minor', 'o.currency', 'o.promised_on', ...facts])
      .where('o.customer_id', '=', customerId)
      .orderBy('o.placed_at', 'desc')
      .limit(200)
      .execute();
  }

  async invoices(handle: Kysely<DB>, orderId: number) {
    return handle
      .selectFrom('order_invoice as oi')
      .innerJoin('invoice as i', 'i.id', 'oi.invoice_id')
      .select(['i.id', 'i.number', 'i.kind', 'i.issued_on', 'i.gross_minor', 'i.currency'])
      .where('oi.order_id', '=', orderId)
      .orderBy('i.id')
      .execute();
  }

  /** Units that left with the order. */
  async units(handle: Kysely<DB>, orderId: number) {
    return handle
      .selectFrom('packed_item as p')
      .innerJoin('shipment as s', 's.id', 'p.shipment_id')
      .innerJoin('unit as u', 'u.id', 'p.unit_id')
      .select(['u.serial', 'u.page_token as pageToken'])
      .where('s.order_id', '=', orderId)
      .where('s.status', '=', 'shipped')
      .where('p.taken_out_at', 'is', null)
      .orderBy('u.serial')
      .execute();
  }
}
