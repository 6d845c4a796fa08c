import type { WiringMethod } from '../electrical/circuit-types';
import { pullPointsFor } from './bends';
import type { RunLeg, RunWay } from './legs';
import type { Point } from './perimeter';
import { supportsFor } from './supports';

/** One feasible way from the panel to the charger. */
export interface RunPlan {
  readonly method: WiringMethod;
  /** What is chiefly seen of it, or where it chiefly hides. */
  readonly way: RunWay;
  readonly methodWords: string;
  readonly legs: readonly RunLeg[];
  /** Level and vertical feet together, from the panel to the charger. */
  readonly lengthFt: number;
  readonly wallFt: number;
  readonly upDownFt: number;
  readonly bends90: number;
  /** Boxes or elbows with a cover, so that no more than 360 degrees of bends lie between two of them. */
  readonly pullPoints: number;
  readonly supports: number;
  /** The part inside the garage, from the panel or from where it comes in, to the charger. Empty outdoors. */
  readonly points: readonly Point[];
  readonly ambientC: number;
  /** True when the charger hangs outdoors. */
  readonly outdoor: boolean;
  /** True when a part of the pipe gets wet. */
  readonly wet: boolean;
  readonly wallPenetrations: number;
  readonly masonryCores: number;
  readonly patches: number;
  readonly paint: boolean;
  readonly trenchFt: number;
  readonly oddities: readonly string[];
}

/** What a way itself knows of its plan; what is left out is none. */
export type RunDraft = Pick<RunPlan, 'method' | 'way' | 'methodWords' | 'legs' | 'bends90' | 'points'>
  & Partial<Pick<RunPlan, 'outdoor' | 'wallPenetrations' | 'masonryCores' | 'patches' | 'paint' | 'trenchFt' | 'oddities'>>;

/** Indoors and in open air in the shade. Source: base of NEC 2023 Table 310.16. */
const INDOOR_C = 30;
/** Under a roof in summer. Source: common practice, no source. */
const ATTIC_C = 54;
/** Pipe on an outside wall in the sun. Source: common practice, no source. */
const OUTSIDE_C = 40;

const hundredth = (feet: number) => Math.round(feet * 100) / 100;

function hottest(legs: readonly RunLeg[]): number {
  let ambientC = INDOOR_C;
  for (const { way } of legs) {
    if (way === 'attic') return ATTIC_C;
    if (way === 'outside_wall') ambientC = OUTSIDE_C;
  }
  return ambientC;
}

/** Adds up the legs of a way and works out its supports, pull points and surroundings. Lengths to a hundredth of a foot. */
export function runPlan(draft: RunDraft): RunPlan {
  const { method, legs, bends90 } = draft;
  let [wallFt, upDownFt, wet] = [0, 0, false];
  for (const { way, levelFt, upDownFt: riseFt } of legs) {
    wallFt += levelFt;
    upDownFt += riseFt;
    wet ||= way === 'outside_wall' || way === 'underground';
  }
  [wallFt, upDownFt] = [hundredth(wallFt), hundredth(upDownFt)];
  return {
    method, way: draft.way, methodWords: draft.methodWords, legs, lengthFt: hundredth(wallFt + upDownFt), wallFt, upDownFt, bends90,
    pullPoints: method === 'NM_B' ? 0 : pullPointsFor(bends90), supports: supportsFor(method, legs), points: draft.points, ambientC: hottest(legs),
    outdoor: draft.outdoor ?? false, wet, wallPenetrations: draft.wallPenetrations ?? 0, masonryCores: draft.masonryCores ?? 0,
    patches: draft.patches ?? 0, paint: draft.paint ?? false, trenchFt: draft.trenchFt ?? 0, oddities: draft.oddities ?? [],
  };
}
