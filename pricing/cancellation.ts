/** A calendar date, "2026-12-04". */
type IsoDate = string;

const DAY_MS = 86_400_000;
const [SUNDAY, MONDAY, THURSDAY, SATURDAY] = [0, 1, 4, 6];

const dayMs = (year: number, month: number, day: number): number => Date.UTC(year, month - 1, day);
const weekday = (ms: number): number => new Date(ms).getUTCDay();
const iso = (ms: number): IsoDate => new Date(ms).toISOString().slice(0, 10);

/** The nth given weekday of a month. */
function nth(n: number, day: number, year: number, month: number): number {
  const first = dayMs(year, month, 1);
  return first + ((day - weekday(first) + 7) % 7 + (n - 1) * 7) * DAY_MS;
}

/** Month and day of the fixed federal holidays. 5 U.S.C. 6103(a). */
const fixedHolidays = [[1, 1], [6, 19], [7, 4], [11, 11], [12, 25]] as const;

/** The federal holidays of a year, and the Friday or Monday on which those of a weekend are kept. 5 U.S.C. 6103(a) and (b). */
function holidaysOf(year: number): Set<number> {
  const lastMondayOfMay = nth(1, MONDAY, year, 6) - 7 * DAY_MS;
  const days = new Set([
    nth(3, MONDAY, year, 1), nth(3, MONDAY, year, 2), lastMondayOfMay,
    nth(1, MONDAY, year, 9), nth(2, MONDAY, year, 10), nth(4, THURSDAY, year, 11),
  ]);
  for (const [month, day] of fixedHolidays) {
    const holiday = dayMs(year, month, day);
    days.add(holiday);
    if (weekday(holiday) === SATURDAY) days.add(holiday - DAY_MS);
    if (weekday(holiday) === SUNDAY) days.add(holiday + DAY_MS);
  }
  return days;
}

/** True on Saturdays too; false on Sundays and federal holidays, and on the days on which these are kept. 16 CFR 429.0(f). */
export function isBusinessDay(date: IsoDate): boolean {
  const ms = parse(date);
  const year = new Date(ms).getUTCFullYear();
  // New Year's Day on a Saturday is kept on the last day of the year before.
  return weekday(ms) !== SUNDAY && !holidaysOf(year).has(ms) && !holidaysOf(year + 1).has(ms);
}

/**
 * Last day, to its midnight, on which a buyer may cancel: the third business day after signing. 16 CFR 429.1(a), 429.0(f).
 * @param businessDays more where a state gives more.
 * @throws RangeError when `signedOn` is no date, or the number of days is no positive whole number.
 */
export function cancellationDeadline(signedOn: IsoDate, businessDays = 3): IsoDate {
  if (!Number.isInteger(businessDays) || businessDays < 1) throw new RangeError('At least one business day');
  let ms = parse(signedOn);
  for (let left = businessDays; left > 0;) {
    ms += DAY_MS;
    if (isBusinessDay(iso(ms))) left -= 1;
  }
  return iso(ms);
}

function parse(date: IsoDate): number {
  const ms = Date.parse(`${date}T00:00:00Z`);
  if (Number.isNaN(ms) || iso(ms) !== date) throw new RangeError(`Not a date: ${date}`);
  return ms;
}
