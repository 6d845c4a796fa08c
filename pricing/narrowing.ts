import { roundCents } from '../shared/money';
import type { Narrowing } from '../shared/quote';
import { endsOf } from './band';
import { stratifiedDraws } from './random';

/** What a homeowner can do about one thing that is not known: answer one question, or take one photo. */
interface Group {
  readonly fact: string;
  readonly title: string;
  readonly photo: string | null;
  readonly draws: (name: string) => boolean;
}

const named = (...names: readonly string[]) => {
  const set = new Set(names);
  return (name: string) => set.has(name);
};

const groups: readonly Group[] = [
  { fact: 'mainBreakerAmps', title: 'Main breaker size', photo: 'label', draws: named('mainBreakerAmps') },
  { fact: 'blankSpaces', title: 'Blank spaces in the panel', photo: 'panel', draws: named('blankSpaces') },
  { fact: 'panelCondition', title: 'The look of the panel', photo: 'panel', draws: named('panelCondition', 'panelMount', 'solarAmps') },
  { fact: 'panelPlace', title: 'Where the panel is', photo: null, draws: named('panelPlace') },
  { fact: 'loads', title: 'Big loads in the house', photo: null, draws: (name) => name.startsWith('loads.') },
  { fact: 'floorAreaFt2', title: 'Size of the home', photo: null, draws: named('floorAreaFt2') },
  { fact: 'yearBuilt', title: 'When the home was built', photo: null, draws: named('yearBuilt') },
  { fact: 'pacesToPanel', title: 'Steps to the panel', photo: 'way', draws: named('pacesToPanel', 'floorsBetween') },
  {
    fact: 'room',
    title: 'Garage plan',
    photo: null,
    draws: (name) =>
      named('room', 'ceilingFt', 'panelWall', 'portCorner', 'parked')(name) || name.startsWith('panelAt.') || name.startsWith('chargerAt.'),
  },
  { fact: 'wallFinish', title: 'Garage walls', photo: 'wall', draws: named('wallFinish') },
  { fact: 'atticAbove', title: 'Attic and crawl space', photo: null, draws: named('atticAbove', 'crawlBelow') },
  { fact: 'paintRun', title: 'Paint or no paint', photo: null, draws: named('paintRun') },
  { fact: 'serviceDrop', title: 'How power reaches the house', photo: 'meter', draws: named('serviceDrop') },
  { fact: 'chargerSupply', title: 'Whose charger', photo: null, draws: named('chargerSupply', 'chargerMaxAmps', 'cableLengthFt') },
  { fact: 'parking', title: 'Where the car stands', photo: null, draws: named('parking') },
  { fact: 'zip', title: 'The ZIP', photo: null, draws: named('zip') },
];

const BINS = 10;
/** Totals beyond these shares are pulled in, so that a rare great price does not outweigh what moves the range. */
const [PULL_LOW, PULL_HIGH] = [0.05, 0.95];
/** A draw whose bins explain less than this many times what chance alone would is left out. */
const ABOVE_CHANCE = 2;
const CHANCE_KEYS = 4;
const STEP_CENTS = 1_000;
/** Less is noise of the draws, and no reason to ask anybody for anything. */
const LEAST_CENTS = 2_000;

/** Mean of the totals in each tenth of a draw, less the mean of all; null when that explains no more than chance. */
function effectOf(
  totals: Float64Array,
  homes: readonly number[],
  draws: Float64Array,
  mean: number,
  variance: number,
): Float64Array | null {
  const [sums, counts] = [new Float64Array(BINS), new Float64Array(BINS)];
  homes.forEach((home, place) => {
    const bin = binOf(draws[home]);
    sums[bin] = (sums[bin] ?? 0) + (totals[place] ?? 0);
    counts[bin] = (counts[bin] ?? 0) + 1;
  });
  const effect = sums.map((sum, bin) => ((counts[bin] ?? 0) > 0 ? sum / (counts[bin] ?? 1) - mean : 0));
  const between = effect.reduce((sum, value, bin) => sum + (counts[bin] ?? 0) * value ** 2, 0) / homes.length;
  return between / variance > (ABOVE_CHANCE * (BINS - 1)) / homes.length ? effect : null;
}

const binOf = (draw: number | undefined): number => Math.min(BINS - 1, Math.floor((draw ?? 0) * BINS));

/** Mean width, 10th to 90th percentile, of tenths of the homes when they are put in order of `key`. */
function meanWidth(totalsCents: readonly number[], key: Float64Array): number {
  const order = totalsCents.map((_, place) => place).sort((a, b) => (key[a] ?? 0) - (key[b] ?? 0) || a - b);
  let width = 0;
  for (let bin = 0; bin < BINS; bin += 1) {
    const part = order
      .slice(Math.round((bin * order.length) / BINS), Math.round(((bin + 1) * order.length) / BINS))
      .map((place) => totalsCents[place] ?? 0);
    const { lowCents, highCents } = endsOf(Float64Array.from(part).sort());
    width += ((highCents - lowCents) * part.length) / order.length;
  }
  return width;
}

/** Mean width within tenths by chance alone; near a cliff of prices even that is less than the whole range's. */
function widthByChance(totalsCents: readonly number[]): number {
  const keys = Array.from({ length: CHANCE_KEYS }, (_, index) => stratifiedDraws(`chance ${index}`, totalsCents.length));
  return keys.reduce((sum, key) => sum + meanWidth(totalsCents, key), 0) / CHANCE_KEYS;
}

/**
 * What each unknown thing would take off the width of the range on average when it is answered, most first. Homes are sorted by
 * what the thing alone adds to their price (the sum of its draws' first-order effects), the width is taken within tenths, and set against
 * tenths by chance.
 * @param totalsCents prices of the homes whose draw numbers are `homes`, in the same order.
 */
export function narrowingOf(
  totalsCents: readonly number[],
  homes: readonly number[],
  streams: ReadonlyMap<string, Float64Array>,
): Narrowing[] {
  if (homes.length < 2 * BINS) return [];
  const sorted = Float64Array.from(totalsCents).sort();
  const at = (share: number) => sorted[Math.floor(share * (sorted.length - 1))] ?? 0;
  const [least, most] = [at(PULL_LOW), at(PULL_HIGH)];
  const totals = Float64Array.from(totalsCents, (cents) => Math.min(most, Math.max(least, cents)));
  const mean = totals.reduce((sum, cents) => sum + cents, 0) / totals.length;
  const variance = totals.reduce((sum, cents) => sum + (cents - mean) ** 2, 0) / totals.length;
  if (variance === 0) return [];
  const byChance = widthByChance(totalsCents);

  return groups
    .flatMap(({ fact, title, photo, draws }) => {
      const key = new Float64Array(homes.length);
      let moves = false;
      for (const [name, stream] of streams) {
        const effect = draws(name) ? effectOf(totals, homes, stream, mean, variance) : null;
        if (effect === null) continue;
        moves = true;
        homes.forEach((home, place) => {
          key[place] = (key[place] ?? 0) + (effect[binOf(stream[home])] ?? 0);
        });
      }
      const cents = moves ? roundCents(byChance - meanWidth(totalsCents, key), STEP_CENTS) : 0;
      return cents < LEAST_CENTS ? [] : [{ fact, title, cents, photo }];
    })
    .sort((a, b) => b.cents - a.cents || a.fact.localeCompare(b.fact));
}
