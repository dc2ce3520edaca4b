import { hash } from '@node-rs/argon2';
import type { Kysely } from 'kysely';
import type { DB } from '@emberlot/db/database.types';
import type { Role } from '../platform/auth/signed-in-user.js';

/** Everybody's in the specs. */
export const testPassword = 'copper kettle on a green bench';

/** Made once a file, since a hash is slow on purpose. */
let testHash: Promise<string> | undefined;

let made = 0;

export interface UserRow {
  readonly id: number;
  readonly name: string;
  readonly email: string;
  readonly role: Role;
  readonly version: number;
}

/** A person who can sign in with `testPassword`; everything not said is made up. */
export async function addUser(
  handle: Kysely<DB>,
  user: { role?: Role; name?: string; email?: string; status?: string; customerId?: number } = {},
  now = new Date('2027-03-01T09:00:00Z'),
): Promise<UserRow> {
  testHash ??= hash(testPassword, { memoryCost: 19_456, timeCost: 2, parallelism: 1 });
  made += 1;
  const role = user.role ?? 'assembler';
  const row = await handle
    .insertInto('app_user')
    .values({
      email: user.email ?? `${role}-${made}@fernhollow.example`,
      name: user.name ?? `The ${role} ${made}`,
      role,
      status: user.status ?? 'active',
      password_hash: await testHash,
      email_confirmed_at: now,
      created_at: now,
      customer_id: user.customerId ?? null,
    })
    .returning(['id', 'name', 'email', 'version'])
    .executeTakeFirstOrThrow();
  return { ...row, role };
}
