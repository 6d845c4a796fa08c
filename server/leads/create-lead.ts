import type { Transaction } from 'sequelize';
import type { Contact } from '../../shared/api/intakes';
import type { QuoteDocument, QuoteOption } from '../../shared/quote';
import { feetInWords } from '../../shared/units';
import type { Db } from '../models/db';
import type { Lead } from '../models/lead';
import { dueAt } from './due-at';

export interface NewLead {
  readonly intakeId: string;
  readonly quoteId: string;
  readonly document: QuoteDocument;
  /** The option whose deposit is paid; null when a visit was asked for. */
  readonly option: QuoteOption | null;
  readonly depositId: string | null;
  readonly contact: Contact;
  /** What the homeowner agreed to, word for word, and when. */
  readonly consentWords: string;
  readonly consentAt: Date;
}

/** "Wall charger, 60 A" and "32 ft, metal pipe (EMT) along the walls"; or that there is no price, and why. */
function workWords({ option, document }: NewLead): { work: string; workNote: string } {
  if (option) return { work: option.title, workNote: `${feetInWords(option.run.lengthFt)}, ${option.run.methodWords.replace(/^[A-Z](?=[a-z])/, (letter) => letter.toLowerCase())}` };
  return { work: 'Visit, no price yet', workNote: document.flags.map(({ deskWords }) => deskWords).join('; ') };
}

/**
 * Makes the lead of an intake from a paid deposit or from a request for a visit; one that asked for a visit and pays later keeps its
 * job number. The caller holds the intake's row, so that two never make two.
 */
export async function createLead({ models }: Db, transaction: Transaction, lead: NewLead, now: Date): Promise<Lead> {
  const { option, contact, document } = lead;
  const columns = {
    intakeId: lead.intakeId, quoteId: lead.quoteId, optionId: option?.id ?? null, depositId: lead.depositId,
    name: contact.name, email: contact.email, phone: contact.phone || null, street: contact.street, town: document.jurisdiction.name,
    ...workWords(lead), contactWays: contact.contactWays, consentAt: lead.consentAt, consentWords: lead.consentWords,
    stage: option ? 'check-photos' : 'needs-a-visit', dueAt: dueAt(now, document.jurisdiction.timeZone),
    lowCents: option?.lowCents ?? null, highCents: option?.highCents ?? null,
    firmCents: option && option.lowCents === option.highCents ? option.midCents : null,
    updatedAt: now,
  } as const;
  const known = await models.Lead.findOne({ where: { intakeId: lead.intakeId }, transaction });
  if (!known) return models.Lead.create({ ...columns, createdAt: now }, { transaction });
  return known.update({ ...columns, version: known.version + 1 }, { transaction });
}
