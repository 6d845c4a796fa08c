import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { startCluster } from './postgres.mjs';

/**
 * A PostgreSQL for one test run, in a temporary folder, fast because nothing of it has to outlive the run.
 * @returns {Promise<{ url: string, stop: () => Promise<void> }>} url: of its maintenance database
 */
export async function startThrowAwayCluster() {
  const dataDir = mkdtempSync(join(tmpdir(), 'tidyrun-test-'));
  const cluster = await startCluster({ dataDir, throwAway: true });
  const remove = () => {
    for (const path of [cluster.clusterDir, dataDir]) rmSync(path, { recursive: true, force: true });
  };
  const endAtOnce = () => {
    cluster.child?.kill('SIGQUIT');
    remove();
  };
  // A test runner that is interrupted exits without its teardown.
  process.on('exit', endAtOnce);
  return {
    url: cluster.urlOf('postgres'),
    async stop() {
      process.off('exit', endAtOnce);
      await cluster.stop();
      remove();
    },
  };
}
