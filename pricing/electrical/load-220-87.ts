import { clause, ElectricalError, type CodeEdition } from './edition';
import { tidy } from './trace';

/** A peak that was measured, and how. Averages over the interval, in W. */
export interface MeasuredDemand {
  readonly peakW: number;
  readonly days: number;
  readonly intervalSeconds: number;
  /** Solar, wind or a battery that shaves the peak behind the meter, or readings that are net of them. */
  readonly hasGeneration: boolean;
  readonly hasPeakShaving?: boolean;
  /** For less than a year: what the exception asks for besides. */
  readonly recorder?: {
    readonly onHighestLoadedPhase: boolean;
    readonly continuous: boolean;
    readonly occupied: boolean;
    /** Larger of heating and cooling, and other periodic loads that did not run meanwhile; measured or calculated. */
    readonly seasonalVa: number;
  };
}

const YEAR_DAYS = 365;
const EXCEPTION_DAYS = 30;
const QUARTER_HOUR_SECONDS = 900;
const HOUR_SECONDS = 3600;
const MEASURED_FACTOR = 1.25;

export interface MeasuredPermission {
  readonly permitted: boolean;
  /** Why not, in words; empty when permitted. */
  readonly whyNot: string;
  /** True for readings longer than 15 minutes: they hide the 15-minute peak, and a reviewer must agree. */
  readonly understates: boolean;
}

/**
 * Whether a measurement may stand for the existing load. NEC 2020 and 2023 220.87: one year; or by its exception 30 days of 15-minute
 * averages on the highest-loaded phase, continuous and occupied, plus the season's loads; never with generation or peak shaving.
 */
export function measuredPermission(demand: MeasuredDemand): MeasuredPermission {
  const whyNot = reasonAgainst(demand);
  return { permitted: whyNot === '', whyNot, understates: whyNot === '' && demand.intervalSeconds > QUARTER_HOUR_SECONDS };
}

function reasonAgainst({ peakW, days, intervalSeconds, hasGeneration, hasPeakShaving, recorder }: MeasuredDemand): string {
  if (!(peakW >= 0) || !(intervalSeconds > 0)) return 'The readings give no peak.';
  if (hasGeneration || hasPeakShaving === true) return 'Solar or peak shaving behind the meter hides the true peak.';
  if (intervalSeconds > HOUR_SECONDS) return 'Readings longer than an hour say nothing about a peak.';
  if (days >= YEAR_DAYS) return '';
  if (!recorder || days < EXCEPTION_DAYS) return 'Less than a year of readings.';
  if (intervalSeconds > QUARTER_HOUR_SECONDS) return 'Less than a year counts only in 15-minute averages.';
  if (!recorder.continuous || !recorder.occupied || !recorder.onHighestLoadedPhase) {
    return 'The recorder must run without a gap on the highest-loaded phase of an occupied home.';
  }
  return '';
}

export interface MeasuredInput {
  readonly edition: CodeEdition;
  readonly demand: MeasuredDemand;
  readonly newLoadVa: number;
  /** 1.25 where the office adds 25 % to the charger because it is continuous. */
  readonly newLoadFactor?: number;
  /** Divide by 0.95 where the office wants kVA; the code speaks of kilowatts and leaves it open. */
  readonly powerFactor?: number;
  readonly serviceAmps: number;
  readonly volts: number;
}

export interface MeasuredLoad extends MeasuredPermission {
  /** 125 % of the measured peak, and the season's loads by the exception. */
  readonly existingVa: number;
  readonly calculatedVa: number;
  readonly amps: number;
  /** Within the service, and permitted. */
  readonly fits: boolean;
  readonly clause: string;
}

/** 125 % of the measured peak plus the new load, against the service. NEC 2020 and 2023 220.87. */
export function load22087(input: MeasuredInput): MeasuredLoad {
  const { edition, demand, newLoadVa, newLoadFactor = 1, powerFactor = 1, serviceAmps, volts } = input;
  const permission = measuredPermission(demand);
  const seasonalVa = demand.days < YEAR_DAYS ? (demand.recorder?.seasonalVa ?? 0) : 0;
  const existingVa = tidy((demand.peakW / powerFactor) * MEASURED_FACTOR) + seasonalVa;
  const calculatedVa = existingVa + newLoadVa * newLoadFactor;
  const amps = calculatedVa / volts;
  const fits = permission.permitted && amps <= serviceAmps;
  return { ...permission, existingVa, calculatedVa, amps, fits, clause: clause(edition, '220.87') };
}

/** Codes of the unit of measure in the ESPI schema. */
const UOM_WATTS = 38;
const UOM_WATT_HOURS = 72;

export interface EspiReading {
  readonly value: number;
  readonly powerOfTenMultiplier: number;
  readonly uom: number;
  readonly intervalSeconds: number;
}

/**
 * Average W of one interval reading. ESPI schema (NAESB REQ.21): value x 10^multiplier in its unit; watt-hours spread over the interval.
 * @throws ElectricalError for another unit than W or Wh, or an interval of no length.
 */
export function espiReadingW({ value, powerOfTenMultiplier, uom, intervalSeconds }: EspiReading): number {
  const amount = value * 10 ** powerOfTenMultiplier;
  if (uom === UOM_WATTS) return tidy(amount);
  if (uom !== UOM_WATT_HOURS) {
    throw new ElectricalError(`The readings are in unit ${uom}; only watts (38) and watt-hours (72) give a peak.`);
  }
  return averageW(amount, intervalSeconds);
}

/**
 * Average W of energy over the seconds that really passed. On the day when clocks go back some exports sum both hours of one label:
 * then 7,200 s passed, and the row is no doubled peak (common practice: seen in exports).
 * @throws ElectricalError for an interval of no length.
 */
export function averageW(energyWh: number, seconds: number): number {
  if (!(seconds > 0)) throw new ElectricalError('A reading without a length gives no power.');
  return tidy((energyWh * HOUR_SECONDS) / seconds);
}
