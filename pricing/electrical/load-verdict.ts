import { measuredSheet, practiceSheet } from './calculation-sheet';
import type { DwellingLoads } from './dwelling-loads';
import { clause, ElectricalError } from './edition';
import { evseVa } from './evse-load';
import { load22087, type MeasuredDemand, type MeasuredLoad } from './load-220-87';
import { practiceIds, practiceLoad, sortLoads, type PracticeId, type SortedLoads } from './load-practice';
import { tidy, type SheetLine } from './trace';

export type { DwellingLoads } from './dwelling-loads';
export type { SheetLine, TraceEntry } from './trace';

/** What the permit office asks for. */
export interface EvsePolicy {
  /** The practice that must be passed for green; the most cautious when it is not stated. */
  readonly practice?: PracticeId;
  /** Adds 25 % of the charger, because an ordinary main is not rated for 100 % continuous load. */
  readonly continuousOnService?: boolean;
  /** A measured peak, which may stand for the existing load by 220.87. */
  readonly measured?: MeasuredDemand;
}

export type LoadStatus = 'green' | 'amber' | 'red';

export interface LoadVerdict {
  readonly status: LoadStatus;
  /** The method that decided, in words; all amps and the sheet are by this one. */
  readonly method: string;
  readonly clause: string;
  readonly serviceAmps: number;
  /** The home without the new charger. */
  readonly homeAmps: number;
  readonly withChargerAmps: number;
  /** What the service has left beside the home, before the charger; never negative. */
  readonly spareAmps: number;
  /** Largest standard setting that stays green or amber; 0: none does. */
  readonly maxChargingAmps: number;
  readonly sheet: readonly SheetLine[];
  readonly practices: readonly { readonly id: PracticeId; readonly amps: number; readonly fits: boolean }[];
}

/** Settings to offer, largest first. Common practice: what chargers can be set to. */
const standardSettingsAmps = [48, 40, 32, 24, 16] as const;

const methodWords: Readonly<Record<PracticeId, string>> = {
  literal: 'Existing home, the charger with the other loads',
  hvac_and_ev_at_100: 'Existing home, the charger and heating or cooling in full',
  all_in_pool: 'Existing home, everything with the other loads',
};

interface Judged { readonly status: LoadStatus; readonly by: PracticeId | 'measured' }

/**
 * Judges whether the service carries the home and a charger. Green: passes the practice that the office asks for, by default the most
 * cautious (heating or cooling and the charger at 100 %). Amber: not that, but the literal reading of 220.83 or a permitted measurement
 * (220.87). Red: neither, even if everything in the 40 % pool would fit. NEC 2020 and 2023 220.83, 220.87; charger 220.57 (2023).
 * @param chargingAmps the setting; behind restricted access it counts as the nameplate, 625.42(B).
 * @throws ElectricalError when a load is no number or the service has no rating.
 */
export function judgeLoad(loads: DwellingLoads, chargingAmps: number, policy: EvsePolicy = {}): LoadVerdict {
  const sorted = sortLoads(loads);
  const { serviceAmps, volts, edition } = loads;
  const newEvseVa = evseVa(edition, chargingAmps * volts);
  const full = ampsBy('hvac_and_ev_at_100', sorted, newEvseVa, policy);
  if (!(serviceAmps > 0) || !Number.isFinite(full)) {
    throw new ElectricalError('The load calculation lacks a number: it needs every load, the floor area and the service rating.');
  }

  const { status, by } = judge(sorted, newEvseVa, policy);
  const measured = by === 'measured' && policy.measured ? measuredLoad(sorted, policy.measured, newEvseVa, policy) : null;
  const practice = by === 'measured' ? 'literal' : by;
  const load = measured ?? practiceLoad(practice, sorted, newEvseVa, policy.continuousOnService === true);
  const homeAmps = measured ? tidy(measured.existingVa / volts) : ampsBy(practice, sorted, 0, policy);
  let sheet: readonly SheetLine[] | null = null;
  return {
    status, serviceAmps, homeAmps,
    method: measured ? measuredWords(measured) : methodWords[practice],
    clause: measured ? measured.clause : clause(edition, '220.83'),
    withChargerAmps: tidy(load.amps),
    spareAmps: Math.max(0, tidy(serviceAmps - homeAmps)),
    maxChargingAmps: largestSetting(sorted, policy),
    practices: practiceIds.map((id) => {
      const amps = ampsBy(id, sorted, newEvseVa, policy);
      return { id, amps, fits: amps <= serviceAmps };
    }),
    // Ranges judge thousands of homes and print the sheet of one, so it is written when it is first read.
    get sheet() {
      sheet ??= measured && policy.measured
        ? measuredSheet(edition, policy.measured, measured, chargingAmps)
        : practiceSheet(practice, sorted, chargingAmps, newEvseVa, load);
      return sheet;
    },
  };
}

const measuredWords = ({ understates }: MeasuredLoad): string =>
  understates ? 'Measured peak, from readings longer than 15 minutes' : 'Measured peak';

const ampsBy = (practice: PracticeId, sorted: SortedLoads, newEvseVa: number, policy: EvsePolicy): number =>
  tidy(practiceLoad(practice, sorted, newEvseVa, policy.continuousOnService === true).amps);

function measuredLoad({ loads }: SortedLoads, demand: MeasuredDemand, newEvseVa: number, policy: EvsePolicy): MeasuredLoad {
  const newLoadFactor = policy.continuousOnService ? 1.25 : 1;
  const { edition, serviceAmps, volts } = loads;
  return load22087({ edition, demand, newLoadVa: newEvseVa, newLoadFactor, serviceAmps, volts });
}

/** Status at one setting, and the method to name: a permitted measurement before the disputed literal reading. */
function judge(sorted: SortedLoads, newEvseVa: number, policy: EvsePolicy): Judged {
  const asked = policy.practice ?? 'hvac_and_ev_at_100';
  const { serviceAmps } = sorted.loads;
  if (ampsBy(asked, sorted, newEvseVa, policy) <= serviceAmps) return { status: 'green', by: asked };
  if (policy.measured && measuredLoad(sorted, policy.measured, newEvseVa, policy).fits) return { status: 'amber', by: 'measured' };
  return ampsBy('literal', sorted, newEvseVa, policy) <= serviceAmps ? { status: 'amber', by: 'literal' } : { status: 'red', by: asked };
}

function largestSetting(sorted: SortedLoads, policy: EvsePolicy): number {
  const { edition, volts } = sorted.loads;
  return standardSettingsAmps.find((amps) => judge(sorted, evseVa(edition, amps * volts), policy).status !== 'red') ?? 0;
}
