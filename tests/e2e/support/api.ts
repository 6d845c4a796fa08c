import { expect, type APIRequestContext, type APIResponse, type Page, type PlaywrightWorkerArgs } from '@playwright/test';
import type { Quote } from '../../../shared/api/quotes';
import type { Answers } from '../../../shared/wizard/index';
import { phonePhoto } from './pictures';
import { product } from './product';

type Playwright = PlaywrightWorkerArgs['playwright'];

export interface Person { readonly name: string; readonly email: string; readonly street: string; readonly phone?: string }

/** A browser's worth of cookies without a browser; its requests say that they come from the site. */
export const newVisitor = (playwright: Playwright): Promise<APIRequestContext> =>
  playwright.request.newContext({ baseURL: product.siteUrl, extraHTTPHeaders: { Origin: product.siteUrl } });

export const contactOf = (person: Person) => ({ ...person, contactWays: ['email'], consent: true });

let keys = 0;
/** For what may happen once only. */
export const newKey = (): string => `e2e-${process.pid}-${Date.now()}-${(keys += 1)}`;

/** Someone whom no earlier test or run has met. */
export const newPerson = (givenName: string, familyName: string): Person => {
  const tag = `${Date.now().toString(36)}${(keys += 1)}`;
  return { name: `${givenName} ${familyName} ${tag}`, email: `${familyName.toLowerCase()}.${tag}@example.com`, street: `${keys} Demo Lane` };
};

export async function expectOk(response: APIResponse): Promise<APIResponse> {
  expect(response.ok(), `${response.url()} says ${response.status()} ${response.ok() ? '' : await response.text()}`).toBe(true);
  return response;
}

/** Starts an intake with these answers. */
export async function startIntake(visitor: APIRequestContext, answers: Answers): Promise<void> {
  await expectOk(await visitor.post('/api/intakes'));
  await expectOk(await visitor.patch('/api/intakes/current/answers', { data: { answers } }));
}

/** Gives a page's browser what the visitor holds, as if it had been typed there. */
export async function lendTo(page: Page, visitor: APIRequestContext): Promise<void> {
  await page.context().addCookies((await visitor.storageState()).cookies);
}

export async function addPhoto(visitor: APIRequestContext, slot: string): Promise<void> {
  const photo = { name: 'photo.jpg', mimeType: 'image/jpeg', buffer: await phonePhoto() };
  await expectOk(await visitor.post('/api/intakes/current/photos', { multipart: { slot, photo } }));
}

/** Pays the deposit of the recommended option on the practice page, as its form does, and waits until it is known. @returns the job's number */
export async function payDeposit(visitor: APIRequestContext, person: Person): Promise<number> {
  const quote = (await (await expectOk(await visitor.post('/api/intakes/current/quote'))).json()) as Quote;
  const started = await visitor.post('/api/intakes/current/deposit', {
    headers: { 'Idempotency-Key': newKey() },
    data: { quoteId: quote.id, optionId: quote.document.recommendedOptionId, contact: contactOf(person) },
  });
  const { checkoutUrl } = (await (await expectOk(started)).json()) as { checkoutUrl: string };
  await visitor.post(checkoutUrl, { form: { card: '4242 4242 4242 4242' }, maxRedirects: 0 });
  let jobNumber: number | null = null;
  await expect.poll(async () => {
    const deposit = (await (await visitor.get('/api/intakes/current/deposit')).json()) as { state: string; jobNumber: number | null };
    jobNumber = deposit.jobNumber;
    return deposit.state;
  }, { timeout: 20_000 }).toBe('paid');
  if (jobNumber === null) throw new Error('A paid deposit has a job number');
  return jobNumber;
}

/** Signs in at the desk. @returns the headers that a change needs */
export async function signInByApi(visitor: APIRequestContext, { email, password }: { email: string; password: string }): Promise<Record<string, string>> {
  const session = (await (await expectOk(await visitor.post('/api/session', { data: { email, password } }))).json()) as { csrfToken: string };
  return { 'X-CSRF-Token': session.csrfToken };
}
