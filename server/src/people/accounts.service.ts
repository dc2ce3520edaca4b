import { Injectable } from '@nestjs/common';
import type { Transaction } from 'kysely';
import type { DB } from '@emberlot/db/database.types';
import type { Role } from '../platform/auth/signed-in-user.js';
import { Clock } from '../platform/clock/clock.js';
import { UsersRepository, type User } from './users.repository.js';

export interface NewAccount {
  readonly name: string;
  readonly email: string;
  readonly role: Role;
  readonly passwordHash: string;
}

/** Accounts that need no mail to be confirmed: the first owner's, and those of the demo. */
@Injectable()
export class AccountsService {
  constructor(
    private readonly users: UsersRepository,
    private readonly clock: Clock,
  ) {}

  async create(trx: Transaction<DB>, { name, email, role, passwordHash }: NewAccount): Promise<User> {
    const now = this.clock.now();
    return this.users.insert(trx, {
      name,
      email,
      role,
      status: 'active',
      createdAt: now,
      confirmed: { passwordHash, at: now },
    });
  }
}
