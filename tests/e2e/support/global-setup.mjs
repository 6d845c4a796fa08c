import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { countSteps } from '../../../server/cli/lib/console.mjs';
import { createProduct, productSteps } from '../../../server/cli/lib/product.mjs';

// What would lead the tests to a real database, provider or address.
const real = new Set(['DATABASE_URL', 'SMTP_URL', 'STRIPE_SECRET_KEY', 'STRIPE_WEBHOOK_SECRET', 'PUBLIC_URL', 'STORAGE_DIR', 'DEMO', 'NODE_ENV']);

/** Starts the whole product as `npm start` does, on free ports, with a fresh database and the demo; gives what ends it. */
export default async function startProduct() {
  const dataDir = mkdtempSync(join(tmpdir(), 'tidyrun-e2e-'));
  const env = Object.fromEntries(Object.entries(process.env).filter(([name]) => !real.has(name)));
  // All the tests' visitors come from one address.
  const product = createProduct({ dataDir, throwAway: true, env: { ...env, NODE_ENV: 'production', RATE_LIMIT_FACTOR: '1000' } });
  const stop = async () => {
    await product.stop();
    rmSync(dataDir, { recursive: true, force: true });
  };
  // Ended from outside, the runner leaves without its teardown.
  process.once('SIGTERM', () => void stop().finally(() => process.exit(143)));
  try {
    const started = await Promise.race([product.start(countSteps(productSteps)), product.failed]);
    Object.assign(process.env, {
      E2E_SITE_URL: started.siteUrl,
      E2E_MAIL_URL: started.mailUrl,
      E2E_PAYMENTS_URL: started.paymentsUrl,
      E2E_DATABASE_URL: started.databaseUrl,
      E2E_SIGN_INS: JSON.stringify(started.signIns),
    });
    return stop;
  } catch (error) {
    await stop();
    throw error;
  }
}
