import type { CodeEdition } from './edition';

/** General lighting and receptacles, VA a square foot of dwelling. NEC 2020 and 2023: 3; 2026 is reported to have 2. */
export const LIGHTING_VA_PER_FT2 = 3;
/** Each small-appliance and laundry circuit. NEC 2020 and 2023 220.52. */
export const CIRCUIT_VA = 1500;

export interface Appliance { readonly id: string; readonly words: string; readonly va: number }

/** Heating and cooling by kind, rated VA; 0 where there is none. */
export interface Hvac {
  readonly coolingVa: number;
  readonly heatPumpVa: number;
  /** Strips that help a heat pump. */
  readonly supplementalHeatVa: number;
  /** Electric furnace or other central electric heat. */
  readonly centralHeatVa: number;
  /** Room heaters together, and how many are separately controlled. */
  readonly roomHeatersVa: number;
  readonly roomHeaterCount: number;
}

/** What a dwelling load calculation needs to know of a home, without the new charger. */
export interface DwellingLoads {
  readonly edition: CodeEdition;
  /** Outside dimensions; without garage and open porches. NEC 2020 220.12, 2023 220.5(C). */
  readonly floorAreaFt2: number;
  readonly smallApplianceCircuits: number;
  readonly laundryCircuits: number;
  readonly appliances: readonly Appliance[];
  readonly hvac: Hvac;
  readonly serviceAmps: number;
  readonly volts: number;
}

export type GeneralLoads = Pick<DwellingLoads, 'floorAreaFt2' | 'smallApplianceCircuits' | 'laundryCircuits' | 'appliances'>;

/** VA of lighting and of the small-appliance and laundry circuits, no demand factor. NEC 2020 and 2023 220.52, 220.82(B), 220.83(A). */
export const lightingAndCircuitsVa = (loads: Omit<GeneralLoads, 'appliances'>): number =>
  loads.floorAreaFt2 * LIGHTING_VA_PER_FT2 + (loads.smallApplianceCircuits + loads.laundryCircuits) * CIRCUIT_VA;

/** Connected VA of everything but heating, cooling and the new charger. NEC 2020 and 2023 220.82(B), 220.83(A). */
export function otherConnectedVa(loads: GeneralLoads): number {
  let va = lightingAndCircuitsVa(loads);
  for (const appliance of loads.appliances) va += appliance.va;
  return va;
}

/** 100 % of a first tier and 40 % of the rest, in VA. NEC 2020 and 2023: 10,000 VA in 220.82(B), 8,000 VA in 220.83. */
export const tieredVa = (connectedVa: number, firstTierVa: number): number =>
  connectedVa <= firstTierVa ? connectedVa : firstTierVa + 0.4 * (connectedVa - firstTierVa);

/** From this many separately controlled room heaters on, they count with the other loads. NEC 2020 and 2023 220.82(C), 220.83(B). */
export const MANY_ROOM_HEATERS = 4;
