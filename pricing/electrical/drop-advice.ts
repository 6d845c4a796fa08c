import { compareAwg, type Awg, type Material } from './awg';
import { nmCableGround } from './circuit-limits';
import { groundForCircuit } from './grounding';
import { ADVISED_DROP_PERCENT, voltageDrop } from './voltage-drop';

export interface DropAdviceInput {
  readonly chargingAmps: number;
  readonly breakerAmps: number;
  readonly material: Material;
  readonly oneWayFt: number;
  readonly volts: number;
  readonly nmCable: boolean;
  /** Size that is enough by the code. */
  readonly minimumAwg: Awg;
  /** Made sizes, thinnest first. */
  readonly sizes: readonly Awg[];
}

/**
 * Thinnest made size that keeps the voltage drop within 3 %, or null when the minimum does so already or no size does. A cable's ground
 * is what it is: where thicker hots ask for a thicker one, that cable is no answer. NEC 2020 and 2023 210.19(A) (advice), 250.122(B).
 */
export function suggestAwgForDrop(input: DropAdviceInput): Awg | null {
  const { minimumAwg, sizes, nmCable, breakerAmps } = input;
  if (keepsDrop(input, minimumAwg)) return null;
  for (const awg of sizes) {
    if (compareAwg(awg, minimumAwg) <= 0 || !keepsDrop(input, awg)) continue;
    if (!nmCable) return awg;
    const groundAwg = groundForCircuit({ deviceAmps: breakerAmps, material: 'Cu', minimumHotAwg: minimumAwg, installedHotAwg: awg });
    if (compareAwg(groundAwg, nmCableGround(awg)) <= 0) return awg;
  }
  return null;
}

const keepsDrop = ({ chargingAmps: amps, material, oneWayFt, volts }: DropAdviceInput, awg: Awg): boolean =>
  voltageDrop({ amps, material, awg, oneWayFt, volts }).dropPercent <= ADVISED_DROP_PERCENT;
