import { createHash, randomBytes } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { Decimal } from '@emberlot/shared/measure/decimal';
import { isoDay } from '@emberlot/shared/plan/iso-day';
import { isoWeek } from '@emberlot/shared/plan/iso-week';
import type { Transaction } from 'kysely';
import type { Cover, ShopPromise } from '../catalogue/promise.js';
import type { Quote, QuotedLine } from '../catalogue/quote.js';
import { needsOf, QuotesService } from '../catalogue/quotes.service.js';
import { Audit } from '../platform/audit/audit.js';
import { Clock } from '../platform/clock/clock.js';
import { AppError } from '../platform/errors/app-error.js';
import { Numbers } from '../platform/numbers/numbers.js';
import { ShopService } from '../settings/shop.service.js';
import { ReservationsService, type Claim } from '../stock/reservations.service.js';
import type { NewOrder, Orderer } from './new-order.js';
import { OrdersRepository } from './orders.repository.js';

/** How many unpaid orders one address may hold goods with. */
const mostUnpaid = 3;

type HeldPromise = Extract<ShopPromise, { kind: 'by' }>;

export interface OrderPlaced {
  readonly orderId: number;
  readonly number: string;
  readonly guestToken: string;
  readonly grossMinor: number;
  readonly currency: string;
  /** When the claims end if nothing is paid. */
  readonly heldUntil: Date;
}

/**
 * Takes an order: works the price out again, promises the day, claims what it needs, all in the caller's transaction.
 * What the buyer saw is what is ordered; anything else is shown first.
 */
@Injectable()
export class PlaceOrderService {
  constructor(
    private readonly clock: Clock,
    private readonly numbers: Numbers,
    private readonly audit: Audit,
    private readonly shop: ShopService,
    private readonly quotes: QuotesService,
    private readonly reservations: ReservationsService,
    private readonly repository: OrdersRepository,
  ) {}

  /**
   * @throws AppError `rule_broken` where the shop must be asked, `changed_meanwhile` when price or day are others than
   *   the buyer saw, `too_many_tries` when the address holds too many unpaid orders, `not_enough_stock`
   */
  async place(trx: Transaction<DB>, orderer: Orderer, order: NewOrder): Promise<OrderPlaced> {
    await this.refuseHoarding(trx, order.email);
    const { country, postcode } = order.address;
    const quote = await this.quotes.hold(trx, { country, postcode, lines: order.lines });
    const { priced, promise } = orderable(quote, order);
    const customerId = await this.customer(trx, orderer, order);
    const guestToken = randomBytes(32).toString('base64url');
    const number = await this.nextNumber(trx);
    const orderId = await this.insert(trx, { order, priced, promise, customerId, guestToken, number });
    const heldUntil = await this.heldUntil(trx);
    await this.insertLines(trx, { orderId, number, priced, promise, heldUntil });
    await this.audit.record(trx, {
      actor: null,
      action: 'order.placed',
      subjectKind: 'sales_order',
      subjectId: orderId,
      subjectCode: number,
      after: { gross: priced.totals.withVat, currency: priced.currency, promisedOn: promise.day },
    });
    return { orderId, number, guestToken, grossMinor: priced.totals.withVat, currency: priced.currency, heldUntil };
  }

  private async refuseHoarding(trx: Transaction<DB>, email: string): Promise<void> {
    const since = new Date((await this.heldUntil(trx)).getTime() - 2 * 3_600_000);
    if ((await this.repository.countUnpaid(trx, email, since)) < mostUnpaid) return;
    throw new AppError(
      'too_many_tries',
      `${mostUnpaid} orders of this address wait to be paid. Pay one of them, or wait until they have run out.`,
    );
  }

  private async heldUntil(trx: Transaction<DB>): Promise<Date> {
    const { checkout_hold_minutes: minutes } = await this.shop.get(trx);
    return new Date(this.clock.now().getTime() + minutes * 60_000);
  }

  private async nextNumber(trx: Transaction<DB>): Promise<string> {
    const { year, week } = isoWeek(isoDay(this.clock.today()));
    const period = `${String(year % 100).padStart(2, '0')}${String(week).padStart(2, '0')}`;
    const next = await this.numbers.next(trx, 'order', period);
    return `O-${period}-${String(next).padStart(3, '0')}`;
  }

  private async customer(trx: Transaction<DB>, orderer: Orderer, order: NewOrder): Promise<number> {
    if (orderer.customerId !== null) return orderer.customerId;
    const { recipient, company } = order.address;
    const id = await this.repository.insertCustomer(trx, {
      kind: company === null ? 'person' : 'company',
      name: company ?? recipient,
      email: order.email,
      createdAt: this.clock.now(),
    });
    if (orderer.userId !== null) await this.repository.setCustomerOfUser(trx, orderer.userId, id);
    return id;
  }

