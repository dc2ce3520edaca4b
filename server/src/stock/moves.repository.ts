import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import type { Kysely } from 'kysely';
import { containing, countOf, paged, sorted, type Page } from '../platform/paging/page.js';
import type { MovesQuery } from './move.dto.js';

export interface MoveRecord {
  readonly id: number;
  readonly occurredAt: Date;
  readonly document: string;
  readonly documentKind: string;
  readonly note: string | null;
  readonly part: string;
  readonly measure: string;
  readonly lot: string;
  readonly bin: string;
  readonly quantity: string;
  readonly valueMinor: number;
  readonly reason: string;
  readonly person: string | null;
  readonly reversedBy: string | null;
}

/** Instants between which the moves lie, in place of the query's days. */
export interface MoveSpan {
  readonly since: Date | undefined;
  readonly before: Date | undefined;
}

const sortColumns = {
  occurredAt: 'm.id',
  part: 'p.code',
  quantity: 'm.quantity',
  value: 'm.value_minor',
  reason: 'm.reason',
};

@Injectable()
export class MovesRepository {
  async findPage(handle: Kysely<DB>, query: MovesQuery, span: MoveSpan): Promise<Page<MoveRecord>> {
    const found = this.filtered(handle, query, span);
    const items = await paged(
      sorted(this.withColumns(found), query.sort, sortColumns, '-occurredAt', 'm.id'),
      query,
    ).execute();
    return { items, total: await countOf(found) };
  }

  /** The latest of one part or lot, newest first. */
  async latest(
    handle: Kysely<DB>,
    of: { readonly partId: number } | { readonly lotId: number },
    limit: number,
  ): Promise<MoveRecord[]> {
    const found = this.base(handle);
    const narrowed = 'partId' in of ? found.where('m.part_id', '=', of.partId) : found.where('m.lot_id', '=', of.lotId);
    return this.withColumns(narrowed).orderBy('m.id', 'desc').limit(limit).execute();
  }

  private base(handle: Kysely<DB>) {
    return handle
      .selectFrom('stock_move as m')
      .innerJoin('document as d', 'd.id', 'm.document_id')
      .innerJoin('part as p', 'p.id', 'm.part_id')
      .innerJoin('lot as l', 'l.id', 'm.lot_id')
      .innerJoin('bin as b', 'b.id', 'm.bin_id');
  }

  private filtered(handle: Kysely<DB>, query: MovesQuery, span: MoveSpan) {
    let found = this.base(handle);
    if (query.part) found = found.where('p.code', '=', query.part);
    if (query.lot) found = found.where('l.code', '=', query.lot);
    if (query.bin) found = found.where('b.code', '=', query.bin);
    if (query.reason) found = found.where('m.reason', '=', query.reason);
    if (span.since) found = found.where('m.occurred_at', '>=', span.since);
    if (span.before) found = found.where('m.occurred_at', '<', span.before);
    if (!query.q) return found;
    const pattern = containing(query.q);
    return found.where((where) =>
      where.or([
        where('d.number', 'ilike', pattern),
        where('d.note', 'ilike', pattern),
        where('p.code', 'ilike', pattern),
        where('l.code', 'ilike', pattern),
      ]),
    );
  }

  private withColumns(found: ReturnType<MovesRepository['base']>) {
    return found
      .leftJoin('app_user as u', 'u.id', 'm.recorded_by')
      .leftJoin('document as rev', 'rev.reverses_document_id', 'd.id')
      .select([
        'm.id',
        'm.occurred_at as occurredAt',
        'd.number as document',
        'd.kind as documentKind',
        'd.note',
        'p.code as part',
        'p.measure',
        'l.code as lot',
        'b.code as bin',
        'm.quantity',
        'm.value_minor as valueMinor',
        'm.reason',
        'u.name as person',
        'rev.number as reversedBy',
      ]);
  }
}
