import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import { sql } from 'kysely';
import { startTestApp, type TestApp } from '../../testing/test-app.js';
import { Numbers } from '../numbers/numbers.js';
import { PrivilegeFault, appendOnlyTables, readOnlyTables, refuseRewritableLedgers } from './append-only.js';
import { Transactions } from './transactions.js';

describe('transactions', () => {
  let app: TestApp;
  let transactions: Transactions;

  beforeAll(async () => {
    app = await startTestApp();
    transactions = app.get(Transactions);
  });

  afterAll(() => app.close());

  const numbers = () => app.get(Numbers);

  const lastNumber = async (series: string) => {
    const row = await app.database.handle
      .selectFrom('number_series')
      .select('last_number')
      .where('series', '=', series)
      .executeTakeFirst();
    return row?.last_number;
  };

  it('keep what the work wrote, or nothing of it', async () => {
    await transactions.run((trx) => numbers().next(trx, 'kept', ''));
    const failing = transactions.run(async (trx) => {
      await numbers().next(trx, 'kept', '');
      await numbers().next(trx, 'lost', '');
      throw new Error('the work went wrong');
    });
    await expect(failing).rejects.toThrow('the work went wrong');
    expect([await lastNumber('kept'), await lastNumber('lost')]).toEqual([1, undefined]);
  });

  it('are tried again when two of them collide, and both take effect', async () => {
    let tries = 0;
    const addOne = () =>
      transactions.run(
        async (trx) => {
          tries += 1;
          const row = await trx
            .selectFrom('number_series')
            .select('last_number')
            .where('series', '=', 'collide')
            .executeTakeFirstOrThrow();
          await sql`select pg_sleep(0.05)`.execute(trx);
          await trx
            .updateTable('number_series')
            .set({ last_number: row.last_number + 1 })
            .where('series', '=', 'collide')
            .execute();
        },
        { isolation: 'serializable', attempts: 8 },
      );
    await transactions.run((trx) => numbers().next(trx, 'collide', ''));
    await Promise.all([addOne(), addOne(), addOne()]);
    expect(await lastNumber('collide')).toBe(4);
    expect(tries).toBeGreaterThan(3);
  });

  it('are tried a bounded number of times', async () => {
    let tries = 0;
    const hopeless = transactions.run(
      async (trx) => {
        tries += 1;
        await sql`do $$ begin raise exception 'collided' using errcode = '40001'; end $$`.execute(trx);
      },
      { attempts: 3 },
    );
    await expect(hopeless).rejects.toMatchObject({ code: '40001' });
    expect(tries).toBe(3);
  });

  it('do not begin inside another one', async () => {
    const nested = transactions.run(() => transactions.run(async () => 'inside'));
    await expect(nested).rejects.toThrow('A transaction is open already');
  });

  it('give numbers without a gap, whatever runs beside them and whatever fails', async () => {
    const given: number[] = [];
    await Promise.all(
      Array.from({ length: 30 }, async (_, turn) => {
        const work = transactions.run(async (trx) => {
          const number = await numbers().next(trx, 'invoice', '2027');
          if (turn % 3 === 0) throw new Error('this document is not made after all');
          return number;
        });
        await work.then(
          (number) => given.push(number),
          (error: unknown) => expect(String(error)).toContain('not made after all'),
        );
      }),
    );
    expect(given.toSorted((one, other) => one - other)).toEqual(Array.from({ length: 20 }, (_, index) => index + 1));
  });

  it('number each period from one', async () => {
    const first = await transactions.run((trx) => numbers().next(trx, 'invoice', '2028'));
    expect(first).toBe(1);
  });
});

describe('append-only tables', () => {
  let app: TestApp;

  beforeAll(async () => {
    app = await startTestApp();
  });

  afterAll(() => app.close());

  it('cannot be rewritten by the server’s role', async () => {
    await expect(refuseRewritableLedgers(app.database)).resolves.toBeUndefined();
    for (const table of appendOnlyTables) {
      for (const statement of [`delete from ${table}`, `truncate ${table}`]) {
        await expect(app.database.pool.query(statement)).rejects.toMatchObject({ code: '42501' });
      }
    }
    const rewriting = app.database.pool.query(`update audit_entry set action = 'nothing.happened'`);
    await expect(rewriting).rejects.toMatchObject({ code: '42501' });
  });

  it('are listed as the grants have them', async () => {
    const { rows } = await app.database.pool.query<{ name: string; added_to: boolean }>(
      `select relname as name, has_table_privilege(oid, 'insert') as added_to
       from pg_class
       where relnamespace = 'public'::regnamespace and relkind = 'r' and relname <> 'schema_migration'
         and not has_any_column_privilege(oid, 'update') and not has_table_privilege(oid, 'delete')
       order by 1`,
    );
    const named = (addedTo: boolean) => rows.filter((row) => row.added_to === addedTo).map((row) => row.name);
    expect(named(true)).toEqual(appendOnlyTables);
    expect(named(false)).toEqual(readOnlyTables);
  });

  it('keep the server from starting when they are not there or can be rewritten', async () => {
    const missing = refuseRewritableLedgers(app.database, ['audit_entry', 'no_such_table']);
    await expect(missing).rejects.toThrow(PrivilegeFault);
    const rewritable = refuseRewritableLedgers(app.database, ['audit_entry', 'outbox_mail']);
    await expect(rewritable).rejects.toThrow(/could change or delete rows of outbox_mail/);
  });
});
