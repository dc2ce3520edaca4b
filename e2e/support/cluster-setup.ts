import { startThrowAwayCluster } from '../../db/scripts/cluster.mjs';

/** Before the browser tests: the cluster that was given, or a throw-away one that goes with the answered function. */
export default async function setUp(): Promise<() => Promise<void>> {
  if (process.env.TEST_DATABASE_ADMIN_URL) return () => Promise.resolve();
  const cluster = await startThrowAwayCluster((text) => process.stderr.write(`${text}\n`));
  process.env.TEST_DATABASE_ADMIN_URL = cluster.adminUrl;
  return cluster.stop;
}
