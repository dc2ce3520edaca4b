// The database that npm start, npm run dev and npm run doctor work on: this checkout's own, or the one of DATABASE_URL.
import { createRequire } from 'node:module';
import { join } from 'node:path';
import { pathToFileURL } from 'node:url';
import { openLastingCluster } from '../../db/scripts/lasting-cluster.mjs';
import { root } from './root.mjs';

const name = 'emberlot';
/** Filled under this name and renamed when whole, so that an interrupted first start begins anew. */
const draftName = 'emberlot_draft';

const isEmptyQuestion = "select case when exists (select from app_user) then 'no' else 'yes' end as answer";

/** @param {string} email of somebody the demo brings */
const hasPersonQuestion = (email) =>
  `select case when exists (select from app_user where email = '${email.replaceAll("'", "''")}') then 'yes' else 'no' end as answer`;

async function migrate(ownerUrl) {
  const runner = await import(pathToFileURL(join(root, 'db/dist/migrate.js')).href);
  return runner.migrate(ownerUrl);
}

/** @param {{ report: (text: string) => void, guard: import('../../db/scripts/guard.mjs').Guard }} options */
export async function openDatabase({ report, guard }) {
  return process.env.DATABASE_URL ? givenDatabase(process.env.DATABASE_URL) : ownDatabase({ report, guard });
}

function givenDatabase(serverUrl) {
  const ownerUrl = process.env.DATABASE_MIGRATION_URL;
  if (!ownerUrl)
    throw new Error(
      'With DATABASE_URL set, DATABASE_MIGRATION_URL must be set too: the connection of the owner of the schema.',
    );
  return {
    description: 'the server of DATABASE_URL',
    serverUrl,
    reset: () => {
      throw new Error('--reset works on the private cluster only; DATABASE_URL names a server of your own.');
    },
    async prepare(fill) {
      const applied = await migrate(ownerUrl);
      if (fill && (await askAt(ownerUrl, isEmptyQuestion))) await fill(serverUrl);
      return applied.length;
    },
    isEmpty: () => askAt(ownerUrl, isEmptyQuestion),
    hasPerson: (email) => askAt(ownerUrl, hasPersonQuestion(email)),
  };
}

async function askAt(ownerUrl, question) {
  const pg = createRequire(join(root, 'db/package.json'))('pg');
  const client = new pg.Client({ connectionString: ownerUrl });
  await client.connect();
  try {
    return (await client.query(question)).rows[0].answer === 'yes';
  } finally {
    await client.end();
  }
}

async function ownDatabase({ report, guard }) {
  const cluster = await openLastingCluster({ root, report });
  if (cluster.started) guard.entrust({ cluster: cluster.settings });
  const exists = () => cluster.sql(`select 1 from pg_database where datname = '${name}'`) === '1';
  const drop = (database) => cluster.sql(`drop database if exists ${database} with (force)`);
  const create = (database) =>
    cluster.sql(`create database ${database} owner emberlot_owner template template0 encoding 'UTF8'`);
  const ask = async (question) => cluster.sql(question, name) === 'yes';
  const fillAnew = async (fill) => {
    drop(draftName);
    create(draftName);
    const applied = await migrate(cluster.ownerUrl(draftName));
    await fill(cluster.serverUrl(draftName));
    drop(name);
    cluster.sql(`alter database ${draftName} rename to ${name}`);
    return applied.length;
  };
  return {
    description: `private, in ${cluster.folder}`,
    serverUrl: cluster.serverUrl(name),
    reset: () => drop(name),
    async prepare(fill) {
      if (fill && !exists()) return fillAnew(fill);
      if (!exists()) create(name);
      const applied = await migrate(cluster.ownerUrl(name));
      return fill && (await ask(isEmptyQuestion)) ? fillAnew(fill) : applied.length;
    },
    isEmpty: () => ask(isEmptyQuestion),
    hasPerson: (email) => ask(hasPersonQuestion(email)),
  };
}
