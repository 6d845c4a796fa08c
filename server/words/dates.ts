/** "2026-12-04" of a moment as people of a time zone see it. */
export function isoDateIn(at: Date, timeZone: string): string {
  const parts = Object.fromEntries(new Intl.DateTimeFormat('en-US', { timeZone, year: 'numeric', month: '2-digit', day: '2-digit' }).formatToParts(at).map(({ type, value }) => [type, value]));
  return `${parts.year}-${parts.month}-${parts.day}`;
}

/** The moment at which clocks of a time zone show `hour`:00 on a calendar date; the earlier one when that hour comes twice. */
export function momentIn(isoDate: string, hour: number, timeZone: string): Date {
  const wanted = Date.parse(`${isoDate}T${String(hour).padStart(2, '0')}:00:00Z`);
  const shownAt = (at: number) => {
    const parts = Object.fromEntries(new Intl.DateTimeFormat('en-US', {
      timeZone, hourCycle: 'h23', year: 'numeric', month: '2-digit', day: '2-digit', hour: '2-digit', minute: '2-digit',
    }).formatToParts(new Date(at)).map(({ type, value }) => [type, value]));
    return Date.parse(`${parts.year}-${parts.month}-${parts.day}T${parts.hour}:${parts.minute}:00Z`);
  };
  // Twice, because the first guess may lie on the other side of a change of the clocks.
  const guess = wanted - (shownAt(wanted) - wanted);
  return new Date(guess - (shownAt(guess) - wanted));
}
