import { MANY_ROOM_HEATERS, tieredVa, type Hvac } from './dwelling-loads';
import { clause, type CodeEdition } from './edition';

/** Tier that counts whole in an existing dwelling; not the 10,000 VA of 220.82. NEC 2020 and 2023 220.83. */
export const EXISTING_FIRST_TIER_VA = 8000;

export interface ExistingLoad { readonly calculatedVa: number; readonly amps: number; readonly clause: string }

/** Heating and cooling as 220.83(B) sorts them, in VA. Which season is the larger shows only with the tiers. */
export interface Seasons {
  readonly coolingVa: number;
  /** Heat that counts whole: heat pump with its strips, central heat, fewer than four room heaters. */
  readonly heatingVa: number;
  /** Four or more room heaters: among the other loads while heating. */
  readonly pooledHeatVa: number;
}

/**
 * Sorts a home's heating and cooling for 220.83(B): 100 %, never the 65 % of 220.82(C). A heat pump runs in both seasons.
 * Heating and cooling are never added together. NEC 2020 and 2023 220.83(B), 220.60.
 */
export function seasonsOf({ coolingVa, heatPumpVa, supplementalHeatVa, centralHeatVa, roomHeatersVa, roomHeaterCount }: Hvac): Seasons {
  const many = roomHeaterCount >= MANY_ROOM_HEATERS;
  return {
    coolingVa: coolingVa + heatPumpVa,
    heatingVa: heatPumpVa + supplementalHeatVa + centralHeatVa + (many ? 0 : roomHeatersVa),
    pooledHeatVa: many ? roomHeatersVa : 0,
  };
}

/** Everything connected that runs in the larger season, in VA, with no demand factor. NEC 2020 and 2023 220.60. */
export const largerSeasonVa = ({ coolingVa, heatingVa, pooledHeatVa }: Seasons): number => Math.max(coolingVa, heatingVa + pooledHeatVa);

/**
 * Existing dwelling, 220.83(A): all loads, existing and new, through 8,000 VA at 100 % and the rest at 40 %. NEC 2020 and 2023.
 * @param connectedVa everything that counts; with heating or cooling in it this is the least cautious reading of (A).
 */
export function load22083A(edition: CodeEdition, connectedVa: number, volts: number): ExistingLoad {
  const calculatedVa = tieredVa(connectedVa, EXISTING_FIRST_TIER_VA);
  return { calculatedVa, amps: calculatedVa / volts, clause: clause(edition, '220.83(A)') };
}

export interface SeasonalLoad extends ExistingLoad { readonly season: 'cooling' | 'heating' }

/**
 * Existing dwelling, 220.83(B): heating or cooling at 100 %, the larger, and 8,000 VA / 40 % on the rest. NEC 2020 and 2023.
 * @param fullVa loads outside of the tiers besides, such as a charger where the office wants it at 100 %.
 */
export function load22083B(edition: CodeEdition, otherVa: number, seasons: Seasons, fullVa: number, volts: number): SeasonalLoad {
  const summerVa = tieredVa(otherVa, EXISTING_FIRST_TIER_VA) + seasons.coolingVa;
  const winterVa = tieredVa(otherVa + seasons.pooledHeatVa, EXISTING_FIRST_TIER_VA) + seasons.heatingVa;
  const season = winterVa > summerVa ? 'heating' : 'cooling';
  const calculatedVa = Math.max(summerVa, winterVa) + fullVa;
  return { calculatedVa, amps: calculatedVa / volts, season, clause: clause(edition, '220.83(B)') };
}
