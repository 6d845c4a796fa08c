import { correctedAmpacity, placeFactor, tableAmpacity } from './ampacity';
import { awgSizes, type Awg, type Material } from './awg';
import { ElectricalError } from './edition';
import { minimumDeviceAmps, standardRatingAtLeast } from './standard-ratings';

/** Largest device, in amps, on small conductors whatever their ampacity. NEC 2020 and 2023 240.4(D). */
const smallConductorCapAmps: Readonly<Record<Material, Readonly<Partial<Record<Awg, number>>>>> = {
  Cu: { 14: 15, 12: 20, 10: 30 },
  Al: { 12: 15, 10: 25 },
};

export interface ConductorInput {
  readonly chargingAmps: number;
  readonly deviceAmps: number;
  readonly material: Material;
  readonly nmCable: boolean;
  /** Column of the terminals at both ends, the lower of the two. NEC 2020 and 2023 110.14(C)(1): 60 unless marked 75. */
  readonly terminalC: 60 | 75;
  readonly ambientC: number;
  readonly currentCarryingConductors: number;
  /** Sizes to choose from, thinnest first; all of the table's when left out. */
  readonly sizes?: readonly Awg[];
}

/**
 * True when a device protects a conductor of this corrected ampacity: the next standard rating up is allowed, as the circuit does not
 * feed several outlets for portable loads. NEC 2020 and 2023 240.4(B), 240.4(D).
 */
export function deviceProtects(deviceAmps: number, correctedAmps: number, material: Material, awg: Awg): boolean {
  const capAmps = smallConductorCapAmps[material][awg];
  return deviceAmps <= standardRatingAtLeast(correctedAmps) && (capAmps === undefined || deviceAmps <= capAmps);
}

/**
 * Smallest conductor for a charging circuit: (1) 125 % of the charging current within the terminals' column, no factors (for NM-B
 * within its 60 C column); (2) the charging current within the corrected ampacity, and protected by the device; (3) the cap on small
 * conductors. NEC 2020 and 2023 110.14(C), 210.19(A)(1), 240.4(B) and (D), 310.16, 334.80, 625.41. Insulation is of the 90 C kinds.
 * @throws ElectricalError when no size of the list is enough, or the place is hotter than the tables reach.
 */
export function smallestConductor(input: ConductorInput): Awg {
  const { chargingAmps, deviceAmps, material, nmCable, terminalC, sizes = awgSizes } = input;
  const continuousAmps = minimumDeviceAmps(chargingAmps);
  const factor = placeFactor(90, input.ambientC, input.currentCarryingConductors);
  for (const awg of sizes) {
    const terminalAmps = tableAmpacity(material, awg, nmCable ? 60 : terminalC);
    if (terminalAmps === null || terminalAmps < continuousAmps) continue;
    const correctedAmps = correctedAmpacity(material, awg, 90, factor, nmCable);
    if (correctedAmps >= chargingAmps && deviceProtects(deviceAmps, correctedAmps, material, awg)) return awg;
  }
  const largest = sizes[sizes.length - 1] ?? '';
  throw new ElectricalError(
    nmCable
      ? `${chargingAmps} A of charging is more than NM-B cable may carry: it ends at ${largest} AWG, 60 °C column. Use wire in conduit.`
      : `${chargingAmps} A of charging needs wire thicker than ${largest}. Fewer conductors together or a cooler way would help.`,
  );
}
