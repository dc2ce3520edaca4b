import { afterAll, beforeAll, describe, expect, test } from '@jest/globals';
import { type Kysely, sql } from 'kysely';
import pg from 'pg';
import { createDatabase, createPool, databaseOver } from './database.js';
import type { DB } from './database.types.js';
import { createTestDatabase, type TestDatabase } from './testing.js';

let testDatabase: TestDatabase;
let db: Kysely<DB>;

beforeAll(async () => {
  testDatabase = await createTestDatabase('database');
  db = createDatabase(testDatabase.serverUrl);
});

afterAll(async () => {
  await db.destroy();
  await testDatabase.drop();
});

const read = async (expression: string): Promise<unknown> => {
  const { rows } = await sql<{ value: unknown }>`select ${sql.raw(expression)} as value`.execute(db);
  return rows[0]?.value;
};

describe('values arrive', () => {
  test.each([
    ['count(*) from (values (1), (2)) v', 2],
    ['9007199254740991::int8', 9007199254740991],
    ['array[1::int8, null]', [1, null]],
    ['0.10::numeric', '0.10'],
    ['array[0.10::numeric]', ['0.10']],
    [`date '2026-03-29'`, '2026-03-29'],
    [`array[date '2026-03-29']`, ['2026-03-29']],
    [`timestamptz '2026-03-29 02:30:00+02'`, new Date('2026-03-29T00:30:00Z')],
    [`'{"a": [1]}'::jsonb`, { a: [1] }],
    [`current_setting('TimeZone')`, 'UTC'],
  ])('%s', async (expression, expected) => {
    await expect(read(expression.replace(/^(count\(\*\)) (from .*)$/, '(select $1 $2)'))).resolves.toEqual(expected);
  });

  test('an integer that would lose digits is refused', async () => {
    await expect(read('9007199254740992::int8')).rejects.toThrow(RangeError);
  });
});

describe('limits', () => {
  test('a statement that runs too long is ended by the database', async () => {
    const hasty = createDatabase(testDatabase.serverUrl, { statementMilliseconds: 50 });
    await expect(sql`select pg_sleep(5)`.execute(hasty)).rejects.toMatchObject({ code: '57014' });
    await hasty.destroy();
  });

  test('a lock that is not free in time is given up', async () => {
    const hasty = createDatabase(testDatabase.serverUrl, { lockMilliseconds: 50 });
    await db.transaction().execute(async (holder) => {
      await sql`select pg_advisory_xact_lock(1)`.execute(holder);
      await expect(
        hasty.transaction().execute((waiter) => sql`select pg_advisory_xact_lock(1)`.execute(waiter)),
      ).rejects.toMatchObject({ code: '55P03' });
    });
    await hasty.destroy();
  });

  test('a transaction left idle is ended, and the process goes on', async () => {
    const reported: string[] = [];
    const hasty = createDatabase(testDatabase.serverUrl, {
      idleInTransactionMilliseconds: 50,
      onConnectionError: (error) => reported.push(error.message),
    });
    const idle = hasty.transaction().execute(async (transaction) => {
      await sql`select 1`.execute(transaction);
      await new Promise((resolve) => setTimeout(resolve, 400));
      await sql`select 1`.execute(transaction);
    });
    await expect(idle).rejects.toThrow();
    expect(reported.join()).toMatch(/idle-in-transaction/);
    await hasty.destroy();
  });
});

test('a connection cut while idle is reported and replaced', async () => {
  const reported: string[] = [];
  const pool = createPool(testDatabase.serverUrl, { onConnectionError: (error) => reported.push(error.message) });
  const other = databaseOver(pool);
  const { rows } = await sql<{ pid: number }>`select pg_backend_pid() as pid`.execute(other);
  const admin = new pg.Client({ connectionString: process.env.TEST_DATABASE_ADMIN_URL });
  await admin.connect();
  const cut = new Promise((resolve) => pool.once('error', resolve));
  await admin.query('select pg_terminate_backend($1)', [rows[0]?.pid]);
  await cut;
  await admin.end();
  expect(reported.join()).toMatch(/terminating connection/);
  await expect(sql`select 1`.execute(other)).resolves.toMatchObject({ rows: [{ '?column?': 1 }] });
  await other.destroy();
});

test('an unreachable database is a refusal in time, not a wait', async () => {
  const nowhere = createDatabase('postgres://nobody@127.0.0.1:1/none', { connectMilliseconds: 200 });
  await expect(sql`select 1`.execute(nowhere)).rejects.toThrow(/ECONNREFUSED/);
  await nowhere.destroy();
});
