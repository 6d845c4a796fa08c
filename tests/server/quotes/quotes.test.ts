import { QueryTypes } from 'sequelize';
import { quoteDocumentSchema, type QuoteDocument } from '../../../shared/quote';
import { completeAnswers } from '../../support/answers';
import { startTestApp, type Agent, type TestApp } from '../../support/app';
import { expectProblem } from '../../support/problem';

let server: TestApp;
// 7:30 in the evening of May 14 in Denver, May 15 in UTC: the price is dated where the home is.
const evening = new Date('2026-05-15T01:30:00Z');
let now = evening;
beforeAll(async () => { server = await startTestApp({ clock: () => now }); });
afterAll(() => server.stop());
afterEach(() => { now = evening; });

const save = (browser: Agent, answers: object) => browser.patch('/api/intakes/current/answers').send({ answers });
async function answered(answers: object = completeAnswers): Promise<Agent> {
  const browser = server.browser();
  await browser.post('/api/intakes').expect(200);
  await save(browser, answers).expect(200);
  return browser;
}
const price = (browser: Agent) => browser.post('/api/intakes/current/quote');
interface Priced { readonly id: string; readonly document: QuoteDocument }
const priced = async (browser: Agent): Promise<Priced> => (await price(browser).expect(200)).body as Priced;

it('is refused without an intake, and before every question has an answer, with a pointer to each', async () => {
  expectProblem(await price(server.browser()), 'not-found');
  const { tenure: _left, ...rest } = completeAnswers;
  expect(expectProblem(await price(await answered(rest)), 'validation')).toEqual(['/answers/tenure']);
});

it('there is none before it is asked for', async () => {
  expectProblem(await (await answered()).get('/api/intakes/current/quote'), 'not-found');
});

it('freezes a document by the date where the home is, held for the edition’s 30 days', async () => {
  const browser = await answered();
  const { id, document } = await priced(browser);
  expect(quoteDocumentSchema.parse(document)).toMatchObject({ pricedOn: '2026-05-14', heldUntil: '2026-06-13', rulebookEdition: 1, codeEdition: '2023' });
  expect(document.options.length).toBeGreaterThan(1);
  expect(document.facts).toContainEqual({ name: 'zip', label: 'ZIP', words: '00017', source: 'homeowner' });
  expect((await browser.get('/api/intakes/current/quote').expect(200)).body).toMatchObject({ id, document });
  expect((await browser.get('/api/intakes/current')).body).toHaveProperty('stage', 'priced');
  const [row] = await server.deps.sequelize.query<{ low: number; high: number }>('SELECT low_cents AS low, high_cents AS high FROM quotes WHERE id = $id', { type: QueryTypes.SELECT, bind: { id } });
  const recommended = document.options.find((option) => option.id === document.recommendedOptionId);
  expect(row).toEqual({ low: recommended?.lowCents, high: recommended?.highCents });
});

it('the same answers give the same document back, also from two tabs at once', async () => {
  const browser = await answered();
  const replies = await Promise.all([price(browser), price(browser), price(browser)]);
  const ids = new Set(replies.map(({ body }) => (body as Priced).id));
  expect(replies.map(({ status }) => status)).toEqual([200, 200, 200]);
  expect(ids.size).toBe(1);
  now = new Date(now.getTime() + 20 * 86_400_000);
  expect((await priced(browser)).document).toEqual((replies[0]?.body as Priced).document);
});

it('a price that is no longer held is made anew', async () => {
  const browser = await answered();
  const first = await priced(browser);
  now = new Date(now.getTime() + 31 * 86_400_000);
  const second = await priced(browser);
  expect(second.id).not.toBe(first.id);
  expect(second.document.pricedOn).toBe('2026-06-14');
});

it('a changed answer withdraws it; an answer that says the same does not', async () => {
  const browser = await answered();
  const first = await priced(browser);
  await save(browser, { tenure: 'own' }).expect(200);
  await browser.get('/api/intakes/current/quote').expect(200);
  expect((await save(browser, { mainBreakerAmps: '100' }).expect(200)).body).toHaveProperty('stage', 'open');
  expectProblem(await browser.get('/api/intakes/current/quote'), 'not-found');
  const second = await priced(browser);
  expect(second.id).not.toBe(first.id);
  expect(second.document.facts).not.toEqual(first.document.facts);
});

it('a job for a visit gets a document without options that says why', async () => {
  const { document } = await priced(await answered({ ...completeAnswers, panelCondition: ['rust_or_water'] }));
  expect(document).toMatchObject({ outcome: 'visit', options: [], recommendedOptionId: null });
  expect(document.flags.length).toBeGreaterThan(0);
});

it('after payment the paid price stays, whatever is answered later', async () => {
  const browser = await answered();
  const { id, document } = await priced(browser);
  const { models, sequelize } = server.deps;
  const quote = await models.Quote.findByPk(id);
  await models.Deposit.create({
    intakeId: quote?.intakeId ?? '', quoteId: id, optionId: document.recommendedOptionId ?? '', amountCents: 15_000, state: 'paid', paidAt: now, consentWords: 'yes',
    contact: { name: 'Maren Oakes', email: 'maren.oakes@example.com', street: '1 Lane', contactWays: [], consent: true },
  });
  await sequelize.query(`UPDATE intakes SET stage = 'paid' WHERE id = $id`, { bind: { id: quote?.intakeId ?? '' } });
  expect((await save(browser, { mainBreakerAmps: '100' }).expect(200)).body).toMatchObject({ stage: 'paid', answers: { mainBreakerAmps: '100' } });
  expect((await browser.get('/api/intakes/current/quote').expect(200)).body).toMatchObject({ id, document });
  expect((await priced(browser)).id).toBe(id);
});
