import { button, text, type MailContent } from '../content';

export interface ResumeLinkFacts {
  readonly resumeUrl: string;
  /** "Thu, May 14": the last day on which the link works. */
  readonly openUntil: string;
  /** "Panel": where the homeowner stopped; null when nothing is left to ask. */
  readonly nextStep: string | null;
}

/** The link that "Finish later" sends. */
export const resumeLinkMail = ({ resumeUrl, openUntil, nextStep }: ResumeLinkFacts): MailContent => ({
  subject: 'Your answers are kept: a link to finish later',
  title: 'Your answers are kept',
  blocks: [
    text('You asked us for a link to finish later. It opens your answers on any phone or computer.'),
    text(nextStep === null ? 'Everything is answered. Your price is next.' : `Next: ${nextStep.charAt(0).toLowerCase()}${nextStep.slice(1)}.`),
    button('Open my answers', resumeUrl),
    text(`The link works through ${openUntil}. Whoever has it can see and change your answers, so keep it to yourself.`),
    text('You did not ask for this? Then someone typed your address by mistake. Leave the mail alone and we write no more.'),
  ],
});
