/** "Thu, May 14", with the year only when it is not this one. `date`: "YYYY-MM-DD" or an ISO instant. */
export function dayInWords(date: string, timeZone = 'UTC', now = new Date()): string {
  const instant = date.length === 10 ? new Date(`${date}T12:00:00Z`) : new Date(date);
  const zone = date.length === 10 ? 'UTC' : timeZone;
  const year = (day: Date) => day.toLocaleDateString('en-US', { timeZone: zone, year: 'numeric' });
  return instant.toLocaleDateString('en-US', {
    timeZone: zone, weekday: 'short', month: 'short', day: 'numeric', ...(year(instant) === year(now) ? {} : { year: 'numeric' }),
  });
}

/** "Thu, May 14, 5 p.m." in the jurisdiction's time. */
export function momentInWords(instant: string, timeZone: string): string {
  const time = new Date(instant).toLocaleTimeString('en-US', { timeZone, hour: 'numeric', minute: '2-digit' });
  return `${dayInWords(instant, timeZone)}, ${time.replace(':00', '').replace(/\s?([AP])M$/, (_, half: string) => `\u00a0${half.toLowerCase()}.m.`)}`;
}
