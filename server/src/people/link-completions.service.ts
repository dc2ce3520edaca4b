import { Injectable } from '@nestjs/common';
import type { Transaction } from 'kysely';
import type { DB } from '@emberlot/db/database.types';
import { Audit } from '../platform/audit/audit.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Clock } from '../platform/clock/clock.js';
import { Config } from '../platform/config/config.js';
import { Transactions } from '../platform/database/transactions.js';
import { AppError } from '../platform/errors/app-error.js';
import { AttemptLimits } from '../platform/limits/attempt-limits.js';
import { Outbox } from '../platform/mail/outbox.js';
import { peopleLimits } from './limits.js';
import { Links, type LinkPurpose } from './links.js';
import { PasswordHasher } from './password-hasher.js';
import { refuseWeakPassword } from './password-rules.js';
import { emailChangedLetter, passwordChangedLetter } from './people-mails.js';
import { SessionsRepository } from './sessions.repository.js';
import { SignInService } from './sign-in.service.js';
import { UsersRepository, toSignedInUser, type User } from './users.repository.js';

/** What happens when somebody opens a link from a mail. */
@Injectable()
export class LinkCompletionsService {
  constructor(
    private readonly transactions: Transactions,
    private readonly links: Links,
    private readonly users: UsersRepository,
    private readonly sessions: SessionsRepository,
    private readonly hasher: PasswordHasher,
    private readonly signIn: SignInService,
    private readonly limits: AttemptLimits,
    private readonly outbox: Outbox,
    private readonly audit: Audit,
    private readonly clock: Clock,
    private readonly config: Config,
  ) {}

  /**
   * Sets the password of whoever the link was sent to, and lets them in.
   *
   * @throws AppError `link_expired`; `invalid_input` for a weak password, which leaves the link usable
   */
  async choosePassword(
    purpose: Exclude<LinkPurpose, 'email_change'>,
    token: string,
    password: string,
    from: string,
  ): Promise<SignedInUser> {
    // Hashed before the transaction, which must not wait for the queue of hashes while it holds rows.
    const passwordHash = await this.hasher.hash(password);
    const user = await this.transactions.run(async (trx) => {
      const { userId } = await this.links.use(trx, token, purpose);
      const found = await this.users.get(trx, userId);
      refuseWeakPassword(password, found, '/password');
      const active = await this.users.activate(trx, userId, passwordHash, this.clock.now());
      if (!active) throw new AppError('link_expired', 'This account is closed. Write to the shop to open it.');
      await this.links.void(trx, userId, ['sign_up', 'invitation', 'password_reset']);
      await this.sessions.endAll(trx, userId);
      if (purpose === 'password_reset') await this.#tellOfNewPassword(trx, active);
      await this.audit.record(trx, {
        actor: active,
        action: `user.${purpose}_completed`,
        subjectKind: 'app_user',
        subjectId: userId,
        subjectCode: active.name,
      });
      return active;
    });
    // Whoever opens the mail is the person: guesses of others no longer stand in their way.
    await this.limits.forget(peopleLimits.signInToAccount, user.email.toLowerCase());
    await this.signIn.recordStart(user, from);
    return toSignedInUser(user);
  }

  /** @throws AppError `link_expired`; `already_exists` when somebody else took the address meanwhile */
  async confirmNewEmail(token: string): Promise<void> {
    await this.transactions.run(async (trx) => {
      const { userId, newEmail } = await this.links.use(trx, token, 'email_change');
      if (newEmail === null) throw new Error('A link for a new address carries none.');
      const user = await this.users.get(trx, userId);
      await this.users.setEmail(trx, userId, newEmail, this.clock.now());
      // A reset link in the old mailbox must not open the account any more.
      await this.links.void(trx, userId, ['password_reset']);
      await this.outbox.enqueue(trx, {
        dedupeKey: `email_changed ${userId} ${user.version}`,
        to: user.email,
        ...emailChangedLetter(),
      });
      await this.audit.record(trx, {
        actor: user,
        action: 'user.email_changed',
        subjectKind: 'app_user',
        subjectId: userId,
        subjectCode: user.name,
        before: { email: user.email },
        after: { email: newEmail },
      });
    });
  }

  async #tellOfNewPassword(trx: Transaction<DB>, user: User): Promise<void> {
    await this.outbox.enqueue(trx, {
      dedupeKey: `password_reset_done ${user.id} ${user.version}`,
      to: user.email,
      ...passwordChangedLetter(this.config.baseUrl),
    });
  }
}
