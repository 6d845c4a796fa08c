import type Stripe from 'stripe';
import type { Transaction } from 'sequelize';
import { dollars } from '../../shared/money';
import { addTask } from '../jobs/outbox';
import { createLead } from '../leads/create-lead';
import { queueMail } from '../mail/queue-mail';
import type { Deposit } from '../models/deposit';
import type { Db } from '../models/db';
import { readQuote } from '../quotes/read-quote';

export type Settled = 'paid' | 'paid-before' | 'refunding' | 'expired' | 'unknown' | 'unchanged';

async function depositOf({ models: { Deposit } }: Db, transaction: Transaction, session: Stripe.Checkout.Session): Promise<Deposit | null> {
  const known = await Deposit.findOne({ where: { checkoutSessionId: session.id }, transaction });
  if (known) return known;
  // We stopped between the provider's answer and our own note of it: the session still says whose it is.
  const reference = session.client_reference_id ?? '';
  return /^[0-9a-f-]{36}$/.test(reference) ? Deposit.findByPk(reference, { transaction }) : null;
}

const intentOf = ({ payment_intent: intent }: Stripe.Checkout.Session): string | null => (typeof intent === 'string' ? intent : (intent?.id ?? null));

/**
 * Brings a deposit into line with the provider's session: paid (with lead, history, receipt and the mail to the desk), expired, or
 * unchanged. All in the caller's transaction; the same session again changes nothing. A second payment for one intake is sent back.
 */
export async function settleDeposit(db: Db, transaction: Transaction, session: Stripe.Checkout.Session, now: Date): Promise<Settled> {
  const deposit = await depositOf(db, transaction, session);
  if (!deposit) return 'unknown';
  // Payments of one intake are settled one after the other; what was read before the lock may be old.
  await db.models.Intake.findByPk(deposit.intakeId, { transaction, lock: transaction.LOCK.UPDATE });
  await deposit.reload({ transaction });
  if (deposit.paidAt !== null) return 'paid-before';
  if (session.payment_status === 'paid') return pay(db, transaction, session, deposit, now);
  if (session.status !== 'expired' || deposit.state !== 'pending') return 'unchanged';
  await deposit.update({ state: 'expired', checkoutSessionId: session.id }, { transaction });
  return 'expired';
}

async function pay(db: Db, transaction: Transaction, session: Stripe.Checkout.Session, deposit: Deposit, now: Date): Promise<Settled> {
  if (session.amount_total !== deposit.amountCents) throw new RangeError(`Deposit ${deposit.id}: the provider took another amount than we asked for`);
  const { models } = db;
  const { id, intakeId } = deposit;
  const payment = { checkoutSessionId: session.id, paymentIntentId: intentOf(session), paidAt: now };
  if (await models.Deposit.findOne({ where: { intakeId, state: 'paid' }, transaction })) {
    await deposit.update(payment, { transaction });
    await addTask(db, transaction, 'refund-deposit', `refund:${id}`, { depositId: id });
    return 'refunding';
  }
  await deposit.update({ ...payment, state: 'paid' }, { transaction });
  await models.Intake.update({ stage: 'paid', updatedAt: now }, { where: { id: intakeId }, transaction });
  const { document } = await readQuote(db.sequelize, deposit.quoteId, transaction);
  const option = document.options.find((one) => one.id === deposit.optionId);
  if (!option) throw new RangeError(`Deposit ${id}: its quote has no option ${deposit.optionId}`);
  const { contact, consentWords, createdAt: consentAt } = deposit;
  const job = { intakeId, quoteId: deposit.quoteId, document, option, depositId: id, contact, consentWords, consentAt };
  const lead = await createLead(db, transaction, job, now);
  await models.History.create(
    { leadId: lead.id, intakeId, at: now, who: 'Payment provider', what: 'Deposit paid', after: `${dollars(deposit.amountCents)} for ${option.title}` },
    { transaction },
  );
  await queueMail(db, transaction, { intakeId, leadId: lead.id, template: 'receipt', dedupeKey: `receipt:${id}` });
  await queueMail(db, transaction, { intakeId, leadId: lead.id, template: 'new-lead', dedupeKey: `new-lead:${id}` });
  return 'paid';
}
