import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { sql, type Kysely, type Transaction } from 'kysely';
import { containing, countOf, paged, sorted, type Page } from '../platform/paging/page.js';
import type { ImportsQuery } from './imports.dto.js';

export interface ImportRunRow {
  readonly id: number;
  readonly kind: string;
  readonly fileName: string;
  readonly rowCount: number;
  readonly appliedAt: Date;
  readonly appliedBy: string;
  readonly document: string | null;
}

export interface NewImportRun {
  readonly kind: string;
  readonly fileName: string;
  readonly content: Buffer;
  readonly rowCount: number;
  readonly appliedAt: Date;
  readonly appliedBy: number;
  readonly documentId: number | null;
}

const sortColumns = { appliedAt: 'r.id', kind: 'r.kind', fileName: 'r.file_name', rowCount: 'r.row_count' };

@Injectable()
export class ImportsRepository {
  /** One import at a time: what two files bring may be the same things. */
  async lock(trx: Transaction<DB>): Promise<void> {
    await sql`select pg_advisory_xact_lock(hashtext('import'))`.execute(trx);
  }

  async findPage(handle: Kysely<DB>, query: ImportsQuery): Promise<Page<ImportRunRow>> {
    let found = this.rows(handle);
    if (query.q) found = found.where('r.file_name', 'ilike', containing(query.q));
    const items = await paged(sorted(found, query.sort, sortColumns, '-appliedAt', 'r.id'), query).execute();
    return { items, total: await countOf(found) };
  }

  async get(handle: Kysely<DB>, id: number): Promise<ImportRunRow> {
    return this.rows(handle).where('r.id', '=', id).executeTakeFirstOrThrow();
  }

  /** The run that took in the very same bytes, if there was one. */
  async findSame(handle: Kysely<DB>, kind: string, content: Buffer): Promise<ImportRunRow | undefined> {
    return this.rows(handle)
      .where('r.kind', '=', kind)
      .where('r.content_sha256', '=', content)
      .limit(1)
      .executeTakeFirst();
  }

  async insert(trx: Transaction<DB>, run: NewImportRun): Promise<number> {
    const { id } = await trx
      .insertInto('import_run')
      .values({
        kind: run.kind,
        file_name: run.fileName,
        content_sha256: run.content,
        row_count: run.rowCount,
        applied_at: run.appliedAt,
        applied_by: run.appliedBy,
        document_id: run.documentId,
      })
      .returning('id')
      .executeTakeFirstOrThrow();
    return id;
  }

  private rows(handle: Kysely<DB>) {
    return handle
      .selectFrom('import_run as r')
      .innerJoin('app_user as u', 'u.id', 'r.applied_by')
      .leftJoin('document as d', 'd.id', 'r.document_id')
      .select([
        'r.id',
        'r.kind',
        'r.file_name as fileName',
        'r.row_count as rowCount',
        'r.applied_at as appliedAt',
        'u.name as appliedBy',
        'd.number as document',
      ]);
  }
}
