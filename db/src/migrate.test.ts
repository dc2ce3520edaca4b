import { afterAll, beforeAll, describe, expect, test } from '@jest/globals';
import pg from 'pg';
import { MigrationRefused, type MigrationFile, migrate, pendingOf, readMigrations } from './migrate.js';
import { createTestDatabase, type TestDatabase } from './testing.js';

const file = (name: string, sha256 = 'a'): MigrationFile => ({ name, sql: '', sha256 });

describe('which migrations are still to be applied', () => {
  test('those without a record, in order', () => {
    const files = [file('01.sql'), file('02.sql'), file('03.sql')];
    expect(pendingOf(files, new Map([['01.sql', 'a']])).map((each) => each.name)).toEqual(['02.sql', '03.sql']);
  });

  test('a changed file is refused by name', () => {
    const refused = () => pendingOf([file('01.sql', 'b')], new Map([['01.sql', 'a']]));
    expect(refused).toThrow(MigrationRefused);
    expect(refused).toThrow(/01\.sql has changed/);
  });

  test('a database of a newer version is refused', () => {
    expect(() => pendingOf([file('01.sql')], new Map([['02.sql', 'a']]))).toThrow(/02\.sql, which this version/);
  });

  test('a new file that sorts before an applied one is refused', () => {
    const refused = () => pendingOf([file('01.sql'), file('02.sql')], new Map([['02.sql', 'a']]));
    expect(refused).toThrow(/01\.sql sorts before 02\.sql/);
  });
});

describe('a migrated database', () => {
  let database: TestDatabase;
  let owner: pg.Client;

  beforeAll(async () => {
    database = await createTestDatabase('migrate');
    owner = new pg.Client({ connectionString: database.ownerUrl });
    await owner.connect();
  });

  afterAll(async () => {
    await owner.end();
    await database.drop();
  });

  test('has a record of every file', async () => {
    const { rows } = await owner.query<{ name: string }>('select name from schema_migration order by name');
    expect(rows.map((row) => row.name)).toEqual((await readMigrations()).map((each) => each.name));
  });

  test('has the job queue', async () => {
    const { rows } = await owner.query<{ found: string | null }>(`select to_regclass('graphile_worker.jobs') as found`);
    expect(rows[0]?.found).toBe('graphile_worker.jobs');
  });

  test('is left as it is by migrating again, also by two at once', async () => {
    await expect(Promise.all([migrate(database.ownerUrl), migrate(database.ownerUrl)])).resolves.toEqual([[], []]);
  });

  test('is refused when an applied file was edited', async () => {
    const edited = 'f'.repeat(64);
    const { rows } = await owner.query<{ name: string; sha256: string }>(
      'select name, sha256 from schema_migration order by name limit 1',
    );
    const first = rows[0];
    if (!first) throw new Error('There is no migration to try this with');
    await owner.query('update schema_migration set sha256 = $1 where name = $2', [edited, first.name]);
    await expect(migrate(database.ownerUrl)).rejects.toThrow(/has changed since it was applied/);
    await owner.query('update schema_migration set sha256 = $1 where name = $2', [first.sha256, first.name]);
  });
});
