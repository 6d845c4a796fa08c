import { deskMoment, timeLeft } from '../../../components/desk/time-words';

const now = Date.parse('2026-05-11T18:00:00Z');
const at = (hours: number) => new Date(now + hours * 3_600_000).toISOString();
const plain = (text: string | undefined) => text?.replaceAll('\u00a0', ' ');

// "2 h left" and "4 h late" as in the shared design picture of the leads; days from two whole days on is our own choice.
it.each([[2, '2 h left', false], [-4, '4 h late', true], [0.5, '30 min left', false], [47.9, '47 h left', false], [72, '3 days left', false], [-50, '2 days late', true]])(
  '%d hours from now: %s', (hours, words, late) => {
    const left = timeLeft(at(hours), now);
    expect([plain(left?.words), left?.late]).toEqual([words, late]);
  },
);

it('nothing due says nothing', () => expect(timeLeft(null, now)).toBeNull());

// voice.md of the shared design: "Thu, May 14"; "5 p.m., 8:12 a.m."; "Today" and "Yesterday" at the desk. Here: 2 p.m. in New York.
it.each([
  ['2026-05-11T12:12:00Z', 'Today, 8:12 a.m.'],
  ['2026-05-11T03:30:00Z', 'Yesterday, 11:30 p.m.'],
  ['2026-05-09T21:00:00Z', 'Sat, May 9, 5 p.m.'],
])('%s is %s', (instant, words) => {
  jest.useFakeTimers({ now });
  expect(plain(deskMoment(instant, 'America/New_York', now))).toBe(words);
  jest.useRealTimers();
});
