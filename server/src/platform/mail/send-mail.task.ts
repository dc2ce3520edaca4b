import { Injectable, Logger } from '@nestjs/common';
import { Clock } from '../clock/clock.js';
import { Database } from '../database/database.js';
import { Files } from '../files/files.js';
import { type JobTask, Task } from '../jobs/job-task.js';
import { MailTransport, type MailMessage, type MailOutcome } from './mail-transport.js';
import { OutboxRepository, type ClaimedMail } from './outbox.repository.js';

/** A mail that could not leave for so many attempts (about a day) is left to a person. */
const mostAttempts = 14;

/** It waits; the queue tries again. */
class MailWaits extends Error {
  override readonly name = 'MailWaits';
}

/**
 * Sends one mail, never twice: it is claimed in the database first, and a claim whose outcome nobody learned (the
 * process died, the line broke after the mail was handed over) is not tried again until a person says so.
 */
@Injectable()
@Task({ name: 'send_mail' })
export class SendMailTask implements JobTask<{ mailId: number }> {
  readonly #logger = new Logger('Mail');

  constructor(
    private readonly database: Database,
    private readonly outbox: OutboxRepository,
    private readonly transport: MailTransport,
    private readonly files: Files,
    private readonly clock: Clock,
  ) {}

  async run({ mailId }: { mailId: number }): Promise<void> {
    const { handle } = this.database;
    const mail = await this.outbox.claim(handle, mailId, this.clock.now());
    if (!mail) return;
    const outcome = await this.transport.send(await this.#messageOf(mail));
    await this.#conclude(mail, outcome);
  }

  async #conclude(mail: ClaimedMail, outcome: MailOutcome): Promise<void> {
    const { handle } = this.database;
    switch (outcome.kind) {
      case 'sent':
        await this.outbox.markSent(handle, mail.id, this.clock.now());
        return;
      case 'uncertain':
        await this.outbox.noteUncertain(handle, mail.id, outcome.reason);
        this.#logger.warn({ event: 'mail_uncertain', mailId: mail.id, reason: outcome.reason });
        return;
      case 'refused':
        await this.outbox.giveUp(handle, mail.id, outcome.reason, this.clock.now());
        this.#logger.warn({ event: 'mail_refused', mailId: mail.id, reason: outcome.reason });
        return;
      case 'later':
        await this.#wait(mail, outcome.reason);
    }
  }

  async #wait(mail: ClaimedMail, reason: string): Promise<void> {
    const now = this.clock.now();
    if (mail.attempts >= mostAttempts) {
      await this.outbox.giveUp(this.database.handle, mail.id, reason, now);
      this.#logger.warn({ event: 'mail_given_up', mailId: mail.id, reason });
      return;
    }
    // The queue waits for e to the power of the attempts in seconds, up to e^10 (about six hours).
    const next = new Date(now.getTime() + 1_000 * Math.exp(Math.min(10, mail.attempts)));
    await this.outbox.release(this.database.handle, mail.id, reason, next);
    throw new MailWaits(reason);
  }

  async #messageOf(mail: ClaimedMail): Promise<MailMessage> {
    const attachments = await this.#attachmentsOf(mail);
    return {
      to: mail.recipient,
      subject: mail.subject,
      text: mail.body_text,
      html: mail.body_html,
      messageId: mail.message_id,
      attachments: attachments.map((attachment) => ({
        filename: attachment.file_name,
        contentType: attachment.media_type,
        content: this.files.stream(attachment.file_id),
      })),
    };
  }

  /** Nothing has left yet: a mail whose files cannot be read now goes back among those that wait. */
  async #attachmentsOf(mail: ClaimedMail) {
    try {
      return await this.outbox.attachmentsOf(this.database.handle, mail.id);
    } catch (error) {
      await this.outbox.release(this.database.handle, mail.id, String(error), this.clock.now());
      throw error;
    }
  }
}
