import { Injectable } from '@nestjs/common';
import type { Transaction } from 'kysely';
import type { DB } from '@emberlot/db/database.types';
import { Clock } from '../platform/clock/clock.js';
import { Config } from '../platform/config/config.js';
import { Transactions } from '../platform/database/transactions.js';
import { type JobTask, Task } from '../platform/jobs/job-task.js';
import { Outbox } from '../platform/mail/outbox.js';
import { Links } from './links.js';
import {
  accountClosedLetter,
  accountExistsLetter,
  invitationLetter,
  type Letter,
  signUpLetter,
} from './people-mails.js';
import { UsersRepository, type User } from './users.repository.js';

export interface SignUpRequest {
  readonly name: string;
  readonly email: string;
  /** Names this request, so that running the job again sends no second mail. */
  readonly request: string;
}

@Injectable()
@Task({ name: 'sign_up_requested' })
export class SignUpRequestedTask implements JobTask<SignUpRequest> {
  constructor(
    private readonly transactions: Transactions,
    private readonly users: UsersRepository,
    private readonly links: Links,
    private readonly outbox: Outbox,
    private readonly clock: Clock,
    private readonly config: Config,
  ) {}

  async run({ name, email, request }: SignUpRequest): Promise<void> {
    const dedupeKey = `sign_up ${request}`;
    await this.transactions.run(async (trx) => {
      if (await this.outbox.has(trx, dedupeKey)) return;
      const known = await this.users.findByEmail(trx, email);
      const letter = known ? await this.#letterTo(trx, known, name) : await this.#welcome(trx, name, email);
      await this.outbox.enqueue(trx, { dedupeKey, to: known?.email ?? email, confidential: true, ...letter });
    });
  }

  async #welcome(trx: Transaction<DB>, name: string, email: string): Promise<Letter> {
    const createdAt = this.clock.now();
    const user = await this.users.insert(trx, { name, email, role: 'customer', status: 'unconfirmed', createdAt });
    return signUpLetter(name, await this.links.issue(trx, user.id, 'sign_up'));
  }

  async #letterTo(trx: Transaction<DB>, known: User, name: string): Promise<Letter> {
    if (known.status === 'active') return accountExistsLetter(this.config.baseUrl);
    if (known.status === 'disabled') return accountClosedLetter();
    if (known.status === 'invited') {
      return invitationLetter(known.name, 'The shop', await this.links.issue(trx, known.id, 'invitation'));
    }
    await this.users.rename(trx, known.id, name);
    return signUpLetter(name, await this.links.issue(trx, known.id, 'sign_up'));
  }
}
