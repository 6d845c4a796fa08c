import { randomBytes } from 'node:crypto';
import { contactOf, lendTo, newKey, newPerson, newVisitor, signInByApi, startIntake } from './support/api';
import { knownHouse, rustyHouse } from './support/homes';
import { product, signInOf } from './support/product';
import { expect, expectAccessible, test } from './support/test';
import { wizardOn } from './support/wizard';

/** Longer than a button ignores a second tap for (400 ms): nobody types an answer faster. */
const TYPING_MS = 500;
const guess = () => randomBytes(32).toString('base64url');

test('an unknown ZIP is said at once, and the address of who asks is kept', async ({ page }) => {
  await page.goto('/quote/home');
  await page.getByRole('textbox', { name: 'ZIP code' }).fill('99999');
  await expect(page.getByRole('heading', { name: 'We do not work in 99999 yet' })).toBeVisible();
  await expect(page.getByText('Harrow Bend and Pell Landing')).toBeVisible();
  await expect(page.getByRole('button', { name: /^Next/ })).toHaveCount(0);
  const tell = page.getByRole('button', { name: 'Tell me if you come here' });
  await page.getByRole('textbox', { name: 'E-mail' }).fill('nobody@');
  await tell.click();
  await expect(page.getByText('Type a full e-mail address, such as name@example.com')).toBeVisible();
  await expect(page.getByRole('textbox', { name: 'E-mail' })).toHaveValue('nobody@');
  await page.getByRole('textbox', { name: 'E-mail' }).fill('far.away@example.com');
  await page.waitForTimeout(TYPING_MS);
  await tell.click();
  await expect(page.getByText('Kept. We write to far.away@example.com once, when we work in 99999.')).toBeVisible();
  await expectAccessible(page);
  await page.getByRole('textbox', { name: 'ZIP code' }).fill('00021');
  await expect(page.getByText('Pell Landing. We work there.')).toBeVisible();
});

test('impossible sizes stay on the page with words beside them, and nothing else is lost', async ({ page, playwright }) => {
  const visitor = await newVisitor(playwright);
  await startIntake(visitor, knownHouse);
  await lendTo(page, visitor);
  const wizard = wizardOn(page);
  await page.goto('/quote/garage?part=size');
  await wizard.type('Width, left to right', '400');
  await page.getByRole('button', { name: /^Next/ }).click();
  await expect(page.getByText('60 ft at most').first()).toBeVisible();
  await expect(page.getByRole('spinbutton', { name: 'Width, left to right' })).toHaveValue(/^400/);
  await expect(page.getByRole('alert').filter({ hasText: 'One answer to fix' })).toBeFocused();
  await expectAccessible(page);
  await wizard.type('Width, left to right', '12');
  await page.getByRole('button', { name: /^Next/ }).click();
  await expect(page.getByText('The garage door is wider than the garage. Check both.').first()).toBeVisible();
  await wizard.type('Width, left to right', '24');
  await page.getByRole('button', { name: /^Next/ }).click();
  await wizard.see('Where on the wall is the panel?');
  await wizard.type('How far along that wall', '50');
  await page.getByRole('button', { name: /^Next/ }).click();
  await expect(page.getByText('That wall is 22 ft long. Pick a smaller distance.').first()).toBeVisible();
});

test('a car that takes more than the charger gives is allowed and worth a word; a plug above 40 A is not', async ({ page, playwright }) => {
  const visitor = await newVisitor(playwright);
  await startIntake(visitor, { zip: '00017', homeKind: 'house', tenure: 'own', parking: 'attached_garage', yearBuilt: 'unsure', floorAreaFt2: 'unsure' });
  await lendTo(page, visitor);
  const wizard = wizardOn(page);
  await page.goto('/quote/car');
  await wizard.pick('Highest charging rate', '80 A');
  await wizard.pick('Do you have a charger?', 'Yes, I have one');
  await wizard.pick('Its highest setting', '32 A');
  await expect(page.getByText('Your charger gives 32 A at most, so that sets the pace. The car can take more.')).toBeVisible();
  await wizard.pick('Its highest setting', '48 A');
  await wizard.pick('Wired in or with a plug?', 'With a plug');
  await page.getByRole('button', { name: 'Next: panel' }).click();
  await expect(page.getByRole('alert').filter({ hasText: 'to fix' })).toContainText('A charger with a plug gives 40 A at most.');
  await expectAccessible(page);
});

