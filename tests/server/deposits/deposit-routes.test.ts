import { randomUUID } from 'node:crypto';
import type { AddressInfo, Server } from 'node:net';
import { Op } from 'sequelize';
import type { Deposit } from '../../../shared/api/quotes';
import { createApp } from '../../../server/app';
import { createCheckoutSession } from '../../../server/deposits/checkout-session';
import { refundDeposit } from '../../../server/deposits/refund-deposit';
import { createStripe } from '../../../server/payments/stripe';
import { browserOf, startTestApp, testOrigin, type Agent, type TestApp } from '../../support/app';
import { startFakeStripe, WEBHOOK_SECRET, type FakeStripeServer } from '../../support/fake-stripe';
import { openIntake } from '../../support/open-intake';
import { contact, storePricedIntake, type PricedIntake } from '../../support/priced-intake';

// The provider is the practice one over HTTP; its shapes are held against the SDK in tests/server/fakes.
// Statuses: RFC 9110; documents: RFC 9457.
// Cards: 4242... pays, ...0002 declines (the provider's test cards, from memory).
const GOOD = '4242 4242 4242 4242';
const DECLINED = '4000 0000 0000 0002';

describe('deposits', () => {
  let provider: FakeStripeServer;
  let app: TestApp;
  let server: Server;

  beforeAll(async () => {
    provider = await startFakeStripe();
    app = await startTestApp({ stripe: provider.stripe }, { STRIPE_SECRET_KEY: 'sk_test_tests', STRIPE_WEBHOOK_SECRET: WEBHOOK_SECRET, STRIPE_API_BASE: provider.url });
    server = app.app.listen(0, '127.0.0.1');
    await new Promise((ready) => server.once('listening', ready));
    provider.sendEventsTo(`http://127.0.0.1:${(server.address() as AddressInfo).port}/api/webhooks/stripe`);
  });
  afterAll(async () => {
    await provider.close();
    await new Promise((done) => server.close(done));
    await app.stop();
  });
  afterEach(async () => { await provider.setMode({ down: false, hold: false }); });

  /** A browser that holds an intake with a frozen price. */
  async function priced(browser = app.browser(), pricedOn?: string): Promise<PricedIntake & { browser: Agent }> {
    const { intakeId } = await openIntake(app, browser);
    return { browser, ...(await storePricedIntake(app.deps, { intakeId, ...(pricedOn === undefined ? {} : { pricedOn }) })) };
  }
  type Job = Pick<PricedIntake, 'quoteId' | 'option'> & { browser: Agent };
  const start = ({ browser, quoteId, option }: Job, changes: object = {}, key = randomUUID()) =>
    browser.post('/api/intakes/current/deposit').set('Idempotency-Key', key).send({ quoteId, optionId: option.id, contact, ...changes });
  const checkoutUrl = async (job: Job) => ((await start(job).expect(201)).body as { checkoutUrl: string }).checkoutUrl;
  const until = async (holds: () => Promise<boolean>) => {
    for (let tries = 0; tries < 200; tries += 1) {
      if (await holds()) return;
      await new Promise((next) => setTimeout(next, 50));
    }
    throw new Error(`Did not come about. ${app.log().slice(-2000)}`);
  };
  const stateOf = async (intakeId: string) => {
    const deposits = await app.deps.models.Deposit.findAll({ where: { intakeId } });
    return deposits.map(({ state }) => state).sort();
  };

  it('are refused to strangers as if there were nothing, and without a key', async () => {
    const job = await priced();
    await start({ ...job, browser: app.browser() }).expect(404).expect('Content-Type', /application\/problem\+json/);
    await job.browser.post('/api/intakes/current/deposit').send({ quoteId: job.quoteId, optionId: job.option.id, contact }).expect(400);
    await app.browser().get('/api/intakes/current/deposit').expect(404);
    await job.browser.get('/api/intakes/current/deposit').expect(404);
  });

  it('are refused with a pointer for each thing that is wrong', async () => {
    const job = await priced();
    const wrong = await start(job, { contact: { ...contact, email: 'no address', name: ' ', consent: false } }).expect(422);
    expect((wrong.body as { errors: { pointer: string }[] }).errors.map(({ pointer }) => pointer).sort()).toEqual(['/contact/consent', '/contact/email', '/contact/name']);
    expect((await start(job, { optionId: 'none' }).expect(422)).body).toMatchObject({ errors: [{ pointer: '/optionId' }] });
    await start(job, { quoteId: randomUUID() }).expect(404);
    await start({ ...job, browser: (await priced()).browser }).expect(404);
    expect(await stateOf(job.intakeId)).toEqual([]);
  });

  it('are refused when the price was withdrawn, or its day is over', async () => {
    const job = await priced();
    await app.deps.models.Quote.update({ withdrawnAt: new Date() }, { where: { id: job.quoteId } });
    expect((await start(job).expect(409)).body).toMatchObject({ detail: expect.stringContaining('An answer changed') as string });
    await start(await priced(app.browser(), '2020-01-06')).expect(409);
  });

  it('take the amount from the frozen price, whatever the browser says', async () => {
    const job = await priced();
    const { body } = await start(job, { amountCents: 1 }).expect(201);
    const sessions = (body as { checkoutUrl: string }).checkoutUrl.split('/pay/')[1] ?? '';
    const session = await provider.stripe.checkout.sessions.retrieve(sessions);
    expect(session).toMatchObject({
      amount_total: job.option.depositCents, currency: 'usd', customer_email: contact.email, success_url: `${testOrigin}/quote/deposit`, cancel_url: `${testOrigin}/quote/price?deposit=cancelled`,
    });
    expect(JSON.stringify(session.metadata)).not.toContain('Maren');
  });

  it('give the same page for a double click, for the same key, and for the same choice later', async () => {
    const job = await priced();
    const key = randomUUID();
    const [one, other] = await Promise.all([start(job, {}, key), start(job, {}, key)]);
    const first = [one, other].find(({ status }) => status === 201)?.body as { checkoutUrl: string };
    // The second click may come while the first is still at work (409, try again) or after it (the same reply).
    expect([one.status, other.status].filter((status) => status !== 201 && status !== 409)).toEqual([]);
    expect((await start(job, {}, key).expect(201)).body).toEqual(first);
    expect(await checkoutUrl(job)).toBe(first.checkoutUrl);
    expect(await stateOf(job.intakeId)).toEqual(['pending']);
  });

  it('are pending until paid; then booked once, with job number and page', async () => {
    const job = await priced();
    const url = await checkoutUrl(job);
    expect((await job.browser.get('/api/intakes/current/deposit').expect(200)).body).toMatchObject({ state: 'pending', jobNumber: null, myUrl: null });
    await provider.pay(url, GOOD);
    await until(async () => (await stateOf(job.intakeId)).includes('paid'));
    const { body } = (await job.browser.get('/api/intakes/current/deposit').expect(200)) as { body: Deposit };
    expect(body).toMatchObject({ state: 'paid', amountCents: job.option.depositCents, optionTitle: job.option.title, email: contact.email });
    expect(body.jobNumber).toBeGreaterThan(1000);
    expect(body.myUrl).toMatch(new RegExp(`^${testOrigin}/my/[\\w-]{43}$`));
    expect((await start(job).expect(409)).body).toMatchObject({ detail: expect.stringContaining('already paid') as string });
    const { data } = await provider.stripe.events.list({ type: 'checkout.session.completed', limit: 1 });
    expect(await provider.resend(data[0]?.id ?? '', { times: 5 })).toEqual([204, 204, 204, 204, 204]);
    expect(await app.deps.models.Lead.count({ where: { intakeId: job.intakeId } })).toBe(1);
    expect(await app.deps.models.Mail.count({ where: { intakeId: job.intakeId } })).toBe(2);
  });

  it('take nothing from a declined card, and then another card', async () => {
    const job = await priced();
    const url = await checkoutUrl(job);
    await provider.pay(url, DECLINED);
    expect((await job.browser.get('/api/intakes/current/deposit').expect(200)).body).toMatchObject({ state: 'pending' });
    await provider.pay(url, GOOD);
    await until(async () => (await stateOf(job.intakeId)).includes('paid'));
  });

  it('are found paid by asking the provider when its message is late', async () => {
    await provider.setMode({ hold: true });
    const job = await priced();
    await provider.pay(await checkoutUrl(job), GOOD);
    expect((await job.browser.get('/api/intakes/current/deposit').expect(200)).body).toMatchObject({ state: 'paid' });
    await provider.setMode({ hold: false });
    await until(async () => (await provider.stripe.events.list({ type: 'checkout.session.completed', limit: 1 })).data.length === 1);
    expect(await app.deps.models.Lead.count({ where: { intakeId: job.intakeId } })).toBe(1);
  });

  it('close the payment page of an option that another one replaces', async () => {
    const job = await priced();
    const first = await checkoutUrl(job);
    const other = job.document.options.find(({ id }) => id !== job.option.id);
    if (!other) throw new Error('There is another option');
    const second = await checkoutUrl({ ...job, option: other });
    expect(second).not.toBe(first);
    await provider.pay(first, GOOD);
    await provider.pay(second, GOOD);
    await until(async () => (await stateOf(job.intakeId)).includes('paid'));
    expect(await stateOf(job.intakeId)).toEqual(['expired', 'paid']);
    expect((await app.deps.models.Lead.findOne({ where: { intakeId: job.intakeId } }))?.optionId).toBe(other.id);
  });

  it('start a new page when the old one ran out', async () => {
    const job = await priced();
    const first = await checkoutUrl(job);
    await provider.stripe.checkout.sessions.expire(first.split('/pay/')[1] ?? '');
    expect(await checkoutUrl(job)).not.toBe(first);
  });

  it('are sent back once when two payment pages of one intake were paid', async () => {
    const { intakeId, quoteId, option } = await storePricedIntake(app.deps);
    for (const email of ['one@example.com', 'other@example.com']) {
      const { id: depositId, amountCents } = await app.deps.models.Deposit.create({
        intakeId, quoteId, optionId: option.id, contact: { ...contact, email }, consentWords: 'agreed', amountCents: option.depositCents,
      });
      const facts = { depositId, intakeId, amountCents, email, optionTitle: option.title, companyName: 'Demo', publicUrl: testOrigin };
      await provider.pay((await createCheckoutSession(provider.stripe, facts)).url ?? '', GOOD);
    }
    const extra = () => app.deps.models.Deposit.findOne({ where: { intakeId, state: 'pending', paidAt: { [Op.not]: null } } });
    await until(async () => (await extra()) !== null);
    const { id } = (await extra()) ?? { id: '' };
    await Promise.all([refundDeposit(app.deps, provider.stripe, id), refundDeposit(app.deps, provider.stripe, id).catch(() => undefined)]);
    await until(async () => (await stateOf(intakeId)).includes('refunded'));
    await refundDeposit(app.deps, provider.stripe, id);
    expect(await stateOf(intakeId)).toEqual(['paid', 'refunded']);
    const { data } = await provider.stripe.events.list({ type: 'charge.refunded', limit: 100 });
    expect(data).toHaveLength(1);
  });

  it('say that nothing was taken while the provider is away, and go on afterwards', async () => {
    const job = await priced();
    const away = createStripe({ secretKey: 'sk_test_tests', apiBase: 'http://127.0.0.1:1' });
    const refused = await start(await priced(browserOf(createApp({ ...app.deps, stripe: away }).app))).expect(503);
    expect(refused.body).toMatchObject({ type: '/problems/payment-unavailable', detail: expect.stringContaining('Nothing was taken') as string });

    await provider.setMode({ down: true });
    await start(job).expect(503);
    await provider.setMode({ down: false });
    await start(job).expect(201);
    expect(await stateOf(job.intakeId)).toEqual(['pending']);
  });

  it('count no event that is forged, old or empty', async () => {
    const job = await priced();
    await provider.setMode({ hold: true });
    await provider.pay(await checkoutUrl(job), GOOD);
    const { data } = await provider.stripe.events.list({ type: 'checkout.session.completed', limit: 1 });
    const id = data[0]?.id ?? '';
    expect(await provider.resend(id, { secret: 'whsec_guessed' })).toEqual([400]);
    // Five minutes is the SDK's own tolerance.
    expect(await provider.resend(id, { ageSeconds: 301 })).toEqual([400]);
    const webhook = '/api/webhooks/stripe';
    await app.browser().post(webhook).send({ id, type: 'checkout.session.completed' }).expect(400).expect('Content-Type', /problem\+json/);
    await app.browser().post(webhook).expect(400);
    expect(await stateOf(job.intakeId)).toEqual(['pending']);
    expect(await provider.resend(id)).toEqual([204]);
    expect(await stateOf(job.intakeId)).toEqual(['paid']);
  });

  it('leave no name, address or ZIP in the log', () => {
    expect(app.log()).not.toMatch(/Maren|maren@|Example Lane|00017/);
  });
});
