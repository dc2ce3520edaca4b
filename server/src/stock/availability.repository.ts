import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { sql, type Kysely } from 'kysely';

export interface AvailabilityRow {
  readonly partId: number;
  /** All that lies on the shelf and is the shop's own. */
  readonly onShelf: string;
  /** Of that, what may be issued: released, not expired, in no quarantine bin. */
  readonly usable: string;
  /** Claimed by live reservations on the shelf. */
  readonly claimed: string;
}

/** What lies of a part, what of it may be used, and what is already claimed: one reading for lists, claims and promises. */
@Injectable()
export class AvailabilityRepository {
  /**
   * @param partIds which parts; an empty list reads none
   * @param at the instant for claims that end by themselves
   * @param today the day for lots that expire, in the shop's zone
   */
  async read(handle: Kysely<DB>, partIds: readonly number[], at: Date, today: string): Promise<AvailabilityRow[]> {
    if (partIds.length === 0) return [];
    const usable = sql<boolean>`l.status = 'released' and not bin.quarantine and coalesce(l.expires_on >= ${today}, true)`;
    return handle
      .selectFrom('part')
      .leftJoinLateral(
        (from) =>
          from
            .selectFrom('stock_balance as b')
            .innerJoin('lot as l', 'l.id', 'b.lot_id')
            .innerJoin('bin', 'bin.id', 'b.bin_id')
            .whereRef('b.part_id', '=', 'part.id')
            .where('b.owner_customer_id', 'is', null)
            .where('b.quantity', '>', '0')
            .select([
              sql<string>`sum(b.quantity)`.as('on_shelf'),
              sql<string>`sum(b.quantity) filter (where ${usable})`.as('usable'),
            ])
            .as('lying'),
        (join) => join.onTrue(),
      )
      .leftJoinLateral(
        (from) =>
          from
            .selectFrom('reservation as r')
            .whereRef('r.part_id', '=', 'part.id')
            .where('r.supply', '=', 'shelf')
            .where('r.ended_at', 'is', null)
            .where((where) => where.or([where('r.expires_at', 'is', null), where('r.expires_at', '>', at)]))
            .select(sql<string>`sum(r.quantity)`.as('claimed'))
            .as('claims'),
        (join) => join.onTrue(),
      )
      .where('part.id', 'in', [...partIds])
      .select([
        'part.id as partId',
        sql<string>`coalesce(lying.on_shelf, 0)`.as('onShelf'),
        sql<string>`coalesce(lying.usable, 0)`.as('usable'),
        sql<string>`coalesce(claims.claimed, 0)`.as('claimed'),
      ])
      .orderBy('part.id')
      .execute();
  }
}
