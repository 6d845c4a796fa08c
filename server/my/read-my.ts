import { dollars } from '../../shared/money';
import type { My } from '../../shared/api/quotes';
import { company } from '../config/company';
import { presentDeposit } from '../deposits/read-deposit';
import type { Deps } from '../deps';
import { problem } from '../http/problem';
import { readQuote } from '../quotes/read-quote';
import { dayInWords } from '../../shared/dates';
import { timeline } from './timeline';

/**
 * The homeowner's page of an intake: the frozen price, the deposit, and what comes next.
 * @throws problem not-found when the intake is no job
 */
export async function readMy({ sequelize, models, clock }: Deps, intakeId: string): Promise<My> {
  const lead = await models.Lead.findOne({ where: { intakeId } });
  if (!lead?.quoteId) throw problem('not-found', 'There is no job behind this link yet.');
  const { document } = await readQuote(sequelize, lead.quoteId);
  const deposit = lead.depositId === null ? null : await models.Deposit.findByPk(lead.depositId);
  const zone = document.jurisdiction.timeZone;
  const day = (at: Date) => dayInWords(at, zone, clock());
  return {
    jobNumber: lead.jobNumber, name: lead.name, street: lead.street, town: lead.town, phone: company.phone,
    stage: lead.stage, quote: document, optionId: lead.optionId, deposit: deposit && await presentDeposit({ sequelize, models }, deposit),
    timeline: timeline({
      stage: lead.stage,
      depositWords: deposit?.paidAt ? `${dollars(deposit.amountCents)}, ${day(deposit.paidAt)}` : null,
      dueOn: lead.dueAt && day(lead.dueAt),
      firmPrice: lead.firmCents === null ? null : dollars(lead.firmCents),
    }),
  };
}
