import type { Browser, BrowserContext } from 'playwright-core';
import { steps } from '../../../shared/wizard/index';
import { signInAtDesk, type Product } from './product';
import { kilobytes, type Row } from './table';

// Targets: the project's goals, "JavaScript to the first wizard step, brotli".
const firstStepLimitBytes = 290 * 1024;
const laterStepLimitBytes = 12 * 1024;

/** Measures what script bytes each address brings over the wire, in the order in which a homeowner meets them. */
export async function scriptSizeRows(product: Product, browser: Browser): Promise<Row[]> {
  const rows: Row[] = [];
  const [firstStep, ...laterSteps] = steps.map((step) => `/quote/${step.id}`);

  const landing = await browser.newContext();
  rows.push(told('/', (await scriptsOf(landing, product.siteUrl, '/')).bytes));
  await landing.close();

  const homeowner = await browser.newContext();
  const first = await scriptsOf(homeowner, product.siteUrl, firstStep ?? '/quote/home');
  rows.push(limited(`first wizard step (${firstStep})`, first.bytes, firstStepLimitBytes));
  const publicFiles = new Set(first.files);
  for (const address of laterSteps) {
    const { bytes, files } = await scriptsOf(homeowner, product.siteUrl, address);
    files.forEach((file) => publicFiles.add(file));
    rows.push(limited(`then ${address}`, bytes, laterStepLimitBytes));
  }
  await homeowner.close();

  const staff = await browser.newContext();
  rows.push(told('/desk/sign-in, all of it', (await scriptsOf(staff, product.siteUrl, '/desk/sign-in')).bytes));
  await signInAtDesk(staff, product);
  rows.push(told('then /desk/leads', (await scriptsOf(staff, product.siteUrl, '/desk/leads')).bytes));
  await staff.close();

  const desk = [...publicFiles].filter((file) => /desk/i.test(file));
  rows.push({ what: 'desk files loaded by the public', measured: desk.join(', ') || 'none', target: 'none', reached: desk.length === 0 });
  return rows;
}

/** Opens an address and gives its scripts: those that came over the wire, not from the browser's cache. */
async function scriptsOf(context: BrowserContext, siteUrl: string, address: string): Promise<{ bytes: number; files: string[] }> {
  const page = await context.newPage();
  const session = await context.newCDPSession(page);
  await session.send('Network.enable');
  const names = new Map<string, string>();
  let bytes = 0;
  const files: string[] = [];
  session.on('Network.responseReceived', ({ requestId, type, response }) => {
    if (type === 'Script' && !response.fromDiskCache) names.set(requestId, new URL(response.url).pathname);
  });
  session.on('Network.loadingFinished', ({ requestId, encodedDataLength }) => {
    const name = names.get(requestId);
    if (name === undefined || encodedDataLength === 0) return;
    bytes += encodedDataLength;
    files.push(name);
  });
  await page.goto(siteUrl + address, { waitUntil: 'networkidle' });
  await page.close();
  return { bytes, files };
}

const told = (what: string, bytes: number): Row => ({ what, measured: kilobytes(bytes), target: '', reached: null });

const limited = (what: string, bytes: number, limitBytes: number): Row =>
  ({ what, measured: kilobytes(bytes), target: `${kilobytes(limitBytes)} or less`, reached: bytes <= limitBytes });
