import { Injectable } from '@nestjs/common';
import type { SessionData } from 'express-session';
import type { Kysely } from 'kysely';
import type { DB } from '@emberlot/db/database.types';

export interface StoredSession {
  /** The digest that stands for the session's id in the table. */
  readonly sid: string;
  readonly data: SessionData;
}

/** People's sessions, beside the session store, which knows them only one at a time. */
@Injectable()
export class SessionsRepository {
  async findByUser(handle: Kysely<DB>, userId: number): Promise<readonly StoredSession[]> {
    const rows = await handle
      .selectFrom('user_session')
      .select(['sid', 'sess'])
      .where('user_id', '=', userId)
      .execute();
    return rows.map((row) => ({ sid: row.sid, data: row.sess as unknown as SessionData }));
  }

  async end(handle: Kysely<DB>, userId: number, sid: string): Promise<boolean> {
    const row = await handle
      .deleteFrom('user_session')
      .where('user_id', '=', userId)
      .where('sid', '=', sid)
      .returning('sid')
      .executeTakeFirst();
    return row !== undefined;
  }

  /** Ends all sessions of a person but one, or all. */
  async endAll(handle: Kysely<DB>, userId: number, except?: string): Promise<void> {
    let ended = handle.deleteFrom('user_session').where('user_id', '=', userId);
    if (except !== undefined) ended = ended.where('sid', '!=', except);
    await ended.execute();
  }
}
