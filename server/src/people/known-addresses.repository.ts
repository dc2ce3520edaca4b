import { createHash } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import type { Kysely } from 'kysely';
import type { DB } from '@emberlot/db/database.types';

/** Network addresses that a person signed in from before, by digest. */
@Injectable()
export class KnownAddressesRepository {
  async has(handle: Kysely<DB>, userId: number, address: string, since: Date): Promise<boolean> {
    const row = await handle
      .selectFrom('user_known_address')
      .select('user_id')
      .where('user_id', '=', userId)
      .where('address_digest', '=', digestOf(address))
      .where('last_signed_in_at', '>=', since)
      .executeTakeFirst();
    return row !== undefined;
  }

  async remember(handle: Kysely<DB>, userId: number, address: string, now: Date): Promise<void> {
    await handle
      .insertInto('user_known_address')
      .values({ user_id: userId, address_digest: digestOf(address), last_signed_in_at: now })
      .onConflict((conflict) => conflict.columns(['user_id', 'address_digest']).doUpdateSet({ last_signed_in_at: now }))
      .execute();
  }
}

function digestOf(address: string): Buffer {
  return createHash('sha256').update(address).digest();
}
