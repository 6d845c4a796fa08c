import type { Facts } from '../shared/facts';
import type { LoadSheet } from '../shared/quote';
import { dwellingLoads } from './dwelling';
import { judgeLoad } from './electrical/load-verdict';
import type { Home } from './home';

const bigLoads = ['range', 'dryer', 'waterHeater', 'centralAir', 'heatPump', 'stripHeat', 'roomHeaters'] as const;

/** True when nothing big of the calculation was assumed: the main, the floor area and the big loads were answered. */
const isKnown = (facts: Facts): boolean =>
  facts.mainBreakerAmps !== null && facts.floorAreaFt2 !== null && bigLoads.every((id) => facts.loads[id]?.present != null);

/** The calculation sheet of one home at one setting, NEC 220.83 in the edition of its place. */
export function loadSheet(facts: Facts, home: Home, chargingAmps: number): LoadSheet {
  const loads = dwellingLoads(home.known, home.place.codeEdition);
  const verdict = judgeLoad(loads, chargingAmps);
  return {
    status: verdict.status,
    method: verdict.method,
    clause: verdict.clause,
    serviceAmps: loads.serviceAmps,
    homeAmps: round(verdict.homeAmps),
    chargerAmps: round(verdict.withChargerAmps - verdict.homeAmps),
    spareAmps: round(verdict.spareAmps),
    known: isKnown(facts),
    lines: verdict.sheet.map(({ label, va, clause, note }) => ({
      label,
      va: Math.round(va),
      clause,
      ...(note === undefined ? {} : { note }),
    })),
  };
}

const round = (amps: number): number => Math.round(amps * 10) / 10;
