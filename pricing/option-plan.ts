import type { Facts } from '../shared/facts';
import type { KnownFacts } from './known-facts';
import type { Edition } from './rulebook/schema';

export type OptionRole = 'everyday' | 'full' | 'outlet' | 'two_cars';

/** What could be installed, before any home is looked at. */
export interface OptionPlan {
  readonly id: string;
  readonly role: OptionRole;
  readonly connection: 'wired' | 'plug_in';
  readonly chargingAmps: number;
  /** Chargers on the circuit. */
  readonly chargers: 1 | 2;
  /** True: the homeowner brings the first charger whatever was answered; false: as answered, ours or theirs. */
  readonly bringsOwn: boolean;
  /** True when it is what the homeowner asked for: their charger or ours, and their kind of connection. */
  readonly asAsked: boolean;
}

const MAX_SHOWN = 4;

/** How many chargers we supply in a home: all of them, or all but the homeowner's own. */
export const chargersSupplied = ({ chargers, bringsOwn }: OptionPlan, known: KnownFacts): number =>
  bringsOwn || known.chargerSupply === 'theirs' ? chargers - 1 : chargers;

/** Most amps that the car can use, through the homeowner's charger where that is theirs. */
export const mostUsefulAmps = (known: KnownFacts): number =>
  known.chargerSupply === 'theirs' ? Math.min(known.carMaxAmps, known.chargerMaxAmps) : known.carMaxAmps;

/** kW into the car: the setting or what car and charger take, whichever is less. */
export const kwOf = (chargingAmps: number, known: KnownFacts): number =>
  (Math.min(chargingAmps, mostUsefulAmps(known)) * known.volts) / 1000;

/** Miles that the hours at home bring back; Wh a mile is counted at the wall, so no loss is taken off again. */
export const milesPerNight = (chargingAmps: number, known: KnownFacts): number =>
  Math.floor((kwOf(chargingAmps, known) * 1000 * known.hoursHome) / known.whPerMile);

export const coversUsualDay = (chargingAmps: number, known: KnownFacts): boolean => milesPerNight(chargingAmps, known) >= known.milesPerDay;

function plan(
  role: OptionRole,
  connection: OptionPlan['connection'],
  chargingAmps: number,
  asAsked: boolean,
  bringsOwn = false,
): OptionPlan {
  const chargers = role === 'two_cars' ? 2 : 1;
  return {
    id: `${chargers === 2 ? 'two-' : ''}${connection === 'wired' ? 'wired' : 'outlet'}-${chargingAmps}`,
    role,
    connection,
    chargingAmps,
    chargers,
    bringsOwn,
    asAsked,
  };
}

/** Settings that car and charger can use; the smallest when even that is more than they take. */
function usable(offered: readonly number[], capAmps: number): number[] {
  const fitting = offered.filter((amps) => amps <= capAmps);
  return fitting.length > 0 ? fitting : [Math.min(...offered)];
}

/**
 * Every setting worth pricing for this homeowner. Those `asAsked` compete for the recommendation; an outlet without a
 * charger is an alternative to our wired one, never the same job.
 * @param facts as answered: an unknown connection of their own charger means that both kinds are priced.
 */
export function candidates(facts: Facts, likely: KnownFacts, edition: Edition): OptionPlan[] {
  const theirs = likely.chargerSupply === 'theirs';
  const capAmps = Math.min(likely.carMaxAmps, theirs ? likely.chargerMaxAmps : edition.options.ourChargerAmps);
  const wired = usable(edition.options.wiredAmps, capAmps);
  const plugIn = usable(edition.options.plugInAmps, capAmps);
  const asked = facts.chargerConnection;

  const wiredPlans = asked === 'plug_in' ? [] : wired.map((amps) => plan('everyday', 'wired', amps, true));
  const outletAsAsked = asked === 'plug_in' || (theirs && asked === null);
  const outlets =
    theirs && asked === 'wired'
      ? []
      : plugIn.map((amps) => plan(outletAsAsked ? 'everyday' : 'outlet', 'plug_in', amps, outletAsAsked, !outletAsAsked));
  // Chargers share a circuit only with others of their make, which theirs is not known to be.
  const twoCars = !theirs && likely.secondCar !== 'no' && wiredPlans.length > 0 ? [plan('two_cars', 'wired', Math.max(...wired), false)] : [];
  return [...wiredPlans, ...outlets, ...twoCars];
}

/**
 * Two to four of the candidates: the cheapest that covers the usual day, the fastest, an outlet, two cars. Never the same twice.
 * @param priceCents price of a candidate in the likeliest home; null where it cannot be built.
 */
export function chooseOptions(
  all: readonly OptionPlan[],
  likely: KnownFacts,
  priceCents: (option: OptionPlan) => number | null,
): OptionPlan[] {
  const priced = all.flatMap((option) => {
    const cents = priceCents(option);
    return cents === null ? [] : [{ option, cents }];
  });
  const asked = priced.filter(({ option }) => option.asAsked);
  const cheapest = (list: typeof priced) =>
    [...list].sort((a, b) => a.cents - b.cents || b.option.chargingAmps - a.option.chargingAmps)[0]?.option;
  const fastest = (list: typeof priced) =>
    [...list].sort((a, b) => b.option.chargingAmps - a.option.chargingAmps || a.cents - b.cents)[0]?.option;
  const covering = asked.filter(({ option }) => coversUsualDay(option.chargingAmps, likely));
  const outlets = priced.filter(({ option }) => option.connection === 'plug_in');

  const everyday = cheapest(covering) ?? fastest(asked);
  const full = fastest(asked);
  const outletsCovering = outlets.filter(({ option }) => coversUsualDay(option.chargingAmps, likely));
  const picks = [
    everyday,
    full && { ...full, role: 'full' as const },
    cheapest(outletsCovering) ?? fastest(outlets),
    priced.find(({ option }) => option.role === 'two_cars')?.option,
  ];
  const seen = new Set<string>();
  return picks
    .filter((option): option is OptionPlan => option !== undefined && !seen.has(option.id) && Boolean(seen.add(option.id)))
    .slice(0, MAX_SHOWN);
}
