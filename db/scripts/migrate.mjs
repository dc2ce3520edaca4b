// Brings the database of DATABASE_MIGRATION_URL up to date; for a shop of its own, before each new version starts.
// Needs the build.
import { migrate } from '../dist/migrate.js';

const url = process.env.DATABASE_MIGRATION_URL;
try {
  if (!url) throw new Error('DATABASE_MIGRATION_URL is not set: the connection of the owner of the schema.');
  const applied = await migrate(url, (name) => console.log(`applied ${name}`));
  console.log(applied.length === 0 ? 'The database is up to date.' : `${applied.length} migrations applied.`);
} catch (error) {
  console.error(error instanceof Error ? error.message : error);
  process.exitCode = 1;
}
