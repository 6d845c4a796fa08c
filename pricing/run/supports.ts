import type { WiringMethod } from '../electrical/circuit-types';
import { pipeFt, stapledFt, type RunLeg } from './legs';

/** Distance between supports, and the most between an end and the first one; feet. */
export interface SupportRule { readonly everyFt: number; readonly fromEndFt: number; readonly clause: string }

const emt: SupportRule = { everyFt: 10, fromEndFt: 3, clause: 'NEC 2023 358.30(A)' };
const smallPvc: SupportRule = { everyFt: 3, fromEndFt: 3, clause: 'NEC 2023 352.30 and Table 352.30' };
const middlePvc: SupportRule = { everyFt: 5, fromEndFt: 3, clause: 'NEC 2023 352.30 and Table 352.30' };
const nm: SupportRule = { everyFt: 4.5, fromEndFt: 1, clause: 'NEC 2023 334.30' };
const middleSizes: ReadonlySet<string> = new Set(['1-1/4', '1-1/2', '2']);

/**
 * How often a pipe or cable has to be held. PVC of 1-1/4 to 2 in. may go 5 ft, smaller sizes 3 ft.
 * @param tradeSize of a pipe; 1 in. or less when it is left out.
 */
export function supportRule(method: WiringMethod, tradeSize: string | null = null): SupportRule {
  if (method === 'EMT') return emt;
  if (method === 'NM_B') return nm;
  return tradeSize !== null && middleSizes.has(tradeSize) ? middlePvc : smallPvc;
}

/** One support for each interval and one more at each end (common practice, no source): never fewer than the clause asks for. */
export const supportCount = (lengthFt: number, rule: SupportRule): number =>
  lengthFt <= 0 ? 0 : Math.ceil(lengthFt / rule.everyFt) + 1;

/** Straps and staples of a whole run; a cable's protecting pipe is EMT. */
export function supportsFor(method: WiringMethod, legs: readonly RunLeg[], tradeSize: string | null = null): number {
  const pipe = method === 'NM_B' ? emt : supportRule(method, tradeSize);
  return supportCount(pipeFt(method, legs), pipe) + supportCount(stapledFt(method, legs), nm);
}
