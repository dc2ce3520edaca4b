import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { Decimal } from '@emberlot/shared/measure/decimal';
import type { Transaction } from 'kysely';
import { PromisesService } from '../catalogue/promises.service.js';
import { Clock } from '../platform/clock/clock.js';
import { ShopService } from '../settings/shop.service.js';
import { ReservationsService } from '../stock/reservations.service.js';
import { StockLedgerService } from '../stock/stock-ledger.service.js';
import { OrderNeedsRepository } from './order-needs.repository.js';
import { spread } from './place-order.service.js';

/** What an order holds of the shelf and of batches, from checkout until it is packed. */
@Injectable()
export class OrderClaimsService {
  constructor(
    private readonly clock: Clock,
    private readonly shop: ShopService,
    private readonly ledger: StockLedgerService,
    private readonly reservations: ReservationsService,
    private readonly promises: PromisesService,
    private readonly needs: OrderNeedsRepository,
  ) {}

  /**
   * The order is paid: its claims no longer end by themselves. Claims that had run out are made again where something
   * is left to claim.
   *
   * @returns codes of the parts that are short now
   */
  async makeLasting(trx: Transaction<DB>, orderId: number): Promise<readonly string[]> {
    const needs = await this.needs.ofOrder(trx, orderId);
    const demandIds = needs.map(({ demandId }) => demandId);
    await this.ledger.lock(
      trx,
      needs.map(({ partId }) => partId),
    );
    await this.needs.reopen(trx, demandIds);
    await this.needs.endRunOut(trx, demandIds, this.clock.now());
    await this.reservations.setExpiry(trx, demandIds, null);
    const open = (await this.needs.ofOrder(trx, orderId))
      .map((need) => ({ ...need, quantity: new Decimal(need.quantity).minus(need.claimed) }))
      .filter(({ quantity }) => quantity.greaterThan(0));
    const short: string[] = [];
    for (const need of open) {
      const promise = await this.promises.hold(trx, [need]);
      if (promise.kind === 'ask') short.push(need.partCode);
      else await this.reservations.claim(trx, spread([need], promise.covers, null));
    }
    return short;
  }

  /** The buyer is on the payment page again: the claims end by themselves after the shop's usual time. */
  async hold(trx: Transaction<DB>, orderId: number): Promise<void> {
    const { checkout_hold_minutes: minutes } = await this.shop.get(trx);
    await this.extend(trx, orderId, new Date(this.clock.now().getTime() + minutes * 60_000));
  }

  /** A slow payment is under way: the claims wait for it. */
  async extend(trx: Transaction<DB>, orderId: number, until: Date): Promise<void> {
    await this.reservations.setExpiry(trx, await this.demandIds(trx, orderId), until);
  }

  /** The order will not be: all that it held is free. */
  async end(trx: Transaction<DB>, orderId: number): Promise<void> {
    await this.reservations.release(trx, await this.demandIds(trx, orderId));
  }

  private async demandIds(trx: Transaction<DB>, orderId: number): Promise<readonly number[]> {
    const needs = await this.needs.ofOrder(trx, orderId);
    return needs.map(({ demandId }) => demandId);
  }
}
