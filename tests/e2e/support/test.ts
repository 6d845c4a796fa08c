import { test as base, expect, type Page } from '@playwright/test';
import { readFileSync } from 'node:fs';
import type { AxeResults } from 'axe-core';
import { product } from './product';

const axeSource = readFileSync(require.resolve('axe-core/axe.min.js'), 'utf8');

export interface Complaints {
  /** What pages wrote to the console as errors, refusals of the content security policy among them. */
  readonly errors: string[];
  /** Addresses on other hosts that pages asked for. */
  readonly strangers: string[];
}

/** A refused or cut off request that a test provokes shows as this line; the page's own words on it are what the tests look at. */
const refusedRequest = /^Failed to load resource: (the server responded with a status of 4\d\d|net::ERR_INTERNET_DISCONNECTED)/;

/** Listens to a page from now on. */
export function listen(page: Page, into: Complaints = { errors: [], strangers: [] }): Complaints {
  const own = [product.siteUrl, product.paymentsUrl].map((url) => new URL(url).host);
  page.on('console', (message) => {
    if (message.type() === 'error' && !refusedRequest.test(message.text())) into.errors.push(`${page.url()}: ${message.text()}`);
  });
  page.on('pageerror', (error) => into.errors.push(`${page.url()}: ${error.message}`));
  page.on('request', (request) => {
    const { protocol, host } = new URL(request.url());
    if (/^https?:$/.test(protocol) && !own.includes(host)) into.strangers.push(request.url());
  });
  return into;
}

/** Runs axe over the page as it stands: no violation of any rule, best practices among them. The test goes on, so that one run tells of all. */
export async function expectAccessible(page: Page): Promise<void> {
  // A page is there when its heading is; before that axe would judge an empty one.
  await page.getByRole('heading', { level: 1 }).first().waitFor();
  // Through the debugger, because the page's security policy rightly refuses a script element.
  await page.evaluate(axeSource);
  const found = await page.evaluate(async () => {
    const { axe } = window as unknown as { axe: { run: (context: Document) => Promise<AxeResults> } };
    return (await axe.run(document)).violations.map(({ id, nodes }) => `${id}: ${nodes.map((node) => node.html.slice(0, 160)).join(' | ')}`);
  });
  expect.soft(found, `axe on ${new URL(page.url()).pathname}`).toEqual([]);
}

/** Every test's page is listened to: an error in the console or a request to another host fails it. */
export const test = base.extend<{ complaints: Complaints }>({
  complaints: [async ({ page }, use) => {
    const complaints = listen(page);
    await use(complaints);
    expect(complaints.errors, 'errors in the console').toEqual([]);
    expect(complaints.strangers, 'requests to other hosts').toEqual([]);
  }, { auto: true }],
});
export { expect };
