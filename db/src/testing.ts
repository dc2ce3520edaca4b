import { createHash, randomBytes } from 'node:crypto';
import { createRequire } from 'node:module';
import pg from 'pg';
import { migrate, readGrants, readMigrations } from './migrate.js';
import { ownerRole, serverRole } from './roles.js';

/** A migrated, empty database of a test's own. */
export interface TestDatabase {
  readonly name: string;
  /** Connects as the server's role: what the product itself uses. */
  readonly serverUrl: string;
  /** Connects as the owner of the schema. */
  readonly ownerUrl: string;
  /** Removes the database; connections that are still open are cut. */
  drop(): Promise<void>;
}

/** Held while a template is looked for and made, so that it is made once. */
const templateLock = 4_310_002;

/**
 * Makes a database from a template that is migrated once per state of the migrations and then only copied.
 * The cluster is the one of `TEST_DATABASE_ADMIN_URL`, which the test commands set; it must be a throw-away one.
 *
 * @param prefix start of the database's name, to tell whose it is
 * @throws Error when `TEST_DATABASE_ADMIN_URL` is not set or a migration fails
 */
export async function createTestDatabase(prefix = 'test'): Promise<TestDatabase> {
  const adminUrl = process.env.TEST_DATABASE_ADMIN_URL;
  if (!adminUrl) throw new Error('TEST_DATABASE_ADMIN_URL is not set: run the tests with npm run test:unit.');
  const name = `${prefix}_${randomBytes(6).toString('hex')}`;
  await withAdmin(adminUrl, async (admin) => {
    const template = await ensureTemplate(admin, adminUrl);
    await admin.query(`create database ${name} template ${template} owner ${ownerRole}`);
  });
  return {
    name,
    serverUrl: urlFor(adminUrl, serverRole, name),
    ownerUrl: urlFor(adminUrl, ownerRole, name),
    drop: () =>
      withAdmin(adminUrl, async (admin) => {
        await admin.query(`drop database if exists ${name} with (force)`);
      }),
  };
}

/** The template's name; made under a lock when this state of the migrations has none yet. */
async function ensureTemplate(admin: pg.Client, adminUrl: string): Promise<string> {
  const template = `emberlot_template_${await schemaFingerprint()}`;
  if (await databaseExists(admin, template)) return template;
  await admin.query('select pg_advisory_lock($1)', [templateLock]);
  try {
    if (!(await databaseExists(admin, template))) await makeTemplate(admin, adminUrl, template);
  } finally {
    await admin.query('select pg_advisory_unlock($1)', [templateLock]);
  }
  return template;
}

/** Built under another name and renamed when whole, so that a run that dies half-way leaves no broken template. */
async function makeTemplate(admin: pg.Client, adminUrl: string, template: string): Promise<void> {
  const draft = `${template}_draft`;
  await ensureRoles(admin);
  await admin.query(`drop database if exists ${draft} with (force)`);
  await admin.query(`create database ${draft} owner ${ownerRole} template template0 encoding 'UTF8'`);
  await migrate(urlFor(adminUrl, ownerRole, draft));
  await admin.query(`alter database ${draft} with allow_connections false`);
  await admin.query('select pg_terminate_backend(pid) from pg_stat_activity where datname = $1', [draft]);
  await admin.query(`alter database ${draft} rename to ${template}`);
}

async function ensureRoles(admin: pg.Client): Promise<void> {
  for (const role of [ownerRole, serverRole]) {
    const { rowCount } = await admin.query('select 1 from pg_roles where rolname = $1', [role]);
    if (rowCount === 0) await admin.query(`create role ${role} login`);
  }
}

async function databaseExists(admin: pg.Client, name: string): Promise<boolean> {
  const { rowCount } = await admin.query('select 1 from pg_database where datname = $1', [name]);
  return rowCount === 1;
}

async function schemaFingerprint(): Promise<string> {
  const require = createRequire(import.meta.url);
  const jobQueue = require('graphile-worker/package.json') as { version: string };
  const hash = createHash('sha256').update(jobQueue.version);
  for (const file of await readMigrations()) hash.update(`\n${file.name} ${file.sha256}`);
  return hash
    .update(await readGrants())
    .digest('hex')
    .slice(0, 16);
}

async function withAdmin<Result>(url: string, use: (admin: pg.Client) => Promise<Result>): Promise<Result> {
  const admin = new pg.Client({ connectionString: url, application_name: 'emberlot-test' });
  admin.on('error', () => {
    // The query that was running rejects with the same fault and reports it.
  });
  await admin.connect();
  try {
    return await use(admin);
  } finally {
    await admin.end();
  }
}

function urlFor(adminUrl: string, user: string, database: string): string {
  const url = new URL(adminUrl);
  url.username = user;
  url.password = '';
  url.pathname = `/${database}`;
  return url.href;
}
