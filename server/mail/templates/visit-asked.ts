import { button, heading, list, rows, text, type MailContent, type Sender } from '../content';

export interface VisitAskedFacts {
  readonly name: string;
  readonly street: string;
  readonly town: string;
  readonly jobNumber: number;
  /** Why there is no price from here, in the words the homeowner saw; empty when they asked of their own accord. */
  readonly reasons: readonly string[];
  /** "Thu, May 14" */
  readonly answerBy: string;
  readonly contactBy: string;
  readonly danger: boolean;
  readonly myUrl: string;
  readonly sender: Sender;
}

/** Confirms that an electrician takes over without a price. */
export const visitAskedMail = (facts: VisitAskedFacts): MailContent => ({
  subject: `We have your answers: job ${facts.jobNumber}`,
  title: 'We have your answers',
  blocks: [
    text(`Hello ${facts.name}. An electrician looks at your answers before you get a price. The visit is free.`),
    ...(facts.danger ? [{ kind: 'caution' as const, words: `Leave the panel alone and call ${facts.sender.phone}. If anything is sparking or smoking, leave the house and call 911.` }] : []),
    rows(['Job', String(facts.jobNumber)], ['Where', `${facts.street}, ${facts.town}`]),
    ...(facts.reasons.length > 0 ? [heading('Why there is no price yet'), list(facts.reasons)] : []),
    heading('What happens next'),
    list([`By ${facts.answerBy}, 5 p.m., we get in touch ${facts.contactBy} to find a time.`, 'You owe nothing. You decide after you know the price.']),
    button('Open my job', facts.myUrl),
  ],
});
