import { dollarRange, dollars, type Cents } from '../../../shared/money';
import { button, list, rows, text, type MailContent } from '../content';

export interface NewLeadFacts {
  readonly jobNumber: number;
  readonly name: string;
  readonly town: string;
  readonly work: string;
  readonly workNote: string;
  readonly lowCents: Cents | null;
  readonly highCents: Cents | null;
  readonly depositCents: Cents | null;
  readonly photoCount: number;
  /** Words of the flags, for the desk. */
  readonly flags: readonly string[];
  /** "Thu, May 14" */
  readonly dueOn: string;
  readonly leadUrl: string;
}

/** Tells the contractor of a new lead. Street, phone and e-mail stay at the desk. */
export const newLeadMail = (facts: NewLeadFacts): MailContent => ({
  subject: `New lead ${facts.jobNumber}: ${facts.work}, ${facts.town}`,
  title: `New lead: ${facts.work}`,
  blocks: [
    rows(
      ['Job', String(facts.jobNumber)], ['Name', facts.name], ['Town', facts.town], ['Work', facts.workNote === '' ? facts.work : `${facts.work}. ${facts.workNote}.`],
      ['Range', facts.lowCents === null || facts.highCents === null ? 'None yet' : dollarRange(facts.lowCents, facts.highCents)],
      ['Deposit', facts.depositCents === null ? 'None' : `${dollars(facts.depositCents)} paid`], ['Photos', String(facts.photoCount)], ['Due', `${facts.dueOn}, 5 p.m.`],
    ),
    ...(facts.flags.length > 0 ? [text('Flagged:'), list(facts.flags)] : []),
    button('Open the lead', facts.leadUrl),
  ],
});
