import { type Page, expect } from '@playwright/test';
import { createDatabase } from '@emberlot/db/database';
import { demoListings } from '@emberlot/db/demo/offers';
import type { components } from '../../../client/src/api/schema.js';
import { Caller, bodyOf } from '../caller.js';
import type { Product } from '../product.js';

/** The shop of the story: Irish, euros, open every day, so that no promise depends on the day the test runs. */
export const fernhollow = {
  name: 'Fernhollow Tools',
  legalName: 'Fernhollow Tools Limited',
  addressLine: '4 Mill Lane',
  city: 'Ballyhollow',
  postcode: 'X99 AB12',
  countryCode: 'IE',
  email: 'shop@fernhollow.example',
  vatNumber: 'IE1234567FA',
  currency: 'EUR',
  workingWeekdays: [1, 2, 3, 4, 5, 6, 7],
  handlingDays: 2,
  checkoutHoldMinutes: 31,
  labourRateMinor: 3600,
  warrantyMonths: 24,
};

export const deliveryToIreland = {
  countryCode: 'IE',
  netMinor: 690,
  transitDays: 2,
  carriesLithium: true,
  validFrom: '2026-01-01',
};

/** Offers these parts as the scenario does: by rows, for no page writes an offer yet. */
export async function offer(product: Product, parts: readonly string[]): Promise<void> {
  const handle = createDatabase(product.ownerDatabaseUrl, { applicationName: 'rehearsal' });
  for (const listing of demoListings.filter(({ part }) => parts.includes(part))) {
    const { id } = await handle
      .selectFrom('part')
      .select('id')
      .where('code', '=', listing.part)
      .executeTakeFirstOrThrow();
    const { part: _part, netMinor, ...texts } = listing;
    await handle
      .insertInto('listing')
      .values({ ...texts, part_id: id, net_minor: netMinor, published_at: new Date() })
      .execute();
  }
  await handle.destroy();
}

export async function putInBasket(page: Page, slug: string): Promise<void> {
  await page.goto(`/products/${slug}`);
  await page.getByRole('button', { name: 'Put in basket' }).click();
  await expect(page).toHaveURL('/basket');
}

/** Goes from the basket to the address and fills it in; what a signed-in buyer's form knows already stays. */
export async function fillInAddress(page: Page, name: string, email: string): Promise<void> {
  await page.getByRole('link', { name: 'Go to the address' }).click();
  const form = page.getByRole('form', { name: 'Order' });
  await form.getByLabel('E-mail address').fill(email);
  await form.getByLabel('Name', { exact: true }).fill(name);
  await form.getByLabel('Street and number').fill('1 Quay Street');
  await form.getByLabel('Postcode').fill('D02 X285');
  await form.getByLabel('Town').fill('Dublin');
  await form.getByLabel(/I have read the terms/).check();
  await expect(form.getByText(/leaves/i).first()).toBeVisible();
}

export const orderButton = { name: 'Order with obligation to pay' } as const;

export async function payWith(page: Page, cardNumber: string): Promise<void> {
  await page.getByLabel('Card number').fill(cardNumber);
  await page.getByLabel('Expiry').fill('12/40');
  await page.getByLabel('Security code').fill('123');
  await page.getByLabel('Name on the card').fill('Robin Buyer');
  await page.getByRole('button', { name: /^Pay / }).click();
}

/** A guest orders so many and goes no further: they are kept for a while. */
export async function orderUnpaid(product: Product, slug: string, quantity: number): Promise<void> {
  type Dto<Name extends keyof components['schemas']> = components['schemas'][Name];
  const guest = await Caller.open(product.url);
  const { id } = (await bodyOf(await guest.get(`/api/shop/listings/${slug}`))) as Dto<'ShopProductDto'>;
  const basket = { country: 'IE', postcode: 'D02 X285', lines: [{ listingId: id, quantity }] };
  const quote = (await bodyOf(await guest.post('/api/shop/quotes', basket))) as Dto<'QuoteDto'>;
  await bodyOf(
    await guest.create('/api/shop/orders', {
      ...basket,
      email: 'careful@buyer.example',
      recipient: 'A careful buyer',
      addressLine: '2 Quay Street',
      city: 'Dublin',
      expectedGross: quote.gross?.amount,
      expectedDay: quote.promise?.leavesBy,
      termsAccepted: true,
    }),
  );
  await guest.dispose();
}
