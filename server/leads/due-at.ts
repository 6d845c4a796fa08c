import { isBusinessDay } from '../../pricing/cancellation';
import { isoDateIn, momentIn } from '../words/dates';

const DAY_MS = 86_400_000;
const END_OF_DAY_HOUR = 17;
const WORKING_DAYS_TO_ANSWER = 2;

/** Mondays to Fridays that are no federal holiday. */
function isWorkingDay(isoDate: string): boolean {
  const weekday = new Date(`${isoDate}T12:00:00Z`).getUTCDay();
  return weekday !== 6 && isBusinessDay(isoDate);
}

/** When a lead that came at `at` must have been looked at: 5 p.m. of the second working day after, where the home is. */
export function dueAt(at: Date, timeZone: string): Date {
  let day = isoDateIn(at, timeZone);
  for (let left = WORKING_DAYS_TO_ANSWER; left > 0;) {
    day = new Date(Date.parse(`${day}T12:00:00Z`) + DAY_MS).toISOString().slice(0, 10);
    if (isWorkingDay(day)) left -= 1;
  }
  return momentIn(day, END_OF_DAY_HOUR, timeZone);
}
