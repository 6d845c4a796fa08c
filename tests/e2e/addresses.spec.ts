import { expect, test } from '@playwright/test';

test('the landing page has its title, its heading and its description', async ({ page }) => {
  const response = await page.goto('/');
  expect(response?.status()).toBe(200);
  await expect(page).toHaveTitle(/\S/);
  await expect(page.getByRole('heading', { level: 1 })).toBeVisible();
  await expect(page.locator('meta[name=description]')).toHaveAttribute('content', /\S{3,}/);
});

test('an address that leads nowhere says so, with status 404 and a way back', async ({ page }) => {
  const response = await page.goto('/no-such-page');
  expect(response?.status()).toBe(404);
  await expect(page).toHaveTitle(/not found/i);
  await page.getByRole('main').getByRole('link').first().click();
  await expect(page).toHaveURL('/');
});

test('no page asks for anything that its own content security policy refuses', async ({ page }) => {
  const complaints: string[] = [];
  page.on('console', (message) => {
    if (/Content Security Policy|Minified React error/i.test(message.text())) complaints.push(message.text());
  });
  for (const address of ['/', '/quote/home', '/desk/sign-in', '/privacy', '/no-such-page']) {
    await page.goto(address);
    await expect(page.getByRole('heading', { level: 1 })).toBeVisible();
  }
  expect(complaints).toEqual([]);
});
