import { lightingAndCircuitsVa } from './dwelling-loads';
import { clause, clauseOf, ElectricalError, type CodeEdition } from './edition';
import { tidy, type TraceEntry } from './trace';

/** Lighting, small-appliance and laundry circuits: 3,000 VA whole, to 120,000 VA 35 %, the rest 25 %. NEC 2020 T 220.42, 2023 T 220.45. */
export const lightingDemandVa = (connectedVa: number): number =>
  tidy(Math.min(connectedVa, 3000) + 0.35 * Math.max(0, Math.min(connectedVa, 120_000) - 3000) + 0.25 * Math.max(0, connectedVa - 120_000));

/**
 * Four or more appliances fastened in place count 75 %; never ranges, dryers, heat, cooling or a charger. NEC 2020 and 2023 220.53
 * (2023 names the charger).
 */
export function fixedApplianceDemandVa(appliancesVa: readonly number[]): number {
  const connectedVa = appliancesVa.reduce((sum, va) => sum + va, 0);
  return appliancesVa.length >= 4 ? 0.75 * connectedVa : connectedVa;
}

/** A household dryer: its nameplate or 5,000 VA, the larger; 0 where there is none. NEC 2020 and 2023 220.54. */
export const dryerDemandVa = (nameplateVa: number): number => (nameplateVa > 0 ? Math.max(nameplateVa, 5000) : 0);

/**
 * One household range. NEC 2020 and 2023 Table 220.55: to 12 kW Column C, 8 kW; above, 5 % more for each kW or larger part of one (note 1);
 * to 8.75 kW 80 % of the nameplate (Columns A and B, from memory).
 * @throws ElectricalError above 27 kW, where the table ends.
 */
export function rangeDemandVa(nameplateVa: number): number {
  if (nameplateVa > 27_000) throw new ElectricalError(`A range of ${nameplateVa} VA is beyond Table 220.55.`);
  if (nameplateVa <= 8750) return tidy(0.8 * nameplateVa);
  return 8000 * (1 + 0.05 * Math.max(0, Math.round((nameplateVa - 12_000) / 1000)));
}

/**
 * Amps of one leg where loads are uneven: the loads of both legs, this leg's motors and others, and 25 % of its largest motor.
 * NEC 2020 and 2023 220.50, 430.24; Annex D Example D1(b).
 */
export const legAmps = (bothLegsAmps: number, motorAmps: readonly number[], otherAmps: readonly number[] = []): number =>
  [...motorAmps, ...otherAmps].reduce((sum, amps) => sum + amps, bothLegsAmps) + 0.25 * Math.max(0, ...motorAmps);

export interface StandardMethodInput {
  readonly edition: CodeEdition;
  readonly floorAreaFt2: number;
  readonly smallApplianceCircuits: number;
  readonly laundryCircuits: number;
  /** As rangeDemandVa gives it. */
  readonly rangeDemandVa: number;
  readonly dryerVa: number;
  readonly fixedAppliancesVa: readonly number[];
  /** Larger of heating and cooling, whole. NEC 2020 and 2023 220.51, 220.60. */
  readonly hvacVa?: number;
  /** As evseVa gives it; always whole. */
  readonly evseVa?: number;
  readonly volts: number;
}

export interface StandardMethodLoad {
  readonly lightingDemandVa: number;
  readonly fixedDemandVa: number;
  readonly calculatedVa: number;
  readonly amps: number;
  /** Neutral: 70 % of range and dryer; heat, cooling and the charger at 240 V add none. NEC 2020 and 2023 220.61. */
  readonly neutralVa: number;
  readonly trace: readonly TraceEntry[];
}

/** The standard method for a dwelling. NEC 2020 and 2023 Article 220 Part III. */
export function standardLoad(input: StandardMethodInput): StandardMethodLoad {
  const { edition, volts, hvacVa = 0, evseVa = 0 } = input;
  const lightingVa = lightingDemandVa(lightingAndCircuitsVa(input));
  const fixedVa = fixedApplianceDemandVa(input.fixedAppliancesVa);
  const dryerVa = dryerDemandVa(input.dryerVa);
  const calculatedVa = lightingVa + fixedVa + dryerVa + input.rangeDemandVa + hvacVa + evseVa;
  return {
    lightingDemandVa: lightingVa, fixedDemandVa: fixedVa, calculatedVa, amps: calculatedVa / volts,
    neutralVa: lightingVa + fixedVa + 0.7 * (input.rangeDemandVa + dryerVa),
    trace: [
      { what: 'Lighting and circuits', value: `${lightingVa} VA`, clause: clauseOf(edition, 'lightingDemand') },
      { what: 'Fixed appliances', value: `${fixedVa} VA`, clause: clause(edition, '220.53') },
      { what: 'Dryer', value: `${dryerVa} VA`, clause: clause(edition, '220.54') },
      { what: 'Range', value: `${input.rangeDemandVa} VA`, clause: clause(edition, 'Table 220.55') },
      { what: 'Heating or cooling', value: `${hvacVa} VA`, clause: clause(edition, '220.60') },
      { what: 'Vehicle charger', value: `${evseVa} VA`, clause: clauseOf(edition, 'evseLoad') },
    ],
  };
}
