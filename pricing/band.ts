import { roundCents, type Cents } from '../shared/money';
import { shareOut } from './split';

export const TOTAL_STEP_CENTS = 1_000;
export const LINE_STEP_CENTS = 500;
const LOW = 0.1;
const MIDDLE = 0.5;
const HIGH = 0.9;
/** Lines at the ends are averaged over samples whose rank is this close to the end's, so that one odd home does not set them. */
const NEAR = 0.05;

/** Prices of one option over the sampled homes: totals, and cents by line for each home. */
export interface Samples {
  readonly totals: readonly Cents[];
  readonly lines: readonly (readonly Cents[])[];
}
export interface Range {
  readonly lowCents: Cents;
  readonly midCents: Cents;
  readonly highCents: Cents;
}
export interface Band extends Range {
  /** One range for each line, in the edition's order; they add up to the totals at low, mid and high. */
  readonly lines: readonly Range[];
  /** Which sample is the middle one, and one near the high end. */
  readonly midSample: number;
  readonly highSample: number;
}

/** The sample numbers in order of their totals, equal totals in order of number. */
const inOrder = (totals: readonly Cents[]): number[] =>
  totals.map((_, index) => index).sort((a, b) => (totals[a] ?? 0) - (totals[b] ?? 0) || a - b);

/** Place of the nearest-rank percentile in a sorted list. */
const rank = (share: number, count: number): number => Math.max(0, Math.ceil(share * count) - 1);

/** The 10th and 90th percentile of sorted prices, nearest rank, not rounded. */
export const endsOf = (sorted: Float64Array): { lowCents: Cents; highCents: Cents } => ({
  lowCents: sorted[rank(LOW, sorted.length)] ?? 0,
  highCents: sorted[rank(HIGH, sorted.length)] ?? 0,
});

function meanLines(samples: Samples, order: readonly number[], share: number, lineCount: number): number[] {
  const count = order.length;
  const from = rank(Math.max(0, share - NEAR), count);
  const to = rank(Math.min(1, share + NEAR), count);
  return Array.from({ length: lineCount }, (_, line) => {
    let sum = 0;
    for (let place = from; place <= to; place += 1) sum += samples.lines[order[place] ?? 0]?.[line] ?? 0;
    return sum / (to - from + 1);
  });
}

/**
 * Low, mid and high of one option: the 10th percentile, the median and the 90th of its totals (nearest rank), rounded to whole
 * ten dollars; lines to five, adding up exactly. Lines of the middle are those of the median home; towards the ends each line
 * takes its share of the difference by how far it itself strays there.
 * @throws RangeError without samples.
 */
export function bandOf(samples: Samples): Band {
  const count = samples.totals.length;
  if (count === 0) throw new RangeError('A range needs at least one priced home');
  const order = inOrder(samples.totals);
  const at = (share: number) => order[rank(share, count)] ?? 0;
  const total = (share: number) => roundCents(samples.totals[at(share)] ?? 0, TOTAL_STEP_CENTS);
  const [low, mid, high] = [total(LOW), total(MIDDLE), total(HIGH)];

  const midRaw = samples.lines[at(MIDDLE)] ?? [];
  const midUnits = roundLines(midRaw, mid / LINE_STEP_CENTS);
  const ends = { lowCents: low, midCents: mid, highCents: high, midSample: at(MIDDLE), highSample: at(HIGH) };
  if (low === high) return { ...ends, lines: midUnits.map((units) => atOnce(units * LINE_STEP_CENTS)) };
  const lineCount = midRaw.length;
  const unlimited = midRaw.map(() => Number.MAX_SAFE_INTEGER);
  const lowRaw = meanLines(samples, order, LOW, lineCount);
  const highRaw = meanLines(samples, order, HIGH, lineCount);
  const down = shareOut(
    (mid - low) / LINE_STEP_CENTS,
    midRaw.map((cents, line) => Math.max(0, cents - (lowRaw[line] ?? 0))),
    midUnits,
  );
  const strays = midRaw.map((cents, line) => Math.max(0, (highRaw[line] ?? 0) - cents));
  const up = shareOut((high - mid) / LINE_STEP_CENTS, strays.some((weight) => weight > 0) ? strays : midUnits, unlimited);

  return {
    ...ends,
    lines: midUnits.map((units, line) => ({
      lowCents: (units - (down[line] ?? 0)) * LINE_STEP_CENTS,
      midCents: units * LINE_STEP_CENTS,
      highCents: (units + (up[line] ?? 0)) * LINE_STEP_CENTS,
    })),
  };
}

/** One price, low, mid and high. */
const atOnce = (cents: Cents): Range => ({ lowCents: cents, midCents: cents, highCents: cents });

/** Lines in whole units that add up to `totalUnits`: each rounded down, the rest to the largest remainders. */
function roundLines(cents: readonly Cents[], totalUnits: number): number[] {
  const units = cents.map((value) => Math.floor(value / LINE_STEP_CENTS));
  const rest = totalUnits - units.reduce((sum, value) => sum + value, 0);
  const remainders = cents.map((value, line) => value - (units[line] ?? 0) * LINE_STEP_CENTS);
  const extra = shareOut(
    rest,
    remainders.some((value) => value > 0) ? remainders : cents,
    cents.map((value) => (value > 0 ? 1 : 0)),
  );
  return units.map((value, line) => value + (extra[line] ?? 0));
}
