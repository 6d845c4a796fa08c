import { otherConnectedVa, type DwellingLoads } from './dwelling-loads';
import { evseVa } from './evse-load';
import { largerSeasonVa, load22083A, load22083B, seasonsOf, type ExistingLoad, type Seasons } from './load-220-83';

/**
 * How offices place a charger in 220.83, which does not say it (NEC 2020 and 2023):
 * `literal` with the other loads in the 40 % pool, heating or cooling whole; `hvac_and_ev_at_100` both whole, beside the pool;
 * `all_in_pool` everything through 8,000 VA / 40 %, the least cautious.
 */
export const practiceIds = ['literal', 'hvac_and_ev_at_100', 'all_in_pool'] as const;
export type PracticeId = (typeof practiceIds)[number];

/** Of a home's appliances this one is a charger too, and is placed as the new one is. */
const OTHER_CHARGER_ID = 'otherCharger';

/** A home's loads sorted once, in VA, so that several settings and practices can be tried on it. */
export interface SortedLoads {
  readonly loads: DwellingLoads;
  /** Lighting, circuits and appliances, chargers apart. */
  readonly otherVa: number;
  /** Chargers that are there already. */
  readonly existingEvseVa: number;
  readonly seasons: Seasons;
}

/** Sorts a home's loads: other loads, chargers that are there, heating and cooling. */
export function sortLoads(loads: DwellingLoads): SortedLoads {
  let [ratedVa, existingEvseVa] = [0, 0];
  for (const { id, va } of loads.appliances) {
    if (id !== OTHER_CHARGER_ID) continue;
    ratedVa += va;
    existingEvseVa += evseVa(loads.edition, va);
  }
  return { loads, otherVa: otherConnectedVa(loads) - ratedVa, existingEvseVa, seasons: seasonsOf(loads.hvac) };
}

export const isCharger = (id: string): boolean => id === OTHER_CHARGER_ID;

/**
 * The calculated load of home and charger by one practice. NEC 2020 and 2023 220.83.
 * @param newEvseVa the new charger as evseVa gives it; 0: the home as it is.
 * @param continuousOnService adds 25 % of the chargers, as some offices ask because an ordinary main is not rated for 100 %.
 */
export function practiceLoad(practice: PracticeId, sorted: SortedLoads, newEvseVa: number, continuousOnService: boolean): ExistingLoad {
  const { loads: { edition, volts }, otherVa, seasons } = sorted;
  const chargersVa = sorted.existingEvseVa + newEvseVa;
  const extraVa = continuousOnService ? 0.25 * chargersVa : 0;
  switch (practice) {
    case 'literal': return load22083B(edition, otherVa + chargersVa, seasons, extraVa, volts);
    case 'hvac_and_ev_at_100': return load22083B(edition, otherVa, seasons, chargersVa + extraVa, volts);
    case 'all_in_pool': {
      const load = load22083A(edition, otherVa + largerSeasonVa(seasons) + chargersVa, volts);
      return extraVa === 0 ? load : { ...load, calculatedVa: load.calculatedVa + extraVa, amps: (load.calculatedVa + extraVa) / volts };
    }
  }
}
