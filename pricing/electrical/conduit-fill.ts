import type { Awg } from './awg';
import { ElectricalError } from './edition';
import { tidy } from './trace';

export const tradeSizes = ['1/2', '3/4', '1', '1-1/4', '1-1/2', '2'] as const;
export type TradeSize = (typeof tradeSizes)[number];
export type Raceway = 'EMT' | 'PVC40' | 'PVC80' | 'FMC' | 'LFMC';
export type WireKind = 'THHN' | 'XHHW';

/** Smallest raceway that the trade runs for a charger: 3/4 in. Common practice, no source. */
export const PRACTICE_MINIMUM: TradeSize = '3/4';

/**
 * Internal diameter in inches, and square inches at 40 % fill as printed. NEC 2020 and 2023 Chapter 9 Table 4; PVC areas and LFMC from
 * memory.
 */
const table4: Readonly<Record<Raceway, Readonly<Record<TradeSize, readonly [number, number]>>>> = {
  EMT: {
    '1/2': [0.622, 0.122], '3/4': [0.824, 0.213], 1: [1.049, 0.346], '1-1/4': [1.38, 0.598], '1-1/2': [1.61, 0.814], 2: [2.067, 1.342],
  },
  PVC40: {
    '1/2': [0.602, 0.114], '3/4': [0.804, 0.203], 1: [1.029, 0.333], '1-1/4': [1.36, 0.581], '1-1/2': [1.59, 0.794], 2: [2.047, 1.316],
  },
  PVC80: {
    '1/2': [0.526, 0.087], '3/4': [0.722, 0.164], 1: [0.936, 0.275], '1-1/4': [1.255, 0.495], '1-1/2': [1.476, 0.684], 2: [1.913, 1.15],
  },
  FMC: {
    '1/2': [0.635, 0.127], '3/4': [0.824, 0.213], 1: [1.02, 0.327], '1-1/4': [1.275, 0.511], '1-1/2': [1.538, 0.743], 2: [2.04, 1.307],
  },
  LFMC: {
    '1/2': [0.632, 0.125], '3/4': [0.83, 0.216], 1: [1.054, 0.349], '1-1/4': [1.395, 0.611], '1-1/2': [1.588, 0.792], 2: [2.033, 1.298],
  },
};

/** Area of one insulated conductor in square inches; THHN and THWN-2 are alike. NEC 2020 and 2023 Chapter 9 Table 5. */
const table5: Readonly<Record<WireKind, Readonly<Partial<Record<Awg, number>>>>> = {
  THHN: {
    14: 0.0097, 12: 0.0133, 10: 0.0211, 8: 0.0366, 6: 0.0507, 4: 0.0824, 3: 0.0973, 2: 0.1158, 1: 0.1562, '1/0': 0.1855, '2/0': 0.2223,
  },
  XHHW: {
    14: 0.0139, 12: 0.0181, 10: 0.0243, 8: 0.0437, 6: 0.059, 4: 0.0814, 3: 0.0962, 2: 0.1146, 1: 0.1534, '1/0': 0.1825, '2/0': 0.219,
  },
};

/** Conductors of one kind in a raceway. The ground counts. A cable counts as one conductor with the area of its broad side. */
export interface Conductors { readonly areaIn2: number; readonly count: number }

/** Square inches of one insulated conductor. NEC 2020 and 2023 Chapter 9 Table 5. @throws ElectricalError when the size is not kept. */
export function conductorAreaIn2(awg: Awg, kind: WireKind = 'THHN'): number {
  const areaIn2 = table5[kind][awg];
  if (areaIn2 === undefined) throw new ElectricalError(`${awg} wire is thicker than a charging circuit has; its area is not kept here.`);
  return areaIn2;
}

/** Square inches and number of all conductors together. */
export function totalFill(conductors: readonly Conductors[]): { areaIn2: number; count: number } {
  let [areaIn2, count] = [0, 0];
  for (const group of conductors) {
    areaIn2 += group.areaIn2 * group.count;
    count += group.count;
  }
  return { areaIn2: tidy(areaIn2), count };
}

/** Share of the raceway that may be filled, by the number of conductors: 53, 31, 40 %. NEC 2020 and 2023 Chapter 9 Table 1. */
const fillShare = (count: number): number => (count === 1 ? 0.53 : count === 2 ? 0.31 : 0.4);

const insideIn2 = (raceway: Raceway, size: TradeSize): number => (Math.PI / 4) * table4[raceway][size][0] ** 2;

/** Square inches that conductors may take. NEC 2020 and 2023 Chapter 9 Tables 1 and 4. */
export const allowedAreaIn2 = (raceway: Raceway, size: TradeSize, count: number): number =>
  count > 2 ? table4[raceway][size][1] : insideIn2(raceway, size) * fillShare(count);

export interface Fill { readonly tradeSize: TradeSize; readonly conductorAreaIn2: number; readonly fillPercent: number }

/**
 * Smallest raceway for the conductors, the ground among them, and how full it then is. NEC 2020 and 2023 Chapter 9 Tables 1, 4 and 5.
 * @param atLeast smallest size to consider, such as PRACTICE_MINIMUM.
 * @throws ElectricalError when 2 in. is not enough.
 */
export function smallestRaceway(raceway: Raceway, conductors: readonly Conductors[], atLeast: TradeSize = '1/2'): Fill {
  const { areaIn2, count } = totalFill(conductors);
  for (let index = tradeSizes.indexOf(atLeast); index < tradeSizes.length; index += 1) {
    const tradeSize = tradeSizes[index];
    if (tradeSize === undefined || areaIn2 > allowedAreaIn2(raceway, tradeSize, count)) continue;
    return { tradeSize, conductorAreaIn2: areaIn2, fillPercent: (100 * areaIn2) / insideIn2(raceway, tradeSize) };
  }
  throw new ElectricalError('These conductors need a raceway larger than 2 in. Split the run in two.');
}

/** Note 7: a count of at least this much past a whole number may be rounded up. NEC 2020 and 2023 Chapter 9. */
const ROUND_UP_FROM = 0.8;

/**
 * How many conductors of one size a raceway takes, as Annex C has it. NEC 2020 and 2023 Annex C, Chapter 9 Table 1 and note 7.
 */
export function maximumCount(raceway: Raceway, size: TradeSize, awg: Awg, kind: WireKind = 'THHN'): number {
  const places = (share: number) => Math.floor((insideIn2(raceway, size) * share) / conductorAreaIn2(awg, kind) + 1 - ROUND_UP_FROM);
  const many = places(fillShare(3));
  if (many > 2) return many;
  if (places(fillShare(2)) >= 2) return 2;
  return places(fillShare(1)) >= 1 ? 1 : 0;
}
