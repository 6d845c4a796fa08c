/** Degrees of bends that may lie between two pull points. NEC 2023 358.26 (EMT), 352.26 (PVC). */
const MOST_DEGREES = 360;
const MOST_BENDS = MOST_DEGREES / 90;

/** How many pull points a pipe needs between its two ends, so that no stretch has more than 360 degrees of bends. */
export const pullPointsFor = (bends90: number): number => Math.max(0, Math.ceil(bends90 / MOST_BENDS) - 1);
