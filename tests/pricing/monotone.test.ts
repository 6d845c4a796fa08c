import fc from 'fast-check';
import { homeOf } from '../../pricing/home';
import { MIDDLE, samplerFor } from '../../pricing/known-sampling';
import { liveRange, priceIntake } from '../../pricing/quote';
import { editionOne } from '../../pricing/rulebook/edition-1/index';
import type { Facts } from '../../shared/facts';
import { loadIds } from '../../shared/loads';
import { anyFacts, exampleFacts, plainFacts } from '../support/any-facts';

const price = (facts: Facts, samples = 4) => priceIntake({ facts, edition: editionOne, pricedOn: '2026-05-12', samples });
const [place] = editionOne.jurisdictions;
if (!place) throw new Error('the edition has no town');
const home = (facts: Facts) => homeOf(samplerFor(facts, editionOne, 1).home(MIDDLE), place, editionOne.options.upgradeAmps);

/** Cents by option id; an option that is not shown is left out. */
const midCents = (facts: Facts) => new Map(price(facts).options.map(({ id, midCents: cents }) => [id, cents]));
function neverCheaper(near: Facts, far: Facts): void {
  const farther = midCents(far);
  for (const [id, cents] of midCents(near)) expect(farther.get(id) ?? Infinity).toBeGreaterThanOrEqual(cents);
}

const numbersIn = (value: unknown): number[] => {
  if (typeof value === 'number') return [value];
  return value !== null && typeof value === 'object' ? Object.values(value).flatMap(numbersIn) : [];
};

// Source: trade sense, no source: more feet are more wire, pipe and hours.
describe('a longer run never costs less', () => {
  const inHouse = fc.constantFrom('next_room' as const, 'elsewhere' as const, 'outside' as const, 'basement' as const);
  const away = fc.record({
    panelPlace: inHouse,
    parking: fc.constantFrom('attached_garage' as const, 'carport' as const, 'driveway' as const),
    floorsBetween: fc.integer({ min: 0, max: 2 }),
    runLook: fc.constantFrom('pipe' as const, 'hidden' as const, null),
    wallFinish: fc.constantFrom('bare_studs' as const, 'drywall' as const, 'masonry' as const),
    atticAbove: fc.boolean(),
    crawlBelow: fc.boolean(),
    paintRun: fc.boolean(),
  });

  it('with more steps to the panel', () => {
    fc.assert(
      fc.property(away, fc.integer({ min: 1, max: 79 }), fc.integer({ min: 1, max: 40 }), (change, paces, more) => {
        const at = (pacesToPanel: number) => exampleFacts({ ...change, panelAt: null, pacesToPanel });
        neverCheaper(at(paces), at(Math.min(80, paces + more)));
      }),
      { numRuns: 300 },
    );
  });

  it('with another floor between', () => {
    fc.assert(
      fc.property(away, fc.integer({ min: 1, max: 80 }), (change, pacesToPanel) => {
        const at = (floorsBetween: number) => exampleFacts({ ...change, panelAt: null, pacesToPanel, floorsBetween });
        neverCheaper(at(change.floorsBetween), at(change.floorsBetween + 1));
      }),
      { numRuns: 300 },
    );
  });

  it('with the charger farther along its wall', () => {
    // Panel on the back wall, charger on the right one, both above the reach of a straight run (6 ft), the other way round longer.
    const along = fc.integer({ min: 12, max: 30 });
    fc.assert(
      fc.property(along, fc.integer({ min: 0, max: 10 }), (halves, more) => {
        const at = (alongFt: number) => exampleFacts({ chargerAt: { wall: 'right', alongFt, heightIn: 45 } });
        neverCheaper(at(halves / 2), at((halves + more) / 2));
      }),
      { numRuns: 300 },
    );
  });
});

