import type { Photo } from '../../shared/api/intakes';
import type { Narrowing } from '../../shared/quote';
import type { PhotoSlotId } from '../../shared/wizard/index';
import { dollars } from '../../shared/money';
import { failureWords, isProblem } from '../api/client';

/** The verdict's tag: a word when all is well, the reason and what to do when another try is worth it. */
export const verdictWords: Record<Photo['verdict'], string> = { good: 'Sharp', dark: 'Too dark, retake', blurred: 'Blurred, retake', small: 'Too small, retake' };

/** One line under a poor picture. */
export const verdictHelp: Record<Exclude<Photo['verdict'], 'good'>, string> = {
  dark: 'Turn on a light and try once more, or keep it.',
  blurred: 'Hold still a moment longer, or keep it.',
  small: 'Step closer and try once more, or keep it.',
};

/** What a slot's picture is worth: the largest of the open questions it can answer. Null when it answers none. */
export function slotWorth(slot: PhotoSlotId, narrowing: readonly Narrowing[]): number | null {
  const worth = narrowing.filter((entry) => entry.photo === slot).map((entry) => entry.cents);
  return worth.length > 0 ? Math.max(...worth) : null;
}

export const worthWords = (cents: number): string => `Would narrow your range by about ${dollars(cents)}`;

/** The slot whose picture would narrow the range most and is not there yet. */
export function mostWanted(narrowing: readonly Narrowing[], filled: ReadonlySet<string>): string | null {
  const open = narrowing.filter((entry) => entry.photo !== null && !filled.has(entry.photo));
  return open.reduce<Narrowing | null>((best, entry) => (best && best.cents >= entry.cents ? best : entry), null)?.photo ?? null;
}

/** Why a picture did not arrive, in its own words. */
export function uploadFailure(error: unknown): string {
  if (isProblem(error, 413)) return error.problem.detail ?? 'That file is too large. 25 MB at most.';
  if (isProblem(error, 415)) return error.problem.detail ?? 'That is not a picture we can read. A JPEG or PNG works.';
  if (isProblem(error, 429)) return error.problem.detail ?? 'Many pictures in a short time. Wait a minute, then try again.';
  return isProblem(error) ? failureWords(error) : 'The picture did not get through. It is kept here. Try again.';
}
