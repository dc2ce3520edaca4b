import { Injectable } from '@nestjs/common';
import type { DB, Listing } from '@emberlot/db/database.types';
import type { Kysely, Selectable, Transaction } from 'kysely';

export type ListingRow = Selectable<Listing>;

export interface OfferRow extends ListingRow {
  readonly part_code: string;
  readonly measure: string;
}

export interface NeedRow {
  readonly listingId: number;
  readonly partId: number;
  readonly quantity: string;
  readonly bag: string | null;
}

export interface ListingValues {
  readonly slug: string;
  readonly part_id: number;
  readonly form: string;
  readonly family: string;
  readonly title: string;
  readonly summary: string;
  readonly description: string;
  readonly skills: string | null;
  readonly cautions: string[];
  readonly drawing: string | null;
  readonly net_minor: number;
  readonly place: number;
  readonly published_at: Date | null;
}

@Injectable()
export class ListingsRepository {
  private offers(handle: Kysely<DB>) {
    return handle
      .selectFrom('listing')
      .innerJoin('part', 'part.id', 'listing.part_id')
      .selectAll('listing')
      .select(['part.code as part_code', 'part.measure']);
  }

  /** What the storefront shows, in the shop's order. */
  async published(handle: Kysely<DB>): Promise<OfferRow[]> {
    return this.offers(handle)
      .where('listing.published_at', 'is not', null)
      .orderBy('listing.place')
      .orderBy('listing.title')
      .execute();
  }

  async all(handle: Kysely<DB>): Promise<OfferRow[]> {
    return this.offers(handle).orderBy('listing.place').orderBy('listing.title').execute();
  }

  async findPublishedBySlug(handle: Kysely<DB>, slug: string): Promise<OfferRow | undefined> {
    return this.offers(handle)
      .where('listing.slug', '=', slug)
      .where('listing.published_at', 'is not', null)
      .executeTakeFirst();
  }

  async findPublished(handle: Kysely<DB>, ids: readonly number[]): Promise<OfferRow[]> {
    if (ids.length === 0) return [];
    return this.offers(handle)
      .where('listing.id', 'in', [...ids])
      .where('listing.published_at', 'is not', null)
      .execute();
  }

  async find(handle: Kysely<DB>, id: number): Promise<OfferRow | undefined> {
    return this.offers(handle).where('listing.id', '=', id).executeTakeFirst();
  }

  /** What leaves the shelf for one of each listing: a kit's contents, or the part itself. */
  async needsOf(handle: Kysely<DB>, ids: readonly number[]): Promise<NeedRow[]> {
    if (ids.length === 0) return [];
    const contents = await handle
      .selectFrom('listing')
      .innerJoin('contents_line as c', 'c.kit_part_id', 'listing.part_id')
      .select(['listing.id as listingId', 'c.part_id as partId', 'c.quantity', 'c.bag'])
      .where('listing.id', 'in', [...ids])
      .where('listing.form', '=', 'kit')
      .orderBy('c.position')
      .execute();
    const itself = await handle
      .selectFrom('listing')
      .select(['id as listingId', 'part_id as partId'])
      .where('id', 'in', [...ids])
      .where('form', '<>', 'kit')
      .execute();
    return [...contents, ...itself.map((row) => ({ ...row, quantity: '1', bag: null }))];
  }

  async insert(trx: Transaction<DB>, values: ListingValues): Promise<number> {
    const { id } = await trx.insertInto('listing').values(values).returning('id').executeTakeFirstOrThrow();
    return id;
  }

  /** @returns whether the version was still the one the edit was made from */
  async update(trx: Transaction<DB>, id: number, version: number, values: ListingValues): Promise<boolean> {
    const result = await trx
      .updateTable('listing')
      .set((set) => ({ ...values, version: set('version', '+', 1) }))
      .where('id', '=', id)
      .where('version', '=', version)
      .executeTakeFirst();
    return result.numUpdatedRows === 1n;
  }
}
