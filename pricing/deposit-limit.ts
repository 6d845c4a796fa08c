import type { Cents } from '../shared/money';

export interface DepositLimit {
  /** Most that may be taken before work starts; null where the state sets no limit by law. */
  readonly limitCents: Cents | null;
  readonly clause: string;
}

const dollars = (amount: number): Cents => amount * 100;
const thirdOf = (contractCents: Cents): Cents => Math.floor(contractCents / 3);

/**
 * Largest deposit that a state lets a home contractor take, in cents, rounded down. A legal figure: to be confirmed before use.
 * CA BPC 7159.5: the lesser of $1,000 and 10 %. MA c.142A s.2(a)(6), contracts over $1,000: the greater of a third and the special-order
 * materials. MD BR 8-617: a third. PA (secondary source), contracts over $5,000: a third and the special-order materials. ME (secondary
 * source): a third, waivable in writing. Others: none found; common practice asks 10 to 50 %.
 * @param state two capital letters.
 * @param specialOrderCents actual cost of materials that must be ordered for this job alone.
 */
export function depositLimit(state: string, contractCents: Cents, specialOrderCents: Cents = 0): DepositLimit {
  switch (state) {
    case 'CA': return { limitCents: Math.min(dollars(1000), Math.floor(contractCents / 10)), clause: 'CA BPC 7159.5' };
    case 'MA': return contractCents > dollars(1000)
      ? { limitCents: Math.min(contractCents, Math.max(thirdOf(contractCents), specialOrderCents)), clause: 'MA c.142A s.2(a)(6)' }
      : { limitCents: null, clause: 'MA c.142A s.2 starts above $1,000' };
    case 'MD': return { limitCents: thirdOf(contractCents), clause: 'MD BR 8-617' };
    case 'PA': return contractCents > dollars(5000)
      ? { limitCents: Math.min(contractCents, thirdOf(contractCents) + specialOrderCents), clause: 'PA home improvement law, a third' }
      : { limitCents: null, clause: 'PA home improvement law starts above $5,000' };
    case 'ME': return { limitCents: thirdOf(contractCents), clause: 'ME home construction law, a third' };
    default: return { limitCents: null, clause: 'no limit by state law is known' };
  }
}
