import type { Deposit as DepositSeen } from '../../shared/api/quotes';
import { problem } from '../http/problem';
import type { Db } from '../models/db';
import type { Deposit } from '../models/deposit';
import { findSession, providerIsAway } from '../payments/stripe';
import { readQuote } from '../quotes/read-quote';
import { settleDeposit } from './settle-deposit';
import type { DepositDeps } from './start-deposit';

/** The one that counts: the paid one, else the newest. */
export async function standingDeposit({ models }: Db, intakeId: string): Promise<Deposit | null> {
  const deposits = await models.Deposit.findAll({ where: { intakeId }, order: [['createdAt', 'DESC'], ['id', 'ASC']] });
  return deposits.find(({ state }) => state === 'paid') ?? deposits[0] ?? null;
}

/** Asks the provider about a pending deposit, whose message may be late; while the provider is away it simply stays pending. */
async function catchUp(deps: DepositDeps, deposit: Deposit): Promise<void> {
  if (!deps.stripe || deposit.checkoutSessionId === null) return;
  try {
    const session = await findSession(deps.stripe, deposit.checkoutSessionId);
    if (!session) return;
    await deps.sequelize.transaction((transaction) => settleDeposit(deps, transaction, session, deps.clock()));
    deps.jobs.nudge();
  } catch (error) {
    if (!providerIsAway(error)) throw error;
    deps.logger.warn({ depositId: deposit.id }, 'deposits: the payment provider does not answer');
  }
}

/** What anybody who may see a deposit sees of it. */
export async function presentDeposit({ sequelize, models }: Db, deposit: Deposit): Promise<Omit<DepositSeen, 'myUrl'>> {
  const { document } = await readQuote(sequelize, deposit.quoteId);
  const lead = await models.Lead.findOne({ where: { depositId: deposit.id } });
  return {
    state: deposit.state, amountCents: deposit.amountCents, optionTitle: document.options.find(({ id }) => id === deposit.optionId)?.title ?? '',
    jobNumber: lead?.jobNumber ?? null, email: deposit.contact.email, paidAt: deposit.paidAt?.toISOString() ?? null,
  };
}

/**
 * Where the deposit of an intake stands, after asking the provider when it is still pending.
 * @param myUrl makes the address of the homeowner's page once it is paid
 * @throws problem not-found when none was started
 */
export async function readDeposit(deps: DepositDeps, intakeId: string, myUrl: () => Promise<string>): Promise<DepositSeen> {
  let deposit = await standingDeposit(deps, intakeId);
  if (deposit?.state === 'pending') {
    await catchUp(deps, deposit);
    deposit = await standingDeposit(deps, intakeId);
  }
  if (!deposit) throw problem('not-found', 'No deposit was started yet.');
  return { ...(await presentDeposit(deps, deposit)), myUrl: deposit.state === 'paid' ? await myUrl() : null };
}
