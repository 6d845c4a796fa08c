import type { CircuitDesign } from '../electrical/circuit-types';
import type { KnownFacts } from '../known-facts';
import type { RunPlan } from '../run/run-plan';
import { endItems } from './end-items';
import { runItems } from './run-items';
import { tasksOf } from './tasks';
import type { Takeoff, TakeoffOptions } from './types';

export type { Takeoff, TakeoffItem, TakeoffOptions, TakeoffTask } from './types';

/**
 * What a circuit on a run takes: every thing with its quantity for the pick list, and every task of the crew.
 * Room and capacity in the panel, permit and visits are not of the run; rules add them.
 */
export const takeoff = (circuit: CircuitDesign, run: RunPlan, known: KnownFacts, options: TakeoffOptions): Takeoff => ({
  items: [...runItems(circuit, run, options), ...endItems(circuit, run, known, options)],
  tasks: tasksOf(circuit, run, options),
});
