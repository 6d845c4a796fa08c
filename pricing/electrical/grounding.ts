import { awgSizes, circularMils, type Awg, type Material } from './awg';
import { ElectricalError } from './edition';

/** Device rating in amps up to which the size holds, copper, aluminum. NEC 2020 and 2023 Table 250.122. */
const table: readonly (readonly [number, Awg, Awg])[] = [
  [15, '14', '12'], [20, '12', '10'], [60, '10', '8'], [100, '8', '6'], [200, '6', '4'], [300, '4', '2'], [400, '3', '1'],
];

/** Circular mils in the tables are rounded: 60 A, 6 to 4 AWG comes to 16,511 against 16,510 for 8 AWG. A thousandth is no difference. */
const ROUNDING_TOLERANCE = 0.001;

/**
 * Equipment grounding conductor by the device. NEC 2020 and 2023 Table 250.122.
 * @throws ElectricalError above 400 A.
 */
export function groundForDevice(deviceAmps: number, material: Material): Awg {
  for (const [upToAmps, copper, aluminum] of table) if (deviceAmps <= upToAmps) return material === 'Cu' ? copper : aluminum;
  throw new ElectricalError(`Table 250.122 is kept here to 400 A; ${deviceAmps} A is beyond a home.`);
}

export interface GroundInput {
  readonly deviceAmps: number;
  readonly material: Material;
  /** Ungrounded conductor that is enough by the code, corrections included. */
  readonly minimumHotAwg: Awg;
  /** Ungrounded conductor that is installed, thicker when it was chosen for less voltage drop. */
  readonly installedHotAwg: Awg;
}

/**
 * Equipment grounding conductor, wire type, increased in proportion when the hots are thicker than needed, and never thicker than the
 * hots. Increases for heat or bundling are part of the minimum and do not count. NEC 2020 and 2023 Table 250.122, 250.122(A) and (B).
 * @throws ElectricalError above 400 A.
 */
export function groundForCircuit({ deviceAmps, material, minimumHotAwg, installedHotAwg }: GroundInput): Awg {
  const base = groundForDevice(deviceAmps, material);
  const neededMils = (circularMils[base] * circularMils[installedHotAwg]) / circularMils[minimumHotAwg];
  const scaled = awgSizes.find((awg) => circularMils[awg] * (1 + ROUNDING_TOLERANCE) >= neededMils) ?? installedHotAwg;
  return circularMils[scaled] > circularMils[installedHotAwg] ? installedHotAwg : scaled;
}
