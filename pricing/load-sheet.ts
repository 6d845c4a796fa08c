import type { LoadSheet } from '../shared/quote';
import { ampsInWords } from '../shared/units';
import { dwellingLoads } from './dwelling';
import { managedSheet } from './electrical/calculation-sheet';
import { clause } from './electrical/edition';
import { judgeLoad, type LoadVerdict } from './electrical/load-verdict';
import type { Home } from './home';
import { managedCharging, type CapacityFix } from './panel-fix';

/**
 * The calculation sheet of one home at one setting, NEC 220.83 in the edition of its place, as the job leaves it: on the larger
 * service where the price has one, and with the charger at what a load manager permits beside the home's peak where it has that.
 * @param known false when something of the calculation was assumed.
 */
export function loadSheet(home: Home, chargingAmps: number, capacityFix: CapacityFix, known: boolean): LoadSheet {
  const loads = dwellingLoads(home.known, home.place.codeEdition);
  if (capacityFix === 'service_upgrade') {
    const upgraded = judgeLoad({ ...loads, serviceAmps: home.upgradeAmps }, chargingAmps);
    return sheetOf(upgraded, known, `${upgraded.method}, on the new service of ${ampsInWords(home.upgradeAmps)}`);
  }
  const verdict = judgeLoad(loads, chargingAmps);
  return capacityFix === 'energy_management' ? managed(home, verdict, chargingAmps, known) : sheetOf(verdict, known, verdict.method);
}

function sheetOf(verdict: LoadVerdict, known: boolean, method: string): LoadSheet {
  const { status, serviceAmps, homeAmps, withChargerAmps, spareAmps } = verdict;
  return {
    status, method, serviceAmps, known,
    clause: verdict.clause,
    homeAmps: round(homeAmps),
    chargerAmps: round(withChargerAmps - homeAmps),
    spareAmps: round(spareAmps),
    lines: rounded(verdict.sheet),
  };
}

function managed(home: Home, { serviceAmps, sheet }: LoadVerdict, chargingAmps: number, known: boolean): LoadSheet {
  const { chargingAmpsAtPeak } = managedCharging(home, chargingAmps);
  const { codeEdition } = home.place;
  return {
    status: 'amber',
    method: 'Existing home, a load manager holds the charger back at its peak',
    clause: clause(codeEdition, '220.83, 625.42(A)'),
    serviceAmps,
    homeAmps: round(home.homeAmps),
    chargerAmps: chargingAmpsAtPeak,
    spareAmps: round(Math.max(0, serviceAmps - home.homeAmps)),
    known,
    lines: rounded(managedSheet(codeEdition, sheet, chargingAmps, chargingAmpsAtPeak * home.known.volts)),
  };
}

const rounded = (lines: LoadVerdict['sheet']): LoadSheet['lines'] =>
  lines.map(({ label, va, clause: reference, note }) => ({
    label,
    va: Math.round(va),
    clause: reference,
    ...(note === undefined ? {} : { note }),
  }));

const round = (amps: number): number => Math.round(amps * 10) / 10;
