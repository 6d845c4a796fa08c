import { loadIds } from '../../../shared/loads';
import type { Distribution, Likelihood } from '../schema';

const weighted = (...pairs: readonly (readonly [unknown, number])[]): Distribution => ({
  weighted: pairs.map(([value, weight]) => ({ value, weight })),
});
const triangle = (low: number, mode: number, high: number, step: number): Distribution => ({ triangle: { low, mode, high, step } });
const yes = (chance: number): Distribution => weighted([true, chance], [false, 1 - chance]);

/** Chance that each big load is there and electric. */
const loadChances: Record<string, number> = {
  range: 0.5,
  dryer: 0.5,
  waterHeater: 0.5,
  heatPump: 0.25,
  stripHeat: 0.2,
  roomHeaters: 0.1,
  spa: 0.08,
  otherCharger: 0.03,
  poolPump: 0.08,
  instantWaterHeater: 0.04,
  workshop: 0.05,
  wallOven: 0.12,
  cooktop: 0.12,
  dishwasher: 0.85,
  disposal: 0.6,
  microwave: 0.6,
  wellPump: 0.08,
  sumpPump: 0.1,
};

/**
 * A small service seldom feeds electric heat or a second heavy machine: beside 100 A or less the chance is this part of the whole,
 * halfway beside 125 and 150.
 */
const beside100: Record<string, number> = {
  waterHeater: 0.6,
  heatPump: 0.25,
  stripHeat: 0.15,
  roomHeaters: 0.5,
  spa: 0.3,
  otherCharger: 0.3,
  instantWaterHeater: 0.1,
  workshop: 0.5,
  wallOven: 0.5,
};
function load(id: string): Likelihood {
  const chance = loadChances[id] ?? 0.1;
  const part = beside100[id];
  if (part === undefined) return yes(chance);
  const [small, middling] = [yes(chance * part), yes((chance * (1 + part)) / 2)];
  return { by: 'mainBreakerAmps', cases: { 60: small, 70: small, 100: small, 125: middling, 150: middling }, otherwise: yes(chance) };
}

/**
 * What an unknown answer may be. All starting points: common practice or invented for the demo, no source; corrected jobs move them.
 * A name with `by` reads another fact that is drawn before it.
 */
export const likelihoods: Record<string, Likelihood> = {
  zip: weighted(['00017', 0.4], ['00018', 0.25], ['00021', 0.35]),
  homeKind: { fixed: 'house' },
  tenure: { fixed: 'own' },
  parking: weighted(['attached_garage', 0.75], ['driveway', 0.15], ['carport', 0.1]),
  yearBuilt: weighted(['before_1965', 0.25], ['1965_1989', 0.35], ['1990_2009', 0.25], ['2010_or_later', 0.15]),
  floorAreaFt2: triangle(1_200, 1_900, 3_200, 50),

  carMaxAmps: weighted([16, 0.05], [24, 0.05], [32, 0.3], [40, 0.15], [48, 0.43], [80, 0.02]),
  milesPerDay: { fixed: 35 },
  hoursHome: { fixed: 10 },
  whPerMile: { fixed: 300 },
  secondCar: weighted(['no', 0.6], ['maybe', 0.3], ['yes', 0.1]),
  chargerSupply: weighted(['ours', 0.55], ['theirs', 0.45]),
  chargerMaxAmps: { fixed: 48 },
  cableLengthFt: { fixed: 18 },

  mainBreakerAmps: {
    by: 'yearBuilt',
    cases: {
      before_1965: weighted([60, 0.1], [100, 0.45], [125, 0.1], [150, 0.1], [200, 0.25]),
      '1965_1989': weighted([60, 0.03], [100, 0.32], [125, 0.1], [150, 0.13], [200, 0.42]),
      '1990_2009': weighted([100, 0.12], [125, 0.08], [150, 0.15], [200, 0.62], [400, 0.03]),
      '2010_or_later': weighted([100, 0.05], [125, 0.05], [150, 0.1], [200, 0.75], [400, 0.05]),
    },
    otherwise: weighted([100, 0.25], [150, 0.15], [200, 0.6]),
  },
  blankSpaces: weighted([0, 0.35], [1, 0.15], [2, 0.5]),
  panelPlace: {
    by: 'parking',
    cases: {
      attached_garage: weighted(['garage_wall', 0.45], ['next_room', 0.1], ['elsewhere', 0.15], ['outside', 0.2], ['basement', 0.1]),
      detached_garage: weighted(['elsewhere', 0.5], ['outside', 0.35], ['basement', 0.15]),
    },
    otherwise: weighted(['outside', 0.45], ['next_room', 0.1], ['elsewhere', 0.25], ['basement', 0.2]),
  },
  panelMount: weighted(['flush', 0.7], ['surface', 0.3]),
  serviceDrop: weighted(['overhead', 0.5], ['underground', 0.5]),
  solarAmps: weighted([0, 0.9], [30, 0.1]),
  panelCondition: weighted([[], 0.9], [['rust_or_water'], 0.04], [['fuses'], 0.03], [['screwed_shut'], 0.03]),

  ...Object.fromEntries(loadIds.filter((id) => id !== 'centralAir').map((id) => [`loads.${id}`, load(id)])),
  // A heat pump is the cooling too, so there is no second machine.
  'loads.centralAir': { by: 'loads.heatPump', cases: { true: { fixed: false } }, otherwise: yes(0.75) },
  'loads.centralAir.amount': triangle(2, 3, 5, 0.5),
  'loads.heatPump.amount': triangle(2, 3, 5, 0.5),
  'loads.stripHeat.amount': weighted([5, 0.25], [10, 0.5], [15, 0.25]),
  'loads.roomHeaters.amount': triangle(1, 3, 7, 1),
  'loads.otherCharger.amount': weighted([16, 0.3], [32, 0.5], [40, 0.2]),
  'loads.instantWaterHeater.amount': weighted([18, 0.5], [27, 0.5]),
  'loads.workshop.amount': triangle(3, 7, 12, 1),

  room: weighted([{ widthFt: 20, depthFt: 22 }, 0.7], [{ widthFt: 12, depthFt: 22 }, 0.3]),
  ceilingFt: triangle(8, 8.5, 10, 0.5),
  wallFinish: weighted(['drywall', 0.75], ['bare_studs', 0.15], ['masonry', 0.1]),
  atticAbove: yes(0.4),
  crawlBelow: yes(0.1),
  panelWall: weighted(['back', 0.4], ['left', 0.28], ['right', 0.28], ['front', 0.04]),
  portCorner: weighted(['front_left', 0.4], ['rear_left', 0.3], ['rear_right', 0.2], ['front_right', 0.1]),
  parked: weighted(['nose_in', 0.8], ['back_in', 0.2]),
  pacesToPanel: triangle(4, 12, 28, 1),
  floorsBetween: weighted([0, 0.75], [1, 0.25]),
  trenchFt: { fixed: 30 },
  surfaceOver: { fixed: 'soil' },
  paintRun: weighted([false, 0.7], [true, 0.3]),
};
