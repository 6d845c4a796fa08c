import type { Awg } from './awg';
import { chargingKw } from './charging';
import { checkCircuit, isWet, MADE_SIZES } from './circuit-limits';
import { circuitTrace } from './circuit-trace';
import type { CircuitDesign, CircuitInput, WiringMethod } from './circuit-types';
import { conductorAreaIn2, PRACTICE_MINIMUM, smallestRaceway, type Conductors, type Fill } from './conduit-fill';
import { smallestConductor } from './conductor';
import { disconnectRequired } from './disconnect';
import { suggestAwgForDrop } from './drop-advice';
import { gfciDecision } from './gfci';
import { groundForCircuit } from './grounding';
import { breakerForCharging, minimumDeviceAmps } from './standard-ratings';
import type { TraceEntry } from './trace';
import { voltageDrop } from './voltage-drop';

export type { Awg } from './awg';
export type { CircuitDesign, CircuitInput, WiringMethod } from './circuit-types';
export type { TradeSize } from './conduit-fill';
export type { TraceEntry } from './trace';

/** Both supplies of a home are 120 V to ground. */
const VOLTS_TO_GROUND = 120;

/**
 * Designs a charging circuit: breaker, wire, ground, raceway, and what goes with it. NEC 2020 and 2023; each figure's clause is in `trace`.
 * Voltage drop is advice: a thicker size is offered, and taken only when asked for.
 * @throws ElectricalError, with words for the desk, when it cannot be built so: a current out of 6 to 80 A, more than 40 A by plug
 * (625.44), NM-B where it is wet, aluminum or too small, a place too hot.
 */
export function designCircuit(input: CircuitInput): CircuitDesign {
  checkCircuit(input);
  const { edition, chargingAmps, volts, material, method, connection, place, oneWayFt, ambientC } = input;
  const nmCable = method === 'NM_B';
  const breakerAmps = breakerForCharging(chargingAmps);
  const sizes = nmCable ? MADE_SIZES.NM_B : MADE_SIZES[material];
  const terminalC = input.terminalC ?? (connection === 'plug_in' ? 60 : 75);
  const currentCarryingConductors = input.currentCarryingConductors ?? 2;
  const minimumAwg = smallestConductor({
    chargingAmps, deviceAmps: breakerAmps, material, nmCable, terminalC, ambientC, currentCarryingConductors, sizes,
  });
  const suggestedAwgForDrop = suggestAwgForDrop({ chargingAmps, breakerAmps, material, oneWayFt, volts, nmCable, minimumAwg, sizes });
  const upsizedForDrop = input.upsizeForDrop === true && suggestedAwgForDrop !== null;
  const hotAwg = upsizedForDrop ? suggestedAwgForDrop : minimumAwg;
  const groundAwg = groundForCircuit({ deviceAmps: breakerAmps, material: 'Cu', minimumHotAwg: minimumAwg, installedHotAwg: hotAwg });
  const fill = nmCable ? null : raceway(method, hotAwg, groundAwg, connection);
  const { dropV, dropPercent } = voltageDrop({ amps: chargingAmps, material, awg: hotAwg, oneWayFt, volts });
  const gfci = gfciDecision({ edition, connection, place, breakerAmps, voltsToGround: VOLTS_TO_GROUND });
  const choices = { minimumAwg, terminalC, ambientC, currentCarryingConductors, oneWayFt, gfciClause: gfci.clause };
  let trace: readonly TraceEntry[] | null = null;
  return {
    edition, chargingAmps, volts, minimumDeviceAmps: minimumDeviceAmps(chargingAmps), breakerAmps, hotAwg, groundAwg, material,
    insulation: nmCable ? 'NM-B' : isWet(input) ? 'THWN-2' : 'THHN', method,
    racewayTradeSize: fill?.tradeSize ?? null, fillPercent: fill?.fillPercent ?? null,
    voltageDropV: dropV, voltageDropPercent: dropPercent, suggestedAwgForDrop, upsizedForDrop,
    disconnectRequired: disconnectRequired(chargingAmps, VOLTS_TO_GROUND), gfciRequired: gfci.required, gfciReason: gfci.reason,
    kw: chargingKw(chargingAmps, volts),
    // Prices look at many circuits and explain a few, so the trace is written when it is first read.
    get trace() { return (trace ??= circuitTrace(this, choices)); },
  };
}

/** Two hots and a ground; a receptacle with a neutral contact takes a neutral as thick as the hots. */
function raceway(method: Exclude<WiringMethod, 'NM_B'>, hotAwg: Awg, groundAwg: Awg, connection: CircuitInput['connection']): Fill {
  const conductors: Conductors[] = [
    { areaIn2: conductorAreaIn2(hotAwg), count: connection === 'plug_in' ? 3 : 2 },
    { areaIn2: conductorAreaIn2(groundAwg), count: 1 },
  ];
  return smallestRaceway(method, conductors, PRACTICE_MINIMUM);
}
