import type { Distribution } from './schema';

/** Gives the value at a place `u` between 0 and 1 of the likelihoods. */
export type Draw = (u: number) => unknown;

/** The value at each place of a distribution: weighted values in their order, a triangle by its inverse, in whole steps. */
export function drawFrom(distribution: Distribution): Draw {
  if ('fixed' in distribution) return () => distribution.fixed;
  if ('weighted' in distribution) {
    const sum = distribution.weighted.reduce((total, { weight }) => total + weight, 0);
    let reached = 0;
    const ends = distribution.weighted.map(({ weight }) => (reached += weight / sum));
    return (u) => {
      let index = 0;
      while (index < ends.length - 1 && u >= (ends[index] ?? 1)) index += 1;
      return distribution.weighted[index]?.value;
    };
  }
  const { low, mode, high, step } = distribution.triangle;
  const rise = (mode - low) / (high - low);
  return (u) => {
    const value = u < rise ? low + Math.sqrt(u * (high - low) * (mode - low)) : high - Math.sqrt((1 - u) * (high - low) * (high - mode));
    return Math.min(high, Math.max(low, Math.round(value / step) * step));
  };
}

/** The likeliest value: the fixed one, the heaviest, the triangle's mode. */
export function likeliest(distribution: Distribution): unknown {
  if ('fixed' in distribution) return distribution.fixed;
  if ('triangle' in distribution) return distribution.triangle.mode;
  return distribution.weighted.reduce((best, entry) => (entry.weight > best.weight ? entry : best)).value;
}
