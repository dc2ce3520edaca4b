import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import type { Kysely } from 'kysely';

/** Which revisions are in hand. What they hold is read through the bills' service. */
@Injectable()
export class ReleasedBillsRepository {
  /** Drafts and released revisions of parts that are not retired, the oldest first. */
  async inHand(handle: Kysely<DB>): Promise<{ id: number; status: string }[]> {
    return handle
      .selectFrom('bill_revision as r')
      .innerJoin('part', 'part.id', 'r.part_id')
      .select(['r.id', 'r.status'])
      .where('r.status', '<>', 'superseded')
      .where('part.retired_on', 'is', null)
      .orderBy('r.created_at')
      .orderBy('r.id')
      .execute();
  }
}
