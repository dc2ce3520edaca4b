import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { sql, type Kysely, type Transaction } from 'kysely';

export interface CountedPlace {
  readonly partId: number;
  readonly bin: string;
}

@Injectable()
export class OpeningStockRepository {
  async counted(handle: Kysely<DB>, partIds: readonly number[]): Promise<CountedPlace[]> {
    return handle
      .selectFrom('stock_move as m')
      .innerJoin('lot as l', 'l.id', 'm.lot_id')
      .innerJoin('bin as b', 'b.id', 'm.bin_id')
      .where('m.part_id', '=', sql<number>`any(${[...partIds]}::bigint[])`)
      .where('m.reason', '=', 'opening')
      .where('l.kind', '=', 'standing')
      .select(['m.part_id as partId', 'b.code as bin'])
      .distinct()
      .execute();
  }

  async insertBins(trx: Transaction<DB>, codes: readonly string[]): Promise<ReadonlyMap<string, number>> {
    const { rows } = await sql<{ id: number; code: string }>`
      insert into bin (code) select code from unnest(${[...codes]}::text[]) as added (code)
      returning id, code`.execute(trx);
    return new Map(rows.map(({ id, code }) => [code, id]));
  }
}
