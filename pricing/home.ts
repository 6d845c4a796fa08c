import type { KnownFacts } from './known-facts';
import { dwellingLoads, SERVICE_VOLTS } from './dwelling';
import { evseVa } from './electrical/evse-load';
import { judgeLoad, type LoadVerdict } from './electrical/load-verdict';
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

/** Works out a home once, for all of its options. */
export function homeOf(known: KnownFacts, place: Jurisdiction): Home {
  const loads = dwellingLoads(known, place.codeEdition);
  const verdict = judgeLoad(loads, FULL_SETTING_AMPS);
  const cautious = verdict.practices.find(({ id }) => id === 'hvac_and_ev_at_100')?.amps ?? verdict.withChargerAmps;
  const chargerAmps = evseVa(place.codeEdition, FULL_SETTING_AMPS * SERVICE_VOLTS) / SERVICE_VOLTS;
  return { known, place, runs: tidyWays(known), verdict, serviceAmps: loads.serviceAmps, homeAmps: cautious - chargerAmps };
}
