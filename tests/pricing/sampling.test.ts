import fc from 'fast-check';
import { MIDDLE, samplerFor } from '../../pricing/known-sampling';
import { stratifiedDraws } from '../../pricing/random';
import { drawFrom, likeliest } from '../../pricing/rulebook/distribution';
import { editionOne } from '../../pricing/rulebook/edition-1/index';
import type { Facts } from '../../shared/facts';
import { anyFacts, barelyKnown, exampleFacts } from '../support/any-facts';

const share = (count: number, holds: (draw: number) => boolean) =>
  Array.from({ length: count }, (_, draw) => holds(draw)).filter(Boolean).length / count;

describe('draws', () => {
  it('are the same for the same name, one from each slice, and differ by name', () => {
    const draws = stratifiedDraws('a', 200);
    expect([...stratifiedDraws('a', 200)]).toEqual([...draws]);
    expect([...draws].sort((a, b) => a - b).every((value, slice) => value >= slice / 200 && value < (slice + 1) / 200)).toBe(true);
    expect([...stratifiedDraws('b', 200)]).not.toEqual([...draws]);
  });
});

describe('a distribution', () => {
  it('gives weighted values in their shares', () => {
    const draw = drawFrom({
      weighted: [
        { value: 'x', weight: 1 },
        { value: 'y', weight: 3 },
      ],
    });
    expect([0, 0.249, 0.251, 0.999].map(draw)).toEqual(['x', 'x', 'y', 'y']);
  });
  it('inverts a triangle', () => {
    // Triangle 0, 1, 3: F(1) = (1 - 0) / (3 - 0) = 1/3; F(x) above 1 is 1 - (3 - x)^2 / 6, so the median is 3 - sqrt(3) = 1.27. Source:
    // triangular distribution.
    const draw = drawFrom({ triangle: { low: 0, mode: 1, high: 3, step: 0.01 } });
    expect([0, 1 / 3, 0.5, 1].map(draw)).toEqual([0, 1, 1.27, 3]);
    expect(likeliest({ triangle: { low: 0, mode: 1, high: 3, step: 0.01 } })).toBe(1);
  });
});

describe('sampled homes', () => {
  it('leave known facts alone and nothing open that counts', () => {
    const open = ['garageDoor', 'panelAt', 'chargerAt', 'carAt', 'runLook'];
    fc.assert(
      fc.property(anyFacts, fc.integer({ min: -1, max: 19 }), (facts, draw) => {
        const home: Record<string, unknown> = { ...samplerFor(facts, editionOne, 20).home(draw) };
        for (const [name, value] of Object.entries(facts)) {
          if (value !== null && name !== 'loads') expect(home[name]).toEqual(value);
          if (!open.includes(name)) expect(home[name]).not.toBeNull();
        }
      }),
      { numRuns: 200 },
    );
  });

  it('do not reshuffle other draws when a question is answered', () => {
    const before = samplerFor(barelyKnown(), editionOne, 50);
    const after = samplerFor(barelyKnown({ blankSpaces: 2 }), editionOne, 50);
    for (let draw = 0; draw < 50; draw += 1)
      expect({ ...after.home(draw), blankSpaces: null }).toEqual({ ...before.home(draw), blankSpaces: null });
  });

  // Source: starting likelihoods of the facts list: old homes .45 at 100 A, new ones .75 at 200 A; no blank space .35.
  it('follow the likelihoods, also those by another fact', () => {
    const mains = (yearBuilt: Facts['yearBuilt'], amps: number) => {
      const sampler = samplerFor(barelyKnown({ yearBuilt }), editionOne, 400);
      return share(400, (draw) => sampler.home(draw).mainBreakerAmps === amps);
    };
    expect(mains('before_1965', 100)).toBeCloseTo(0.45, 2);
    expect(mains('2010_or_later', 200)).toBeCloseTo(0.75, 2);
    const sampler = samplerFor(barelyKnown(), editionOne, 400);
    expect(share(400, (draw) => sampler.home(draw).blankSpaces === 0)).toBeCloseTo(0.35, 2);
    expect(
      share(400, (draw) => {
        const { loads } = sampler.home(draw);
        return loads.heatPump.present && loads.centralAir.present;
      }),
    ).toBe(0);
  });

  it('have nothing to draw when everything is known, and the likeliest value in the middle', () => {
    expect([...samplerFor(exampleFacts(), editionOne, 10).streams.keys()]).toEqual([]);
    expect(samplerFor(barelyKnown(), editionOne, 10).home(MIDDLE)).toMatchObject({
      mainBreakerAmps: 200,
      panelPlace: 'garage_wall',
      blankSpaces: 2,
      milesPerDay: 35,
    });
  });
});
