import { leadStages } from '../../../shared/api/desk';
import { timeline } from '../../../server/my/timeline';

// Words and order: the product's own, invented for the demo.
const facts = { stage: 'check-photos', depositWords: '$150, Tue, Dec 1', dueOn: 'Thu, Dec 3', firmPrice: null } as const;

describe('the homeowner’s timeline', () => {
  it('stands at the electrician’s look after the deposit, with a real deadline', () => {
    expect(timeline(facts).map(({ id, state }) => `${id} ${state}`)).toEqual(['deposit done', 'look now', 'firm-price next', 'day next', 'work next']);
    expect(timeline(facts)[1]?.detail).toBe('By Thu, Dec 3, 5 p.m.');
  });
  it('speaks of a visit, and of no deposit, when a visit was asked for', () => {
    const words = JSON.stringify(timeline({ ...facts, stage: 'needs-a-visit', depositWords: null }));
    expect(words).toContain('A free visit');
    expect(words).not.toMatch(/deposit/i);
  });
  it.each(leadStages)('has at most one entry at work, and nothing done after it: %s', (stage) => {
    const states = timeline({ ...facts, stage }).map(({ state }) => state);
    expect(states).toEqual([...states].sort((one, other) => ['done', 'now', 'next'].indexOf(one) - ['done', 'now', 'next'].indexOf(other)));
    expect(states.filter((state) => state === 'now')).toHaveLength(stage === 'closed' ? 0 : 1);
  });
});
