import { Op, type Transaction } from 'sequelize';
import type Stripe from 'stripe';
import type { Contact } from '../../shared/api/intakes';
import { consentWords } from '../../shared/consent';
import type { QuoteOption } from '../../shared/quote';
import { company } from '../config/company';
import type { Deps } from '../deps';
import { problem } from '../http/problem';
import type { Deposit } from '../models/deposit';
import { findSession, providerIsAway } from '../payments/stripe';
import { findQuote } from '../quotes/read-quote';
import { isoDateIn } from '../words/dates';
import { createCheckoutSession } from './checkout-session';
import { settleDeposit } from './settle-deposit';

export type DepositDeps = Pick<Deps, 'sequelize' | 'models' | 'stripe' | 'clock' | 'env' | 'jobs' | 'logger'>;
export interface DepositRequest {
  readonly intakeId: string;
  readonly quoteId: string;
  readonly optionId: string;
  readonly contact: Contact;
}

const paidAlready = () => problem('conflict', 'The deposit for this job is already paid. Nothing more is taken.');
const unavailable = () => problem('payment-unavailable', 'Nothing was taken and your price is kept. Try again in a minute.');

/** Runs calls to the provider; when it is away the public gets a clear refusal instead of a failure. */
async function atProvider<T>(call: () => Promise<T>): Promise<T> {
  try {
    return await call();
  } catch (error) {
    throw providerIsAway(error) ? unavailable() : error;
  }
}

async function chosenOption({ sequelize, clock }: DepositDeps, transaction: Transaction, request: DepositRequest): Promise<QuoteOption> {
  const quote = await findQuote(sequelize, request.quoteId, transaction);
  if (quote?.intakeId !== request.intakeId) throw problem('not-found', 'There is no such price.');
  if (quote.withdrawnAt !== null) throw problem('conflict', 'An answer changed, so this price no longer holds. Look at the new one first.');
  const { document } = quote;
  if (document.heldUntil < isoDateIn(clock(), document.jurisdiction.timeZone)) throw problem('conflict', 'The day until which this price was held is over. Ask for a new one.');
  if (document.options.length === 0) throw problem('no-price', 'This job needs a visit before there is a price.');
  const option = document.options.find(({ id }) => id === request.optionId);
  if (!option) throw problem('validation', undefined, [{ pointer: '/optionId', detail: 'Pick one of the options of this price' }]);
  return option;
}

/** The pending deposit to go on with, and those that it replaces. */
interface Prepared { readonly deposit: Deposit; readonly option: QuoteOption; readonly replaced: readonly Deposit[] }

const prepare = (deps: DepositDeps, request: DepositRequest): Promise<Prepared> =>
  deps.sequelize.transaction(async (transaction) => {
    const { Deposit, Intake } = deps.models;
    const { intakeId, quoteId, optionId, contact } = request;
    const intake = await Intake.findByPk(intakeId, { transaction, lock: transaction.LOCK.UPDATE });
    if (intake?.stage === 'paid') throw paidAlready();
    const option = await chosenOption(deps, transaction, request);
    const pending = await Deposit.findAll({ where: { intakeId, state: 'pending', paidAt: { [Op.is]: null } }, transaction });
    // The provider keeps the address, so another address needs another session.
    const same = pending.find((one) => one.quoteId === quoteId && one.optionId === optionId && one.contact.email === contact.email);
    const deposit = same
      ? await same.update({ contact }, { transaction })
      : await Deposit.create(
        { intakeId, quoteId, optionId, contact, consentWords, amountCents: option.depositCents, createdAt: deps.clock() },
        { transaction },
      );
    return { deposit, option, replaced: pending.filter(({ id }) => id !== deposit.id) };
  });

/** Brings our row into line with a session; refuses to go on when it turns out to be paid. */
async function settle(deps: DepositDeps, session: Stripe.Checkout.Session): Promise<void> {
  const result = await deps.sequelize.transaction((transaction) => settleDeposit(deps, transaction, session, deps.clock()));
  deps.jobs.nudge();
  if (result === 'paid' || result === 'paid-before' || result === 'refunding') throw paidAlready();
}

/** Ends a deposit that nobody paid; one that was paid in the meantime stays as it is. */
const expire = ({ models }: DepositDeps, id: string) => models.Deposit.update({ state: 'expired' }, { where: { id, state: 'pending', paidAt: { [Op.is]: null } } });

/** Closes the payment page of a deposit that another one replaces, so that nobody pays it by mistake. */
async function close(deps: DepositDeps, stripe: Stripe, { id, checkoutSessionId }: Deposit): Promise<void> {
  const session = checkoutSessionId === null ? null : await findSession(stripe, checkoutSessionId);
  if (session) await settle(deps, session.status === 'open' ? await stripe.checkout.sessions.expire(session.id) : session);
  else await expire(deps, id);
}

/**
 * Makes the payment page for the deposit of one option; the amount is the frozen document's. A second click goes on with the same page.
 * @returns the page's address
 * @throws problems: not-found, conflict (paid, withdrawn, run out), no-price, validation, payment-unavailable (nothing was taken)
 */
export async function startDeposit(deps: DepositDeps, request: DepositRequest): Promise<string> {
  const { stripe } = deps;
  if (!stripe) throw unavailable();
  const { deposit, option, replaced } = await prepare(deps, request);
  const { id: depositId, intakeId, amountCents, contact: { email } } = deposit;
  const session = await atProvider(async () => {
    for (const other of replaced) await close(deps, stripe, other);
    if (deposit.checkoutSessionId !== null) return findSession(stripe, deposit.checkoutSessionId);
    return createCheckoutSession(stripe, {
      depositId, intakeId, amountCents, email, optionTitle: option.title, companyName: company.name, publicUrl: deps.env.PUBLIC_URL,
    });
  });
  if (session?.url && session.status === 'open') {
    if (deposit.checkoutSessionId === null) await deposit.update({ checkoutSessionId: session.id });
    return session.url;
  }
  if (session) await settle(deps, session);
  // Its page ran out: that deposit is over, and a new one takes its place.
  await expire(deps, depositId);
  return startDeposit(deps, request);
}
