import { randomUUID } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { Transactions } from '../platform/database/transactions.js';
import { Jobs } from '../platform/jobs/jobs.js';
import { AttemptLimits } from '../platform/limits/attempt-limits.js';
import { peopleLimits } from './limits.js';

/**
 * Sign-up and forgotten passwords: what a visitor asks for with an address. Nothing is looked up while they wait, so the
 * answer and its time are the same whether or not the address is known; the mail that a job sends says what happened.
 */
@Injectable()
export class AccountRequestsService {
  constructor(
    private readonly transactions: Transactions,
    private readonly jobs: Jobs,
    private readonly limits: AttemptLimits,
  ) {}

  async askForAccount(name: string, email: string): Promise<void> {
    await this.limits.take(peopleLimits.mailToAccount, email.toLowerCase());
    await this.#queue('sign_up_requested', { name, email });
  }

  async askForPassword(email: string): Promise<void> {
    await this.limits.take(peopleLimits.mailToAccount, email.toLowerCase());
    await this.#queue('password_reset_requested', { email });
  }

  /** The request's own key makes its one mail recognisable if the job should run twice. */
  async #queue(task: string, payload: Readonly<Record<string, string>>): Promise<void> {
    const request = randomUUID();
    await this.transactions.run((trx) => this.jobs.add(trx, task, { ...payload, request }));
  }
}
