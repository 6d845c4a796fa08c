import type { TradeSize } from './conduit-fill';
import { clauseOf, ElectricalError, type CodeEdition } from './edition';

export type CoverLocation =
  'general' | 'under_2in_concrete' | 'under_building' | 'under_4in_slab_no_vehicles' | 'street_or_parking' | 'dwelling_driveway';
export type BuriedMethod = 'direct_burial_cable' | 'rmc_imc' | 'pvc' | 'gfci_120v_20a' | 'low_voltage';

const methods: Readonly<Record<BuriedMethod, 0 | 1 | 2 | 3 | 4>> = {
  direct_burial_cable: 0, rmc_imc: 1, pvc: 2, gfci_120v_20a: 3, low_voltage: 4,
};

/** Inches by location: direct burial, RMC or IMC, PVC, 120 V 20 A with GFCI, low voltage. NEC 2020 Table 300.5, 2023 Table 300.5(A). */
const table: Readonly<Record<CoverLocation, readonly [number, number, number, number, number]>> = {
  general: [24, 6, 18, 12, 6],
  under_2in_concrete: [18, 6, 12, 6, 6],
  under_building: [0, 0, 0, 0, 0],
  under_4in_slab_no_vehicles: [18, 4, 4, 6, 6],
  street_or_parking: [24, 24, 24, 24, 24],
  dwelling_driveway: [18, 18, 18, 12, 18],
};

/** Outside diameter in inches of PVC, RMC and IMC of a trade size. Common pipe dimensions, from memory. */
const outsideDiameterIn: Readonly<Record<TradeSize, number>> = {
  '1/2': 0.84, '3/4': 1.05, 1: 1.315, '1-1/4': 1.66, '1-1/2': 1.9, 2: 2.375,
};

export interface CoverInput {
  readonly edition: CodeEdition;
  readonly location: CoverLocation;
  readonly method: BuriedMethod;
  readonly volts: number;
  readonly deviceAmps: number;
}

/**
 * Least cover in inches, from finished grade to the **top** of the raceway or cable. NEC 2020 Table 300.5, 2023 Table 300.5(A).
 * @throws ElectricalError when the shallow 120 V or low-voltage column is asked for a circuit that has no right to it.
 */
export function coverDepth({ edition, location, method, volts, deviceAmps }: CoverInput): { coverIn: number; clause: string } {
  if (method === 'gfci_120v_20a' && (volts > 120 || deviceAmps > 20)) {
    throw new ElectricalError(`The 12 in. column is for 120 V, 20 A or less with GFCI; ${volts} V at ${deviceAmps} A goes deeper.`);
  }
  if (method === 'low_voltage' && volts > 30) {
    throw new ElectricalError(`The low-voltage column ends at 30 V; this circuit has ${volts} V.`);
  }
  return { coverIn: table[location][methods[method]], clause: clauseOf(edition, 'cover') };
}

/** Depth of the trench in inches: the cover counts to the top of the pipe, so the pipe itself comes on top of it. */
export const trenchDepthIn = (coverIn: number, tradeSize: TradeSize): number => coverIn + outsideDiameterIn[tradeSize];
