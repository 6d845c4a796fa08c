import { QueryTypes } from 'sequelize';
import type { Lead } from '../../shared/api/desk';
import { answersToFacts } from '../../shared/wizard/index';
import { factsInWords } from '../../shared/wizard/facts-in-words';
import type { Role } from '../../shared/roles';
import type { Deps } from '../deps';
import { problem } from '../http/problem';
import { listPhotos } from '../photos/list-photos';
import { readDocument } from '../quotes/read-document';
import { movesFor } from './move-lead';
import { differencesOf, presentLeadRow, rowColumns, type LeadRecord } from './present';

/** Everything that a person of this role sees of one lead. @throws problem not-found */
export async function getLead({ sequelize, models }: Pick<Deps, 'sequelize' | 'models'>, id: string, role: Role): Promise<Lead> {
  const lead = await models.Lead.findByPk(id);
  const [row] = await sequelize.query<LeadRecord>(
    `SELECT ${rowColumns} FROM leads LEFT JOIN staff ON staff.id = leads.assignee_id LEFT JOIN deposits ON deposits.id = leads.deposit_id WHERE leads.id = $1`,
    { type: QueryTypes.SELECT, bind: [id] },
  );
  const intake = lead && await models.Intake.findByPk(lead.intakeId);
  if (!lead || !row || !intake) throw problem('not-found', 'There is no such lead');
  const [photos, quote, deposit, history] = await Promise.all([
    listPhotos(models, lead.intakeId),
    lead.quoteId ? models.Quote.findByPk(lead.quoteId) : null,
    lead.depositId ? models.Deposit.findByPk(lead.depositId) : null,
    sequelize.query<{ id: string; at: Date; who: string; what: string; before: string | null; after: string | null }>(
      'SELECT id, at, who, what, before, after FROM history WHERE lead_id = $1 OR (lead_id IS NULL AND intake_id = $2) ORDER BY at DESC, id DESC LIMIT 200',
      { type: QueryTypes.SELECT, bind: [id, lead.intakeId] },
    ),
  ]);
  const document = quote ? readDocument(quote) : null;
  const facts = [...factsInWords(answersToFacts(intake.answers), {})];
  return {
    ...presentLeadRow(row),
    version: lead.version, email: lead.email, phone: lead.phone, street: lead.street, contactWays: lead.contactWays, consentAt: lead.consentAt.toISOString(),
    facts, photos, quote: document, optionId: lead.optionId,
    deposit: deposit && { state: deposit.state, amountCents: deposit.amountCents, paidAt: deposit.paidAt?.toISOString() ?? null },
    differences: document ? differencesOf(document.facts, facts) : [],
    history: history.map((entry) => ({ ...entry, at: entry.at.toISOString() })),
    moves: [...movesFor(lead.stage, role)],
  };
}