  private async insert(
    trx: Transaction<DB>,
    made: {
      order: NewOrder;
      priced: Quote;
      promise: HeldPromise;
      customerId: number;
      guestToken: string;
      number: string;
    },
  ): Promise<number> {
    const { order, priced, promise } = made;
    const { address } = order;
    return this.repository.insertOrder(trx, {
      number: made.number,
      customer_id: made.customerId,
      guest_token_sha256: createHash('sha256').update(made.guestToken).digest(),
      placed_at: this.clock.now(),
      email: order.email,
      recipient: address.recipient,
      company: address.company,
      address_line: address.addressLine,
      address_line_2: address.addressLine2,
      city: address.city,
      postcode: address.postcode,
      country_code: address.country,
      currency: priced.currency,
      vat_treatment: priced.vat.treatment,
      vat_note: priced.vat.note,
      delivery_net_minor: priced.delivery,
      net_minor: priced.totals.withoutVat,
      vat_minor: priced.totals.vat,
      gross_minor: priced.totals.withVat,
      promised_on: promise.day,
    });
  }

  private async insertLines(
    trx: Transaction<DB>,
    made: { orderId: number; number: string; priced: Quote; promise: HeldPromise; heldUntil: Date },
  ): Promise<void> {
    const { orderId, number, priced, promise } = made;
    const lineIds = await this.repository.insertLines(
      trx,
      priced.lines.map((line, index) => lineRow(orderId, index + 1, line, priced)),
    );
    const needs = priced.lines.flatMap((line, index) =>
      line.needs.map((need) => ({ ...need, orderLineId: lineIds[index] ?? 0 })),
    );
    const demandIds = await this.reservations.open(
      trx,
      needs.map(({ partId, quantity }) => ({
        kind: 'order_line' as const,
        partId,
        quantity,
        neededOn: promise.day,
        reference: number,
      })),
    );
    const demanded = needs.map((need, index) => ({ ...need, demandId: demandIds[index] ?? 0 }));
    await this.repository.insertNeeds(
      trx,
      demanded.map(({ orderLineId, partId, quantity, bag, demandId }) => ({
        orderLineId,
        partId,
        bag,
        demandId,
        quantity: quantity.toFixed(),
      })),
    );
    await this.reservations.claim(trx, spread(demanded, promise.covers, made.heldUntil));
  }
}

function orderable(quote: Awaited<ReturnType<QuotesService['hold']>>, order: NewOrder) {
  if ('ask' in quote) throw new AppError('rule_broken', quote.ask);
  if (needsOf(quote.lines).length === 0) throw new AppError('rule_broken', 'There is nothing to send in this basket.');
  const { promise } = quote;
  if (promise.kind === 'ask') {
    throw new AppError(
      'not_enough_stock',
      'Somebody was quicker: not all of this is there any more. Look at the basket again.',
    );
  }
  if (quote.totals.withVat !== order.expectedGross || promise.day > order.expectedDay) {
    throw new AppError(
      'changed_meanwhile',
      'The price or the day has changed since you looked. Look again before you order.',
    );
  }
  return { priced: quote, promise };
}

function lineRow(orderId: number, position: number, line: QuotedLine, { vat }: Quote) {
  const { listing } = line;
  return {
    orderId,
    position,
    listingId: listing.id,
    partId: listing.part_id,
    form: listing.form,
    title: listing.title,
    quantity: line.quantity,
    unitNet: line.unitNet,
    net: line.net,
    vatCategory: vat.category,
    vatRate: vat.ratePercent,
  };
}

interface Demanded {
  readonly partId: number;
  readonly quantity: Decimal;
  readonly demandId: number;
}

/** Shares what covers each part among the demands for it, in their order: first the shelf, then the batches. */
export function spread(
  demanded: readonly Demanded[],
  covers: readonly Cover[],
  expiresAt: Date | null,
): readonly Claim[] {
  const claims: Claim[] = [];
  for (const cover of covers) {
    const sources = [
      { supply: { kind: 'shelf' } as const, left: cover.fromShelf },
      ...cover.fromBatches.map(({ batchId, quantity }) => ({
        supply: { kind: 'batch', batchId } as const,
        left: quantity,
      })),
    ];
    for (const { demandId, partId, quantity } of demanded.filter((demand) => demand.partId === cover.partId)) {
      let missing = quantity;
      for (const source of sources) {
        const taken = Decimal.min(missing, source.left);
        if (taken.lessThanOrEqualTo(0)) continue;
        claims.push({ demandId, partId, quantity: taken, supply: source.supply, expiresAt });
        source.left = source.left.minus(taken);
        missing = missing.minus(taken);
      }
    }
  }
  return claims;
}
