import { designCircuit, type CircuitDesign, type WiringMethod } from './electrical/circuit';
import { ElectricalError } from './electrical/edition';
import type { Home } from './home';
import type { OptionPlan } from './option-plan';
import type { RuleContext } from './rulebook/names';
import type { RunPlan } from './run/run-plan';

/** A circuit, and what rules read of it. The design's own trace is worked out only when it is read. */
export interface BuiltCircuit {
  readonly design: CircuitDesign;
  readonly view: RuleContext['circuit'];
}

const methodNumbers: Readonly<Record<WiringMethod, number>> = { EMT: 0, PVC40: 1, PVC80: 2, NM_B: 3 };
const designs = new Map<number, BuiltCircuit | null>();

/** One number for everything that decides a circuit's sizes; the length is none of it while nothing is upsized for voltage drop. */
function circuitKey({ known, place }: Home, option: OptionPlan, run: RunPlan): number {
  const flags =
    (run.outdoor ? 1 : 0) +
    (run.wet ? 2 : 0) +
    (option.connection === 'wired' ? 4 : 0) +
    (known.volts === 240 ? 8 : 0) +
    (place.codeEdition === '2023' ? 16 : 0);
  return ((run.ambientC * 4 + methodNumbers[run.method]) * 32 + flags) * 128 + option.chargingAmps;
}

/** The circuit for a setting and a way, designed for the very length, or null where the code allows none. */
export function designFor({ known, place }: Home, option: OptionPlan, run: RunPlan): BuiltCircuit | null {
  try {
    const design = designCircuit({
      edition: place.codeEdition,
      chargingAmps: option.chargingAmps,
      volts: known.volts,
      connection: option.connection,
      place: run.outdoor ? 'outdoor' : 'indoor',
      method: run.method,
      material: 'Cu',
      oneWayFt: run.lengthFt,
      ambientC: run.ambientC,
      wetLocation: run.wet,
    });
    const { hotAwg, groundAwg, method, racewayTradeSize, gfciRequired, disconnectRequired, breakerAmps } = design;
    return {
      design,
      view: { words: circuitWords(design), hotAwg, groundAwg, method, racewayTradeSize, gfciRequired, disconnectRequired, breakerAmps },
    };
  } catch (error) {
    if (error instanceof ElectricalError) return null;
    throw error;
  }
}

/** As designFor, but remembered by what decides the sizes: good for prices, not for the voltage drop. */
export function sharedDesignFor(home: Home, option: OptionPlan, run: RunPlan): BuiltCircuit | null {
  const key = circuitKey(home, option, run);
  let design = designs.get(key);
  if (design === undefined) designs.set(key, (design = designFor(home, option, run)));
  return design;
}

/** "6 AWG copper THHN in 3/4 in. EMT" */
export function circuitWords({ hotAwg, material, insulation, racewayTradeSize, method }: CircuitDesign): string {
  const metal = material === 'Cu' ? 'copper' : 'aluminum';
  if (method === 'NM_B') return `${hotAwg} AWG ${metal} NM-B cable`;
  const pipe = { EMT: 'EMT', PVC40: 'PVC', PVC80: 'heavy PVC' }[method];
  return `${hotAwg} AWG ${metal} ${insulation} in ${racewayTradeSize ?? ''} in. ${pipe}`;
}
