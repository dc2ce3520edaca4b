import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { Decimal } from '@emberlot/shared/measure/decimal';
import { addMinor, minorAmount, type MinorAmount } from '@emberlot/shared/money/minor-units';
import { vatOnNet } from '@emberlot/shared/money/vat-amount';
import type { Kysely } from 'kysely';
import { Clock } from '../platform/clock/clock.js';
import type { Plain } from '../platform/api/plain.js';
import { Database } from '../platform/database/database.js';
import { notFound } from '../platform/errors/app-error.js';
import { ShopService, type Shop } from '../settings/shop.service.js';
import { DeliveryRepository } from './delivery.repository.js';
import { ListingsRepository, type OfferRow } from './listings.repository.js';
import { ListingDetailsRepository } from './listing-details.repository.js';
import type { ShopPromise } from './promise.js';
import { PromisesService } from './promises.service.js';
import type { AskUs, QuotedVat } from './quote.js';
import { QuotesService } from './quotes.service.js';
import type {
  BasketDto,
  DestinationQuery,
  QuoteDto,
  ShopFrontDto,
  ShopListingDto,
  ShopListingsDto,
  ShopPriceDto,
  ShopProductDto,
  ShopPromiseDto,
} from './storefront.dto.js';

/** What a visitor sees: offers with the price and the promise that hold for where they live. */
@Injectable()
export class StorefrontService {
  constructor(
    private readonly clock: Clock,
    private readonly database: Database,
    private readonly shop: ShopService,
    private readonly listings: ListingsRepository,
    private readonly details: ListingDetailsRepository,
    private readonly delivery: DeliveryRepository,
    private readonly quotes: QuotesService,
    private readonly promises: PromisesService,
  ) {}

  async front(): Promise<ShopFrontDto> {
    const { handle } = this.database;
    const shop = await this.shop.get(handle);
    return {
      name: shop.name,
      legalName: shop.legal_name,
      addressLine: shop.address_line,
      city: shop.city,
      postcode: shop.postcode,
      country: shop.country_code,
      email: shop.email,
      phone: shop.phone,
      vatNumber: shop.vat_number,
      registrationNumber: shop.registration_number,
      warrantyMonths: shop.warranty_months,
      countries: await this.delivery.countries(handle, this.clock.today()),
    };
  }

  async list(query: DestinationQuery): Promise<ShopListingsDto> {
    const { handle } = this.database;
    const shop = await this.shop.get(handle);
    const vat = await this.vat(handle, shop, query);
    const items = await this.offers(handle, await this.listings.published(handle), vat, shop.currency);
    return { items, ask: 'ask' in vat ? vat.ask : null };
  }

  /** @throws AppError `not_found` */
  async product(slug: string, query: DestinationQuery): Promise<ShopProductDto> {
    const { handle } = this.database;
    const shop = await this.shop.get(handle);
    const row = await this.listings.findPublishedBySlug(handle, slug);
    if (!row) throw notFound('product');
    const family = (await this.listings.published(handle)).filter(
      (other) => other.family === row.family && other.form !== 'spare',
    );
    const vat = await this.vat(handle, shop, query);
    const [offer, ...siblings]: Plain<ShopListingDto>[] = await this.offers(
      handle,
      [row, ...family.filter(({ id }) => id !== row.id)],
      vat,
      shop.currency,
    );
    if (!offer) throw notFound('product');
    return {
      ...offer,
      description: row.description,
      skills: row.skills,
      cautions: row.cautions,
      siblings,
      contents: await this.details.contents(handle, row.part_id),
      positions: await this.details.positions(
        handle,
        [row, ...family].map((other) => other.part_id),
      ),
      ask: 'ask' in vat ? vat.ask : null,
    };
  }

