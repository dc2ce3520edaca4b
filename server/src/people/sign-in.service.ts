import { Injectable } from '@nestjs/common';
import { Audit } from '../platform/audit/audit.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Clock } from '../platform/clock/clock.js';
import { Database } from '../platform/database/database.js';
import { Transactions } from '../platform/database/transactions.js';
import { AppError } from '../platform/errors/app-error.js';
import { AttemptLimits } from '../platform/limits/attempt-limits.js';
import { KnownAddressesRepository } from './known-addresses.repository.js';
import { peopleLimits } from './limits.js';
import { PasswordHasher } from './password-hasher.js';
import { UsersRepository, toSignedInUser, type User } from './users.repository.js';

/** An address counts as known for so long after the last sign-in from it. */
const knownAddressDays = 90;

/** Stands for nobody where the same queries are made as for somebody. */
const nobody = 0;

@Injectable()
export class SignInService {
  constructor(
    private readonly database: Database,
    private readonly transactions: Transactions,
    private readonly users: UsersRepository,
    private readonly knownAddresses: KnownAddressesRepository,
    private readonly hasher: PasswordHasher,
    private readonly limits: AttemptLimits,
    private readonly audit: Audit,
    private readonly clock: Clock,
  ) {}

  /**
   * Checks address and password. Unknown address, wrong password and closed account get the same answer after the same
   * work, so that nobody learns who has an account here.
   *
   * @param from the network address of the request
   * @throws AppError `wrong_credentials` or `too_many_tries`
   */
  async signIn(email: string, password: string, from: string): Promise<SignedInUser> {
    await this.limits.take(peopleLimits.signInFromAddress, from);
    const user = await this.users.findByEmail(this.database.handle, email);
    await this.#takeAccountAttempt(user, email, from);
    const right = await this.hasher.verify(user?.passwordHash, password);
    if (!user || !right || user.status !== 'active') {
      await this.#recordRefusal(user);
      throw new AppError('wrong_credentials', 'This address and password do not belong together.');
    }
    if (user.passwordHash !== null && this.hasher.isOutdated(user.passwordHash)) {
      await this.users.setPasswordHash(this.database.handle, user.id, await this.hasher.hash(password));
    }
    await this.#forgetAttempts(email, from);
    await this.recordStart(user, from);
    return toSignedInUser(user);
  }

  /** What is kept of every beginning of a session, however somebody came in. */
  async recordStart(user: Pick<User, 'id' | 'name' | 'role'>, from: string): Promise<void> {
    await this.transactions.run(async (trx) => {
      await this.knownAddresses.remember(trx, user.id, from, this.clock.now());
      await this.audit.record(trx, {
        actor: user,
        action: 'session.started',
        subjectKind: 'app_user',
        subjectId: user.id,
        subjectCode: user.name,
      });
    });
  }

  async #takeAccountAttempt(user: User | undefined, email: string, from: string): Promise<void> {
    const since = new Date(this.clock.now().getTime() - knownAddressDays * 24 * 60 * 60 * 1_000);
    const known = await this.knownAddresses.has(this.database.handle, user?.id ?? nobody, from, since);
    const account = email.toLowerCase();
    if (known) await this.limits.take(peopleLimits.signInFromKnownAddress, `${account} ${from}`);
    else await this.limits.take(peopleLimits.signInToAccount, account);
  }

  async #forgetAttempts(email: string, from: string): Promise<void> {
    const account = email.toLowerCase();
    await this.limits.forget(peopleLimits.signInToAccount, account);
    await this.limits.forget(peopleLimits.signInFromKnownAddress, `${account} ${from}`);
  }

  async #recordRefusal(user: User | undefined): Promise<void> {
    await this.transactions.run((trx) =>
      this.audit.record(trx, {
        actor: null,
        action: 'session.refused',
        subjectKind: 'app_user',
        subjectId: user?.id ?? null,
        subjectCode: user?.name ?? null,
      }),
    );
  }
}
