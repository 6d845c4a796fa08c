/** A small seeded generator, so that the demo is the same every time (mulberry32, public domain). */
export interface Chance {
  /** 0 up to, not including, 1. */
  next(): number;
  /** Whole number from `low` to `high`, both included. */
  whole(low: number, high: number): number;
  /** One of the list. */
  pick<T>(list: readonly [T, ...T[]]): T;
  /** True in `share` of the cases. */
  often(share: number): boolean;
}

export function chance(seed: number): Chance {
  let state = seed >>> 0;
  const next = () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), 1 | state);
    mixed = (mixed + Math.imul(mixed ^ (mixed >>> 7), 61 | mixed)) ^ mixed;
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4_294_967_296;
  };
  const whole = (low: number, high: number) => low + Math.floor(next() * (high - low + 1));
  return { next, whole, pick: (list) => list[whole(0, list.length - 1)] ?? list[0], often: (share) => next() < share };
}
