import { cancellationDeadline, isBusinessDay } from '../../pricing/cancellation';

describe('16 CFR 429: third business day; Saturday counts, Sundays and federal holidays do not', () => {
  it.each([
    ['2026-12-04', '2026-12-08', 'Friday: Sat, Mon, Tue'], ['2026-12-24', '2026-12-29', 'Christmas Day'], ['2026-12-07', '2026-12-10',
    'no Sunday between'],
    ['2026-12-05', '2026-12-09', 'Saturday: Mon, Tue, Wed'], ['2026-12-06', '2026-12-09', 'Sunday: Mon, Tue, Wed'],
    ['2026-11-25', '2026-11-30', 'Thanksgiving Day, then Fri, Sat, Mon'], ['2026-12-31', '2027-01-05', 'New Year’s Day'],
  ])('signed %s: to the midnight of %s (%s)', (signed, lastDay) => expect(cancellationDeadline(signed)).toBe(lastDay));

  it('states may give more days (seniors in California five, from memory)', () => expect(cancellationDeadline('2026-12-04', 5))
    .toBe('2026-12-10'));

  it.each([
    '2026-01-01', '2026-01-19', '2026-02-16', '2026-05-25', '2026-06-19', '2026-07-04', '2026-09-07', '2026-10-12', '2026-11-11',
      '2026-11-26', '2026-12-25',
  ])('5 U.S.C. 6103(a): %s is a federal holiday', (date) => expect(isBusinessDay(date)).toBe(false));

  it('5 U.S.C. 6103(b): kept on Friday when it falls on Saturday, on Monday when on Sunday; neither day counts', () => {
    expect(isBusinessDay('2026-07-03')).toBe(false);
    expect(isBusinessDay('2027-07-05')).toBe(false);
    expect(isBusinessDay('2027-12-31')).toBe(false);
    expect(isBusinessDay('2026-07-06')).toBe(true);
  });

  it('an ordinary Saturday counts, an ordinary Sunday does not', () => {
    expect([isBusinessDay('2026-12-05'), isBusinessDay('2026-12-06'), isBusinessDay('2026-05-18')]).toEqual([true, false, true]);
  });

  it.each(['2026-02-30', 'tomorrow', '2026-1-1', ''])('refuses %j', (date) => expect(() => cancellationDeadline(date)).toThrow(RangeError));
  it.each([0, -1, 1.5, NaN])('refuses %f days', (days) => expect(() => cancellationDeadline('2026-12-04', days)).toThrow(RangeError));
});
