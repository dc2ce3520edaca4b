import { startThrowAwayCluster } from '../../db/scripts/cluster.mjs';

/** Before the tests of the projects that need PostgreSQL: the cluster that was given, or a throw-away one. */
export default async function setUp() {
  if (process.env.TEST_DATABASE_ADMIN_URL) return;
  const cluster = await startThrowAwayCluster((text) => process.stderr.write(`${text}\n`));
  globalThis.emberlotTestCluster = cluster;
  process.env.TEST_DATABASE_ADMIN_URL = cluster.adminUrl;
}
