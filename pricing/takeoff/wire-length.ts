/** Spare wire at both ends and waste; the rulebook's. */
export interface WireAllowance { readonly panelSlackFt: number; readonly chargerSlackFt: number; readonly wastePercent: number }

/** Feet of one conductor or cable to take along: the run, the spare at both ends, and waste, up to the next whole foot. */
export const wireFt = (runFt: number, { panelSlackFt, chargerSlackFt, wastePercent }: WireAllowance): number =>
  // A millionth is rounding of the hundredths, not another foot.
  Math.ceil((runFt + panelSlackFt + chargerSlackFt) * (1 + wastePercent / 100) - 1e-6);
