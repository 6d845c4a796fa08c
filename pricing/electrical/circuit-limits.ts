import type { Awg, Material } from './awg';
import type { CircuitInput } from './circuit-types';
import { ElectricalError } from './edition';

/**
 * Sizes that a supply house has: NM-B without 3 AWG, aluminum building wire from 8 AWG on; no thicker than a raceway of a home takes.
 * Common practice, no source.
 */
export const MADE_SIZES: Readonly<Record<Material | 'NM_B', readonly Awg[]>> = {
  Cu: ['14', '12', '10', '8', '6', '4', '3', '2', '1', '1/0', '2/0'],
  Al: ['8', '6', '4', '2', '1', '1/0', '2/0'],
  NM_B: ['14', '12', '10', '8', '6', '4', '2'],
};

/** The ground that comes inside NM-B cable; it cannot be chosen. Common cable make-up, from memory. */
export const nmCableGround = (awg: Awg): Awg => (awg === '4' || awg === '2' ? '8' : awg === '14' || awg === '12' ? awg : '10');

/** True when part of the run is wet, so that wire must be of a wet-rated kind. */
export const isWet = ({ wetLocation, place }: Pick<CircuitInput, 'wetLocation' | 'place'>): boolean => wetLocation ?? place === 'outdoor';

const LEAST_AMPS = 6;
const MOST_AMPS = 80;
/** Receptacles for charging end at 50 A, so that a plug carries 40 A. NEC 2020 and 2023 625.44. */
const MOST_PLUG_IN_AMPS = 40;

/**
 * Refuses what cannot be built, in words.
 * @throws ElectricalError naming the clause: 625.44 (plug), 334.12(B)(4) (wet NM-B, from memory), and numbers out of bounds.
 */
export function checkCircuit({ chargingAmps, connection, method, material, place, wetLocation, oneWayFt, ambientC }: CircuitInput): void {
  if (!(chargingAmps >= LEAST_AMPS && chargingAmps <= MOST_AMPS)) {
    throw new ElectricalError(`A home charger is set to ${LEAST_AMPS} to ${MOST_AMPS} A, not ${chargingAmps} A.`);
  }
  if (!(oneWayFt >= 0) || !Number.isFinite(oneWayFt)) throw new ElectricalError('The length of the run is missing.');
  if (!Number.isFinite(ambientC)) throw new ElectricalError('The temperature along the run is missing.');
  if (connection === 'plug_in' && chargingAmps > MOST_PLUG_IN_AMPS) {
    throw new ElectricalError(
      `A receptacle for charging ends at 50 A, which carries ${MOST_PLUG_IN_AMPS} A (625.44). Wire ${chargingAmps} A directly.`,
    );
  }
  if (method !== 'NM_B') return;
  if (material === 'Al') {
    throw new ElectricalError('NM-B cable for a charger is made with copper. Use copper, or aluminum wire in conduit.');
  }
  if (isWet({ wetLocation, place })) {
    throw new ElectricalError('NM-B cable may not be where it is damp or wet (334.12(B)(4)). Use wire in conduit.');
  }
}
