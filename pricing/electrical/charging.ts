/** Power in kW of a charging current: amps x volts / 1,000, at a power factor near 1. */
export const chargingKw = (amps: number, volts: number): number => (amps * volts) / 1000;

export interface ConsumptionInput {
  readonly kw: number;
  readonly whPerMile: number;
  /** `wall`: as on the label of a new car, charging loss included. `battery`: as a dashboard shows it. */
  readonly basis: 'wall' | 'battery';
  /** Share of the wall's energy that reaches the battery, 0 to 1; looked at for battery figures only. Common: 0.85 to 0.92, from memory. */
  readonly efficiency?: number;
}

/** Miles of range an hour. A figure at the wall has the charging loss in it already; it is not taken off twice. */
export const milesPerHour = ({ kw, whPerMile, basis, efficiency = 0.9 }: ConsumptionInput): number =>
  (kw * 1000 * (basis === 'battery' ? efficiency : 1)) / whPerMile;

/** Whole miles that the hours at home bring back. */
export const milesPerNight = (milesAnHour: number, hoursHome: number): number => Math.floor(milesAnHour * hoursHome);

export type PilotMeaning = 'current' | 'digital' | 'error' | 'not_available';
export interface PilotReading { readonly amps: number; readonly meaning: PilotMeaning }

/**
 * Current that a charger offers by the duty of its 1 kHz pilot signal. SAE J1772 / IEC 61851-1: 8 to 10 % 6 A, 10 to 85 % 0.6 A a percent,
 * above 85 to 96 % 2.5 A a percent over 64, to 97 % 80 A; 4.5 to 5.5 % digital; below 3 % and above 97 % nothing; between them an error.
 * 0 A for whatever is no current.
 */
export function pilotReading(dutyPercent: number): PilotReading {
  if (dutyPercent < 3 || dutyPercent > 97) return { amps: 0, meaning: 'not_available' };
  if (dutyPercent >= 4.5 && dutyPercent <= 5.5) return { amps: 0, meaning: 'digital' };
  if (dutyPercent < 8) return { amps: 0, meaning: 'error' };
  if (dutyPercent < 10) return { amps: 6, meaning: 'current' };
  if (dutyPercent <= 85) return { amps: dutyPercent * 0.6, meaning: 'current' };
  if (dutyPercent <= 96) return { amps: (dutyPercent - 64) * 2.5, meaning: 'current' };
  return { amps: 80, meaning: 'current' };
}
