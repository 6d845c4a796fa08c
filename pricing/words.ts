import { dollars } from '../shared/money';
import { ampsInWords, kilowattsInWords } from '../shared/units';
import { chargersSupplied, milesPerNight, type OptionPlan } from './option-plan';
import type { KnownFacts } from './known-facts';

/** "Wall charger, 60 A": what it is, and the size of its breaker. */
export function optionTitle(option: OptionPlan, breakerAmps: number): string {
  const what = option.chargers === 2 ? 'Two cars' : option.connection === 'wired' ? 'Wall charger' : 'Outlet';
  return `${what}, ${ampsInWords(breakerAmps)}`;
}

export function optionSubtitle(option: OptionPlan, known: KnownFacts): string {
  const supplied = chargersSupplied(option, known);
  if (option.chargers === 2) return supplied === 2 ? 'Two chargers' : 'Yours and one of ours';
  return supplied === 1 ? 'Charger included' : 'You bring the charger';
}

/** Why this option, or what it brings, in one sentence. `dearerCents`: against the recommended one. */
export function optionBecause(
  option: OptionPlan,
  known: KnownFacts,
  recommended: boolean,
  covers: boolean,
  dearerCents: number,
  kw: number,
): string {
  const nightly = milesPerNight(option.chargingAmps, known).toLocaleString('en-US');
  if (recommended) {
    return covers
      ? `The lowest price that covers your usual ${known.milesPerDay} miles: a night brings back about ${nightly}.`
      : `The fastest for your car. A night brings back about ${nightly} of your usual ${known.milesPerDay} miles.`;
  }
  const more = dearerCents > 0 ? `, for about ${dollars(dearerCents)} more` : '';
  if (option.chargers === 2) return `Two cars share one circuit of ${kilowattsInWords(kw)}, so the panel carries no more than one charger.`;
  if (option.connection === 'plug_in') return 'A heavy-duty outlet for a charger with a plug, which you can take along when you move.';
  return `As fast as your car and charger allow: a night brings back about ${nightly} miles${more}.`;
}

/** "The charger" to "the charger", so that a note can follow other words. */
export const lowerFirst = (words: string): string => words.charAt(0).toLowerCase() + words.slice(1);
