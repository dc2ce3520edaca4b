import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import type { Kysely } from 'kysely';

export interface ReversibleDocument {
  readonly id: number;
  readonly number: string;
  readonly kind: string;
  readonly reversedBy: string | null;
}

export interface ReversibleMove {
  readonly id: number;
  readonly partId: number;
  readonly part: string;
  readonly traced: string;
  readonly lotId: number;
  readonly lot: string;
  readonly binId: number;
  readonly bin: string;
  readonly quantity: string;
  readonly valueMinor: number;
  readonly reason: string;
}

@Injectable()
export class ReversalsRepository {
  async findByNumber(handle: Kysely<DB>, number: string): Promise<ReversibleDocument | undefined> {
    return handle
      .selectFrom('document as d')
      .leftJoin('document as r', 'r.reverses_document_id', 'd.id')
      .select(['d.id', 'd.number', 'd.kind', 'r.number as reversedBy'])
      .where('d.number', '=', number)
      .executeTakeFirst();
  }

  /** In the order in which they were made. */
  async movesOf(handle: Kysely<DB>, documentId: number): Promise<ReversibleMove[]> {
    return handle
      .selectFrom('stock_move as m')
      .innerJoin('part as p', 'p.id', 'm.part_id')
      .innerJoin('lot as l', 'l.id', 'm.lot_id')
      .innerJoin('bin as b', 'b.id', 'm.bin_id')
      .where('m.document_id', '=', documentId)
      .select([
        'm.id',
        'm.part_id as partId',
        'p.code as part',
        'p.traced',
        'm.lot_id as lotId',
        'l.code as lot',
        'm.bin_id as binId',
        'b.code as bin',
        'm.quantity',
        'm.value_minor as valueMinor',
        'm.reason',
      ])
      .orderBy('m.id')
      .execute();
  }
}
