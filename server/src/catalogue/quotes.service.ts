import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { Decimal } from '@emberlot/shared/measure/decimal';
import { minorAmount } from '@emberlot/shared/money/minor-units';
import { totalsFromNet, type VatEntry } from '@emberlot/shared/money/vat-totals';
import { vatTreatment } from '@emberlot/shared/money/vat-treatment';
import { isoDay } from '@emberlot/shared/plan/iso-day';
import type { Kysely, Transaction } from 'kysely';
import { Clock } from '../platform/clock/clock.js';
import { AppError } from '../platform/errors/app-error.js';
import { ShopService } from '../settings/shop.service.js';
import { standardRate, VatRulesService } from '../settings/vat-rules.service.js';
import { StockLedgerService } from '../stock/stock-ledger.service.js';
import { DeliveryRepository, type CountryRow } from './delivery.repository.js';
import { ListingsRepository } from './listings.repository.js';
import type { Need } from './promise.js';
import { PromisesService } from './promises.service.js';
import type { AskUs, Quote, QuotedLine, QuotedVat, QuoteRequest } from './quote.js';
import { questionSentence, vatNote } from './vat-words.js';

/** Prices a basket: VAT of its destination, delivery, totals, and the day by which it leaves. */
@Injectable()
export class QuotesService {
  constructor(
    private readonly clock: Clock,
    private readonly shop: ShopService,
    private readonly vatRules: VatRulesService,
    private readonly listings: ListingsRepository,
    private readonly delivery: DeliveryRepository,
    private readonly promises: PromisesService,
    private readonly ledger: StockLedgerService,
  ) {}

  /** @throws AppError `not_found` when something in the basket is not offered any more */
  async read(handle: Kysely<DB>, request: QuoteRequest): Promise<Quote | AskUs> {
    const lines = await this.lines(handle, request);
    return this.price(handle, request, lines, () => this.promises.read(handle, needsOf(lines)));
  }

  /** As `read`, but the promise holds until the transaction ends: parts and batches are locked. */
  async hold(trx: Transaction<DB>, request: QuoteRequest): Promise<Quote | AskUs> {
    const lines = await this.lines(trx, request);
    const needs = needsOf(lines);
    return this.price(trx, request, lines, async () => {
      await this.ledger.lock(
        trx,
        needs.map(({ partId }) => partId),
      );
      return this.promises.hold(trx, needs);
    });
  }

  /** The VAT on goods sent to a place today. */
  async vat(handle: Kysely<DB>, country: CountryRow, postcode: string | undefined): Promise<QuotedVat | AskUs> {
    const supply = {
      day: isoDay(this.clock.today()),
      rateClass: standardRate,
      shipTo: { country: country.code, postcode },
      carriedBy: 'shop',
      buyer: { kind: 'consumer' },
    } as const;
    const decided = vatTreatment(supply, await this.vatRules.load(handle, country.code));
    if (decided.kind === 'ask') return { ask: questionSentence[decided.question](country.name) };
    if (decided.kind === 'intra-community') throw new Error('a consumer is never supplied free of VAT in the union');
    return {
      treatment: decided.kind,
      category: decided.category,
      ratePercent: decided.ratePercent,
      country: decided.country,
      note: vatNote(decided, country.name),
    };
  }

  private async price(
    handle: Kysely<DB>,
    request: QuoteRequest,
    lines: readonly QuotedLine[],
    promise: () => Promise<Quote['promise']>,
  ): Promise<Quote | AskUs> {
    const country = await this.delivery.findCountry(handle, request.country);
    const rate = await this.delivery.find(handle, request.country, this.clock.today());
    if (!country || !rate) {
      return { ask: `We do not deliver to ${country?.name ?? 'this country'} yet. Write to us, and we will find out.` };
    }
    const vat = await this.vat(handle, country, request.postcode);
    if ('ask' in vat) return vat;
    const { currency } = await this.shop.get(handle);
    const entry = (amount: VatEntry['amount']): VatEntry => ({ ...vat, amount });
    const delivery = minorAmount(rate.netMinor);
    return {
      lines,
      delivery,
      transitDays: rate.transitDays,
      vat,
      currency,
      totals: totalsFromNet({
        lines: lines.map(({ net }) => entry(net)),
        charges: delivery === 0 ? [] : [entry(delivery)],
      }),
      promise: await promise(),
    };
  }

  private async lines(handle: Kysely<DB>, request: QuoteRequest): Promise<readonly QuotedLine[]> {
    const ids = request.lines.map(({ listingId }) => listingId);
    const listings = new Map((await this.listings.findPublished(handle, ids)).map((row) => [row.id, row]));
    const needs = await this.listings.needsOf(handle, ids);
    return request.lines.map(({ listingId, quantity }) => {
      const listing = listings.get(listingId);
      if (!listing)
        throw new AppError('not_found', 'Something in the basket is not offered any more. Look at it again.');
      return {
        listing,
        quantity,
        unitNet: minorAmount(listing.net_minor),
        net: minorAmount(listing.net_minor * quantity),
        needs: needs
          .filter((need) => need.listingId === listingId)
          .map(({ partId, quantity: each, bag }) => ({ partId, bag, quantity: new Decimal(each).times(quantity) })),
      };
    });
  }
}

/** All that must leave the shelf for the lines of a basket. */
export function needsOf(lines: readonly QuotedLine[]): readonly Need[] {
  return lines.flatMap(({ needs }) => needs);
}
