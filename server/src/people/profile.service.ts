import { randomUUID } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { Audit } from '../platform/audit/audit.js';
import { sessionDigest } from '../platform/auth/session.store.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Config } from '../platform/config/config.js';
import { Database } from '../platform/database/database.js';
import { Transactions } from '../platform/database/transactions.js';
import { changedMeanwhile, fieldFault } from '../platform/errors/app-error.js';
import { AttemptLimits } from '../platform/limits/attempt-limits.js';
import { Outbox } from '../platform/mail/outbox.js';
import { peopleLimits } from './limits.js';
import { Links } from './links.js';
import { PasswordHasher } from './password-hasher.js';
import { refuseWeakPassword } from './password-rules.js';
import type { EmailChangeDto, PasswordChangeDto, ProfileDto, ProfileEditDto } from './people.dto.js';
import { accountExistsLetter, emailChangeLetter, passwordChangedLetter } from './people-mails.js';
import { SessionsRepository } from './sessions.repository.js';
import { UsersRepository, type User } from './users.repository.js';

/** What people see and change of their own account. */
@Injectable()
export class ProfileService {
  constructor(
    private readonly database: Database,
    private readonly transactions: Transactions,
    private readonly users: UsersRepository,
    private readonly sessions: SessionsRepository,
    private readonly hasher: PasswordHasher,
    private readonly limits: AttemptLimits,
    private readonly links: Links,
    private readonly outbox: Outbox,
    private readonly audit: Audit,
    private readonly config: Config,
  ) {}

  async read(user: SignedInUser): Promise<ProfileDto> {
    return toDto(await this.users.get(this.database.handle, user.id));
  }

  async edit(user: SignedInUser, { name, version }: ProfileEditDto): Promise<ProfileDto> {
    return this.transactions.run(async (trx) => {
      const before = await this.users.get(trx, user.id);
      const saved = await this.users.update(trx, user.id, version, { name });
      const after = toDto(await this.users.get(trx, user.id));
      if (!saved) throw changedMeanwhile(after);
      await this.audit.record(trx, {
        actor: user,
        action: 'user.renamed',
        subjectKind: 'app_user',
        subjectId: user.id,
        subjectCode: name,
        before: { name: before.name },
        after: { name },
      });
      return after;
    });
  }

  /** All other devices are signed out, and links to the account stop working. */
  async changePassword(
    actor: SignedInUser,
    { currentPassword, newPassword }: PasswordChangeDto,
    currentSessionId: string,
  ): Promise<void> {
    const user = await this.#confirm(actor, currentPassword);
    refuseWeakPassword(newPassword, user, '/newPassword');
    const passwordHash = await this.hasher.hash(newPassword);
    await this.transactions.run(async (trx) => {
      await this.users.setPasswordHash(trx, user.id, passwordHash);
      await this.sessions.endAll(trx, user.id, sessionDigest(currentSessionId));
      await this.links.void(trx, user.id, ['password_reset', 'email_change']);
      await this.outbox.enqueue(trx, {
        dedupeKey: `password_changed ${user.id} ${randomUUID()}`,
        to: user.email,
        ...passwordChangedLetter(this.config.baseUrl),
      });
      await this.audit.record(trx, {
        actor,
        action: 'user.password_changed',
        subjectKind: 'app_user',
        subjectId: user.id,
        subjectCode: user.name,
      });
    });
  }

  /** Sends a link to the new address; the account keeps the old one until it is opened. */
  async askForEmail(actor: SignedInUser, { currentPassword, email }: EmailChangeDto): Promise<void> {
    const user = await this.#confirm(actor, currentPassword);
    await this.limits.take(peopleLimits.mailToAccount, email.toLowerCase());
    await this.transactions.run(async (trx) => {
      const taken = await this.users.findByEmail(trx, email);
      const free = taken === undefined || taken.id === user.id;
      const letter = free
        ? emailChangeLetter(await this.links.issue(trx, user.id, 'email_change', email))
        : accountExistsLetter(this.config.baseUrl);
      const dedupeKey = `email_change ${user.id} ${randomUUID()}`;
      await this.outbox.enqueue(trx, { dedupeKey, to: email, confidential: true, ...letter });
    });
  }

  /** The password once more, before anything that would let somebody else take the account over. */
  async #confirm(actor: SignedInUser, password: string): Promise<User> {
    await this.limits.take(peopleLimits.passwordOfAccount, `user ${actor.id}`);
    const user = await this.users.get(this.database.handle, actor.id);
    if (!(await this.hasher.verify(user.passwordHash, password))) {
      throw fieldFault('/currentPassword', 'wrong_password', 'This is not your password.');
    }
    await this.limits.forget(peopleLimits.passwordOfAccount, `user ${actor.id}`);
    return user;
  }
}

function toDto({ id, name, email, role, createdAt, version }: User): ProfileDto {
  return { id, name, email, role, memberSince: createdAt.toISOString(), version };
}
