import axe from 'axe-core';
import type { Browser, BrowserContext } from 'playwright-core';
import { steps } from '../../../shared/wizard/index';
import { signInAtDesk, type Product } from './product';
import type { Row } from './table';

// The widths that the project's goals name.
const widthsPx = [320, 390, 820, 1440] as const;
const publicAddresses = ['/', ...steps.map((step) => `/quote/${step.id}`), '/privacy', '/terms', '/resume', '/desk/sign-in', '/no-such-page'];
const deskAddresses = ['/desk', '/desk/leads'];

interface Finding {
  rule: string;
  where: string;
}

/** Looks at every address at four widths with axe and gives what it finds. */
export async function accessibilityRows(product: Product, browser: Browser): Promise<Row[]> {
  const visitor = await browser.newContext();
  const staff = await browser.newContext();
  await signInAtDesk(staff, product);
  const rows: Row[] = [];
  for (const [context, addresses] of [[visitor, publicAddresses], [staff, deskAddresses]] as const) {
    for (const address of addresses) {
      const findings = await findingsAt(context, product.siteUrl + address);
      rows.push({ what: `axe ${address}`, measured: describe(findings), target: '0', reached: findings.length === 0 });
    }
  }
  await visitor.close();
  await staff.close();
  return rows;
}

async function findingsAt(context: BrowserContext, url: string): Promise<Finding[]> {
  const page = await context.newPage();
  const findings: Finding[] = [];
  for (const width of widthsPx) {
    await page.setViewportSize({ width, height: 900 });
    await page.goto(url, { waitUntil: 'networkidle' });
    await page.evaluate(axe.source);
    const { violations } = await page.evaluate(() => (globalThis as unknown as { axe: typeof axe }).axe.run());
    findings.push(...violations.flatMap(({ id, nodes }) => nodes.map(({ target }) => ({ rule: id, where: `${width} px ${target.join(' ')}` }))));
  }
  await page.close();
  return findings;
}

const describe = (findings: readonly Finding[]): string =>
  findings.length === 0 ? '0' : `${findings.length}: ${findings.slice(0, 3).map(({ rule, where }) => `${rule} (${where})`).join('; ')}`;
