import { Injectable } from '@nestjs/common';
import { type Transaction, sql } from 'kysely';
import type { DB } from '@emberlot/db/database.types';

export interface JobTiming {
  /** Not before this instant; at once when nothing is said. */
  readonly runAt?: Date;
  /** A second job of this key replaces the first while that has not begun. */
  readonly jobKey?: string;
}

/** Work to be done after the transaction is committed; if it rolls back, there is no job either. */
@Injectable()
export class Jobs {
  /** @param task the name in the `@Task` of the provider that does it */
  async add(
    trx: Transaction<DB>,
    task: string,
    payload: Readonly<Record<string, unknown>>,
    timing: JobTiming = {},
  ): Promise<void> {
    await sql`
      select graphile_worker.add_job(
        ${task},
        payload => ${JSON.stringify(payload)}::json,
        run_at => ${timing.runAt ?? null}::timestamptz,
        job_key => ${timing.jobKey ?? null}::text
      )
    `.execute(trx);
  }
}
