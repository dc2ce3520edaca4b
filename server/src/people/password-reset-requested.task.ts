import { Injectable } from '@nestjs/common';
import type { Transaction } from 'kysely';
import type { DB } from '@emberlot/db/database.types';
import { Config } from '../platform/config/config.js';
import { Transactions } from '../platform/database/transactions.js';
import { type JobTask, Task } from '../platform/jobs/job-task.js';
import { Outbox } from '../platform/mail/outbox.js';
import { Links } from './links.js';
import {
  accountClosedLetter,
  invitationLetter,
  type Letter,
  noAccountLetter,
  passwordResetLetter,
  signUpLetter,
} from './people-mails.js';
import { UsersRepository, type User } from './users.repository.js';

export interface PasswordResetRequest {
  readonly email: string;
  /** Names this request, so that running the job again sends no second mail. */
  readonly request: string;
}

@Injectable()
@Task({ name: 'password_reset_requested' })
export class PasswordResetRequestedTask implements JobTask<PasswordResetRequest> {
  constructor(
    private readonly transactions: Transactions,
    private readonly users: UsersRepository,
    private readonly links: Links,
    private readonly outbox: Outbox,
    private readonly config: Config,
  ) {}

  async run({ email, request }: PasswordResetRequest): Promise<void> {
    const dedupeKey = `password_reset ${request}`;
    await this.transactions.run(async (trx) => {
      if (await this.outbox.has(trx, dedupeKey)) return;
      const known = await this.users.findByEmail(trx, email);
      const letter = known ? await this.#letterTo(trx, known) : noAccountLetter(this.config.baseUrl);
      await this.outbox.enqueue(trx, { dedupeKey, to: known?.email ?? email, confidential: true, ...letter });
    });
  }

  /** Who has not chosen a password yet gets the link they should have used. */
  async #letterTo(trx: Transaction<DB>, known: User): Promise<Letter> {
    if (known.status === 'disabled') return accountClosedLetter();
    if (known.status === 'active') return passwordResetLetter(await this.links.issue(trx, known.id, 'password_reset'));
    if (known.status === 'unconfirmed') {
      return signUpLetter(known.name, await this.links.issue(trx, known.id, 'sign_up'));
    }
    return invitationLetter(known.name, 'The shop', await this.links.issue(trx, known.id, 'invitation'));
  }
}
