import type { KnownFacts } from './known-facts';
import { dwellingLoads } from './dwelling';
import { evseVa } from './electrical/evse-load';
import { judgeLoad, type LoadVerdict } from './electrical/load-verdict';
import { tidy } from './electrical/trace';
import { planRuns } from './run/plan-run';
import type { RunPlan } from './run/run-plan';
import type { Jurisdiction } from './rulebook/schema';

/** The largest setting that any option uses; one verdict at it says for every setting whether the service carries it. */
const FULL_SETTING_AMPS = 48;

/** One home with everything known, and what does not depend on the option: its ways for the wire and its load. */
export interface Home {
  readonly known: KnownFacts;
  readonly place: Jurisdiction;
  /** Ways for the wire that look as wanted. */
  readonly runs: readonly RunPlan[];
  readonly verdict: LoadVerdict;
  readonly serviceAmps: number;
  /** The home without the new charger by the most cautious practice, heating or cooling in full. */
  readonly homeAmps: number;
  /** The service that the rulebook upgrades to. */
  readonly upgradeAmps: number;
  /** Largest setting that the service carries as it is, and that the upgraded one would; 0: none, or no upgrade. */
  readonly maxChargingAmps: number;
  readonly maxUpgradedAmps: number;
}

const hiddenWays: ReadonlySet<string> = new Set(['open_studs', 'attic', 'crawl', 'finished_wall', 'joists']);

/** The ways that look as wanted; all of them when none does, or when either look will do. */
export function tidyWays(known: KnownFacts): readonly RunPlan[] {
  const runs = planRuns(known);
  if (known.runLook === null) return runs;
  const wantHidden = known.runLook === 'hidden';
  const fitting = runs.filter((run) => hiddenWays.has(run.way) === wantHidden);
  return fitting.length > 0 ? fitting : runs;
}

/**
 * Works out a home once, for all of its options.
 * @param upgradeAmps the service that the rulebook upgrades to; no upgrade where there is as large a one already.
 * @param runs the ways for the wire, when they were planned already.
 */
export function homeOf(known: KnownFacts, place: Jurisdiction, upgradeAmps: number, runs = tidyWays(known)): Home {
  const loads = dwellingLoads(known, place.codeEdition);
  const verdict = judgeLoad(loads, FULL_SETTING_AMPS);
  const { serviceAmps } = loads;
  const cautious = verdict.practices.find(({ id }) => id === 'hvac_and_ev_at_100')?.amps ?? verdict.withChargerAmps;
  const chargerAmps = evseVa(place.codeEdition, FULL_SETTING_AMPS * known.volts) / known.volts;
  const { maxChargingAmps } = verdict;
  const needsMore = maxChargingAmps < FULL_SETTING_AMPS && serviceAmps < upgradeAmps;
  return {
    known, place, runs, verdict, serviceAmps, homeAmps: tidy(cautious - chargerAmps), upgradeAmps, maxChargingAmps,
    maxUpgradedAmps: needsMore ? judgeLoad({ ...loads, serviceAmps: upgradeAmps }, FULL_SETTING_AMPS).maxChargingAmps : 0,
  };
}
