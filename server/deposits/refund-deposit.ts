import type Stripe from 'stripe';
import type { Db } from '../models/db';

/**
 * Sends a deposit back to the card, once however often it is called: the key is the deposit's. Our own row follows when the provider's
 * event comes.
 * @throws the provider's error while it is away, so that the job is tried again
 */
export async function refundDeposit({ models: { Deposit } }: Db, stripe: Stripe, depositId: string): Promise<void> {
  const deposit = await Deposit.findByPk(depositId);
  if (!deposit?.paymentIntentId || deposit.state === 'refunded') return;
  await stripe.refunds.create(
    { payment_intent: deposit.paymentIntentId, reason: 'duplicate', metadata: { depositId } },
    { idempotencyKey: `refund:${depositId}` },
  );
}
