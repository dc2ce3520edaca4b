import { startThrowAwayCluster } from './cluster.mjs';

/**
 * Runs something against a cluster that may be filled and emptied at will: the one of TEST_DATABASE_ADMIN_URL if that
 * is set, else a throw-away one that is gone afterwards.
 * @template Result
 * @param {(adminUrl: string) => Promise<Result>} use
 * @returns {Promise<Result>}
 */
export async function withCluster(use) {
  const given = process.env.TEST_DATABASE_ADMIN_URL;
  if (given) return use(given);
  const cluster = await startThrowAwayCluster();
  try {
    return await use(cluster.adminUrl);
  } finally {
    await cluster.stop();
  }
}