test('rust at the panel: the caution comes first, no price is given, a visit is asked for, and the desk has the lead without a number', async ({ page, playwright }) => {
  test.setTimeout(90_000);
  const visitor = await newVisitor(playwright);
  await startIntake(visitor, { ...rustyHouse, panelCondition: [] });
  await lendTo(page, visitor);
  const wizard = wizardOn(page);
  await page.goto('/quote/panel');
  const caution = page.getByText('Stop here if you smell burning, hear buzzing or see rust or water.').first();
  const question = page.getByRole('group', { name: 'What do you see or hear?' });
  expect((await caution.boundingBox())?.y).toBeLessThan((await question.boundingBox())?.y ?? 0);
  await wizard.tick('What do you see or hear?', 'Rust or water');
  const stop = page.getByRole('note').filter({ hasText: 'Leave the panel alone' }).filter({ hasText: 'call 911' });
  await expect(stop).toBeFocused();
  await expectAccessible(page);
  await page.goto('/quote/price');
  await expect(page).toHaveURL('/quote/visit');
  await wizard.see('We can’t give a fair range for this one from here');
  await expect(page.getByText('Rust or water does not belong in a panel.')).toBeVisible();
  expect(await page.getByRole('main').innerText()).not.toContain('$');
  await expectAccessible(page);
  const person = newPerson('Corin', 'Lisle');
  await page.getByRole('textbox', { name: 'Your name' }).fill(person.name);
  await page.getByRole('textbox', { name: 'E-mail' }).fill(person.email);
  await page.getByRole('textbox', { name: 'House number and street' }).fill(person.street);
  await page.getByRole('checkbox', { name: /You may use my details and photos/ }).check();
  await page.getByRole('button', { name: 'Ask for a visit' }).click();
  await wizard.see('Thank you. We have it.');
  await expectAccessible(page);

  const desk = await newVisitor(playwright);
  await signInByApi(desk, signInOf('estimator'));
  const { leads } = await (await desk.get('/api/leads', { params: { search: person.name } })).json();
  expect(leads).toHaveLength(1);
  expect(leads[0]).toMatchObject({ name: person.name, stage: 'needs-a-visit', lowCents: null, highCents: null, firmCents: null, depositPaid: false });
});

test('a guessed link opens nothing and says what to do', async ({ page }) => {
  await page.goto(`/resume/${guess()}`);
  await expect(page.getByRole('heading', { level: 1, name: 'This link does not open anything any more' })).toBeVisible();
  await expectAccessible(page);
  await page.goto(`/my/${guess()}`);
  await expect(page.getByRole('heading', { level: 1, name: 'This link does not open anything' })).toBeVisible();
  await expectAccessible(page);
  await page.goto('/my');
  await expect(page.getByRole('heading', { level: 1, name: 'Open your page from your mail' })).toBeVisible();
});

test('a webhook with a bad signature is refused with a problem document', async ({ request }) => {
  const event = JSON.stringify({ id: 'evt_forged', type: 'checkout.session.completed', data: { object: {} } });
  for (const signature of [undefined, 'nonsense', `t=${Math.floor(Date.now() / 1000)},v1=${'0'.repeat(64)}`]) {
    const response = await request.post('/api/webhooks/stripe', {
      data: event, headers: { 'Content-Type': 'application/json', ...(signature === undefined ? {} : { 'Stripe-Signature': signature }) },
    });
    expect(response.status()).toBe(400);
    expect(response.headers()['content-type']).toContain('application/problem+json');
  }
});

