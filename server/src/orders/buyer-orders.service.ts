import { createHash } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Clock } from '../platform/clock/clock.js';
import { Database } from '../platform/database/database.js';
import { notFound } from '../platform/errors/app-error.js';
import type { BuyerOrderDto, BuyerOrdersDto } from './buyer-orders.dto.js';
import { BuyerOrdersRepository } from './buyer-orders.repository.js';
import { eventsOf, standingOf } from './order-standing.js';
import { OrdersService } from './orders.service.js';

/** Who asks for an order: somebody signed in, or whoever holds the link from the mail. */
export interface BuyerAccess {
  readonly user: SignedInUser | null;
  readonly token: string | undefined;
}

/** Orders as their own buyer sees them. Somebody else's is not there. */
@Injectable()
export class BuyerOrdersService {
  constructor(
    private readonly clock: Clock,
    private readonly database: Database,
    private readonly orders: OrdersService,
    private readonly repository: BuyerOrdersRepository,
  ) {}

  /** @throws AppError `not_found` for a number that does not exist or is not the asker's */
  async find(number: string, access: BuyerAccess) {
    const order = await this.repository.find(this.database.handle, number, {
      tokenSha256: access.token === undefined ? null : createHash('sha256').update(access.token).digest(),
      customerId: access.user?.customerId ?? null,
    });
    if (!order) throw notFound('order');
    return order;
  }

  async open(number: string, access: BuyerAccess): Promise<BuyerOrderDto> {
    const { handle } = this.database;
    const order = await this.find(number, access);
    const money = (amount: number) => ({ amount, currency: order.currency });
    const lines = await this.orders.lines(handle, order.id);
    const invoices = await this.repository.invoices(handle, order.id);
    return {
      number: order.number,
      placedAt: order.placed_at.toISOString(),
      recipient: order.recipient,
      company: order.company,
      addressLine: order.address_line,
      addressLine2: order.address_line_2,
      city: order.city,
      postcode: order.postcode,
      country: order.country_name,
      lines: lines.map((line) => ({
        title: line.title,
        quantity: line.quantity,
        net: money(line.net_minor),
        vatRate: line.vat_rate,
      })),
      delivery: money(order.delivery_net_minor),
      net: money(order.net_minor),
      vat: money(order.vat_minor),
      gross: money(order.gross_minor),
      vatNote: order.vat_note,
      promisedOn: order.promised_on,
      standing: standingOf(order, order.promised_on, this.clock.now()),
      events: eventsOf(order).map(({ at, what }) => ({ at: at.toISOString(), what })),
      invoices: invoices.map(({ id, number: invoiceNumber, kind, issued_on: issuedOn, gross_minor: gross }) => ({
        id,
        number: invoiceNumber,
        kind,
        issuedOn,
        gross: money(gross),
      })),
      units: await this.repository.units(handle, order.id),
      canPay: !order.paidAt && !order.cancelledAt && !order.waitingForBank,
    };
  }

  async list(user: SignedInUser): Promise<BuyerOrdersDto> {
    if (user.customerId === null) return { items: [] };
    const rows = await this.repository.ofCustomer(this.database.handle, user.customerId);
    const now = this.clock.now();
    return {
      items: rows.map((row) => ({
        number: row.number,
        placedAt: row.placed_at.toISOString(),
        gross: { amount: row.gross_minor, currency: row.currency },
        standing: standingOf(row, row.promised_on, now),
      })),
    };
  }
}
