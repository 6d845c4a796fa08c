import fc from 'fast-check';
import { bandOf, LINE_STEP_CENTS, TOTAL_STEP_CENTS } from '../../pricing/band';
import { shareOut } from '../../pricing/split';

const sum = (values: readonly number[]) => values.reduce((total, value) => total + value, 0);
/** Homes whose lines are whole cents; totals are their sums. */
const samplesOf = (lines: number[][]) => ({ lines, totals: lines.map(sum) });
const anySamples = fc
  .integer({ min: 1, max: 9 })
  .chain((lineCount) =>
    fc
      .array(fc.array(fc.oneof(fc.constant(0), fc.integer({ min: 0, max: 400_000 })), { minLength: lineCount, maxLength: lineCount }), {
        minLength: 1,
        maxLength: 60,
      })
      .map(samplesOf),
  );

describe('a range from sampled prices', () => {
  // Nearest rank of 1..10: the 10th percentile is the 1st, the median the 5th, the 90th the 9th. Source: definition of the nearest-rank
  // percentile.
  it('is the 10th, 50th and 90th percentile by nearest rank', () => {
    const band = bandOf(samplesOf([7, 3, 10, 1, 5, 9, 2, 8, 4, 6].map((tens) => [tens * 1_000])));
    expect([band.lowCents, band.midCents, band.highCents]).toEqual([1_000, 5_000, 9_000]);
  });

  // Source: product rule in the design's voice document, totals to $10, lines to $5, lines add up to the total.
  it('rounds totals to whole ten dollars and lines to five that still add up', () => {
    // 123.33 + 45.55 + 10.01 = 178.89 -> $180. Fives: 120 + 45 + 10 = 175, one five is left: the largest remainder is line 1 (3.33).
    const band = bandOf(samplesOf([[12_333, 4_555, 1_001]]));
    expect(band.midCents).toBe(18_000);
    expect(band.lines.map((line) => line.midCents)).toEqual([12_500, 4_500, 1_000]);
  });

  it('gives the difference to the lines that stray', () => {
    // Line 1 is 100 dollars in every home; line 2 is 0 in five homes of ten, 50 in the median, 200 in four.
    const homes = [0, 0, 0, 0, 5_000, 5_000, 20_000, 20_000, 20_000, 20_000].map((second) => [10_000, second]);
    const band = bandOf(samplesOf(homes));
    expect(band.lines[0]).toEqual({ lowCents: 10_000, midCents: 10_000, highCents: 10_000 });
    expect(band.lines[1]).toEqual({ lowCents: 0, midCents: 5_000, highCents: 20_000 });
  });

  it('adds up at low, mid and high for any prices, never below nothing, never crossing', () => {
    fc.assert(
      fc.property(anySamples, (samples) => {
        const band = bandOf(samples);
        for (const end of ['lowCents', 'midCents', 'highCents'] as const) {
          expect(sum(band.lines.map((line) => line[end]))).toBe(band[end]);
          expect(band[end] % TOTAL_STEP_CENTS).toBe(0);
          for (const line of band.lines) expect(line[end] % LINE_STEP_CENTS).toBe(0);
        }
        for (const line of [...band.lines, band]) {
          expect(line.lowCents).toBeGreaterThanOrEqual(0);
          expect(line.midCents).toBeGreaterThanOrEqual(line.lowCents);
          expect(line.highCents).toBeGreaterThanOrEqual(line.midCents);
        }
      }),
      { numRuns: 400 },
    );
  });

  it('refuses to make a range of nothing', () => {
    expect(() => bandOf({ totals: [], lines: [] })).toThrow(RangeError);
  });
});

describe('sharing whole units out', () => {
  // Source: largest-remainder method. 10 units by 5 : 3 : 1 are 5.56, 3.33, 1.11 -> 5, 3, 1 and one left for .56.
  it('rounds down and gives the rest to the largest remainders', () => {
    expect(shareOut(10, [5, 3, 1], [99, 99, 99])).toEqual([6, 3, 1]);
  });
  it('fills caps and passes the rest on', () => {
    expect(shareOut(10, [5, 5], [2, 99])).toEqual([2, 8]);
    expect(shareOut(6, [1, 0, 0], [2, 3, 3])).toEqual([2, 2, 2]);
  });
  it('gives out exactly what there is', () => {
    const places = fc.array(fc.tuple(fc.integer({ min: 0, max: 1_000 }), fc.integer({ min: 0, max: 50 })), { minLength: 1, maxLength: 12 });
    fc.assert(
      fc.property(places, fc.integer({ min: 0, max: 600 }), (entries, wanted) => {
        const caps = entries.map(([, cap]) => cap);
        const units = Math.min(wanted, sum(caps));
        const given = shareOut(
          units,
          entries.map(([weight]) => weight),
          caps,
        );
        expect(sum(given)).toBe(units);
        given.forEach((value, index) => {
          expect(value).toBeGreaterThanOrEqual(0);
          expect(value).toBeLessThanOrEqual(caps[index] ?? 0);
        });
      }),
      { numRuns: 400 },
    );
  });
});
