import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { sql, type Kysely, type Transaction } from 'kysely';
import type { Plain } from '../platform/api/plain.js';
import { containing, countOf, paged, sorted, type Page } from '../platform/paging/page.js';
import type { BinContentDto, BinInputDto, BinItemDto, BinsQuery } from './bin.dto.js';

export interface BinRow extends BinInputDto {
  readonly id: number;
  readonly retiredAt: Date | null;
  readonly version: number;
}

const sortColumns = { code: 'code', name: 'name', partCount: sql`"partCount"`, lotCount: sql`"lotCount"` };

@Injectable()
export class BinsRepository {
  async findPage(handle: Kysely<DB>, query: BinsQuery): Promise<Page<BinItemDto>> {
    let found = handle.selectFrom('bin as b');
    if (!query.retired) found = found.where('b.retired_at', 'is', null);
    if (query.quarantine !== undefined) found = found.where('b.quarantine', '=', query.quarantine);
    if (query.q) {
      const pattern = containing(query.q);
      found = found.where((where) => where.or([where('b.code', 'ilike', pattern), where('b.name', 'ilike', pattern)]));
    }
    const filled = found
      .leftJoinLateral(
        (from) =>
          from
            .selectFrom('stock_balance as s')
            .whereRef('s.bin_id', '=', 'b.id')
            .where('s.quantity', '>', '0')
            .select([
              sql<number>`count(distinct s.part_id)`.as('partCount'),
              sql<number>`count(distinct s.lot_id)`.as('lotCount'),
            ])
            .as('filled'),
        (join) => join.onTrue(),
      )
      .select(['b.id', 'b.code', 'b.name', 'b.quarantine', 'b.retired_at', 'filled.partCount', 'filled.lotCount']);
    const rows = await paged(sorted(filled, query.sort, sortColumns, 'code', 'b.id'), query).execute();
    const items = rows.map(({ retired_at, partCount, lotCount, ...row }) => ({
      ...row,
      retired: retired_at !== null,
      partCount: partCount ?? 0,
      lotCount: lotCount ?? 0,
    }));
    return { items, total: await countOf(found) };
  }

  async findByCode(handle: Kysely<DB>, code: string): Promise<BinRow | undefined> {
    return handle
      .selectFrom('bin')
      .select(['id', 'code', 'name', 'quarantine', 'retired_at as retiredAt', 'version'])
      .where('code', '=', code)
      .executeTakeFirst();
  }

  /** Bins by code, each only if it is there. */
  async byCodes(handle: Kysely<DB>, codes: readonly string[]): Promise<BinRow[]> {
    return handle
      .selectFrom('bin')
      .select(['id', 'code', 'name', 'quarantine', 'retired_at as retiredAt', 'version'])
      .where('code', '=', sql<string>`any(${[...codes]}::text[])`)
      .execute();
  }

  async contentsOf(handle: Kysely<DB>, binId: number): Promise<Plain<BinContentDto>[]> {
    return handle
      .selectFrom('stock_balance as s')
      .innerJoin('lot as l', 'l.id', 's.lot_id')
      .innerJoin('part as p', 'p.id', 's.part_id')
      .where('s.bin_id', '=', binId)
      .where('s.quantity', '>', '0')
      .where('s.owner_customer_id', 'is', null)
      .select([
        'p.code as part',
        'p.name',
        'p.measure',
        'p.traced',
        'l.code as lot',
        'l.status as lotStatus',
        'l.expires_on as expiresOn',
        's.quantity',
      ])
      .orderBy('p.code')
      .orderBy('l.id')
      .execute();
  }

  async insert(trx: Transaction<DB>, rows: readonly BinInputDto[]): Promise<ReadonlyMap<string, number>> {
    if (rows.length === 0) return new Map();
    const { rows: inserted } = await sql<{ id: number; code: string }>`
      insert into bin (code, name, quarantine)
      select code, name, quarantine
      from jsonb_to_recordset(${JSON.stringify(rows)}::jsonb) as added (code text, name text, quarantine boolean)
      returning id, code`.execute(trx);
    return new Map(inserted.map(({ id, code }) => [code, id]));
  }

  /** @returns false when somebody else saved a newer version */
  async update(trx: Transaction<DB>, id: number, version: number, row: BinInputDto): Promise<boolean> {
    const result = await trx
      .updateTable('bin')
      .set({ code: row.code, name: row.name, quarantine: row.quarantine, version: version + 1 })
      .where('id', '=', id)
      .where('version', '=', version)
      .executeTakeFirst();
    return result.numUpdatedRows === 1n;
  }

  /** @returns false when somebody else saved a newer version */
  async setRetired(trx: Transaction<DB>, id: number, version: number, at: Date | null): Promise<boolean> {
    const result = await trx
      .updateTable('bin')
      .set({ retired_at: at, version: version + 1 })
      .where('id', '=', id)
      .where('version', '=', version)
      .executeTakeFirst();
    return result.numUpdatedRows === 1n;
  }
}
