import { Injectable } from '@nestjs/common';
import { type Kysely, type Transaction, sql } from 'kysely';
import type { DB } from '@emberlot/db/database.types';
import type { Role, SignedInUser } from '../platform/auth/signed-in-user.js';
import { notFound } from '../platform/errors/app-error.js';
import type { PageQuery } from '../platform/paging/page-query.dto.js';
import { containing, countOf, paged, sorted, type Page } from '../platform/paging/page.js';
import type { UserStatus } from './people.dto.js';

const columns = [
  'id',
  'email',
  'name',
  'role',
  'status',
  'password_hash',
  'customer_id',
  'created_at',
  'version',
] as const;

export interface User {
  readonly id: number;
  readonly email: string;
  readonly name: string;
  readonly role: Role;
  readonly status: UserStatus;
  readonly passwordHash: string | null;
  readonly customerId: number | null;
  readonly createdAt: Date;
  readonly version: number;
}

export interface NewUser {
  readonly email: string;
  readonly name: string;
  readonly role: Role;
  readonly status: UserStatus;
  readonly createdAt: Date;
  /** Both at once: who has a password has shown that the address is theirs. */
  readonly confirmed?: { readonly passwordHash: string; readonly at: Date };
}

const sortColumns = { name: 'name', email: 'email', role: 'role', status: 'status' };

@Injectable()
export class UsersRepository {
  /** Addresses are compared without regard to case. */
  async findByEmail(handle: Kysely<DB>, email: string): Promise<User | undefined> {
    const row = await handle
      .selectFrom('app_user')
      .select(columns)
      .where(sql`lower(email)`, '=', email.toLowerCase())
      .executeTakeFirst();
    return row && toUser(row);
  }

  async find(handle: Kysely<DB>, id: number): Promise<User | undefined> {
    const row = await handle.selectFrom('app_user').select(columns).where('id', '=', id).executeTakeFirst();
    return row && toUser(row);
  }

  /** @throws AppError `not_found` */
  async get(handle: Kysely<DB>, id: number): Promise<User> {
    const user = await this.find(handle, id);
    if (!user) throw notFound('person');
    return user;
  }

  async isEmpty(handle: Kysely<DB>): Promise<boolean> {
    const row = await handle.selectFrom('app_user').select('id').limit(1).executeTakeFirst();
    return row === undefined;
  }

  async insert(trx: Transaction<DB>, user: NewUser): Promise<User> {
    const row = await trx
      .insertInto('app_user')
      .values({
        email: user.email,
        name: user.name,
        role: user.role,
        status: user.status,
        password_hash: user.confirmed?.passwordHash ?? null,
        email_confirmed_at: user.confirmed?.at ?? null,
        created_at: user.createdAt,
      })
      .returning(columns)
      .executeTakeFirstOrThrow();
    return toUser(row);
  }

  /** Makes an account one that can be signed in to; nothing when it was closed meanwhile. */
  async activate(trx: Transaction<DB>, id: number, passwordHash: string, now: Date): Promise<User | undefined> {
    const row = await trx
      .updateTable('app_user')
      .set({
        status: 'active',
        password_hash: passwordHash,
        email_confirmed_at: sql<Date>`coalesce(email_confirmed_at, ${now})`,
        version: sql`version + 1`,
      })
      .where('id', '=', id)
      .where('status', '!=', 'disabled')
      .returning(columns)
      .executeTakeFirst();
    return row && toUser(row);
  }

  async setPasswordHash(handle: Kysely<DB>, id: number, passwordHash: string): Promise<void> {
    await handle.updateTable('app_user').set({ password_hash: passwordHash }).where('id', '=', id).execute();
  }

  async setEmail(trx: Transaction<DB>, id: number, email: string, now: Date): Promise<void> {
    await trx
      .updateTable('app_user')
      .set({ email, email_confirmed_at: now, version: sql`version + 1` })
      .where('id', '=', id)
      .execute();
  }

  /** Only over the version that was seen; false when somebody was faster. */
  async update(
    trx: Transaction<DB>,
    id: number,
    version: number,
    change: { readonly name?: string; readonly role?: Role; readonly status?: UserStatus },
  ): Promise<boolean> {
    const row = await trx
      .updateTable('app_user')
      .set({ ...change, version: sql`version + 1` })
      .where('id', '=', id)
      .where('version', '=', version)
      .returning('id')
      .executeTakeFirst();
    return row !== undefined;
  }

  /** Only for somebody who buys and belongs to no other customer yet. */
  async setCustomer(trx: Transaction<DB>, id: number, customerId: number): Promise<boolean> {
    const row = await trx
      .updateTable('app_user')
      .set({ customer_id: customerId })
      .where('id', '=', id)
      .where('role', '=', 'customer')
      .where((where) => where.or([where('customer_id', 'is', null), where('customer_id', '=', customerId)]))
      .returning('id')
      .executeTakeFirst();
    return row !== undefined;
  }

  async rename(trx: Transaction<DB>, id: number, name: string): Promise<void> {
    await trx.updateTable('app_user').set({ name }).where('id', '=', id).execute();
  }

  /** Owners who can sign in, locked in the order of their ids, so that two of them cannot remove each other at once. */
  async lockActiveOwners(trx: Transaction<DB>): Promise<readonly number[]> {
    const rows = await trx
      .selectFrom('app_user')
      .select('id')
      .where('role', '=', 'owner')
      .where('status', '=', 'active')
      .orderBy('id')
      .forUpdate()
      .execute();
    return rows.map((row) => row.id);
  }

  async findStaffPage(handle: Kysely<DB>, query: PageQuery): Promise<Page<User>> {
    let found = handle.selectFrom('app_user').where('role', '!=', 'customer');
    if (query.q) {
      const pattern = containing(query.q);
      found = found.where((where) => where.or([where('name', 'ilike', pattern), where('email', 'ilike', pattern)]));
    }
    const rows = await paged(sorted(found.select(columns), query.sort, sortColumns, 'name', 'id'), query).execute();
    return { items: rows.map(toUser), total: await countOf(found) };
  }
}

/** What a session holds of a person. */
export function toSignedInUser(user: User): SignedInUser {
  const { id, role, name, email, customerId } = user;
  return { id, role, name, email, customerId };
}

function toUser(row: {
  id: number;
  email: string;
  name: string;
  role: string;
  status: string;
  password_hash: string | null;
  customer_id: number | null;
  created_at: Date;
  version: number;
}): User {
  return {
    id: row.id,
    email: row.email,
    name: row.name,
    role: row.role as Role,
    status: row.status as UserStatus,
    passwordHash: row.password_hash,
    customerId: row.customer_id,
    createdAt: row.created_at,
    version: row.version,
  };
}
