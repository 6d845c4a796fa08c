import { dayInWords, momentInWords } from '../../shared/dates';

const MINUTE_MS = 60_000;
const HOUR_MS = 3_600_000;
const DAY_MS = 86_400_000;

/** A span in its largest whole unit: "40 min", "4 h", "3 days". */
function spanInWords(ms: number): string {
  if (ms < HOUR_MS) return `${Math.max(1, Math.floor(ms / MINUTE_MS))}\u00a0min`;
  if (ms < 2 * DAY_MS) return `${Math.floor(ms / HOUR_MS)}\u00a0h`;
  return `${Math.floor(ms / DAY_MS)}\u00a0days`;
}

export interface TimeLeft { readonly words: string; readonly late: boolean }

/** "2 h left" or "4 h late" for an ISO instant, seen at `nowMs`; null when nothing is due. */
export function timeLeft(dueAt: string | null, nowMs: number): TimeLeft | null {
  if (dueAt === null) return null;
  const ms = Date.parse(dueAt) - nowMs;
  return ms < 0 ? { words: `${spanInWords(-ms)}\u00a0late`, late: true } : { words: `${spanInWords(ms)}\u00a0left`, late: false };
}

const dayIn = (ms: number, timeZone: string) => new Date(ms).toLocaleDateString('en-CA', { timeZone });

/** "Today, 8:12 a.m.", "Yesterday, 5 p.m.", earlier "Thu, May 14, 5 p.m.", in the home's own time. */
export function deskMoment(instant: string, timeZone: string, nowMs: number): string {
  const words = momentInWords(instant, timeZone);
  const time = words.slice(dayInWords(instant, timeZone).length);
  const day = dayIn(Date.parse(instant), timeZone);
  if (day === dayIn(nowMs, timeZone)) return `Today${time}`;
  return day === dayIn(nowMs - DAY_MS, timeZone) ? `Yesterday${time}` : words;
}
