import { randomUUID } from 'node:crypto';
import { QueryTypes } from 'sequelize';
import type Stripe from 'stripe';
import { handleEvent } from '../../../server/deposits/handle-event';
import { useDb } from '../../support/db';
import { contact, storePricedIntake, type PricedIntake } from '../../support/priced-intake';

// Events in the shape of stripe 23.1.0's types. That they come repeated and in any order: the provider's documentation (from memory).
describe('events of the payment provider', () => {
  const db = useDb();
  const now = new Date('2026-12-01T17:00:00Z');

  const storeDeposit = async ({ intakeId, quoteId, option }: PricedIntake) => {
    const sessionId = `cs_test_${randomUUID()}`;
    const deposit = await db.models.Deposit.create({
      intakeId, quoteId, optionId: option.id, contact, consentWords: 'agreed', amountCents: option.depositCents, checkoutSessionId: sessionId, createdAt: now,
    });
    return { deposit, sessionId };
  };
  const event = (type: Stripe.Event.Type, object: object, id = `evt_${randomUUID()}`) =>
    ({ id, object: 'event', type, created: Math.floor(now.getTime() / 1000), data: { object } }) as unknown as Stripe.Event;
  const session = (id: string, changes: Partial<Stripe.Checkout.Session> = {}) => ({
    id, object: 'checkout.session', status: 'complete', payment_status: 'paid', amount_total: 15_000, payment_intent: `pi_${id}`, client_reference_id: null, ...changes,
  });
  const outboxOf = (key: string) => db.sequelize.query<{ kind: string; payload: Record<string, string> }>('SELECT kind, payload FROM outbox WHERE dedupe_key LIKE $key', { type: QueryTypes.SELECT, bind: { key } });

  it('records a deposit once however often the event comes, even at the same moment', async () => {
    const priced = await storePricedIntake(db);
    const { deposit, sessionId } = await storeDeposit(priced);
    const paid = event('checkout.session.completed', session(sessionId));
    const results = await Promise.all(Array.from({ length: 6 }, () => handleEvent(db, paid, now)));
    expect(results.filter((result) => result === 'paid')).toHaveLength(1);
    expect(results.filter((result) => result === 'seen')).toHaveLength(5);
    // Another event that tells of the same payment.
    expect(await handleEvent(db, event('checkout.session.async_payment_succeeded', session(sessionId)), now)).toBe('paid-before');

    expect(await deposit.reload()).toMatchObject({ state: 'paid', paidAt: now, paymentIntentId: `pi_${sessionId}` });
    expect((await db.models.Intake.findByPk(priced.intakeId))?.stage).toBe('paid');
    const leads = await db.models.Lead.findAll({ where: { intakeId: priced.intakeId } });
    expect(leads).toHaveLength(1);
    expect(leads[0]).toMatchObject({
      stage: 'check-photos', name: 'Maren Oakes', town: 'Harrow Bend', work: priced.option.title, lowCents: priced.option.lowCents, highCents: priced.option.highCents,
      consentWords: 'agreed', dueAt: new Date('2026-12-04T00:00:00Z'),
    });
    expect(await db.models.History.count({ where: { intakeId: priced.intakeId, what: 'Deposit paid' } })).toBe(1);
    const mails = await db.models.Mail.findAll({ where: { intakeId: priced.intakeId }, order: ['template'] });
    expect(mails.map(({ template }) => template)).toEqual(['new-lead', 'receipt']);
    expect(await outboxOf(`mail:receipt:${deposit.id}`)).toEqual([{ kind: 'send-mail', payload: { mailId: mails[1]?.id } }]);
  });

  it('takes them in any order: expired after paid changes nothing, paid after expired counts', async () => {
    const first = await storeDeposit(await storePricedIntake(db));
    await handleEvent(db, event('checkout.session.completed', session(first.sessionId)), now);
    expect(await handleEvent(db, event('checkout.session.expired', session(first.sessionId, { status: 'expired', payment_status: 'unpaid' })), now)).toBe('paid-before');
    expect((await first.deposit.reload()).state).toBe('paid');

    const second = await storeDeposit(await storePricedIntake(db));
    expect(await handleEvent(db, event('checkout.session.expired', session(second.sessionId, { status: 'expired', payment_status: 'unpaid' })), now)).toBe('expired');
    expect(await handleEvent(db, event('checkout.session.completed', session(second.sessionId)), now)).toBe('paid');
    expect((await second.deposit.reload()).state).toBe('paid');
  });

  it('finds the deposit by our own reference when its session was never noted', async () => {
    const { deposit } = await storeDeposit(await storePricedIntake(db));
    await deposit.update({ checkoutSessionId: null });
    expect(await handleEvent(db, event('checkout.session.completed', session('cs_test_lost', { client_reference_id: deposit.id })), now)).toBe('paid');
    expect((await deposit.reload()).checkoutSessionId).toBe('cs_test_lost');
  });

  it('never counts two payments for one intake: the second is sent back', async () => {
    const priced = await storePricedIntake(db);
    const [one, other] = [await storeDeposit(priced), await storeDeposit(priced)];
    const results = await Promise.all([one, other].map(({ sessionId }) => handleEvent(db, event('checkout.session.completed', session(sessionId)), now)));
    expect(results.sort()).toEqual(['paid', 'refunding']);
    const extra = (await one.deposit.reload()).state === 'paid' ? other.deposit : one.deposit;
    expect(await outboxOf(`refund:${extra.id}`)).toEqual([{ kind: 'refund-deposit', payload: { depositId: extra.id } }]);
    expect(await db.models.Lead.count({ where: { intakeId: priced.intakeId } })).toBe(1);

    const refunded = event('charge.refunded', { payment_intent: (await extra.reload()).paymentIntentId, refunded: true });
    expect(await handleEvent(db, refunded, now)).toBe('refunded');
    expect(await handleEvent(db, refunded, now)).toBe('seen');
    expect((await extra.reload()).state).toBe('refunded');
  });

  it('leaves everything as it was when the amount is another', async () => {
    const { deposit, sessionId } = await storeDeposit(await storePricedIntake(db));
    const odd = event('checkout.session.completed', session(sessionId, { amount_total: 1 }));
    await expect(handleEvent(db, odd, now)).rejects.toThrow('another amount');
    expect((await deposit.reload()).state).toBe('pending');
    expect(await db.models.PaymentEvent.findByPk(odd.id)).toBeNull();
  });

  it('notes events that are not ours and does nothing', async () => {
    expect(await handleEvent(db, event('checkout.session.completed', session('cs_test_stranger')), now)).toBe('unknown');
    expect(await handleEvent(db, event('customer.created', { id: 'cus_1' }), now)).toBe('ignored');
    expect(await handleEvent(db, event('charge.refunded', { payment_intent: 'pi_stranger', refunded: true }), now)).toBe('ignored');
  });
});
