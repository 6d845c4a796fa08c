import { isoDateIn, momentIn } from '../../../server/words/dates';

describe('dates where the home is', () => {
  it.each([
    // Source: UTC offsets of the IANA time zone database: Denver −7 in winter, −6 from the second Sunday of March to the first of November.
    ['2026-12-01T06:59:00Z', 'America/Denver', '2026-11-30'],
    ['2026-12-01T07:00:00Z', 'America/Denver', '2026-12-01'],
    ['2026-07-01T06:00:00Z', 'America/Denver', '2026-07-01'],
  ])('%s in %s is on %s', (at, zone, day) => expect(isoDateIn(new Date(at), zone)).toBe(day));

  it.each([
    ['2026-12-03', 'America/Denver', '2026-12-04T00:00:00.000Z'],
    ['2026-07-01', 'America/Denver', '2026-07-01T23:00:00.000Z'],
    // The days on which clocks change, 2026-03-08 and 2026-11-01: by 5 p.m. they have changed.
    ['2026-03-08', 'America/Denver', '2026-03-08T23:00:00.000Z'],
    ['2026-11-01', 'America/Denver', '2026-11-02T00:00:00.000Z'],
  ])('5 p.m. of %s in %s is %s', (day, zone, at) => expect(momentIn(day, 17, zone).toISOString()).toBe(at));
});
