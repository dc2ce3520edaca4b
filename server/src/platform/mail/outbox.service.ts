import { Injectable } from '@nestjs/common';
import { Audit } from '../audit/audit.js';
import type { SignedInUser } from '../auth/signed-in-user.js';
import { Clock } from '../clock/clock.js';
import { Database } from '../database/database.js';
import { Transactions } from '../database/transactions.js';
import { AppError } from '../errors/app-error.js';
import { Jobs } from '../jobs/jobs.js';
import type { MailState, OutboxMailDto, OutboxPageDto, OutboxQuery } from './outbox.dto.js';
import { OutboxRepository, type OutboxRow } from './outbox.repository.js';

/** A mail in hand for longer than any attempt lasts: whoever held it is gone. */
const staleClaimMilliseconds = 10 * 60_000;

@Injectable()
export class OutboxService {
  constructor(
    private readonly database: Database,
    private readonly transactions: Transactions,
    private readonly outbox: OutboxRepository,
    private readonly jobs: Jobs,
    private readonly audit: Audit,
    private readonly clock: Clock,
  ) {}

  async list(query: OutboxQuery): Promise<OutboxPageDto> {
    const staleBefore = this.#staleBefore();
    const page = await this.outbox.findPage(this.database.handle, query, staleBefore);
    return { items: page.items.map((row) => toDto(row, staleBefore)), total: page.total };
  }

  async retry(id: number, actor: SignedInUser): Promise<void> {
    await this.transactions.run(async (trx) => {
      if (!(await this.outbox.reopen(trx, id, this.#staleBefore(), this.clock.now()))) {
        throw new AppError('wrong_state', 'This mail has left, or is still being tried.');
      }
      await this.jobs.add(trx, 'send_mail', { mailId: id }, { jobKey: `send_mail ${id}` });
      await this.audit.record(trx, { actor, action: 'mail.retried', subjectKind: 'outbox_mail', subjectId: id });
    });
  }

  #staleBefore(): Date {
    return new Date(this.clock.now().getTime() - staleClaimMilliseconds);
  }
}

function toDto(row: OutboxRow, staleBefore: Date): OutboxMailDto {
  return {
    id: row.id,
    to: row.recipient,
    subject: row.subject,
    createdAt: row.created_at.toISOString(),
    attempts: row.attempts,
    state: stateOf(row, staleBefore),
    sentAt: row.sent_at?.toISOString() ?? null,
    lastError: row.last_error,
  };
}

function stateOf(row: OutboxRow, staleBefore: Date): MailState {
  if (row.sent_at) return 'sent';
  if (row.given_up_at) return 'given_up';
  return row.claimed_at && row.claimed_at < staleBefore ? 'uncertain' : 'waiting';
}
