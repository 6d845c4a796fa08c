/** Changing it moves every range; documents keep their bytes only while it stays. */
const SEED = 'tidyrun draws 1';

/** FNV-1a, 32 bit. */
function hashOf(text: string): number {
  let hash = 0x811c9dc5;
  for (let index = 0; index < text.length; index += 1) hash = Math.imul(hash ^ text.charCodeAt(index), 0x01000193);
  return hash >>> 0;
}

/** Mulberry32: a small seeded generator of numbers from 0 up to 1. */
export function seededRandom(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), state | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4_294_967_296;
  };
}

const streams = new Map<string, Float64Array>();

/**
 * `count` numbers between 0 and 1 for one named thing: one from each of `count` equal slices, shuffled, so that few draws
 * cover the likelihoods evenly. The same name and count give the same numbers always, whatever else is unknown: an answered
 * question does not reshuffle the others, and two rulebooks are tried on the same draws.
 */
export function stratifiedDraws(name: string, count: number): Float64Array {
  const key = `${name}:${count}`;
  const known = streams.get(key);
  if (known) return known;
  const random = seededRandom(hashOf(`${SEED} ${name}`));
  const draws = Float64Array.from({ length: count }, (_, slice) => (slice + random()) / count);
  for (let last = count - 1; last > 0; last -= 1) {
    const other = Math.floor(random() * (last + 1));
    [draws[last], draws[other]] = [draws[other] ?? 0, draws[last] ?? 0];
  }
  streams.set(key, draws);
  return draws;
}
