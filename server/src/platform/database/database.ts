import { Inject, Injectable, type OnApplicationShutdown } from '@nestjs/common';
import type { Kysely } from 'kysely';
import type pg from 'pg';
import { databaseOver } from '@emberlot/db/database';
import type { DB } from '@emberlot/db/database.types';

/** The pool of connections that everything except the job queue shares. */
export const pgPool = Symbol('pgPool');

/** The query builder for reads outside a transaction; changes go through `Transactions`. */
@Injectable()
export class Database implements OnApplicationShutdown {
  readonly handle: Kysely<DB>;

  constructor(@Inject(pgPool) readonly pool: pg.Pool) {
    this.handle = databaseOver(pool);
  }

  async onApplicationShutdown(): Promise<void> {
    await this.handle.destroy();
  }
}
