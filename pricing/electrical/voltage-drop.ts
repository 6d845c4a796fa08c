import type { Awg, Material } from './awg';
import { circularMils } from './awg';
import { ElectricalError } from './edition';

/** Percent that the code advises on a branch circuit. NEC 2020 and 2023 210.19(A), informational note: advice, not a rule. */
export const ADVISED_DROP_PERCENT = 3;

/** Ohms per 1,000 ft. `table8_dc`: at 75 C, uncoated, stranded (from memory). `table9_ac`: in PVC at unity power factor. */
type Source = 'table8_dc' | 'table9_ac';
const ohmsPerKft: Readonly<Record<Source, Readonly<Record<Material, Readonly<Partial<Record<Awg, number>>>>>>> = {
  table8_dc: {
    Cu: { 14: 3.14, 12: 1.98, 10: 1.24, 8: 0.778, 6: 0.491, 4: 0.308, 3: 0.245, 2: 0.194, 1: 0.154, '1/0': 0.122, '2/0': 0.0967 },
    Al: { 12: 3.25, 10: 2.04, 8: 1.28, 6: 0.808, 4: 0.508, 3: 0.403, 2: 0.319, 1: 0.253, '1/0': 0.201, '2/0': 0.159, '4/0': 0.1 },
  },
  table9_ac: {
    Cu: { 14: 3.1, 12: 2, 10: 1.2, 8: 0.78, 6: 0.49, 4: 0.31, 3: 0.25, 2: 0.19, 1: 0.15, '1/0': 0.12, '2/0': 0.1 },
    Al: { 12: 3.2, 10: 2, 8: 1.3, 6: 0.81, 4: 0.51, 3: 0.4, 2: 0.32, 1: 0.25, '1/0': 0.2, '2/0': 0.16 },
  },
};

/** Ohm circular mils per foot at about 75 C, the trade's shortcut: common practice, from memory. */
const kFactor: Readonly<Record<Material, number>> = { Cu: 12.9, Al: 21.2 };

export interface VoltageDropInput {
  /** The charging current itself, not 125 % of it. */
  readonly amps: number;
  readonly material: Material;
  readonly awg: Awg;
  /** One way; the current goes there and back, which the formula counts. */
  readonly oneWayFt: number;
  readonly volts: number;
  readonly by?: Source | 'k_factor';
}

/**
 * Voltage lost along the wire: 2 x I x R x L / 1,000, single phase, in volts and in percent of the supply.
 * NEC 2020 and 2023 Chapter 9 Table 8 (default) or Table 9.
 * @throws ElectricalError when the table has no such size.
 */
export function voltageDrop(input: VoltageDropInput): { dropV: number; dropPercent: number } {
  const { amps, material, awg, oneWayFt, volts, by = 'table8_dc' } = input;
  const dropV = (2 * amps * resistance(material, awg, by) * oneWayFt) / 1000;
  return { dropV, dropPercent: (100 * dropV) / volts };
}

function resistance(material: Material, awg: Awg, by: NonNullable<VoltageDropInput['by']>): number {
  if (by === 'k_factor') return (1000 * kFactor[material]) / circularMils[awg];
  const ohms = ohmsPerKft[by][material][awg];
  if (ohms !== undefined) return ohms;
  throw new ElectricalError(`The resistance of ${awg} AWG ${material === 'Cu' ? 'copper' : 'aluminum'} is not kept here.`);
}
