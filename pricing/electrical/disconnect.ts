/** Charging equipment above this needs a disconnecting means: 60 A itself does not. */
const DISCONNECT_ABOVE_AMPS = 60;
const DISCONNECT_ABOVE_VOLTS_TO_GROUND = 150;

/**
 * True when the charger needs its own disconnecting means, lockable open and readily accessible: rated more than 60 A, or more than
 * 150 V to ground. NEC 2020 and 2023 625.43. Local rules may ask for one anyway.
 */
export const disconnectRequired = (evseAmps: number, voltsToGround: number): boolean =>
  evseAmps > DISCONNECT_ABOVE_AMPS || voltsToGround > DISCONNECT_ABOVE_VOLTS_TO_GROUND;
