import { dayInWords, momentInWords } from '../../shared/dates';

describe('dates in words', () => {
  it.each([
    // Source: voice guide, "Dates: Thu, May 14. With year only when not this year." May 14, 2026 is a Thursday by the calendar.
    ['2026-05-14', '2026-12-01', 'Thu, May 14'],
    ['2026-06-11', '2026-05-14', 'Thu, June 11'],
    // Our own choice, no source: months of more than five letters are shortened.
    ['2027-01-04', '2026-12-01', 'Mon, Jan 4, 2027'],
  ])('%s, seen on %s, is "%s"', (day, today, words) => expect(dayInWords(day, 'UTC', new Date(`${today}T12:00:00Z`))).toBe(words));

  it.each([
    // Source: voice guide, "Times: 5 p.m., 8:12 a.m."; Denver is seven hours behind UTC in winter and six in summer (IANA time zone database).
    ['2026-05-14T23:00:00Z', 'Thu, May 14, 5\u00a0p.m.'],
    ['2026-12-01T15:12:00Z', 'Tue, Dec 1, 8:12\u00a0a.m.'],
    // Still the day before where the home is.
    ['2026-12-01T06:30:00Z', 'Mon, Nov 30, 11:30\u00a0p.m.'],
  ])('%s in Denver is "%s"', (at, words) => expect(momentInWords(at, 'America/Denver', new Date('2026-12-01T12:00:00Z'))).toBe(words));
});
