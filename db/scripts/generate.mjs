// Writes what follows from the migrations: schema.sql for people, database.types.ts for the compiler.
//   node db/scripts/generate.mjs            writes both files
//   node db/scripts/generate.mjs --check    fails when they differ from what the migrations make
import { spawnSync } from 'node:child_process';
import { randomBytes } from 'node:crypto';
import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import { join, resolve } from 'node:path';
import { fileURLToPath, pathToFileURL } from 'node:url';
import { findBinaries } from './cluster-binaries.mjs';
import { withCluster } from './with-cluster.mjs';

const root = resolve(fileURLToPath(import.meta.url), '../../..');
const require = createRequire(import.meta.url);
const outputs = { schema: join(root, 'db/schema.sql'), types: join(root, 'db/src/database.types.ts') };
const check = process.argv.includes('--check');

/** The migration runner is TypeScript; it does not need the types that are generated here, so their faults may wait. */
function buildMigrationRunner() {
  const tsc = join(root, 'node_modules/typescript/bin/tsc');
  const run = spawnSync(process.execPath, [tsc, '-b', 'db'], { cwd: root, encoding: 'utf8' });
  if (!existsSync(join(root, 'db/dist/migrate.js'))) throw new Error(`db does not compile:\n${run.stdout}`);
}

async function inScratchDatabase(adminUrl, use) {
  const pg = require('pg');
  const name = `generate_${randomBytes(6).toString('hex')}`;
  const admin = new pg.Client({ connectionString: adminUrl });
  await admin.connect();
  try {
    await admin.query(`create database ${name} owner emberlot_owner template template0 encoding 'UTF8'`);
    const url = (user) => Object.assign(new URL(adminUrl), { username: user, pathname: `/${name}` }).href;
    return await use({ ownerUrl: url('emberlot_owner'), adminUrl: url(new URL(adminUrl).username) });
  } finally {
    await admin.query(`drop database if exists ${name} with (force)`);
    await admin.end();
  }
}

async function missingComments(db, sql) {
  const { rows } = await sql`
    select c.relname as name from pg_class c
    where c.relnamespace = 'public'::regnamespace and c.relkind in ('r', 'p') and not c.relispartition
      and obj_description(c.oid, 'pg_class') is null
    order by 1`.execute(db);
  return rows.map((row) => row.name);
}

async function extensionLines(db, sql) {
  const { rows } = await sql`select extname from pg_extension where extname <> 'plpgsql' order by 1`.execute(db);
  return rows.map((row) => `CREATE EXTENSION ${row.extname};`);
}

/** pg_dump's text without versions, session settings and headings, which differ from machine to machine. */
function normalise(dump, extensions) {
  const noise =
    /^(--|SET |SELECT pg_catalog\.set_config|\\restrict|\\unrestrict|CREATE SCHEMA public;|COMMENT ON SCHEMA public)/;
  const body = dump.split('\n').filter((line) => !noise.test(line));
  const head = ['-- Generated from db/migrations by npm run db:generate; do not edit.', '', ...extensions, ''];
  return `${[...head, ...body]
    .join('\n')
    .replaceAll(/\n{3,}/g, '\n\n')
    .trim()}\n`;
}

function dumpSchema(binaries, url) {
  const args = ['--schema-only', '--schema=public', '--no-owner', `--dbname=${url}`];
  const run = spawnSync(join(binaries, 'pg_dump'), args, { encoding: 'utf8', maxBuffer: 1 << 28 });
  if (run.status !== 0) throw new Error(`pg_dump failed:\n${run.stderr}`);
  return run.stdout;
}

async function generateTypes(db) {
  const codegen = require('kysely-codegen');
  const dialect = new codegen.PostgresDialect({ dateParser: 'string', numericParser: 'string' });
  // What db/src/type-parsers.ts delivers. Decimals are strings in both directions, so that no binary float gets in.
  dialect.adapter.scalars.int8 = new codegen.IdentifierNode('number');
  dialect.adapter.scalars.numeric = new codegen.IdentifierNode('string');
  return codegen.generate({
    db,
    dialect,
    defaultSchemas: ['public'],
    includePattern: 'public.!(schema_migration)',
    logger: new codegen.Logger('error'),
    outFile: null,
    typeOnlyImports: true,
  });
}

async function generate(adminUrl) {
  const { migrate } = await import(pathToFileURL(join(root, 'db/dist/migrate.js')).href);
  const { Kysely, PostgresDialect, sql } = require('kysely');
  const pg = require('pg');
  return inScratchDatabase(adminUrl, async (urls) => {
    await migrate(urls.ownerUrl);
    const pool = new pg.Pool({ connectionString: urls.adminUrl, max: 1 });
    // The pool counts as closed a moment before its connections are; dropping the database cuts those.
    pool.on('error', () => {});
    const db = new Kysely({ dialect: new PostgresDialect({ pool }) });
    try {
      const bare = await missingComments(db, sql);
      if (bare.length > 0) throw new Error(`These tables have no comment that says what a row is: ${bare.join(', ')}`);
      const schema = normalise(dumpSchema(findBinaries(), urls.adminUrl), await extensionLines(db, sql));
      return { schema, types: await generateTypes(db) };
    } finally {
      await db.destroy();
    }
  });
}

function compare(made) {
  const stale = Object.keys(outputs).filter(
    (key) => !existsSync(outputs[key]) || readFileSync(outputs[key], 'utf8') !== made[key],
  );
  for (const key of stale) console.error(`${outputs[key]} is not what the migrations make: npm run db:generate`);
  return stale.length === 0;
}

try {
  buildMigrationRunner();
  const made = await withCluster(generate);
  if (check) process.exitCode = compare(made) ? 0 : 1;
  else for (const key of Object.keys(outputs)) writeFileSync(outputs[key], made[key]);
} catch (error) {
  console.error(error instanceof Error ? error.message : error);
  process.exitCode = 1;
}
