/** For jest's server project: one PostgreSQL for the whole run, unless TEST_DATABASE_URL names another. */
import { startThrowAwayCluster } from '../../server/cli/lib/throw-away-cluster.mjs';

/** @type {Awaited<ReturnType<typeof startThrowAwayCluster>> | null} */
let cluster = null;

export async function startForJest() {
  if (process.env.TEST_DATABASE_URL) return;
  cluster = await startThrowAwayCluster();
  // Workers are started after this and inherit it.
  process.env.TEST_DATABASE_URL = cluster.url;
}

export async function stopForJest() {
  await cluster?.stop();
}