// Source: NEC 2023 220.83: every load adds to the sum, in full or at 40 %.
describe('a bigger load never frees capacity', () => {
  const added = fc.integer({ min: 1, max: 12 });
  const small = fc.constantFrom(100 as const, 125 as const, 150 as const);
  const large = fc.constantFrom(175 as const, 200 as const, 400 as const);
  const atMost = (id: string) => (id === 'roomHeaters' ? 3 : 12);
  it('of the service, whatever is added, enlarged, or built on', () => {
    fc.assert(
      fc.property(plainFacts, fc.constantFrom(...loadIds), added, fc.integer({ min: 0, max: 2_000 }), (facts, id, more, area) => {
        const there = facts.loads[id].present === true ? (facts.loads[id].amount ?? 1) : 0;
        // A fourth room heater moves them all to the other loads, 220.83(B): that is the code's own step down.
        fc.pre(id !== 'roomHeaters' || there + more <= atMost(id));
        const floorAreaFt2 = Math.min(8_000, (facts.floorAreaFt2 ?? 1_900) + area);
        const withLoad = (amount: number) => ({ ...facts.loads, [id]: { present: amount > 0, amount: amount || null } });
        const less = { ...facts, floorAreaFt2: facts.floorAreaFt2 ?? 1_900, loads: withLoad(there) };
        const bigger = { ...less, floorAreaFt2, loads: withLoad(there + more) };
        // A heat pump that was not there makes the strips its helpers, and the likely cooling its own; both sides are given.
        fc.pre(id !== 'heatPump' || facts.loads.centralAir.present !== null);
        const [before, after] = [home(less), home(bigger)];
        expect(after.homeAmps).toBeGreaterThanOrEqual(before.homeAmps - 1e-6);
        expect(after.maxChargingAmps).toBeLessThanOrEqual(before.maxChargingAmps);
        expect(after.maxUpgradedAmps).toBeLessThanOrEqual(Math.max(before.maxUpgradedAmps, before.maxChargingAmps));
      }),
      { numRuns: 400 },
    );
  });

  it('by a smaller main: what fits beside it fits beside a larger one', () => {
    fc.assert(
      fc.property(plainFacts, small, large, (facts, smaller, larger) => {
        const common = { ...facts, busRatingAmps: null, loads: exampleFacts().loads };
        const at = (mainBreakerAmps: Facts['mainBreakerAmps']) => home({ ...common, mainBreakerAmps });
        expect(at(smaller).maxChargingAmps).toBeLessThanOrEqual(at(larger).maxChargingAmps);
      }),
      { numRuns: 300 },
    );
  });

  it('and an upgrade is offered only to a smaller service, and only where it is enough', () => {
    // Source: arithmetic; the rulebook's upgrade is to 200 A.
    const main = fc.constantFrom(70 as const, 100 as const, 150 as const, 175 as const, 200 as const, 225 as const);
    const heat = fc.integer({ min: 5, max: 40 });
    fc.assert(
      fc.property(main, heat, fc.boolean(), fc.integer({ min: 300, max: 8_000 }), (mainBreakerAmps, kilowatts, spa, floorAreaFt2) => {
        const loads = { ...exampleFacts().loads, stripHeat: { present: true, amount: kilowatts }, spa: { present: spa, amount: null } };
        for (const { panelChange, load } of price(exampleFacts({ mainBreakerAmps, busRatingAmps: null, floorAreaFt2, loads })).options) {
          if (panelChange === 'service_upgrade') expect([mainBreakerAmps < 200, load.serviceAmps]).toEqual([true, 200]);
          else expect(load.serviceAmps).toBe(mainBreakerAmps);
          expect(load.homeAmps + load.chargerAmps).toBeLessThanOrEqual(load.serviceAmps + 0.1);
        }
      }),
      { numRuns: 300 },
    );
  });
});

// Source: the product's rules: lines add up at low, mid and high; whatever was answered, there is no broken number.
describe('any answers', () => {
  it('give lines that sum to totals and no number that is none', () => {
    fc.assert(
      fc.property(anyFacts, (facts) => {
        const document = price(facts, 6);
        expect(numbersIn(document).every(Number.isFinite)).toBe(true);
        for (const { lines, ...option } of document.options) {
          for (const end of ['lowCents', 'midCents', 'highCents'] as const) {
            expect(lines.reduce((sum, line) => sum + line[end], 0)).toBe(option[end]);
          }
          expect(option.run.wallFt + option.run.upDownFt).toBe(option.run.lengthFt);
          expect(option.load.status === 'red').toBe(false);
          expect(option.load.homeAmps + option.load.chargerAmps <= option.load.serviceAmps + 0.1).toBe(true);
        }
        expect(numbersIn(liveRange({ facts, edition: editionOne, samples: 4 })).every(Number.isFinite)).toBe(true);
      }),
      { numRuns: 300 },
    );
  });
});
