import type { KnownFacts } from '../known-facts';
import { garageWays } from './garage-ways';
import { houseWays } from './house-ways';
import { garageOf } from './inside-leg';
import { outdoorWays, yardWays } from './outdoor-ways';
import type { RunPlan } from './run-plan';

export type { RunLeg, RunWay } from './legs';
export type { Point } from './perimeter';
export type { RunPlan } from './run-plan';

/**
 * Every feasible way from the panel to the charger, in no order of price; which looks right and costs least is for the caller.
 * @returns an empty list when no way is tidy, as for a charger that hangs on the garage door.
 */
export function planRuns(known: KnownFacts): RunPlan[] {
  if (known.parking === 'carport' || known.parking === 'driveway') return outdoorWays(known);
  const garage = garageOf(known);
  if (garage === null) return [];
  if (known.panelPlace === 'garage_wall') return garageWays(garage);
  return known.parking === 'detached_garage' ? yardWays(known) : houseWays(garage);
}
