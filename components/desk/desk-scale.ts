import type { Scale } from '../price/tape-scale';

const STEP_CENTS = 50_000;

/** A section of the tape round a range, from and to whole $500, with room on both sides. */
export const deskScale = (lowCents: number, highCents: number): Scale => ({
  fromCents: Math.max(0, Math.floor((lowCents - STEP_CENTS / 2) / STEP_CENTS) * STEP_CENTS),
  toCents: Math.ceil((highCents + STEP_CENTS / 2) / STEP_CENTS) * STEP_CENTS,
});
