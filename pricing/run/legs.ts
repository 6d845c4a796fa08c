import type { WiringMethod } from '../electrical/circuit-types';

/** Where a wire goes. In a run of cable, `surface` is the part inside a protecting pipe. */
export type RunWay = 'surface' | 'open_studs' | 'attic' | 'crawl' | 'finished_wall' | 'outside_wall' | 'underground' | 'joists';

/** A stretch of a run that goes one way: its level feet and its feet up and down. */
export interface RunLeg { readonly way: RunWay; readonly levelFt: number; readonly upDownFt: number }

/** Feet of a run that are inside a pipe on a surface: all of a pipe above ground, or what protects a cable. */
export function pipeFt(method: WiringMethod, legs: readonly RunLeg[]): number {
  let feet = 0;
  for (const { way, levelFt, upDownFt } of legs) if (way === 'surface' || (method !== 'NM_B' && way !== 'underground')) feet += levelFt + upDownFt;
  return feet;
}

/** Feet of cable that are stapled or lie in bored holes. Fished cable needs no support: NEC 2023 334.30(B)(1). */
export function stapledFt(method: WiringMethod, legs: readonly RunLeg[]): number {
  let feet = 0;
  if (method === 'NM_B') for (const { way, levelFt, upDownFt } of legs) if (way !== 'surface' && way !== 'finished_wall') feet += levelFt + upDownFt;
  return feet;
}

/** Feet of a run in the ground. */
export function undergroundFt(legs: readonly RunLeg[]): number {
  let feet = 0;
  for (const { way, levelFt, upDownFt } of legs) if (way === 'underground') feet += levelFt + upDownFt;
  return feet;
}
