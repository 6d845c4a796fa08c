import type { Awg, Material } from './awg';
import { ElectricalError } from './edition';
import { tidy } from './trace';

export type TemperatureC = 60 | 75 | 90;

/**
 * Ampacity in amps at 30 C with up to three current-carrying conductors: 60, 75 and 90 C columns; null where the table has no entry.
 * NEC 2020 and 2023 Table 310.16. Copies from before 2011 differ (14 Cu 20, 1 Cu 150) and must not be used.
 */
const table: Readonly<Record<Material, Readonly<Record<Awg, readonly [number, number, number] | null>>>> = {
  Cu: {
    14: [15, 20, 25], 12: [20, 25, 30], 10: [30, 35, 40], 8: [40, 50, 55], 6: [55, 65, 75], 4: [70, 85, 95], 3: [85, 100, 115],
    2: [95, 115, 130], 1: [110, 130, 145], '1/0': [125, 150, 170], '2/0': [145, 175, 195], '3/0': [165, 200, 225], '4/0': [195, 230, 260],
    250: [215, 255, 290],
  },
  Al: {
    14: null, 12: [15, 20, 25], 10: [25, 30, 35], 8: [35, 40, 45], 6: [40, 50, 55], 4: [55, 65, 75], 3: [65, 75, 85],
    2: [75, 90, 100], 1: [85, 100, 115], '1/0': [100, 120, 135], '2/0': [115, 135, 150], '3/0': [130, 155, 175], '4/0': [150, 180, 205],
    250: [170, 205, 230],
  },
};

/** Upper ends of the ambient bands in C. NEC 2020 and 2023 Table 310.15(B)(1), base 30 C. */
const ambientBandsC = [10, 15, 20, 25, 30, 35, 40, 45, 50, 55, 60, 65, 70] as const;
const ambientFactors: Readonly<Record<TemperatureC, readonly number[]>> = {
  60: [1.29, 1.22, 1.15, 1.08, 1, 0.91, 0.82, 0.71, 0.58, 0.41],
  75: [1.2, 1.15, 1.11, 1.05, 1, 0.94, 0.88, 0.82, 0.75, 0.67, 0.58, 0.47, 0.33],
  90: [1.15, 1.12, 1.08, 1.04, 1, 0.96, 0.91, 0.87, 0.82, 0.76, 0.71, 0.65, 0.58],
};

const columns: Readonly<Record<TemperatureC, 0 | 1 | 2>> = { 60: 0, 75: 1, 90: 2 };

/** Ampacity in amps from a column of Table 310.16, uncorrected; null where the table has none (14 AWG aluminum). NEC 2020 and 2023. */
export const tableAmpacity = (material: Material, awg: Awg, columnC: TemperatureC): number | null =>
  table[material][awg]?.[columns[columnC]] ?? null;

/**
 * Correction for the air around the wire. NEC 2020 and 2023 Table 310.15(B)(1).
 * @throws ElectricalError where the table ends: hotter than the insulation bears.
 */
export function ambientFactor(insulationC: TemperatureC, ambientC: number): number {
  const factors = ambientFactors[insulationC];
  for (let band = 0; band < factors.length; band += 1) {
    const upToC = ambientBandsC[band];
    const factor = factors[band];
    if (upToC !== undefined && factor !== undefined && ambientC <= upToC) return factor;
  }
  throw new ElectricalError(`At ${ambientC} °C around it, wire with ${insulationC} °C insulation may not be used. Choose a cooler way.`);
}

/** Upper counts and the factor up to each. NEC 2020 and 2023 Table 310.15(C)(1). */
const bundlingSteps = [[3, 1], [6, 0.8], [9, 0.7], [20, 0.5], [30, 0.45], [40, 0.4]] as const;
const BUNDLING_BEYOND_40 = 0.35;

/**
 * Adjustment for more than three current-carrying conductors together. Grounds never count; a 240 V charging circuit has two.
 * NEC 2020 and 2023 Table 310.15(C)(1).
 */
export function bundlingFactor(currentCarryingConductors: number): number {
  for (const [upTo, factor] of bundlingSteps) if (currentCarryingConductors <= upTo) return factor;
  return BUNDLING_BEYOND_40;
}

export interface AmpacityInput {
  readonly material: Material;
  readonly awg: Awg;
  readonly insulationC: TemperatureC;
  readonly terminalC: TemperatureC;
  readonly ambientC: number;
  readonly currentCarryingConductors: number;
  /** NM-B: corrected from its 90 C column, but never above its 60 C column (334.80). */
  readonly nmCable: boolean;
}

/** Correction for heat and adjustment for company, as one factor. NEC 2020 and 2023 310.15(B)(1), 310.15(C)(1). Throws as ambientFactor. */
export const placeFactor = (insulationC: TemperatureC, ambientC: number, currentCarryingConductors: number): number =>
  ambientFactor(insulationC, ambientC) * bundlingFactor(currentCarryingConductors);

/**
 * Amps from the insulation's column after correction, before the terminals are looked at. NM-B starts from its 90 C column and ends
 * at its 60 C column. NEC 2020 and 2023 310.15, 334.80.
 * @param factor as placeFactor gives it.
 * @throws ElectricalError where the table has no entry.
 */
export function correctedAmpacity(material: Material, awg: Awg, insulationC: TemperatureC, factor: number, nmCable: boolean): number {
  const corrected = tidy(columnAmps(material, awg, insulationC) * factor);
  return nmCable ? Math.min(corrected, columnAmps(material, awg, 60)) : corrected;
}

/**
 * Usable amps of a conductor: what is left after correction, and no more than its terminals' column. NEC 2020 and 2023 110.14(C), 310.16.
 * @throws ElectricalError where the tables have no entry.
 */
export function ampacity({ material, awg, insulationC, terminalC, ambientC, currentCarryingConductors, nmCable }: AmpacityInput): number {
  const factor = placeFactor(insulationC, ambientC, currentCarryingConductors);
  return Math.min(correctedAmpacity(material, awg, insulationC, factor, nmCable), columnAmps(material, awg, terminalC));
}

function columnAmps(material: Material, awg: Awg, columnC: TemperatureC): number {
  const amps = tableAmpacity(material, awg, columnC);
  if (amps === null) throw new ElectricalError(`Table 310.16 has no ${material === 'Al' ? 'aluminum' : 'copper'} conductor of ${awg} AWG.`);
  return amps;
}
