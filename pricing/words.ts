import { dollars } from '../shared/money';
import { ampsInWords, countInWords, kilowattsInWords } from '../shared/units';
import { chargersSupplied, milesPerNight, mostUsefulAmps, type OptionPlan } from './option-plan';
import type { KnownFacts } from './known-facts';

/** "Wall charger, 60 A": what it is, and the size of its breaker. */
export function optionTitle(option: OptionPlan, breakerAmps: number): string {
  const what = option.chargers === 2 ? 'Two cars' : option.connection === 'wired' ? 'Wall charger' : 'Outlet';
  return `${what}, ${ampsInWords(breakerAmps)}`;
}

/** Who brings the charger. */
export function optionSubtitle(option: OptionPlan, known: KnownFacts): string {
  if (option.chargers === 2) return 'Two chargers';
  return chargersSupplied(option, known) === 1 ? 'Charger included' : 'You bring the charger';
}

/** What an option brings to this home, as far as its sentence needs it. */
export interface OptionBrings {
  readonly recommended: boolean;
  /** Covers the usual day. */
  readonly covers: boolean;
  /** Against the recommended one, rounded; below nothing when it costs less. */
  readonly dearerCents: number;
  readonly kw: number;
  /** The homeowner's charger may be of either kind: wired or with a plug. */
  readonly kindOpen: boolean;
  /** A load manager holds the charger back. */
  readonly managed: boolean;
  /** A larger service comes first. */
  readonly upgraded: boolean;
}

const OUTLET = 'A heavy-duty outlet for a charger with a 14-50 plug, which you can take along when you move.';
const WIRED_KIND = ' Your charger must be of the kind that is wired in.';
const PLUG_KIND = ' Your charger must have a 14-50 plug.';
const MANAGED = ' The charger waits while the house is busy; the electrician confirms it.';
const UPGRADED = ' A larger service comes first.';

/** Why this option, or what it brings: one sentence, and one more for each thing that it takes. */
export function optionBecause(option: OptionPlan, known: KnownFacts, brings: OptionBrings): string {
  const kind = !brings.kindOpen || option.chargers === 2 ? '' : option.connection === 'wired' ? WIRED_KIND : PLUG_KIND;
  return `${mainReason(option, known, brings)}${kind}${brings.managed ? MANAGED : ''}${brings.upgraded ? UPGRADED : ''}`;
}

function mainReason(option: OptionPlan, known: KnownFacts, { recommended, covers, dearerCents, kw, managed }: OptionBrings): string {
  const usual = countInWords(known.milesPerDay, 'mile', 'miles');
  const nightly = `${managed ? 'up to' : 'about'} ${countInWords(milesPerNight(option.chargingAmps, known), 'mile', 'miles')}`;
  if (recommended) {
    const included = chargersSupplied(option, known) > 0 ? ', charger included,' : '';
    return covers
      ? `The lowest price${included} that covers your usual ${usual}. A night brings back ${nightly}.`
      : `The fastest here. A night brings back ${nightly} of your usual ${usual}.`;
  }
  if (option.chargers === 2) return `Two cars share one circuit of ${kilowattsInWords(kw)}, so the panel carries no more than one charger.`;
  if (!option.asAsked) return OUTLET;
  const more = dearerCents > 0 ? `, for about ${dollars(dearerCents)} more` : '';
  if (option.role !== 'full') return `A night brings back ${nightly}${more}.`;
  const fastest = option.chargingAmps >= mostUsefulAmps(known) ? 'As fast as your car and charger allow' : 'The fastest here';
  return `${fastest}: a night brings back ${nightly}${more}.`;
}

/** "The charger" to "the charger", so that a note can follow other words. */
export const lowerFirst = (words: string): string => words.charAt(0).toLowerCase() + words.slice(1);
