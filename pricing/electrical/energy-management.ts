import { clause, clauseOf, type CodeEdition } from './edition';
import { chargingAmpsOn } from './standard-ratings';
import type { TraceEntry } from './trace';

/** Least current that a car accepts by its pilot signal. SAE J1772: 10 % duty, 6 A. */
export const LEAST_CHARGING_AMPS = 6;

export interface EnergyManagementInput {
  readonly edition: CodeEdition;
  readonly serviceAmps: number;
  /** Calculated load of the home without the charger. */
  readonly homeAmps: number;
  readonly chargingAmps: number;
  /** True when the service device is listed for 100 % continuous load; ordinary main breakers are not. */
  readonly deviceFullRated?: boolean;
}

export interface EnergyManagement {
  /** Largest setting of the whole service, in amps; the charger gives way above it. */
  readonly setPointAmps: number;
  /** What is left for the charger while the home draws all that it is calculated to, at most its setting. */
  readonly chargingAmpsAtPeak: number;
  /** The home alone keeps within the service, so that a charger that gives way altogether never overloads it. 625.42(A). */
  readonly possible: boolean;
  /** The home alone keeps within the set point too, which then may stand for the whole service in its load calculation. 220.70. */
  readonly withinSetPoint: boolean;
  /** Enough is left at the peak for a car to go on charging; otherwise it waits. */
  readonly chargesAtPeak: boolean;
  readonly trace: readonly TraceEntry[];
}

/** Amps that a limit leaves to the charger beside the home, whole amps, at most `chargingAmps`. NEC 2020 and 2023 625.42(A). */
export const chargingAmpsWithin = (limitAmps: number, homeAmps: number, chargingAmps: number): number =>
  Math.max(0, Math.min(chargingAmps, Math.floor(limitAmps - homeAmps)));

/**
 * A listed energy management system that limits the service: its set point may be used as the load and counts as continuous, so that
 * it may be 80 % of an ordinary main. Between set point and rating the home alone is within its service and the charger, of which only
 * what the system permits counts, waits. NEC 2020 625.42(A), 750.30; NEC 2023 220.70, 625.42(A), 750.30.
 */
export function planEnergyManagement(input: EnergyManagementInput): EnergyManagement {
  const { edition, serviceAmps, homeAmps, chargingAmps, deviceFullRated = false } = input;
  const setPointAmps = deviceFullRated ? serviceAmps : chargingAmpsOn(serviceAmps);
  const chargingAmpsAtPeak = chargingAmpsWithin(setPointAmps, homeAmps, chargingAmps);
  return {
    setPointAmps, chargingAmpsAtPeak, possible: homeAmps <= serviceAmps, withinSetPoint: homeAmps <= setPointAmps,
    chargesAtPeak: chargingAmpsAtPeak >= LEAST_CHARGING_AMPS,
    trace: [
      {
        what: 'Set point of the service', value: `${setPointAmps} A on a main of ${serviceAmps} A`,
        clause: clauseOf(edition, 'energyManagement'),
      },
      { what: 'Left for the charger at the calculated peak', value: `${chargingAmpsAtPeak} A`, clause: clause(edition, '625.42(A)') },
    ],
  };
}
