import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import type { Kysely, Transaction } from 'kysely';
import { Database } from '../platform/database/database.js';
import { notFound } from '../platform/errors/app-error.js';
import { OrdersRepository, type OrderRow } from './orders.repository.js';

export type Order = OrderRow;
export type OrderLines = Awaited<ReturnType<OrdersRepository['linesOf']>>;

/** An order as other domains see it. Every action on an order takes its lock here first. */
@Injectable()
export class OrdersService {
  constructor(
    private readonly database: Database,
    private readonly repository: OrdersRepository,
  ) {}

  /** @throws AppError `not_found` */
  async idOf(number: string): Promise<number> {
    const id = await this.repository.findId(this.database.handle, number);
    if (id === undefined) throw notFound('order');
    return id;
  }

  /** @throws AppError `not_found` */
  async get(handle: Kysely<DB>, orderId: number): Promise<Order> {
    const order = await this.repository.find(handle, orderId);
    if (!order) throw notFound('order');
    return order;
  }

  /**
   * Locks the order until the transaction ends.
   *
   * @throws AppError `not_found`
   */
  async lock(trx: Transaction<DB>, orderId: number): Promise<Order> {
    const order = await this.repository.lock(trx, orderId);
    if (!order) throw notFound('order');
    return order;
  }

  async lines(handle: Kysely<DB>, orderId: number): Promise<OrderLines> {
    return this.repository.linesOf(handle, orderId);
  }
}