test('a change that another site asks for is refused', async ({ playwright }) => {
  const visitor = await newVisitor(playwright);
  await startIntake(visitor, { zip: '00017' });
  const headers = { Origin: 'https://elsewhere.example', 'Sec-Fetch-Site': 'cross-site' };
  const response = await visitor.patch('/api/intakes/current/answers', { headers, data: { answers: { zip: '00021' } } });
  expect(response.status()).toBe(403);
  expect(response.headers()['content-type']).toContain('application/problem+json');
  expect((await (await visitor.get('/api/intakes/current')).json()).answers.zip).toBe('00017');
});

test('the same wish sent twice makes one lead', async ({ playwright }) => {
  const visitor = await newVisitor(playwright);
  await startIntake(visitor, rustyHouse);
  const headers = { 'Idempotency-Key': newKey() };
  const person = newPerson('Edda', 'Quill');
  const data = contactOf(person);
  const answers = await Promise.all([1, 2].map(() => visitor.post('/api/intakes/current/visit', { headers, data })));
  // The second may also be told that the first is still on its way.
  expect(answers.map((answer) => answer.status()).sort()[0]).toBe(200);
  const desk = await newVisitor(playwright);
  await signInByApi(desk, signInOf('sales'));
  expect((await (await desk.get('/api/leads', { params: { search: person.name } })).json()).total).toBe(1);
});

test('a step can be done with the keyboard alone', async ({ page }) => {
  await page.goto('/quote/home');
  await expect(page.getByRole('heading', { level: 1 })).toBeVisible();
  const focusOn = async (name: RegExp) => {
    for (let presses = 0; presses < 40; presses += 1) {
      await page.keyboard.press('Tab');
      const focused = page.locator(':focus');
      if (name.test(await focused.evaluate((element) => [element.getAttribute('aria-label'), element.id, element.textContent, element.getAttribute('name')].join(' ')))) return;
    }
    throw new Error(`Tab never reached ${name}`);
  };
  await focusOn(/ZIP code/);
  await page.keyboard.type('00017');
  await expect(page.getByText('Harrow Bend. We work there.')).toBeVisible();
  await focusOn(/homeKind/);
  await page.keyboard.press('Space');
  await expect(page.getByRole('radio', { name: 'House', exact: true })).toBeChecked();
  await focusOn(/tenure/);
  await page.keyboard.press('Space');
  await focusOn(/parking/);
  await page.keyboard.press('Space');
  await page.keyboard.press('ArrowDown');
  await expect(page.getByRole('radio', { name: 'Detached garage' })).toBeChecked();
  await page.keyboard.press('ArrowUp');
  await focusOn(/yearBuilt/);
  await page.keyboard.press('Space');
  await focusOn(/^How big is the living space\? floorAreaFt2/);
  await page.keyboard.press('ArrowUp');
  await expect(page.getByRole('spinbutton', { name: 'How big is the living space?' })).toHaveValue(/^1,?800/);
  await focusOn(/^Next: car/);
  await page.keyboard.press('Enter');
  await expect(page).toHaveURL(/\/quote\/car/);
  await expect(page.getByRole('heading', { level: 1 })).toBeFocused();
});

test('without the connection nothing typed is lost', async ({ page, context }) => {
  await page.goto('/quote/home');
  const zip = page.getByRole('textbox', { name: 'ZIP code' });
  await zip.fill('00017');
  await expect(page.getByText('Harrow Bend. We work there.')).toBeVisible();
  await context.setOffline(true);
  await wizardOn(page).pick('Kind of home', 'Town house');
  await expect(page.getByText(/^No connection\. Your answers are kept on this page/)).toBeVisible();
  await context.setOffline(false);
  await expect(page.getByText(/^No connection\./)).toHaveCount(0, { timeout: 20_000 });
  await page.reload();
  await expect(page.getByRole('radio', { name: 'Town house' })).toBeChecked();
});

test('strangers see neither the desk’s leads nor another home’s photos', async ({ request }) => {
  expect((await request.get('/api/leads')).status()).toBe(401);
  expect((await request.get('/api/intakes/current')).status()).toBe(404);
  expect((await request.get('/api/photos/00000000-0000-4000-8000-000000000000/full')).status()).toBe(404);
  expect((await request.get(`${product.siteUrl}/api/nothing`)).status()).toBe(404);
});
