import { QueryTypes, type Transaction } from 'sequelize';
import type Stripe from 'stripe';
import type { Db } from '../models/db';
import { settleDeposit, type Settled } from './settle-deposit';

export type Handled = Settled | 'seen' | 'refunded' | 'ignored';

type SessionEvent =
  | Stripe.CheckoutSessionCompletedEvent
  | Stripe.CheckoutSessionAsyncPaymentSucceededEvent
  | Stripe.CheckoutSessionExpiredEvent;

const sessionEvents: ReadonlySet<string> = new Set([
  'checkout.session.completed', 'checkout.session.async_payment_succeeded', 'checkout.session.expired',
]);
const tellsOfSession = (event: Stripe.Event): event is SessionEvent => sessionEvents.has(event.type);

/**
 * Takes one signed event of the provider. It is noted in the same transaction as what it does, so that it counts once however often
 * and in whatever order it comes; two copies at the same moment wait for each other at the event's key.
 */
export const handleEvent = (db: Db, event: Stripe.Event, now: Date): Promise<Handled> =>
  db.sequelize.transaction(async (transaction) => {
    const fresh = await db.sequelize.query(
      'INSERT INTO payment_events (event_id, type, created_at, handled_at) VALUES ($id, $type, $createdAt, $now) ON CONFLICT (event_id) DO NOTHING RETURNING event_id',
      { type: QueryTypes.SELECT, transaction, bind: { id: event.id, type: event.type, createdAt: new Date(event.created * 1000), now } },
    );
    if (fresh.length === 0) return 'seen';
    if (event.type === 'charge.refunded') return noteRefund(db, transaction, event.data.object, now);
    return tellsOfSession(event) ? settleDeposit(db, transaction, event.data.object, now) : 'ignored';
  });

async function noteRefund({ models }: Db, transaction: Transaction, charge: Stripe.Charge, now: Date): Promise<Handled> {
  const { Deposit, History, Lead } = models;
  const paymentIntentId = typeof charge.payment_intent === 'string' ? charge.payment_intent : charge.payment_intent?.id;
  if (paymentIntentId === undefined || !charge.refunded) return 'ignored';
  const deposit = await Deposit.findOne({ where: { paymentIntentId }, transaction, lock: transaction.LOCK.UPDATE });
  if (!deposit || deposit.state === 'refunded') return 'ignored';
  const before = deposit.state;
  await deposit.update({ state: 'refunded', refundedAt: now }, { transaction });
  const lead = await Lead.findOne({ where: { intakeId: deposit.intakeId }, transaction });
  await History.create(
    { leadId: lead?.id ?? null, intakeId: deposit.intakeId, at: now, who: 'Payment provider', what: 'Deposit sent back', before, after: 'refunded' },
    { transaction },
  );
  return 'refunded';
}
