import { Injectable } from '@nestjs/common';
import { Database } from '../database/database.js';
import type { Role, SignedInUser } from './signed-in-user.js';

/** Reads the person behind a session. Who may become one is the business of `people`. */
@Injectable()
export class UsersReader {
  constructor(private readonly database: Database) {}

  /** Nothing when there is no such person, or they may no longer sign in. */
  async findActive(id: number): Promise<SignedInUser | undefined> {
    const row = await this.database.handle
      .selectFrom('app_user')
      .select(['id', 'role', 'name', 'email', 'customer_id'])
      .where('id', '=', id)
      .where('status', '=', 'active')
      .executeTakeFirst();
    return row && { id: row.id, role: row.role as Role, name: row.name, email: row.email, customerId: row.customer_id };
  }
}
