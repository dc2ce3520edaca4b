import { Injectable } from '@nestjs/common';
import type { DB, SalesOrder } from '@emberlot/db/database.types';
import type { Insertable, Kysely, Selectable, Transaction } from 'kysely';

export type OrderRow = Selectable<SalesOrder>;

export interface NewLineRow {
  readonly orderId: number;
  readonly position: number;
  readonly listingId: number;
  readonly partId: number;
  readonly form: string;
  readonly title: string;
  readonly quantity: number;
  readonly unitNet: number;
  readonly net: number;
  readonly vatCategory: string;
  readonly vatRate: string;
}

export interface NewNeedRow {
  readonly orderLineId: number;
  readonly partId: number;
  readonly quantity: string;
  readonly bag: string | null;
  readonly demandId: number;
}

@Injectable()
export class OrdersRepository {
  async insertCustomer(
    trx: Transaction<DB>,
    customer: { kind: 'person' | 'company'; name: string; email: string; createdAt: Date },
  ): Promise<number> {
    const { id } = await trx
      .insertInto('customer')
      .values({ kind: customer.kind, name: customer.name, email: customer.email, created_at: customer.createdAt })
      .returning('id')
      .executeTakeFirstOrThrow();
    return id;
  }

  async setCustomerOfUser(trx: Transaction<DB>, userId: number, customerId: number): Promise<void> {
    await trx.updateTable('app_user').set({ customer_id: customerId }).where('id', '=', userId).execute();
  }

  /** Orders of an address that wait to be paid: each holds goods. */
  async countUnpaid(handle: Kysely<DB>, email: string, since: Date): Promise<number> {
    const { count } = await handle
      .selectFrom('sales_order as o')
      .select(({ fn }) => fn.countAll<number>().as('count'))
      .where((where) => where(where.fn('lower', ['o.email']), '=', email.toLowerCase()))
      .where('o.placed_at', '>', since)
      .where((where) =>
        where.not(
          where.exists(where.selectFrom('payment as p').select('p.document_id').whereRef('p.order_id', '=', 'o.id')),
        ),
      )
      .where((where) =>
        where.not(
          where.exists(
            where.selectFrom('order_cancellation as c').select('c.document_id').whereRef('c.order_id', '=', 'o.id'),
          ),
        ),
      )
      .executeTakeFirstOrThrow();
    return count;
  }

  async insertOrder(trx: Transaction<DB>, values: Insertable<SalesOrder>): Promise<number> {
    const { id } = await trx.insertInto('sales_order').values(values).returning('id').executeTakeFirstOrThrow();
    return id;
  }

  /** Ids come back in the order of the rows. */
  async insertLines(trx: Transaction<DB>, rows: readonly NewLineRow[]): Promise<number[]> {
    const inserted = await trx
      .insertInto('order_line')
      .values(
        rows.map((row) => ({
          order_id: row.orderId,
          position: row.position,
          listing_id: row.listingId,
          part_id: row.partId,
          form: row.form,
          title: row.title,
          quantity: row.quantity,
          unit_net_minor: row.unitNet,
          net_minor: row.net,
          vat_category: row.vatCategory,
          vat_rate: row.vatRate,
        })),
      )
      .returning('id')
      .execute();
    return inserted.map(({ id }) => id);
  }

  async insertNeeds(trx: Transaction<DB>, rows: readonly NewNeedRow[]): Promise<void> {
    await trx
      .insertInto('order_line_need')
      .values(
        rows.map((row) => ({
          order_line_id: row.orderLineId,
          part_id: row.partId,
          quantity: row.quantity,
          bag: row.bag,
          demand_id: row.demandId,
        })),
      )
      .execute();
  }

  /** Locks the order: every action on it goes through here first. */
  async lock(trx: Transaction<DB>, orderId: number): Promise<OrderRow | undefined> {
    return trx.selectFrom('sales_order').selectAll().where('id', '=', orderId).forUpdate().executeTakeFirst();
  }

  async find(handle: Kysely<DB>, orderId: number): Promise<OrderRow | undefined> {
    return handle.selectFrom('sales_order').selectAll().where('id', '=', orderId).executeTakeFirst();
  }

  async findId(handle: Kysely<DB>, number: string): Promise<number | undefined> {
    const row = await handle.selectFrom('sales_order').select('id').where('number', '=', number).executeTakeFirst();
    return row?.id;
  }

  async demandsOf(handle: Kysely<DB>, orderId: number): Promise<number[]> {
    const rows = await handle
      .selectFrom('order_line_need as n')
      .innerJoin('order_line as l', 'l.id', 'n.order_line_id')
      .select('n.demand_id')
      .where('l.order_id', '=', orderId)
      .orderBy('n.id')
      .execute();
    return rows.map(({ demand_id: id }) => id);
  }

  async linesOf(handle: Kysely<DB>, orderId: number) {
    return handle
      .selectFrom('order_line as l')
      .innerJoin('part as p', 'p.id', 'l.part_id')
      .selectAll('l')
      .select(['p.code', 'p.measure'])
      .where('l.order_id', '=', orderId)
      .orderBy('l.position')
      .execute();
  }
}