  async quote(basket: BasketDto): Promise<QuoteDto> {
    const { handle } = this.database;
    const quote = await this.quotes.read(handle, basket);
    if ('ask' in quote) return { ...noQuote, ask: quote.ask };
    const { currency } = quote;
    const money = (amount: number) => ({ amount, currency });
    const asked = quote.promise.kind === 'ask';
    return {
      ask: asked ? 'Not all of this is there or on the bench just now. Write to us, or take less of it.' : null,
      lines: quote.lines.map(({ listing, quantity, unitNet, net }) => ({
        listingId: listing.id,
        slug: listing.slug,
        title: listing.title,
        form: listing.form,
        quantity,
        unitNet: money(unitNet),
        unitGross: money(grossOf(unitNet, quote.vat)),
        net: money(net),
      })),
      delivery: money(quote.delivery),
      net: money(quote.totals.withoutVat),
      vat: money(quote.totals.vat),
      gross: money(quote.totals.withVat),
      vatRate: quote.vat.ratePercent,
      vatCountry: quote.vat.treatment === 'export' ? null : await this.countryName(handle, quote.vat.country),
      vatNote: quote.vat.note,
      promise: promiseDto(quote.promise),
      transitDays: quote.transitDays,
    };
  }

  private async vat(handle: Kysely<DB>, shop: Shop, query: DestinationQuery): Promise<QuotedVat | AskUs> {
    const code = query.country ?? shop.country_code;
    const country = await this.delivery.findCountry(handle, code);
    if (!country) return { ask: 'We do not know this country. Write to us, and we will find out.' };
    // A list has no postcode yet; a special place is asked about when the address is there.
    return this.quotes.vat(handle, country, query.postcode ?? '-');
  }

  private async offers(
    handle: Kysely<DB>,
    rows: readonly OfferRow[],
    vat: QuotedVat | AskUs,
    currency: string,
  ): Promise<ShopListingDto[]> {
    const needs = await this.listings.needsOf(
      handle,
      rows.map(({ id }) => id),
    );
    const vatCountry = 'ask' in vat || vat.treatment === 'export' ? null : await this.countryName(handle, vat.country);
    const offers: ShopListingDto[] = [];
    for (const row of rows) {
      const own = needs
        .filter(({ listingId }) => listingId === row.id)
        .map(({ partId, quantity }) => ({ partId, quantity: new Decimal(quantity) }));
      const promise: ShopPromise = own.length === 0 ? { kind: 'ask' } : await this.promises.read(handle, own);
      offers.push({
        id: row.id,
        slug: row.slug,
        form: row.form,
        family: row.family,
        title: row.title,
        summary: row.summary,
        drawing: row.drawing,
        price: 'ask' in vat ? null : priceOf(row, vat, vatCountry, currency),
        promise: promiseDto(promise),
      });
    }
    return offers;
  }

  private async countryName(handle: Kysely<DB>, code: string): Promise<string> {
    return (await this.delivery.findCountry(handle, code))?.name ?? code;
  }
}

const noQuote: Plain<QuoteDto> = {
  ask: null,
  lines: [],
  delivery: null,
  net: null,
  vat: null,
  gross: null,
  vatRate: null,
  vatCountry: null,
  vatNote: null,
  promise: null,
  transitDays: null,
};

function grossOf(net: MinorAmount, vat: QuotedVat): MinorAmount {
  return addMinor(net, vatOnNet(net, vat.ratePercent));
}

function priceOf(row: OfferRow, vat: QuotedVat, vatCountry: string | null, currency: string): ShopPriceDto {
  const net = minorAmount(row.net_minor);
  return {
    net: { amount: net, currency },
    gross: { amount: grossOf(net, vat), currency },
    vatRate: vat.ratePercent,
    vatCountry,
  };
}

function promiseDto(promise: ShopPromise): ShopPromiseDto {
  if (promise.kind === 'ask') return { leavesBy: null, fromBatch: false };
  return { leavesBy: promise.day, fromBatch: promise.batchNumber !== null };
}
