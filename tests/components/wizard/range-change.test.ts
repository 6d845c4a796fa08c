import { rangeLine, spokenChange, standOf } from '../../../components/wizard/range-change';
import type { LiveRange } from '../../../shared/quote';

const range = (change: Partial<LiveRange>): LiveRange => ({
  outcome: 'range', lowCents: 124_000, highCents: 278_000, optionTitle: null, narrowing: [], flags: [], load: null, plan: null, planProblems: [], ...change,
});
// Widths: $2,110 before, $1,540 now, so $570 narrower.
// Figures and wording from the design: voice, example strings 4 and 5; components, "The tape".
const before = { lowCents: 112_000, highCents: 323_000 };
const blanks = { fact: 'blankSpaces', title: 'Blank spaces', cents: 24_000, photo: null };

describe('the line under the tape', () => {
  it('says what the last answer did and what would do most next', () => {
    expect(rangeLine(range({ narrowing: [blanks] }), before)).toBe('Narrowed by $570. Blank spaces would take off about $240 more.');
    expect(rangeLine(range({ narrowing: [blanks] }), null)).toBe('Blank spaces would narrow this by about $240.');
  });
  it('asks for the picture that answers it where photos are asked for', () => {
    const label = { fact: 'mainBreakerAmps', title: 'Main breaker size', cents: 38_000, photo: 'label' };
    expect(rangeLine(range({ narrowing: [blanks, label] }), null, true)).toBe('A photo of the panel label would narrow this by about $380.');
    expect(rangeLine(range({ narrowing: [blanks] }), null, true)).toBe('Blank spaces would narrow this by about $240.');
  });
  it('never hides that an answer widened the range', () => {
    expect(rangeLine(range({}), { lowCents: 124_000, highCents: 270_000 })).toBe('Wider now, by $80.');
  });
  it('has nothing to say while there is no range', () => {
    expect(rangeLine(range({ outcome: 'visit', lowCents: null, highCents: null }), before)).toBe('');
    expect(standOf(range({ outcome: 'too-early', lowCents: null, highCents: null }))).toBeNull();
  });
});

describe('what is spoken after an answer', () => {
  it('names both ends and the change', () => {
    expect(spokenChange(before, { lowCents: 124_000, highCents: 278_000 })).toBe('Range now 1,240 to 2,780 dollars. Narrowed by 570.');
    expect(spokenChange(null, { lowCents: 195_000, highCents: 195_000 })).toBe('Firm price now 1,950 dollars.');
  });
});
