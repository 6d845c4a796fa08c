const parts = (at: Date, timeZone: string) => new Map(new Intl.DateTimeFormat('en-US', {
  timeZone, weekday: 'short', year: 'numeric', month: 'long', day: 'numeric', hour: 'numeric', minute: '2-digit',
}).formatToParts(at).map(({ type, value }) => [type, value]));

/**
 * "Thu, May 14", with the year only when it is not that of `now`. Months of more than five letters are shortened.
 * @param date a calendar date such as "2026-05-14", or a moment, seen where `timeZone` is
 */
export function dayInWords(date: Date | string, timeZone = 'UTC', now = new Date()): string {
  const isCalendarDate = typeof date === 'string' && date.length === 10;
  const day = isCalendarDate ? parts(new Date(`${date}T12:00:00Z`), 'UTC') : parts(new Date(date), timeZone);
  const month = day.get('month') ?? '';
  const year = day.get('year') === parts(now, timeZone).get('year') ? '' : `, ${day.get('year')}`;
  return `${day.get('weekday')}, ${month.length > 5 ? month.slice(0, 3) : month} ${day.get('day')}${year}`;
}

/** A moment where the home is: "Thu, May 14, 5 p.m.", "Thu, May 14, 8:12 a.m.". */
export function momentInWords(at: Date | string, timeZone: string, now = new Date()): string {
  const shown = parts(new Date(at), timeZone);
  const minute = shown.get('minute') === '00' ? '' : `:${shown.get('minute')}`;
  return `${dayInWords(new Date(at), timeZone, now)}, ${shown.get('hour')}${minute}\u00a0${shown.get('dayPeriod')?.startsWith('A') ? 'a.m.' : 'p.m.'}`;
}
