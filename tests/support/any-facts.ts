import fc from 'fast-check';
import {
  builtPeriods,
  homeKinds,
  mainBreakerRatings,
  panelConditions,
  panelPlaces,
  parkings,
  portCorners,
  surfaces,
  tenures,
  unknownFacts,
  wallFinishes,
  walls,
  type Facts,
} from '../../shared/facts';
import { factsOf } from '../../shared/api/intake-input';
import { loadIds } from '../../shared/loads';
import { exampleIntake } from '../../server/cli/example-intake';

/** The complete example: everything known, nothing odd. */
export const exampleFacts = (changes: Partial<Facts> = {}): Facts => ({ ...factsOf(exampleIntake), ...changes });

/** A home of which the first two steps are answered and nothing else. */
export const barelyKnown = (changes: Partial<Facts> = {}): Facts => ({
  ...unknownFacts(),
  zip: '00017',
  homeKind: 'house',
  tenure: 'own',
  parking: 'attached_garage',
  chargerSupply: 'ours',
  ...changes,
});

const maybe = <Value>(value: fc.Arbitrary<Value>) => fc.option(value, { freq: 2 });
const of = <Value>(...values: readonly Value[]) => fc.constantFrom(...values);
const feet = (min: number, max: number) => fc.integer({ min: min * 2, max: max * 2 }).map((halves) => halves / 2);

const loadFact = fc.record({ present: maybe(fc.boolean()), amount: maybe(fc.integer({ min: 1, max: 12 })) });
const spot = fc.record({ wall: of(...walls), alongFt: feet(0, 24) });

/** Any answers within their limits, each possibly not known; flags and impossible plans included. */
export const anyFacts: fc.Arbitrary<Facts> = fc.record({
  zip: of('00017', '00018', '00021', '99999', null),
  homeKind: maybe(of(...homeKinds)),
  tenure: maybe(of(...tenures)),
  parking: maybe(of(...parkings)),
  yearBuilt: maybe(of(...builtPeriods)),
  floorAreaFt2: maybe(fc.integer({ min: 300, max: 8_000 })),
  carMaxAmps: maybe(of(6, 16, 24, 32, 40, 48, 80)),
  milesPerDay: maybe(fc.integer({ min: 1, max: 300 })),
  hoursHome: maybe(fc.integer({ min: 3, max: 24 })),
  whPerMile: maybe(of(260, 300, 380, 480)),
  secondCar: maybe(of('no' as const, 'maybe' as const, 'yes' as const)),
  chargerSupply: maybe(of('ours' as const, 'theirs' as const)),
  chargerMaxAmps: maybe(of(16, 24, 32, 40, 48, 80)),
  chargerConnection: maybe(of('wired' as const, 'plug_in' as const)),
  cableLengthFt: maybe(fc.integer({ min: 12, max: 25 })),
  mainBreakerAmps: maybe(of(0 as const, ...mainBreakerRatings)),
  busRatingAmps: maybe(of(100, 125, 200, 225, 400)),
  blankSpaces: maybe(of(0 as const, 1 as const, 2 as const)),
  panelPlace: maybe(of(...panelPlaces)),
  panelMount: maybe(of('flush' as const, 'surface' as const)),
  serviceDrop: maybe(of('overhead' as const, 'underground' as const)),
  solarAmps: maybe(of(0, 20, 40)),
  panelCondition: maybe(
    fc.oneof(
      { weight: 5, arbitrary: fc.subarray([...panelConditions], { maxLength: 0 }) },
      { weight: 1, arbitrary: fc.subarray([...panelConditions]) },
    ),
  ),
  legacyPanel: fc.oneof({ weight: 9, arbitrary: fc.constant(false) }, { weight: 1, arbitrary: fc.constant(true) }),
  volts: of(240 as const, 208 as const),
  loads: fc.record(Object.fromEntries(loadIds.map((id) => [id, loadFact]))) as fc.Arbitrary<Facts['loads']>,
  room: maybe(fc.record({ widthFt: feet(8, 60), depthFt: feet(8, 60) })),
  ceilingFt: maybe(feet(7, 16)),
  wallFinish: maybe(of(...wallFinishes)),
  atticAbove: maybe(fc.boolean()),
  crawlBelow: maybe(fc.boolean()),
  garageDoor: maybe(fc.record({ alongFt: feet(0, 10), widthFt: feet(6, 18) })),
  openings: fc.array(fc.record({ wall: of(...walls), alongFt: feet(0, 20), widthFt: of(2.5, 3) }), { maxLength: 2 }),
  panelAt: maybe(fc.record({ wall: of(...walls), alongFt: feet(0, 24), topIn: fc.integer({ min: 36, max: 90 }) })),
  chargerAt: maybe(fc.tuple(spot, fc.integer({ min: 18, max: 60 })).map(([at, heightIn]) => ({ ...at, heightIn }))),
  carAt: maybe(fc.record({ centerXFt: feet(3, 20), parked: of('nose_in' as const, 'back_in' as const), portCorner: of(...portCorners) })),
  pacesToPanel: maybe(fc.integer({ min: 1, max: 80 })),
  floorsBetween: maybe(fc.integer({ min: 0, max: 3 })),
  trenchFt: maybe(fc.integer({ min: 1, max: 150 })),
  surfaceOver: maybe(of(...surfaces)),
  runLook: maybe(of('pipe' as const, 'hidden' as const)),
  paintRun: maybe(fc.boolean()),
});

/** Answers that nothing flags. */
export const plainFacts: fc.Arbitrary<Facts> = anyFacts.map((facts) => ({
  ...facts,
  zip: facts.zip === '99999' ? '00017' : facts.zip,
  homeKind: 'house',
  tenure: 'own',
  parking: facts.parking === 'detached_garage' ? 'attached_garage' : facts.parking,
  mainBreakerAmps: facts.mainBreakerAmps === 0 || facts.mainBreakerAmps === 60 ? 100 : facts.mainBreakerAmps,
  panelCondition: [],
  legacyPanel: false,
  surfaceOver: 'soil',
}));
