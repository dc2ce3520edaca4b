import type { Kysely } from 'kysely';
import type { DB } from '@emberlot/db/database.types';
import { addPart, type PartRow } from './shelf.js';

const at = new Date('2027-03-01T08:00:00Z');
let made = 0;

/** A spare that is offered at 100.00 net; everything not said is made up. */
export async function addListing(
  handle: Kysely<DB>,
  listing: { part?: PartRow; netMinor?: number; form?: 'tool' | 'kit' | 'spare' } = {},
): Promise<{ id: number; slug: string; part: PartRow }> {
  made += 1;
  const part = listing.part ?? (await addPart(handle));
  const form = listing.form ?? 'spare';
  const row = await handle
    .insertInto('listing')
    .values({
      slug: `offer-${made}`,
      part_id: part.id,
      form,
      family: 'Spares',
      title: `Offer ${made}`,
      summary: 'Something to sell.',
      skills: form === 'kit' ? 'Soldering.' : null,
      net_minor: listing.netMinor ?? 10_000,
      published_at: at,
    })
    .returning(['id', 'slug'])
    .executeTakeFirstOrThrow();
  return { ...row, part };
}

/** What delivery to a country costs; 10.00 net when nothing is said. */
export async function addDelivery(handle: Kysely<DB>, country: string, netMinor = 1_000): Promise<void> {
  await handle
    .insertInto('delivery_rate')
    .values({ country_code: country, net_minor: netMinor, transit_days: 3, valid_from: '2020-01-01' })
    .execute();
}
