import type { Page, TestInfo } from '@playwright/test';
import { addPhoto, lendTo, newPerson, newVisitor, payDeposit, startIntake } from './support/api';
import { doubtfulHouse, rustyHouse } from './support/homes';
import { linkIn, waitForMail } from './support/mailbox';
import { product, signInOf } from './support/product';
import { expect, expectAccessible, test } from './support/test';

const windows = [{ width: 320, height: 640 }, { width: 390, height: 844 }, { width: 820, height: 1180 }, { width: 1440, height: 900 }] as const;

/** Every address that a person can stand on, by whose browser opens it. */
const pages = {
  'a new visitor': ['/', '/privacy', '/terms', '/resume', '/my', '/quote/home', '/no-such-page', '/desk/sign-in'],
  'someone with answers': [
    '/quote/home?part=kind', '/quote/car', '/quote/car?part=days', '/quote/panel', '/quote/panel?part=odd', '/quote/loads', '/quote/garage', '/quote/garage?part=charger-place',
    '/quote/garage?part=finish', '/quote/photos', '/quote/price', '/quote/check', '/quote/book',
  ],
  'someone whose panel rusts': ['/quote/panel?part=odd', '/quote/visit'],
  'someone who has paid': ['/quote/deposit', '/my'],
} as const;

for (const { width, height } of windows) {
  test.describe(`in a window of ${width} px`, () => {
    test.use({ viewport: { width, height } });

    for (const [who, addresses] of Object.entries(pages)) {
      test(`the pages of ${who} fit, are accessible, and say what they are`, async ({ page, playwright }, info) => {
        test.setTimeout(180_000);
        if (who !== 'a new visitor') {
          const visitor = await newVisitor(playwright);
          await startIntake(visitor, who === 'someone whose panel rusts' ? rustyHouse : doubtfulHouse);
          await addPhoto(visitor, 'panel');
          if (who === 'someone who has paid') {
            const person = newPerson('Juno', 'Marsh');
            await payDeposit(visitor, person);
            const token = new URL(linkIn(await waitForMail(person.email, /deposit is paid/), '/my/')).pathname.split('/').pop();
            await visitor.post('/api/my', { data: { token } });
          }
          await lendTo(page, visitor);
        }
        for (const address of addresses) {
          await page.goto(address);
          await expectWellMade(page, address);
          await picture(page, info, `${who} ${address}`);
        }
      });
    }

    test('the pages of the desk fit, are accessible, and say what they are', async ({ page }, info) => {
      test.setTimeout(120_000);
      const { email, password } = signInOf('owner');
      await page.goto('/desk');
      await page.getByRole('textbox', { name: 'E-mail' }).fill(email);
      await page.getByRole('textbox', { name: 'Password' }).fill(password);
      await page.getByRole('button', { name: 'Sign in' }).click();
      await expect(page.getByRole('heading', { level: 1, name: 'Leads' })).toBeVisible();
      await expectWellMade(page, '/desk/leads');
      await picture(page, info, 'desk leads');
      const { leads } = await (await page.request.get('/api/leads', { params: { limit: 1, sort: 'newest' } })).json();
      await page.goto(`/desk/leads/${leads[0].id}`);
      await expect(page.getByRole('heading', { level: 1 })).toContainText(leads[0].name);
      await expectWellMade(page, '/desk/leads/[id]');
      await picture(page, info, 'desk lead');
    });
  });
}

/** With E2E_PICTURES=1 every page is kept as a picture under test-results/, to be looked at. */
async function picture(page: Page, info: TestInfo, name: string): Promise<void> {
  if (process.env.E2E_PICTURES === '1') await page.screenshot({ path: info.outputPath(`${name.replaceAll(/\W+/g, '-')}.png`), fullPage: true });
}

/** One heading with the focus ready for it, a title, nothing wider than the window, no violation of axe's rules. */
async function expectWellMade(page: Page, address: string): Promise<void> {
  const heading = page.getByRole('heading', { level: 1 });
  await expect(heading, address).toHaveCount(1);
  await expect(heading, address).toBeVisible();
  await expect(page.getByRole('status', { name: /^(Loading|Opening|Working)/ }), address).toHaveCount(0);
  await expect(page, address).toHaveTitle(/\S{2}.* – /);
  const overflow = await page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth);
  expect(overflow, `${address} is wider than its window`).toBeLessThanOrEqual(0);
  await expectAccessible(page);
}

test('every public page has a title of its own', async ({ page, playwright }) => {
  const visitor = await newVisitor(playwright);
  await startIntake(visitor, doubtfulHouse);
  await lendTo(page, visitor);
  const titles: string[] = [];
  const addresses = ['/', '/privacy', '/terms', '/resume', '/my', '/quote/home', '/quote/car', '/quote/panel', '/quote/loads', '/quote/garage', '/quote/photos', '/quote/price', '/quote/check', '/quote/book', '/no-such-page'];
  for (const address of addresses) {
    await page.goto(address);
    await expect(page.getByRole('heading', { level: 1 })).toBeVisible();
    await expect(page).toHaveTitle(/ – /);
    titles.push(await page.title());
  }
  expect(new Set(titles).size, titles.join('\n')).toBe(addresses.length);
});

test('a move to another page puts the focus on its heading', async ({ page }) => {
  await page.goto('/');
  await page.getByRole('main').getByRole('link', { name: 'Start with your home' }).click();
  await expect(page.getByRole('heading', { level: 1, name: 'Where is the home?' })).toBeFocused();
  await page.goBack();
  await expect(page).toHaveURL(product.siteUrl + '/');
  await page.getByRole('link', { name: 'Privacy' }).click();
  await expect(page).toHaveURL(/privacy/);
  await expect(page.getByRole('heading', { level: 1 })).toBeFocused();
});
