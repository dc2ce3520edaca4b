import type { INestApplicationContext } from '@nestjs/common';
import { QuotesService } from '../catalogue/quotes.service.js';
import { PlaceOrderService } from '../orders/place-order.service.js';
import { PastPaymentsService } from '../payments/past-payments.service.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Database } from '../platform/database/database.js';
import { Transactions } from '../platform/database/transactions.js';
import { DispatchService } from '../shipping/dispatch.service.js';
import { PackingService } from '../shipping/packing.service.js';
import { ParcelLithiumService } from '../shipping/parcel-lithium.service.js';
import { ParcelsService } from '../shipping/parcels.service.js';
import type { TurnedClock } from './turned-clock.js';

export interface DemoBuyer {
  readonly country: string;
  readonly city: string;
  readonly postcode: string;
}

/** Buyers from several countries; addresses are made up. */
export const demoBuyers: readonly DemoBuyer[] = [
  { country: 'IE', city: 'Cork', postcode: 'T12 X001' },
  { country: 'DE', city: 'Kassel', postcode: '34117' },
  { country: 'GB', city: 'Leeds', postcode: 'LS1 4AP' },
  { country: 'FR', city: 'Lyon', postcode: '69001' },
  { country: 'IE', city: 'Galway', postcode: 'H91 X002' },
  { country: 'NL', city: 'Utrecht', postcode: '3511 AB' },
  { country: 'CH', city: 'Basel', postcode: '4051' },
  { country: 'SE', city: 'Lund', postcode: '222 22' },
];

/** Takes orders and payments and sends parcels, as buyers and the shop do. */
export class DemoCounter {
  #sold = 0;

  constructor(
    private readonly app: INestApplicationContext,
    private readonly clock: TurnedClock,
    private readonly owner: SignedInUser,
    private readonly assembler: SignedInUser,
  ) {}

  /** @returns the order's id, paid; nothing when it could not be promised */
  async sell(slugs: readonly string[], customer?: SignedInUser): Promise<number | undefined> {
    const buyer = demoBuyers[this.#sold % demoBuyers.length] ?? { country: 'IE', city: 'Cork', postcode: 'T12 X001' };
    this.#sold += 1;
    const { handle } = this.app.get(Database);
    const listings = await handle
      .selectFrom('listing')
      .select(['id', 'slug'])
      .where('slug', 'in', [...slugs])
      .execute();
    const lines = listings.map(({ id }) => ({ listingId: id, quantity: 1 }));
    const quote = await this.app
      .get(QuotesService, { strict: false })
      .read(handle, { country: buyer.country, postcode: buyer.postcode, lines });
    if ('ask' in quote || quote.promise.kind === 'ask') return undefined;
    const { day } = quote.promise;
    const address = {
      recipient: customer?.name ?? `Buyer ${this.#sold}`,
      company: null,
      addressLine: `${this.#sold} Kiln Road`,
      addressLine2: null,
      ...buyer,
    };
    const order = {
      lines,
      address,
      email: customer?.email ?? `buyer-${this.#sold}@fernhollow.example`,
      expectedGross: quote.totals.withVat,
      expectedDay: day,
    };
    const orderer = { userId: customer?.id ?? null, customerId: null };
    return this.app.get(Transactions).run(async (trx) => {
      const placed = await this.app.get(PlaceOrderService, { strict: false }).place(trx, orderer, order);
      const { orderId: id, grossMinor: gross, currency, number } = placed;
      await this.app.get(PastPaymentsService, { strict: false }).record(trx, { orderId: id, number, gross, currency });
      return id;
    });
  }

  /** Packs an order line by line and sends it off. */
  async send(orderId: number): Promise<void> {
    const packing = this.app.get(PackingService, { strict: false });
    const parcels = this.app.get(ParcelsService, { strict: false });
    const number = await packing.open(orderId, this.assembler);
    for (const need of (await parcels.get(number)).needs) {
      let missing = Number(need.quantity);
      for (const { lot, bin } of need.places) {
        if (missing <= 0) break;
        const quantity = need.traced === 'single' ? 1 : missing;
        await packing.scan(
          number,
          { code: lot, bin, needId: need.id, ...(need.traced === 'single' ? {} : { quantity: String(quantity) }) },
          this.assembler,
        );
        missing -= quantity;
      }
      this.clock.advance({ minutes: 1 });
    }
    await packing.close(number, (await parcels.get(number)).version, this.assembler);
    const { version } = await parcels.get(number);
    const said = { mode: 'road', weightG: 900, wattHoursOnCase: true, chargePercent: 30, version } as const;
    await this.app.get(ParcelLithiumService, { strict: false }).say(number, said, this.assembler);
    this.clock.advance({ hours: 2 });
    const dispatch = {
      carrier: 'Hollow Way Parcels',
      trackingCode: `HW${100_000 + orderId}`,
      version: (await parcels.get(number)).version,
    };
    await this.app.get(DispatchService, { strict: false }).dispatch(number, dispatch, this.owner);
  }
}
