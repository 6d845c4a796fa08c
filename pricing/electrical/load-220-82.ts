import { MANY_ROOM_HEATERS, tieredVa, type Hvac } from './dwelling-loads';
import { clause, ElectricalError, type CodeEdition } from './edition';
import type { TraceEntry } from './trace';

/** Tier that counts whole in the optional method. NEC 2020 and 2023 220.82(B); 2026 is reported to have 8,000. */
const OPTIONAL_FIRST_TIER_VA = 10_000;
const CENTRAL_HEAT_SHARE = 0.65;
const MANY_HEATERS_SHARE = 0.4;
const LEAST_SERVICE_AMPS = 100;

export interface OptionalMethodInput {
  readonly edition: CodeEdition;
  /** Lighting, circuits, appliances and the charger, connected VA. */
  readonly generalConnectedVa: number;
  readonly hvac: Hvac;
  /** True when the compressor is locked out while the strips run. */
  readonly compressorLockedOut?: boolean;
  readonly serviceAmps: number;
  readonly volts: number;
}

export interface OptionalMethodLoad {
  readonly generalDemandVa: number;
  readonly hvacVa: number;
  readonly calculatedVa: number;
  readonly amps: number;
  readonly trace: readonly TraceEntry[];
}

/** Heating and cooling by the largest of the selections, in VA. NEC 2020 and 2023 220.82(C)(1) to (5). */
export function hvacDemandVa(hvac: Hvac, compressorLockedOut = false): number {
  const roomShare = hvac.roomHeaterCount >= MANY_ROOM_HEATERS ? MANY_HEATERS_SHARE : CENTRAL_HEAT_SHARE;
  const compressorVa = compressorLockedOut && hvac.supplementalHeatVa > 0 ? 0 : hvac.heatPumpVa;
  return Math.max(
    hvac.coolingVa,
    hvac.heatPumpVa,
    compressorVa + hvac.supplementalHeatVa * CENTRAL_HEAT_SHARE,
    hvac.centralHeatVa * CENTRAL_HEAT_SHARE,
    hvac.roomHeatersVa * roomShare,
  );
}

/**
 * The optional method for a dwelling: 10,000 VA at 100 %, the rest at 40 %, and the largest of heating and cooling by its own share.
 * NEC 2020 and 2023 220.82(B) and (C).
 * @throws ElectricalError for a service below 100 A, to which the method does not apply.
 */
export function load22082(input: OptionalMethodInput): OptionalMethodLoad {
  const { edition, generalConnectedVa, hvac, compressorLockedOut, serviceAmps, volts } = input;
  if (serviceAmps < LEAST_SERVICE_AMPS) {
    throw new ElectricalError(`The optional method of 220.82 is for services of 100 A or more, not ${serviceAmps} A.`);
  }
  const generalDemandVa = tieredVa(generalConnectedVa, OPTIONAL_FIRST_TIER_VA);
  const hvacVa = hvacDemandVa(hvac, compressorLockedOut);
  const calculatedVa = generalDemandVa + hvacVa;
  return {
    generalDemandVa, hvacVa, calculatedVa, amps: calculatedVa / volts,
    trace: [
      { what: 'General loads', value: `${generalDemandVa} VA of ${generalConnectedVa} VA connected`, clause: clause(edition, '220.82(B)') },
      { what: 'Heating or cooling', value: `${hvacVa} VA`, clause: clause(edition, '220.82(C)') },
    ],
  };
}
