import { loadKinds } from '../shared/loads';
import type { DwellingLoads } from './electrical/dwelling-loads';
import type { CodeEdition } from './electrical/edition';
import { typicalLoadVa } from './electrical/typical-loads';
import type { KnownFacts } from './known-facts';

/** Loads that are heating or cooling; the rest are appliances, NEC 2023 220.83. */
const hvacIds: ReadonlySet<string> = new Set(['centralAir', 'heatPump', 'stripHeat', 'roomHeaters']);
const applianceKinds = loadKinds.filter(({ id }) => !hvacIds.has(id));

/** NEC 2023 220.52: two small-appliance circuits and one for laundry, at least. */
const [SMALL_APPLIANCE_CIRCUITS, LAUNDRY_CIRCUITS] = [2, 1];
/** Room heaters when their number is not known; as typical-loads.ts counts them. */
const USUAL_ROOM_HEATERS = 4;

/**
 * What the load calculation needs of a home, VA by typical ratings where no plate is known, at its supply's volts.
 * NEC 2023 220.5(A), from memory.
 */
export function dwellingLoads(known: KnownFacts, edition: CodeEdition): DwellingLoads {
  const { loads } = known;
  const va = (id: keyof typeof loads) => (loads[id].present ? typicalLoadVa(id, loads[id].amount, known.volts) : 0);
  const stripsHelpPump = loads.heatPump.present;
  const appliances = [];
  for (const { id, title } of applianceKinds) if (loads[id].present) appliances.push({ id, words: title, va: va(id) });
  return {
    edition,
    appliances,
    floorAreaFt2: known.floorAreaFt2,
    smallApplianceCircuits: SMALL_APPLIANCE_CIRCUITS,
    laundryCircuits: LAUNDRY_CIRCUITS,
    hvac: {
      coolingVa: va('centralAir'),
      heatPumpVa: va('heatPump'),
      supplementalHeatVa: stripsHelpPump ? va('stripHeat') : 0,
      centralHeatVa: stripsHelpPump ? 0 : va('stripHeat'),
      roomHeatersVa: va('roomHeaters'),
      roomHeaterCount: loads.roomHeaters.present ? (loads.roomHeaters.amount ?? USUAL_ROOM_HEATERS) : 0,
    },
    // The smallest of main and bus governs.
    serviceAmps: Math.min(known.mainBreakerAmps, known.busRatingAmps),
    volts: known.volts,
  };
}
