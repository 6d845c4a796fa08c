/**
 * Shares `units` whole units out by weight, none above its cap. What is left after rounding down goes to the largest
 * remainders, earlier places first. When weights run out before the units do, the rest goes by what room is left.
 * @param caps most that each place can take; their sum must be at least `units`.
 */
export function shareOut(units: number, weights: readonly number[], caps: readonly number[]): number[] {
  const given = weights.map(() => 0);
  let left = units;
  let open = weights.map((weight, index) => (weight > 0 && (caps[index] ?? 0) > 0 ? weight : 0));
  while (left > 0) {
    let sum = open.reduce((total, weight) => total + weight, 0);
    if (sum === 0) {
      // Nothing has a weight any more: room itself becomes the weight.
      open = caps.map((cap, index) => cap - (given[index] ?? 0));
      sum = open.reduce((total, weight) => total + weight, 0);
      if (!(sum > 0)) break;
    }
    const round = left;
    const wanted = open.map((weight) => (round * weight) / sum);
    const order = wanted.map((_, index) => index).sort((a, b) => fraction(wanted[b]) - fraction(wanted[a]) || a - b);
    const whole = wanted.map(Math.floor);
    let spare = round - whole.reduce((total, value) => total + value, 0);
    for (const index of order) {
      const extra = spare > 0 && (open[index] ?? 0) > 0 ? 1 : 0;
      spare -= extra;
      const room = (caps[index] ?? 0) - (given[index] ?? 0);
      const taken = Math.min(room, (whole[index] ?? 0) + extra);
      given[index] = (given[index] ?? 0) + taken;
      left -= taken;
    }
    open = open.map((weight, index) => ((given[index] ?? 0) < (caps[index] ?? 0) ? weight : 0));
  }
  return given;
}

const fraction = (value: number | undefined): number => (value ?? 0) - Math.floor(value ?? 0);
