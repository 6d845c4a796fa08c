import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { chromium, type Browser } from 'playwright-core';
import { chromiumFlags, chromiumPath } from '../lib/chromium-launch.cjs';
import { ensureChromium } from '../lib/chromium.mjs';
import { countSteps, failWith } from '../lib/console.mjs';
import { createProduct, productSteps } from '../lib/product.mjs';

export type Product = Awaited<ReturnType<ReturnType<typeof createProduct>['start']>>;

/** Starts the whole product with fresh demo data and a browser, lets them be measured, and ends both. */
export async function measure(work: (product: Product, browser: Browser) => Promise<void>): Promise<void> {
  const dataDir = mkdtempSync(join(tmpdir(), 'tidyrun-measure-'));
  const product = createProduct({ dataDir, env: { ...process.env, RATE_LIMIT_FACTOR: '1000' } });
  const end = (): void => {
    process.exitCode = 130;
    void product.stop().then(() => process.exit());
  };
  process.once('SIGINT', end).once('SIGTERM', end);
  try {
    await ensureChromium();
    const started = await Promise.race([product.start(countSteps(productSteps)), product.failed]);
    const browser = await chromium.launch({ executablePath: chromiumPath, args: [...chromiumFlags] });
    try {
      await Promise.race([work(started, browser), product.failed]);
    } finally {
      await browser.close();
    }
  } catch (error) {
    failWith(error);
  } finally {
    await product.stop();
    rmSync(dataDir, { recursive: true, force: true });
  }
}

/** Signs a browser context in at the desk with a demo account, so that its pages can be opened. */
export async function signInAtDesk(context: Awaited<ReturnType<Browser['newContext']>>, { siteUrl, signIns }: Product): Promise<void> {
  const [account] = signIns;
  if (account === undefined) throw new Error('The demo has no sign-ins.');
  const { email, password } = account;
  const response = await context.request.post(`${siteUrl}/api/session`, { data: { email, password }, headers: { origin: siteUrl } });
  if (!response.ok()) throw new Error(`Signing in answered ${response.status()}: ${await response.text()}`);
}
