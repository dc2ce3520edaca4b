import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import type { Kysely, Transaction } from 'kysely';

export interface PostingRuleRow {
  readonly component: string;
  readonly debit: string;
  readonly credit: string;
}

export interface NewEntryRow {
  readonly documentId: number;
  readonly event: string;
  readonly sourceKey: string;
  readonly day: string;
  readonly postedAt: Date;
  readonly recordedBy: number | null;
  readonly narrative: string;
}

export interface NewLineRow {
  readonly account: string;
  readonly debit: number;
  readonly credit: number;
}

@Injectable()
export class JournalRepository {
  async rulesOf(handle: Kysely<DB>, event: string): Promise<PostingRuleRow[]> {
    return handle
      .selectFrom('posting_rule')
      .select(['component', 'debit_account_code as debit', 'credit_account_code as credit'])
      .where('event', '=', event)
      .execute();
  }

  async insertEntry(trx: Transaction<DB>, entry: NewEntryRow, lines: readonly NewLineRow[]): Promise<number> {
    const { id } = await trx
      .insertInto('journal_entry')
      .values({
        document_id: entry.documentId,
        event: entry.event,
        source_key: entry.sourceKey,
        day: entry.day,
        posted_at: entry.postedAt,
        recorded_by: entry.recordedBy,
        narrative: entry.narrative,
      })
      .returning('id')
      .executeTakeFirstOrThrow();
    await trx
      .insertInto('journal_line')
      .values(
        lines.map(({ account, debit, credit }) => ({
          entry_id: id,
          account_code: account,
          debit_minor: debit,
          credit_minor: credit,
        })),
      )
      .execute();
    return id;
  }
}
