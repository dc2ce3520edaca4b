import { createHash } from 'node:crypto';
import { readFile, readdir } from 'node:fs/promises';
import { existsSync } from 'node:fs';
import { runMigrations } from 'graphile-worker';
import pg from 'pg';

/** Both `src` and `dist` lie directly in the package, so the same relative path serves tests and the built code. */
const migrationsFolder = new URL('../migrations/', import.meta.url);
const grantsFile = new URL('../grants.sql', import.meta.url);

/** Any constant will do; it only has to be the same for everyone who migrates. */
const migrationLock = 4_310_001;

export interface MigrationFile {
  /** File name, which is also the order: `2026-12-01-01-platform.sql`. */
  readonly name: string;
  readonly sql: string;
  /** Lower-case hexadecimal digest of the file's bytes. */
  readonly sha256: string;
}

/** The database and the migration files disagree; the message says what to do. */
export class MigrationRefused extends Error {
  override readonly name = 'MigrationRefused';
}

/**
 * Brings a database up to date: our migrations, the job queue's own, then the grants to the server's role.
 * Safe to run from several processes at once; those that come second wait and find nothing to do.
 *
 * @param url the owner's connection (`DATABASE_MIGRATION_URL`)
 * @param report told the name of each file as it is applied
 * @returns the names of the files applied now
 * @throws MigrationRefused when a file that was already applied has changed, is missing, or a new one sorts before it
 */
export async function migrate(url: string, report: (name: string) => void = () => {}): Promise<readonly string[]> {
  const files = await readMigrations();
  const client = new pg.Client({ connectionString: url, application_name: 'emberlot-migrate' });
  client.on('error', () => {
    // The query that was running rejects with the same fault and reports it.
  });
  await client.connect();
  try {
    await client.query('select pg_advisory_lock($1)', [migrationLock]);
    const pending = pendingOf(files, await recordedMigrations(client));
    for (const file of pending) {
      await applyFile(client, file);
      report(file.name);
    }
    await migrateJobQueue(url);
    await applyGrants(client);
    return pending.map((file) => file.name);
  } finally {
    await client.end();
  }
}

/** All migration files in the order they are applied. */
export async function readMigrations(): Promise<readonly MigrationFile[]> {
  const names = (await readdir(migrationsFolder)).filter((name) => name.endsWith('.sql')).toSorted();
  return Promise.all(
    names.map(async (name) => {
      const bytes = await readFile(new URL(name, migrationsFolder));
      return { name, sql: bytes.toString('utf8'), sha256: createHash('sha256').update(bytes).digest('hex') };
    }),
  );
}

/** The grants to the server's role; run after every migration, so written to be repeatable. */
export async function readGrants(): Promise<string> {
  return existsSync(grantsFile) ? readFile(grantsFile, 'utf8') : '';
}

async function recordedMigrations(client: pg.Client): Promise<ReadonlyMap<string, string>> {
  await client.query(`
    create table if not exists public.schema_migration (
      name text primary key,
      sha256 text not null check (sha256 ~ '^[0-9a-f]{64}$'),
      applied_at timestamptz not null default clock_timestamp()
    );
    comment on table public.schema_migration is 'One row per migration file applied to this database.';
  `);
  const { rows } = await client.query<{ name: string; sha256: string }>(
    'select name, sha256 from public.schema_migration order by name',
  );
  return new Map(rows.map((row) => [row.name, row.sha256]));
}

/** Which files are still to be applied; refuses a history that the files no longer tell. */
export function pendingOf(
  files: readonly MigrationFile[],
  recorded: ReadonlyMap<string, string>,
): readonly MigrationFile[] {
  const known = new Map(files.map((file) => [file.name, file.sha256]));
  for (const [name, sha256] of recorded) {
    if (!known.has(name)) {
      throw new MigrationRefused(
        `This database already has the migration ${name}, which this version does not know. ` +
          'Run the newer version, or restore a backup made before it.',
      );
    }
    if (known.get(name) !== sha256) {
      throw new MigrationRefused(
        `The migration ${name} has changed since it was applied to this database. An applied migration is never ` +
          'edited: restore the file and write a new one (or, if the data may go, start over with npm start -- --reset).',
      );
    }
  }
  const last = [...recorded.keys()].at(-1) ?? '';
  const pending = files.filter((file) => !recorded.has(file.name));
  const early = pending.find((file) => file.name < last);
  if (early) {
    throw new MigrationRefused(
      `The migration ${early.name} sorts before ${last}, which this database already has. Give it a later name.`,
    );
  }
  return pending;
}

async function applyFile(client: pg.Client, file: MigrationFile): Promise<void> {
  await client.query('begin');
  try {
    await client.query(file.sql);
    await client.query('insert into public.schema_migration (name, sha256) values ($1, $2)', [file.name, file.sha256]);
    await client.query('commit');
  } catch (error) {
    await client.query('rollback');
    throw new Error(`The migration ${file.name} failed: ${describe(error, file.sql)}`, { cause: error });
  }
}

/** PostgreSQL's message, with the line of the file where it knows it. */
function describe(error: unknown, sql: string): string {
  if (!(error instanceof pg.DatabaseError)) return String(error);
  const line = error.position ? ` (line ${sql.slice(0, Number(error.position)).split('\n').length})` : '';
  return `${error.message}${line}${error.detail ? `. ${error.detail}` : ''}`;
}

async function migrateJobQueue(url: string): Promise<void> {
  const pool = new pg.Pool({ connectionString: url, max: 1, application_name: 'emberlot-migrate' });
  const ignore = () => {
    // The query that was running rejects with the same fault and reports it.
  };
  pool.on('error', ignore);
  pool.on('connect', (client) => client.on('error', ignore));
  try {
    await runMigrations({ pgPool: pool });
  } finally {
    await pool.end();
  }
}

async function applyGrants(client: pg.Client): Promise<void> {
  const grants = await readGrants();
  if (grants.trim() === '') return;
  await client.query('begin');
  try {
    await client.query(grants);
    await client.query('commit');
  } catch (error) {
    await client.query('rollback');
    throw new Error(`The grants (db/grants.sql) failed: ${describe(error, grants)}`, { cause: error });
  }
}
