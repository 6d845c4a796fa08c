import { dollarRange, dollars, type Cents } from '../../../shared/money';
import type { QuoteOption } from '../../../shared/quote';
import { button, caution, heading, list, rows, text, type MailContent, type Sender } from '../content';

export interface ReceiptFacts {
  readonly name: string;
  readonly street: string;
  readonly town: string;
  readonly jobNumber: number;
  readonly amountCents: Cents;
  /** Days in words: "Thu, May 14". */
  readonly paidOn: string;
  readonly cancelUntil: string;
  readonly firstLookBy: string;
  readonly option: QuoteOption;
  readonly cautions: readonly string[];
  readonly myUrl: string;
  readonly sender: Sender;
}

/** "$95 – $130", or "Included" where a line costs nothing. */
const lineAmount = ({ lowCents, highCents }: { lowCents: Cents; highCents: Cents }) => (lowCents === 0 && highCents === 0 ? 'Included' : dollarRange(lowCents, highCents));

/** The receipt for a deposit: what was paid, for what, what comes next and how to cancel. Every figure is the frozen document's. */
export function receiptMail(facts: ReceiptFacts): MailContent {
  const { option, sender } = facts;
  const firm = option.lowCents === option.highCents;
  const price = dollarRange(option.lowCents, option.highCents);
  return {
    subject: `Your ${dollars(facts.amountCents)} deposit is paid: job ${facts.jobNumber}`,
    title: 'Your deposit is paid',
    blocks: [
      text(`Hello ${facts.name}. Thank you. Your deposit holds this price.`),
      rows(
        ['Deposit', `${dollars(facts.amountCents)}, paid ${facts.paidOn}`], ['Job', String(facts.jobNumber)], ['For', `${option.title}. ${option.subtitle}.`],
        ['Where', `${facts.street}, ${facts.town}`], [firm ? 'Your firm price' : 'Your range', `${price}, installed, tested and inspected`],
      ),
      text('The deposit comes off the bill.'),
      heading('What the price is made of'),
      rows(...option.lines.map((line) => [line.title, lineAmount(line)] as const)),
      heading('What to know'),
      list(facts.cautions),
      heading('What happens next'),
      list([
        `By ${facts.firstLookBy}, 5 p.m., our electrician looks at your answers and photos.`,
        ...(firm ? [] : [`Then you get a firm price. Above ${dollars(option.highCents)} we stop and ask you first.`]),
        'You pick a day for the work. We pull the permit and meet the inspector.',
      ]),
      button('Open my job', facts.myUrl),
      heading('How to cancel'),
      // 16 CFR 429.1 (three business days) is given to everyone, though sales made wholly online are outside it: common practice;
      // have the wording confirmed.
      text(`All of the deposit comes back until you pick a day. You also have the right to cancel, for any reason, until midnight of ${facts.cancelUntil}, the third business day after you paid.`),
      text(`To cancel, reply to this mail or call ${sender.phone}. Your deposit goes back to the card you paid with.`),
      caution(`Never remove the metal cover of the panel. If it is warm, buzzing or smells burnt, leave it alone and call ${sender.phone}.`),
    ],
  };
}
