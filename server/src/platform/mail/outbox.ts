import { randomUUID } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import type { Transaction } from 'kysely';
import type { DB } from '@emberlot/db/database.types';
import { Clock } from '../clock/clock.js';
import { Config } from '../config/config.js';
import { AppError } from '../errors/app-error.js';
import { Jobs } from '../jobs/jobs.js';
import { isEmail } from '../validation/fields.js';
import { renderHtml, renderText } from './layout.js';
import { LetterheadReader } from './letterhead.reader.js';
import type { MailContent } from './mail-content.js';

export interface OutgoingMail {
  /** Names the event: `invoice 12 issued`. A second mail of the same key is not written. */
  readonly dedupeKey: string;
  readonly to: string;
  readonly subject: string;
  readonly content: MailContent;
  /** Holds a link that lets somebody in: its text is not kept once it has left. */
  readonly confidential?: boolean;
  readonly attachments?: readonly { readonly fileId: number; readonly fileName: string }[];
}

/** Mail to be sent once: a row in the transaction of the event that it tells of, and a job that carries it out. */
@Injectable()
export class Outbox {
  constructor(
    private readonly clock: Clock,
    private readonly config: Config,
    private readonly jobs: Jobs,
    private readonly letterhead: LetterheadReader,
  ) {}

  /** Whether the event has its mail already. */
  async has(trx: Transaction<DB>, dedupeKey: string): Promise<boolean> {
    const row = await trx.selectFrom('outbox_mail').select('id').where('dedupe_key', '=', dedupeKey).executeTakeFirst();
    return row !== undefined;
  }

  /**
   * @returns whether it was written; false when the event has its mail already
   * @throws AppError `invalid_input` when the recipient is not one plain address
   */
  async enqueue(trx: Transaction<DB>, mail: OutgoingMail): Promise<boolean> {
    if (!isEmail(mail.to)) throw new AppError('invalid_input', 'A mail needs one plain address to go to.');
    const letterhead = await this.letterhead.read(trx);
    const now = this.clock.now();
    const row = await trx
      .insertInto('outbox_mail')
      .values({
        dedupe_key: mail.dedupeKey,
        recipient: mail.to,
        subject: mail.subject.replaceAll(/\p{Cc}+/gu, ' '),
        body_text: renderText(mail.content, letterhead),
        body_html: renderHtml(mail.content, letterhead),
        confidential: mail.confidential ?? false,
        message_id: `<${randomUUID()}@${new URL(this.config.baseUrl).hostname}>`,
        created_at: now,
        next_attempt_at: now,
      })
      .onConflict((conflict) => conflict.column('dedupe_key').doNothing())
      .returning('id')
      .executeTakeFirst();
    if (!row) return false;
    const attachments = (mail.attachments ?? []).map((attachment, position) => ({
      mail_id: row.id,
      position,
      file_id: attachment.fileId,
      file_name: attachment.fileName,
    }));
    if (attachments.length > 0) await trx.insertInto('outbox_mail_attachment').values(attachments).execute();
    await this.jobs.add(trx, 'send_mail', { mailId: row.id }, { jobKey: `send_mail ${row.id}` });
    return true;
  }
}
