import { Injectable } from '@nestjs/common';
import { Decimal } from '@emberlot/shared/measure/decimal';
import type { Plain } from '../platform/api/plain.js';
import { seesMoney } from '../platform/auth/sees-money.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Clock } from '../platform/clock/clock.js';
import { Database } from '../platform/database/database.js';
import { notFound } from '../platform/errors/app-error.js';
import type {
  OrderDeskDto,
  OrderDeskNeedDto,
  OrderDeskPageDto,
  OrderDeskQuery,
  OrderDeskRowDto,
  OrderState,
} from './order-desk.dto.js';
import { OrderDeskRepository, type DeskNeedRow } from './order-desk.repository.js';

type DeskRow = NonNullable<Awaited<ReturnType<OrderDeskRepository['find']>>>;

const sentences: Readonly<Record<OrderState, (order: DeskRow) => string>> = {
  cancelled: () => 'Cancelled.',
  shipped: ({ parcel }) => `Has left in parcel ${parcel}.`,
  review: () => 'Its payment waits for the owner to look at it.',
  packed: ({ parcel }) => `Packed in ${parcel}. Weigh it and send it off.`,
  packing: ({ parcel }) => `Being packed in ${parcel}.`,
  short: () => 'Paid, but short of something: see what is missing.',
  building: () => 'Paid. Waits for a batch on the bench.',
  ready: () => 'Paid, and all of it is on the shelf. Pack it.',
  paying: () => 'The buyer is on the payment page.',
  unpaid: () => 'Was not paid. It holds nothing.',
};

const documentSentences: Readonly<Record<string, (note: string | null) => string>> = {
  payment: () => 'The payment is here.',
  invoice: () => 'The invoice was issued.',
  credit_note: (note) => `The invoice was credited. ${note ?? ''}`.trim(),
  shipment: (note) => `The parcel left. ${note ?? ''}`.trim(),
  cancellation: (note) => `The order was cancelled. ${note ?? ''}`.trim(),
  refund: (note) => refundSentences[note ?? ''] ?? 'Money goes back.',
};

const refundSentences: Readonly<Record<string, string>> = {
  requested: 'The payment is about to go back.',
  sent: 'The payment went back.',
  failed: 'The bank refused the refund.',
};

/** Orders for those who pack, ship and answer. What has money is left out for who works without it. */
@Injectable()
export class OrderDeskService {
  constructor(
    private readonly clock: Clock,
    private readonly database: Database,
    private readonly repository: OrderDeskRepository,
  ) {}

  async list(query: OrderDeskQuery, person: SignedInUser): Promise<OrderDeskPageDto> {
    const { items, total } = await this.repository.findPage(this.database.handle, query);
    return { total, items: items.map((row) => this.row(row, person)) };
  }

  /** @throws AppError `not_found` */
  async get(number: string, person: SignedInUser): Promise<OrderDeskDto> {
    const handle = this.database.handle;
    const order = await this.repository.find(handle, number);
    if (!order) throw notFound('order');
    const money = moneyFor(order, person);
    const needs = await this.repository.needs(handle, order.id);
    const lines = await this.repository.lines(handle, order.id);
    const documents = await this.repository.documents(handle, order.id);
    const reviews = await this.repository.reviews(handle, order.id);
    return {
      ...this.row(order, person),
      email: order.email,
      address: addressOf(order),
      net: money(order.net_minor),
      vat: money(order.vat_minor),
      delivery: money(order.delivery_net_minor),
      vatNote: order.vat_note,
      cancellable: order.state !== 'cancelled' && order.state !== 'shipped',
      lines: lines.map(({ id, net, ...line }) => ({
        ...line,
        net: money(net),
        needs: needs.filter(({ lineId }) => lineId === id).map((need) => needDto(need, isHere(order.state))),
      })),
      documents: documents.map(({ id: _id, at, note, ...document }) => ({
        ...document,
        at: at.toISOString(),
        sentence: documentSentences[document.kind]?.(note) ?? '',
      })),
      reviews: reviews.map((review) => ({ ...review, createdAt: review.createdAt.toISOString() })),
    };
  }

  private row(order: DeskRow, person: SignedInUser): Plain<OrderDeskRowDto> {
    return {
      number: order.number,
      placedAt: order.placed_at.toISOString(),
      promisedOn: order.promised_on,
      late: isHere(order.state) && order.promised_on < this.clock.today(),
      recipient: order.recipient,
      country: order.country_code,
      state: order.state,
      sentence: sentences[order.state](order),
      parcel: order.parcel,
      gross: moneyFor(order, person)(order.gross_minor),
    };
  }
}

function moneyFor({ currency }: DeskRow, person: SignedInUser) {
  return (amount: number) => (seesMoney(person) ? { amount, currency } : null);
}

function addressOf(order: DeskRow): string[] {
  const place = `${order.postcode} ${order.city}`;
  const lines = [order.company, order.recipient, order.address_line, order.address_line_2, place, order.country_code];
  return lines.filter((line) => line !== null);
}

/** Paid and not gone: what it lacks matters. */
function isHere(state: OrderState): boolean {
  return !['cancelled', 'shipped', 'unpaid', 'paying'].includes(state);
}

function needDto({ lineId: _line, fromBatches, ...need }: DeskNeedRow, here: boolean): OrderDeskNeedDto {
  const held = new Decimal(need.fromShelf).plus(fromBatches);
  return {
    ...need,
    quantity: new Decimal(need.quantity).toFixed(),
    fromShelf: new Decimal(need.fromShelf).toFixed(),
    short: here ? Decimal.max(new Decimal(need.quantity).minus(held), 0).toFixed() : '0',
  };
}
