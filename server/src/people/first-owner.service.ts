import { createHash, timingSafeEqual } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { sql } from 'kysely';
import { Audit } from '../platform/audit/audit.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Config } from '../platform/config/config.js';
import { Database } from '../platform/database/database.js';
import { Transactions } from '../platform/database/transactions.js';
import { AppError, fieldFault } from '../platform/errors/app-error.js';
import { AccountsService } from './accounts.service.js';
import { PasswordHasher } from './password-hasher.js';
import { refuseWeakPassword } from './password-rules.js';
import type { FirstOwnerDto } from './people.dto.js';
import { SignInService } from './sign-in.service.js';
import { UsersRepository, toSignedInUser } from './users.repository.js';

/** Held while the first owner is made, so that there is one. Any constant will do. */
const firstOwnerLock = 4_310_003;

/** How an empty shop gets its owner: whoever reads the code that the server printed when it started. */
@Injectable()
export class FirstOwnerService {
  constructor(
    private readonly database: Database,
    private readonly transactions: Transactions,
    private readonly users: UsersRepository,
    private readonly accounts: AccountsService,
    private readonly hasher: PasswordHasher,
    private readonly signIn: SignInService,
    private readonly audit: Audit,
    private readonly config: Config,
  ) {}

  async isNeeded(): Promise<boolean> {
    return this.users.isEmpty(this.database.handle);
  }

  /** @throws AppError `wrong_state` when there is somebody already, `invalid_input` for a wrong code or weak password */
  async make({ setupCode, name, email, password }: FirstOwnerDto, from: string): Promise<SignedInUser> {
    if (!(await this.isNeeded())) throw alreadyThere();
    if (!sameText(setupCode, this.config.setupCode)) {
      throw fieldFault('/setupCode', 'setup_code', 'This is not the code that the server printed when it started.');
    }
    refuseWeakPassword(password, { name, email }, '/password');
    const passwordHash = await this.hasher.hash(password);
    const user = await this.transactions.run(async (trx) => {
      await sql`select pg_advisory_xact_lock(${firstOwnerLock})`.execute(trx);
      if (!(await this.users.isEmpty(trx))) throw alreadyThere();
      const owner = await this.accounts.create(trx, { name, email, role: 'owner', passwordHash });
      await this.audit.record(trx, {
        actor: owner,
        action: 'user.first_owner_made',
        subjectKind: 'app_user',
        subjectId: owner.id,
        subjectCode: owner.name,
      });
      return owner;
    });
    await this.signIn.recordStart(user, from);
    return toSignedInUser(user);
  }
}

function alreadyThere(): AppError {
  return new AppError('wrong_state', 'This shop has an owner already. Sign in, or ask the owner to invite you.');
}

/** Compared by digest, so that neither length nor content shows in the time it takes. */
function sameText(one: string, other: string): boolean {
  const digest = (text: string) => createHash('sha256').update(text).digest();
  return timingSafeEqual(digest(one), digest(other));
}
