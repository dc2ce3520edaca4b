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

/** What other modules do with accounts: making one that needs no mail to be confirmed, and saying whose orders it sees. */
@Injectable()
export class AccountsService {
  constructor(
    private readonly users: UsersRepository,
    private readonly clock: Clock,
  ) {}

  /** For the first owner, and for the people of the demo. */
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

  /**
   * Lets a person see the orders, units and invoices of a customer from now on.
   *
   * @returns whether it was done; false when they belong to another customer already, or are staff
   */
  async joinCustomer(trx: Transaction<DB>, userId: number, customerId: number): Promise<boolean> {
    return this.users.setCustomer(trx, userId, customerId);
  }
}
