import { ElectricalError } from './edition';
import { tidy } from './trace';

/** Standard ampere ratings of overcurrent devices up to 400 A. NEC 2020 and 2023 240.6(A); the 10 A that 2023 adds is of no use here. */
export const standardRatingsAmps = [
  15, 20, 25, 30, 35, 40, 45, 50, 60, 70, 80, 90, 100, 110, 125, 150, 175, 200, 225, 250, 300, 350, 400,
] as const;

/** Charging counts as continuous: 125 % of it. NEC 2020 and 2023 210.20(A), 625.41. */
const CONTINUOUS_LOAD_FACTOR = 1.25;

/** Least rating of the overcurrent device, in amps, for a continuous load: 125 %. NEC 2020 and 2023 210.20(A), 625.41. */
export const minimumDeviceAmps = (continuousAmps: number): number => tidy(continuousAmps * CONTINUOUS_LOAD_FACTOR);

/**
 * Smallest standard rating of at least so many amps. NEC 2020 and 2023 240.6(A).
 * @throws ElectricalError above 400 A, or when it is no positive number.
 */
export function standardRatingAtLeast(amps: number): number {
  if (!(amps > 0)) throw new ElectricalError(`${amps} A is no current that a breaker could be chosen for.`);
  for (const rating of standardRatingsAmps) if (rating >= amps) return rating;
  throw new ElectricalError(`${amps} A is more than the largest breaker of a home service, 400 A.`);
}

/** Breaker, in amps, for a charging current. NEC 2020 and 2023 210.20(A), 240.6(A), 625.41. Throws as standardRatingAtLeast. */
export const breakerForCharging = (chargingAmps: number): number => standardRatingAtLeast(minimumDeviceAmps(chargingAmps));

/** Largest charging current, in amps, that a device may carry continuously: 80 % of its rating. NEC 2020 and 2023 210.20(A), 625.41. */
export const chargingAmpsOn = (deviceAmps: number): number => tidy(deviceAmps / CONTINUOUS_LOAD_FACTOR);
