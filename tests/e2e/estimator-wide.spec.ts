import type { Page } from '@playwright/test';
import type { Lead } from '../../shared/api/desk';
import { addPhoto, newPerson, newVisitor, payDeposit, signInByApi, startIntake } from './support/api';
import { doubtfulHouse } from './support/homes';
import { signInOf } from './support/product';
import { expect, expectAccessible, listen, test } from './support/test';

const person = newPerson('Bram', 'Ashdown');
let jobNumber = 0;

test.beforeAll(async ({ playwright }) => {
  const visitor = await newVisitor(playwright);
  await startIntake(visitor, doubtfulHouse);
  await addPhoto(visitor, 'panel');
  jobNumber = await payDeposit(visitor, person);
});

async function signIn(page: Page, role: string, password?: string): Promise<void> {
  const account = signInOf(role);
  await page.getByRole('textbox', { name: 'E-mail' }).fill(account.email);
  await page.getByRole('textbox', { name: 'Password' }).fill(password ?? account.password);
  await page.getByRole('button', { name: 'Sign in' }).click();
}

test('an estimator signs in, finds a lead, reads it, moves it on, and signs out', async ({ page, browser }) => {
  test.setTimeout(120_000);

  await test.step('a wrong password says so, the right one opens the desk', async () => {
    await page.goto('/desk/leads');
    await expect(page).toHaveURL(/\/desk\/sign-in/);
    await expectAccessible(page);
    await signIn(page, 'estimator', 'not the password');
    await expect(page.getByText('That e-mail and password do not match. Check both and try again.')).toBeVisible();
    await expectAccessible(page);
    await signIn(page, 'estimator');
    await expect(page.getByRole('heading', { level: 1, name: 'Leads' })).toBeVisible();
    await expect(page.getByText('Estimator', { exact: true })).toBeVisible();
  });

  await test.step('the lead is found by search', async () => {
    await expectAccessible(page);
    await page.getByRole('searchbox', { name: /^Search leads/ }).fill(person.name);
    const rows = page.getByRole('row').filter({ hasText: person.name });
    await expect(rows).toHaveCount(1);
    await expect(page.getByText('1 lead', { exact: true })).toBeVisible();
    await rows.getByRole('link').first().click();
  });

  await test.step('its page shows facts, photo, price lines, load calculation and history', async () => {
    await expect(page.getByRole('heading', { level: 1 })).toContainText(person.name);
    const main = page.getByRole('main');
    await expect(main).toContainText(String(jobNumber));
    await expect(main).toContainText(person.street);
    await expect(page.getByRole('img', { name: /panel, door open/i }).first()).toBeVisible();
    await expect(main).toContainText('Main breaker');
    await expect(main).toContainText('220.83');
    await expect(main).toContainText(/Permit/);
    await expect(main).toContainText(/deposit/i);
    await expect(page.getByRole('heading', { name: 'History' })).toBeVisible();
    await expectAccessible(page);
  });

  await test.step('a stale change in a second window is told calmly and overwrites nothing', async () => {
    const context = await browser.newContext({ storageState: await page.context().storageState(), viewport: { width: 1440, height: 900 } });
    const second = await context.newPage();
    const complaints = listen(second);
    await second.goto(page.url());
    await expect(second.getByRole('heading', { level: 1 })).toContainText(person.name);
    await move(page, 'Waiting on photo');
    await expect(page.getByText('Moved to “Waiting on photo”.')).toBeVisible();
    await move(second, 'Needs a visit');
    await expect(second.getByRole('alert')).toContainText('Someone else changed this first');
    await expect(second.getByRole('combobox', { name: 'Move to' })).toHaveValue('needs-a-visit');
    await expectAccessible(second);
    expect(complaints.errors).toEqual([]);
    await context.close();
    await page.reload();
    await expect(page.getByRole('main')).toContainText('Waiting on photo');
    await expectAccessible(page);
  });

  await test.step('signing out ends it', async () => {
    await page.getByRole('button', { name: 'Sign out' }).click();
    await expect(page).toHaveURL(/\/desk\/sign-in/);
    expect((await page.request.get('/api/leads')).status()).toBe(401);
  });
});

test('a sales lead reads the same lead but cannot move it', async ({ page, playwright }) => {
  const visitor = await newVisitor(playwright);
  const headers = await signInByApi(visitor, signInOf('sales'));
  const { leads } = await (await visitor.get('/api/leads', { params: { search: person.name } })).json();
  const found = await visitor.get(`/api/leads/${leads[0].id}`);
  const lead = (await found.json()) as Lead;
  expect(lead.moves).toEqual([]);
  const refused = await visitor.patch(`/api/leads/${lead.id}`, { headers: { ...headers, 'If-Match': found.headers().etag ?? '' }, data: { stage: 'closed' } });
  expect(refused.status()).toBe(403);
  expect(refused.headers()['content-type']).toContain('application/problem+json');

  await page.goto(`/desk/leads/${lead.id}`);
  await signIn(page, 'sales');
  await expect(page.getByRole('heading', { level: 1 })).toContainText(person.name);
  await expect(page.getByRole('combobox', { name: 'Move to' })).toHaveCount(0);
  await expectAccessible(page);
});

test('a stranger learns nothing of leads', async ({ request }) => {
  expect((await request.get('/api/leads')).status()).toBe(401);
  expect((await request.get('/api/leads/00000000-0000-4000-8000-000000000000')).status()).toBe(401);
});

/** Moves the lead that is open by the controls of its page. */
async function move(page: Page, stage: string): Promise<void> {
  await page.getByRole('combobox', { name: 'Move to' }).selectOption({ label: stage });
  await page.getByRole('button', { name: `Move to “${stage}”` }).click();
}
