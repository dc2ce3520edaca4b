import { Injectable } from '@nestjs/common';
import { type Transaction, sql } from 'kysely';
import type { DB } from '@emberlot/db/database.types';

/** Numbers of documents: one after the other in a series and period, without a gap. */
@Injectable()
export class Numbers {
  /**
   * Takes the next number. The series stays locked until the transaction ends, so take it as the last step before the
   * document is inserted: a rollback gives the number back, and whoever waits gets the one after.
   *
   * @param series which documents: `invoice`
   * @param period the year in which the numbers begin again at 1, or an empty text for a series that never does
   */
  async next(trx: Transaction<DB>, series: string, period: string): Promise<number> {
    return this.nextOf(trx, series, period, 1);
  }

  /**
   * Takes several numbers that follow each other.
   *
   * @param count how many, at least one
   * @returns the first of them
   */
  async nextOf(trx: Transaction<DB>, series: string, period: string, count: number): Promise<number> {
    const row = await trx
      .insertInto('number_series')
      .values({ series, period, last_number: count })
      .onConflict((conflict) =>
        conflict.columns(['series', 'period']).doUpdateSet({ last_number: sql`number_series.last_number + ${count}` }),
      )
      .returning('last_number')
      .executeTakeFirstOrThrow();
    return row.last_number - count + 1;
  }

  /** Passes over numbers that came from elsewhere, so that they are not given a second time. */
  async passOver(trx: Transaction<DB>, series: string, period: string, number: number): Promise<void> {
    await trx
      .insertInto('number_series')
      .values({ series, period, last_number: number })
      .onConflict((conflict) =>
        conflict
          .columns(['series', 'period'])
          .doUpdateSet({ last_number: sql`greatest(number_series.last_number, ${number})` }),
      )
      .execute();
  }
}
