import type { RunPlan } from './run-plan';

/**
 * The lengths of a run as they are shown: whole feet along and in all, and what is left of them up and down, so that they add up.
 * Quantities and voltage drop are worked out from the run itself.
 */
export function wholeFeet(run: Pick<RunPlan, 'lengthFt' | 'wallFt'>): Pick<RunPlan, 'lengthFt' | 'wallFt' | 'upDownFt'> {
  const [lengthFt, wallFt] = [Math.round(run.lengthFt), Math.round(run.wallFt)];
  return { lengthFt, wallFt, upDownFt: lengthFt - wallFt };
}
