import { cancellationDeadline } from '../../pricing/cancellation';
import { firstOpenStep } from '../../shared/wizard/index';
import { makeLink } from '../auth/public-links';
import { company } from '../config/company';
import type { Deps } from '../deps';
import { timeZoneOfZip } from '../intakes/place';
import { contactWaysInWords } from '../leads/contact-ways-in-words';
import type { Mail } from '../models/mail';
import { readQuote } from '../quotes/read-quote';
import { dayInWords } from '../../shared/dates';
import { isoDateIn } from '../words/dates';
import type { Sender } from './content';
import type { MailTemplate } from './queue-mail';
import type { Compose } from './send-mail';
import { newLeadMail } from './templates/new-lead';
import { receiptMail } from './templates/receipt';
import { resumeLinkMail } from './templates/resume-link';
import { visitAskedMail } from './templates/visit-asked';

export type ComposeDeps = Pick<Deps, 'sequelize' | 'models' | 'clock' | 'env' | 'pricing'>;
type Composed = Awaited<ReturnType<Compose>>;

/** Our name, phone and address as they close every mail. */
export const senderOf = ({ env }: Pick<Deps, 'env'>): Sender => ({ ...company, demo: env.DEMO });

/** A link to the homeowner's page, stored at once. Only its hash is kept, so each try to send makes a new one; all of them work. */
async function myUrl({ models, clock, env }: ComposeDeps, intakeId: string): Promise<string> {
  return `${env.PUBLIC_URL}/my/${(await makeLink(models, 'my', intakeId, clock())).token}`;
}

async function resumeLink({ models, clock, env, pricing }: ComposeDeps, { intakeId }: Mail): Promise<Composed> {
  const intake = intakeId === null ? null : await models.Intake.findByPk(intakeId);
  if (!intake?.email) return null;
  const { token, expiresAt } = await makeLink(models, 'resume', intake.id, clock());
  const zone = timeZoneOfZip(pricing.edition, intake.answers.zip);
  const next = firstOpenStep(intake.answers);
  return {
    to: intake.email,
    content: resumeLinkMail({
      resumeUrl: `${env.PUBLIC_URL}/resume/${token}`, openUntil: dayInWords(expiresAt, zone, clock()),
      nextStep: next.id === 'price' ? null : next.short,
    }),
  };
}

/** What every mail about a lead reads. */
async function leadFacts({ sequelize, models, clock }: ComposeDeps, { leadId }: Mail) {
  const lead = leadId === null ? null : await models.Lead.findByPk(leadId);
  if (!lead?.quoteId) return null;
  const { document } = await readQuote(sequelize, lead.quoteId);
  const zone = document.jurisdiction.timeZone;
  const day = (at: Date) => dayInWords(at, zone, clock());
  const deposit = lead.depositId === null ? null : await models.Deposit.findByPk(lead.depositId);
  return { lead, document, zone, day, deposit, due: day(lead.dueAt ?? clock()) };
}

async function receipt(deps: ComposeDeps, mail: Mail): Promise<Composed> {
  const facts = await leadFacts(deps, mail);
  const option = facts?.document.options.find(({ id }) => id === facts.deposit?.optionId);
  if (!facts?.deposit?.paidAt || !option) return null;
  const { lead, deposit, document, zone, day, due } = facts;
  return {
    to: deposit.contact.email,
    content: receiptMail({
      name: lead.name, street: lead.street, town: lead.town, jobNumber: lead.jobNumber, amountCents: deposit.amountCents,
      paidOn: day(facts.deposit.paidAt), firstLookBy: due, option, cautions: document.cautions,
      cancelUntil: dayInWords(cancellationDeadline(isoDateIn(facts.deposit.paidAt, zone)), zone, deps.clock()),
      myUrl: await myUrl(deps, lead.intakeId), sender: senderOf(deps),
    }),
  };
}

async function visitAsked(deps: ComposeDeps, mail: Mail): Promise<Composed> {
  const facts = await leadFacts(deps, mail);
  if (!facts) return null;
  const { lead, document, due } = facts;
  return {
    to: lead.email,
    content: visitAskedMail({
      name: lead.name, street: lead.street, town: lead.town, jobNumber: lead.jobNumber, reasons: document.flags.map(({ words }) => words),
      danger: document.flags.some(({ danger }) => danger), answerBy: due, contactBy: contactWaysInWords(lead.contactWays),
      myUrl: await myUrl(deps, lead.intakeId), sender: senderOf(deps),
    }),
  };
}

async function newLead(deps: ComposeDeps, mail: Mail): Promise<Composed> {
  const facts = await leadFacts(deps, mail);
  if (!facts) return null;
  const { lead, document, deposit, due } = facts;
  const photoCount = await deps.models.Photo.count({ where: { intakeId: lead.intakeId, removedAt: null } });
  return {
    to: company.email,
    content: newLeadMail({
      jobNumber: lead.jobNumber, name: lead.name, town: lead.town, work: lead.work, workNote: lead.workNote,
      lowCents: lead.lowCents, highCents: lead.highCents,
      depositCents: deposit?.paidAt ? deposit.amountCents : null, photoCount, flags: document.flags.map(({ deskWords }) => deskWords),
      dueOn: due, leadUrl: `${deps.env.PUBLIC_URL}/desk/leads/${lead.id}`,
    }),
  };
}

const composers: Record<MailTemplate, (deps: ComposeDeps, mail: Mail) => Promise<Composed>> = { 'resume-link': resumeLink, receipt, 'visit-asked': visitAsked, 'new-lead': newLead };

/** Reads what a queued mail says at the moment it is sent; names and addresses are nowhere else than in their own tables until then. */
export const createCompose = (deps: ComposeDeps): Compose => (mail) => composers[mail.template as MailTemplate](deps, mail);
