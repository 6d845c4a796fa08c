import type { Facts } from '../shared/facts';
import type { LoadId } from '../shared/loads';

/** A load that is known to be there or not; `amount` null: its typical rating. */
export interface KnownLoad { readonly present: boolean; readonly amount: number | null }

/** Open where there is no such thing: places on the plan without a garage, the place of a panel elsewhere, no wish for a look. */
type MayBeOpen = 'garageDoor' | 'panelAt' | 'chargerAt' | 'carAt' | 'runLook';

/**
 * Facts with nothing left open that this home has: what is not known has been drawn from the rulebook's likelihoods.
 * A value may be there that the home does not use (a trench without a detached garage); whoever computes decides what counts.
 */
export type KnownFacts = {
  readonly [Name in Exclude<keyof Facts, 'loads' | MayBeOpen>]: NonNullable<Facts[Name]>;
} & Readonly<Pick<Facts, MayBeOpen>> & {
  readonly loads: Readonly<Record<LoadId, KnownLoad>>;
};
