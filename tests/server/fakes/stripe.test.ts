import { createServer } from 'node:http';
import { mkdtempSync, rmSync } from 'node:fs';
import type { AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type Stripe from 'stripe';
import { createStripe, providerIsAway } from '../../../server/payments/stripe';
import { startFakeStripe, WEBHOOK_SECRET, type FakeStripeServer } from '../../support/fake-stripe';

// The outside check is the provider's own SDK, with its types, its errors and its signature check (stripe 23.1.0, API 2026-10-28).
// Statuses, codes and texts of refusals: from memory of the provider's API reference.
// Test card 4000 0000 0000 0341: invented use for the demo.
const params = (): Stripe.Checkout.SessionCreateParams => ({
  mode: 'payment',
  line_items: [{ quantity: 1, price_data: { currency: 'usd', unit_amount: 15_000, product_data: { name: 'Deposit, wall charger 60 A' } } }],
  success_url: 'http://127.0.0.1:1/quote/deposit?session={CHECKOUT_SESSION_ID}', cancel_url: 'http://127.0.0.1:1/quote/price', client_reference_id: 'dep-1',
  customer_email: 'maren@example.com', metadata: { depositId: 'dep-1' }, payment_intent_data: { metadata: { depositId: 'dep-1' } },
});

describe('the practice payment provider', () => {
  let fake: FakeStripeServer;
  let stripe: Stripe;
  const received: Stripe.Event[] = [];
  let answers: number[] = [];
  const receiver = createServer((request, response) => {
    const parts: Buffer[] = [];
    request.on('data', (part: Buffer) => parts.push(part)).on('end', () => {
      const status = answers.shift() ?? 200;
      // Throws when the signature is not as the SDK wants it.
      if (status === 200) received.push(stripe.webhooks.constructEvent(Buffer.concat(parts), request.headers['stripe-signature'] ?? '', WEBHOOK_SECRET));
      response.writeHead(status).end();
    });
  });

  beforeAll(async () => {
    fake = await startFakeStripe();
    stripe = fake.stripe;
    await new Promise<void>((ready) => { receiver.listen(0, '127.0.0.1', ready); });
    fake.sendEventsTo(`http://127.0.0.1:${(receiver.address() as AddressInfo).port}`);
  });
  afterAll(async () => {
    await fake.close();
    await new Promise((done) => receiver.close(done));
  });
  beforeEach(() => { received.length = 0; answers = []; });

  const arrives = async (type: string) => {
    for (let tries = 0; tries < 100; tries += 1) {
      const event = received.find((one) => one.type === type);
      if (event) return event;
      await new Promise((next) => setTimeout(next, 50));
    }
    throw new Error(`${type} did not arrive`);
  };
  const refusal = (call: Promise<unknown>): Promise<Stripe.errors.StripeError> => call.then(() => { throw new Error('was not refused'); }, (error: Stripe.errors.StripeError) => error);

  it('makes a session that is open and unpaid, and finds it again', async () => {
    const made = await stripe.checkout.sessions.create(params());
    expect(made).toMatchObject({ object: 'checkout.session', status: 'open', payment_status: 'unpaid', amount_total: 15_000, currency: 'usd', client_reference_id: 'dep-1', payment_intent: null, livemode: false });
    expect(made.id).toMatch(/^cs_test_\w+$/);
    expect(made.expires_at - made.created).toBe(24 * 60 * 60);
    expect(await stripe.checkout.sessions.retrieve(made.id)).toMatchObject({ id: made.id, url: made.url });
  });

  it('refuses what the provider refuses', async () => {
    expect(await refusal(stripe.checkout.sessions.retrieve('cs_test_none'))).toMatchObject({ statusCode: 404, code: 'resource_missing', type: 'StripeInvalidRequestError' });
    expect(await refusal(stripe.checkout.sessions.create({ ...params(), customer_email: 'no address' }))).toMatchObject({ statusCode: 400, param: 'customer_email' });
    expect(await refusal(stripe.checkout.sessions.create({ ...params(), mode: 'setup' }))).toMatchObject({ statusCode: 400, param: 'mode' });
    const cheap = { ...params(), line_items: [{ quantity: 1, price_data: { currency: 'usd', unit_amount: 49, product_data: { name: 'x' } } }] };
    expect(await refusal(stripe.checkout.sessions.create(cheap))).toMatchObject({ statusCode: 400, code: 'amount_too_small' });
    expect(await refusal(stripe.paymentIntents.retrieve('pi_none'))).toMatchObject({ statusCode: 404, code: 'resource_missing' });
    expect((await fetch(`${fake.url}/v1/checkout/sessions`, { method: 'POST' })).status).toBe(401);
    expect(await refusal(createStripe({ secretKey: 'sk_live_never', apiBase: fake.url }).checkout.sessions.create(params()))).toMatchObject({ type: 'StripeAuthenticationError' });
    expect((await fetch(`${fake.url}/v1/nothing`, { headers: { authorization: 'Bearer sk_test_x' } })).status).toBe(404);
  });

  it('answers the same idempotency key with the same session, and refuses it with other parameters', async () => {
    const idempotencyKey = 'key-1';
    const one = await stripe.checkout.sessions.create(params(), { idempotencyKey });
    const other = await stripe.checkout.sessions.create(params(), { idempotencyKey });
    expect(other.id).toBe(one.id);
    const clash = await refusal(stripe.checkout.sessions.create({ ...params(), client_reference_id: 'dep-2' }, { idempotencyKey }));
    expect(clash).toMatchObject({ statusCode: 400, type: 'StripeIdempotencyError' });
  });

  it('pays with the good card: complete, paid, a succeeded intent, one signed event', async () => {
    const { id, url } = await stripe.checkout.sessions.create(params());
    expect(await fake.pay(url ?? '', '4242 4242 4242 4242')).toBe(`http://127.0.0.1:1/quote/deposit?session=${id}`);
    const event = await arrives('checkout.session.completed');
    expect(event.data.object).toMatchObject({ id, status: 'complete', payment_status: 'paid' });
    const session = await stripe.checkout.sessions.retrieve(id);
    const intent = await stripe.paymentIntents.retrieve(String(session.payment_intent));
    expect(intent).toMatchObject({ status: 'succeeded', amount_received: 15_000, metadata: { depositId: 'dep-1' } });
    expect(await refusal(stripe.checkout.sessions.expire(id))).toMatchObject({ statusCode: 400 });
    expect((await stripe.events.list({ type: 'checkout.session.completed', limit: 1 })).data[0]?.id).toBe(event.id);

    await fake.pay(`${fake.url}/pay/${id}`, '4242424242424242');
    expect((await stripe.events.list({ type: 'checkout.session.completed', limit: 100 })).data.filter(({ data }) => 'id' in data.object && data.object.id === id)).toHaveLength(1);
  });

  it('declines the bad card, and lets another card pay', async () => {
    const { id, url } = await stripe.checkout.sessions.create(params());
    const again = new URL(await fake.pay(url ?? '', '4000 0000 0000 0002'), fake.url).href;
    expect(await (await fetch(again)).text()).toContain('Your card was declined. Nothing was taken.');
    expect((await stripe.checkout.sessions.retrieve(id)).payment_status).toBe('unpaid');
    expect(await fake.pay(again, '4242 4242 4242 4242')).toContain('/quote/deposit');
  });

  it('lets the card that needs a second try through at the second try', async () => {
    const { id, url } = await stripe.checkout.sessions.create(params());
    expect(await fake.pay(url ?? '', '4000 0000 0000 0341')).toBe(`/pay/${id}`);
    expect(await fake.pay(url ?? '', '4000 0000 0000 0341')).toContain('/quote/deposit');
  });

  it('expires a session; then it can no longer be paid', async () => {
    const { id, url } = await stripe.checkout.sessions.create(params());
    expect(await stripe.checkout.sessions.expire(id)).toMatchObject({ status: 'expired', url: null });
    expect(await arrives('checkout.session.expired')).toMatchObject({ data: { object: { id } } });
    expect(await fake.pay(url ?? '', '4242 4242 4242 4242')).toBe(`/pay/${id}`);
    expect((await stripe.checkout.sessions.retrieve(id)).payment_status).toBe('unpaid');
  });

  it('refunds once and sends charge.refunded', async () => {
    const { id, url } = await stripe.checkout.sessions.create(params());
    await fake.pay(url ?? '', '4242424242424242');
    const intent = String((await stripe.checkout.sessions.retrieve(id)).payment_intent);
    expect(await stripe.refunds.create({ payment_intent: intent, reason: 'requested_by_customer' })).toMatchObject({ status: 'succeeded', amount: 15_000 });
    expect(await arrives('charge.refunded')).toMatchObject({ data: { object: { refunded: true, amount_refunded: 15_000, payment_intent: intent } } });
    expect(await refusal(stripe.refunds.create({ payment_intent: intent }))).toMatchObject({ statusCode: 400, code: 'charge_already_refunded' });
  });

  it('sends an event again until it is taken', async () => {
    answers = [500, 503];
    const { id, url } = await stripe.checkout.sessions.create(params());
    await fake.pay(url ?? '', '4242424242424242');
    expect((await arrives('checkout.session.completed')).data.object).toMatchObject({ id });
    expect(answers).toEqual([]);
  });

  it('counts as away, not as a refusal, while it is switched off', async () => {
    await fake.setMode({ down: true });
    const error = await refusal(stripe.checkout.sessions.create(params(), { maxNetworkRetries: 0 }));
    await fake.setMode({ down: false });
    expect(providerIsAway(error)).toBe(true);
    expect(providerIsAway(await refusal(stripe.checkout.sessions.retrieve('cs_test_none')))).toBe(false);
  });

  it('keeps everything over a restart', async () => {
    const dir = mkdtempSync(join(tmpdir(), 'fake-stripe-kept-'));
    const first = await startFakeStripe(dir);
    const { id } = await first.stripe.checkout.sessions.create(params(), { idempotencyKey: 'kept' });
    await first.close();
    const second = await startFakeStripe(dir);
    expect((await second.stripe.checkout.sessions.retrieve(id)).status).toBe('open');
    expect((await second.stripe.checkout.sessions.create(params(), { idempotencyKey: 'kept' })).id).toBe(id);
    await second.close();
    rmSync(dir, { recursive: true });
  });
});
