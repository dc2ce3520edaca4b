import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import type { Transaction } from 'kysely';
import type { DocumentKind } from './document-kinds.js';

export interface DocumentRow {
  readonly kind: DocumentKind;
  readonly number: string;
  readonly occurredAt: Date;
  readonly recordedBy: number | null;
  readonly note: string | null;
  readonly reverses: number | null;
}

export type KeptDocumentRow = Pick<DocumentRow, 'kind' | 'number' | 'occurredAt' | 'recordedBy'> & {
  readonly id: number;
};

@Injectable()
export class DocumentsRepository {
  async insert(trx: Transaction<DB>, row: DocumentRow): Promise<number> {
    const { id } = await trx
      .insertInto('document')
      .values({
        kind: row.kind,
        number: row.number,
        occurred_at: row.occurredAt,
        recorded_by: row.recordedBy,
        note: row.note,
        reverses_document_id: row.reverses,
      })
      .returning('id')
      .executeTakeFirstOrThrow();
    return id;
  }

  async get(trx: Transaction<DB>, id: number): Promise<KeptDocumentRow> {
    const row = await trx
      .selectFrom('document')
      .select(['id', 'kind', 'number', 'occurred_at as occurredAt', 'recorded_by as recordedBy'])
      .where('id', '=', id)
      .executeTakeFirstOrThrow();
    return { ...row, kind: row.kind as DocumentKind };
  }
}
