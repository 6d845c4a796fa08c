import type { LeadStage } from '../../shared/api/desk';
import type { My } from '../../shared/api/quotes';

export interface TimelineFacts {
  readonly stage: LeadStage;
  /** "$150, Thu, May 14"; null when no deposit was paid. */
  readonly depositWords: string | null;
  /** "Thu, May 14" */
  readonly dueOn: string | null;
  readonly firmPrice: string | null;
}

/** Which entry is at work at each stage; a stage counts everything before it as done. */
const nowAt: Record<LeadStage, number> = {
  'check-photos': 1, 'waiting-on-photo': 1, 'needs-a-visit': 1, 'firm-price-sent': 2, accepted: 3, booked: 4, closed: 5,
};

/** What was done for the homeowner's job, what is at work and what comes next, in order. */
export function timeline({ stage, depositWords, dueOn, firmPrice }: TimelineFacts): My['timeline'] {
  const by = dueOn === null ? '' : `By ${dueOn}, 5 p.m.`;
  const look = stage === 'needs-a-visit'
    ? { title: 'A free visit', detail: dueOn === null ? 'We write or call to find a time.' : `We write or call by ${dueOn}, 5 p.m., to find a time.` }
    : { title: 'Our electrician looks at your answers', detail: stage === 'waiting-on-photo' ? 'A photo is missing.' : by };
  const entries = [
    depositWords === null
      ? { id: 'asked', title: 'We have your answers', detail: '' }
      : { id: 'deposit', title: 'Deposit paid', detail: depositWords },
    { id: 'look', ...look },
    { id: 'firm-price', title: 'Your firm price', detail: firmPrice ?? '' },
    { id: 'day', title: 'You pick a day', detail: depositWords === null ? '' : 'Your deposit comes back in full until then.' },
    { id: 'work', title: 'We do the work and meet the inspector', detail: '' },
  ];
  const now = nowAt[stage];
  return entries.map((entry, index) => ({ ...entry, state: index < now ? 'done' : index === now ? 'now' : 'next' }));
}
