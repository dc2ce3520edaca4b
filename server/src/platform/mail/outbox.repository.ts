import { Injectable } from '@nestjs/common';
import { type Kysely, sql } from 'kysely';
import type { DB } from '@emberlot/db/database.types';
import { containing, countOf, paged, sorted, type Page } from '../paging/page.js';
import type { OutboxQuery } from './outbox.dto.js';

const sortColumns = { createdAt: 'created_at', to: 'recipient', subject: 'subject', sentAt: 'sent_at' };

const listColumns = [
  'id',
  'recipient',
  'subject',
  'created_at',
  'attempts',
  'claimed_at',
  'sent_at',
  'given_up_at',
  'last_error',
] as const;

export interface ClaimedMail {
  readonly id: number;
  readonly recipient: string;
  readonly subject: string;
  readonly body_text: string;
  readonly body_html: string;
  readonly message_id: string;
  readonly attempts: number;
}

@Injectable()
export class OutboxRepository {
  /** Takes a mail in hand, unless it is sent, given up, or in somebody's hand already. */
  async claim(handle: Kysely<DB>, id: number, now: Date): Promise<ClaimedMail | undefined> {
    return handle
      .updateTable('outbox_mail')
      .set({ claimed_at: now, attempts: sql`attempts + 1` })
      .where('id', '=', id)
      .where('sent_at', 'is', null)
      .where('given_up_at', 'is', null)
      .where('claimed_at', 'is', null)
      .returning(['id', 'recipient', 'subject', 'body_text', 'body_html', 'message_id', 'attempts'])
      .executeTakeFirst();
  }

  /** A text that lets somebody in is not kept. */
  async markSent(handle: Kysely<DB>, id: number, now: Date): Promise<void> {
    await handle
      .updateTable('outbox_mail')
      .set({
        sent_at: now,
        last_error: null,
        body_text: sql<string>`case when confidential then '' else body_text end`,
        body_html: sql<string>`case when confidential then '' else body_html end`,
      })
      .where('id', '=', id)
      .execute();
  }

  /** It certainly did not leave: back among those that wait. */
  async release(handle: Kysely<DB>, id: number, reason: string, nextAttemptAt: Date): Promise<void> {
    await handle
      .updateTable('outbox_mail')
      .set({ claimed_at: null, last_error: reason, next_attempt_at: nextAttemptAt })
      .where('id', '=', id)
      .where('sent_at', 'is', null)
      .execute();
  }

  async giveUp(handle: Kysely<DB>, id: number, reason: string, now: Date): Promise<void> {
    await handle
      .updateTable('outbox_mail')
      .set({ given_up_at: now, last_error: reason })
      .where('id', '=', id)
      .where('sent_at', 'is', null)
      .execute();
  }

  /** Nobody can know whether it left: it stays in hand, for a person to decide. */
  async noteUncertain(handle: Kysely<DB>, id: number, reason: string): Promise<void> {
    await handle.updateTable('outbox_mail').set({ last_error: reason }).where('id', '=', id).execute();
  }

  /** Puts a mail that was given up, or whose fate is unknown, back among those that wait. */
  async reopen(handle: Kysely<DB>, id: number, staleBefore: Date, now: Date): Promise<boolean> {
    const row = await handle
      .updateTable('outbox_mail')
      .set({ claimed_at: null, given_up_at: null, next_attempt_at: now })
      .where('id', '=', id)
      .where('sent_at', 'is', null)
      .where((where) => where.or([where('given_up_at', 'is not', null), where('claimed_at', '<', staleBefore)]))
      .returning('id')
      .executeTakeFirst();
    return row !== undefined;
  }

  async attachmentsOf(handle: Kysely<DB>, mailId: number) {
    return handle
      .selectFrom('outbox_mail_attachment as attachment')
      .innerJoin('file_object as file', 'file.id', 'attachment.file_id')
      .select(['attachment.file_id', 'attachment.file_name', 'file.media_type'])
      .where('attachment.mail_id', '=', mailId)
      .orderBy('attachment.position')
      .execute();
  }

  async findPage(handle: Kysely<DB>, query: OutboxQuery, staleBefore: Date): Promise<Page<OutboxRow>> {
    let found = handle.selectFrom('outbox_mail');
    if (query.q) {
      const pattern = containing(query.q);
      found = found.where((where) =>
        where.or([where('recipient', 'ilike', pattern), where('subject', 'ilike', pattern)]),
      );
    }
    if (query.state === 'sent') found = found.where('sent_at', 'is not', null);
    if (query.state === 'given_up') found = found.where('given_up_at', 'is not', null);
    if (query.state === 'uncertain' || query.state === 'waiting') {
      found = found.where('sent_at', 'is', null).where('given_up_at', 'is', null);
      found = found.where((where) =>
        query.state === 'uncertain'
          ? where('claimed_at', '<', staleBefore)
          : where.or([where('claimed_at', 'is', null), where('claimed_at', '>=', staleBefore)]),
      );
    }
    const items = await paged(
      sorted(found.select(listColumns), query.sort, sortColumns, '-createdAt', 'id'),
      query,
    ).execute();
    return { items, total: await countOf(found) };
  }
}

export interface OutboxRow {
  readonly id: number;
  readonly recipient: string;
  readonly subject: string;
  readonly created_at: Date;
  readonly attempts: number;
  readonly claimed_at: Date | null;
  readonly sent_at: Date | null;
  readonly given_up_at: Date | null;
  readonly last_error: string | null;
}
