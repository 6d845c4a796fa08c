import { CIRCUIT_VA, LIGHTING_VA_PER_FT2, type DwellingLoads } from './dwelling-loads';
import { clause, clauseOf, type CodeEdition } from './edition';
import { evseClause } from './evse-load';
import { EXISTING_FIRST_TIER_VA, largerSeasonVa, load22083B, type ExistingLoad, type Seasons } from './load-220-83';
import type { MeasuredDemand, MeasuredLoad } from './load-220-87';
import { isCharger, type PracticeId, type SortedLoads } from './load-practice';
import type { SheetLine } from './trace';

type Season = 'cooling' | 'heating';

const TOTAL = 'Calculated load';
const newChargerLabel = (chargingAmps: number): string => `New charger, ${chargingAmps} A`;
const MAIN_NOT_RATED = 'the main breaker is not rated for continuous load';

/** Every figure of 220.83 by one practice, in the order of the calculation, subtotals and total included. NEC 2020 and 2023. */
export function practiceSheet(
  practice: PracticeId, sorted: SortedLoads, chargingAmps: number, newEvseVa: number, load: ExistingLoad,
): SheetLine[] {
  const { loads, seasons, otherVa, existingEvseVa } = sorted;
  const { edition } = loads;
  const chargers = chargerLines(loads, existingEvseVa, chargingAmps, newEvseVa);
  const pooled = practice !== 'hvac_and_ev_at_100';
  const inPool = pooled ? existingEvseVa + newEvseVa : 0;
  const season = practice === 'all_in_pool' ? seasonOf(seasons) : load22083B(edition, otherVa + inPool, seasons, 0, loads.volts).season;
  const hvac = hvacLines(edition, season, seasons, practice === 'all_in_pool');
  const connectedVa = otherVa + inPool + hvac.pool.reduce((sum, line) => sum + line.va, 0);
  const fullVa = hvac.full.reduce((sum, line) => sum + line.va, 0) + (pooled ? 0 : existingEvseVa + newEvseVa);
  const firstVa = Math.min(connectedVa, EXISTING_FIRST_TIER_VA);
  const restVa = 0.4 * (connectedVa - firstVa);
  const extraVa = load.calculatedVa - fullVa - firstVa - restVa;

  return [
    ...generalLines(loads),
    ...hvac.pool,
    ...(pooled ? chargers : []),
    { label: 'These together, as connected', va: connectedVa, clause: load.clause },
    { label: 'First 8,000 VA in full', va: firstVa, clause: load.clause },
    { label: 'The rest at 40 %', va: restVa, clause: load.clause },
    ...hvac.full,
    ...(pooled ? [] : chargers),
    ...(extraVa > 0.5 ? [{ label: 'A quarter of the charger more', va: extraVa, clause: 'office practice', note: MAIN_NOT_RATED }] : []),
    { label: TOTAL, va: load.calculatedVa, clause: load.clause },
  ];
}

function generalLines({ edition, floorAreaFt2, smallApplianceCircuits, laundryCircuits, appliances }: DwellingLoads): SheetLine[] {
  const circuits = (label: string, count: number, reference: string): SheetLine =>
    ({ label, va: count * CIRCUIT_VA, clause: clause(edition, reference), note: `${count} at 1,500 VA` });
  const lines: SheetLine[] = [
    {
      label: 'Lighting and outlets', va: floorAreaFt2 * LIGHTING_VA_PER_FT2, clause: clauseOf(edition, 'floorArea'),
      note: `${floorAreaFt2} sq ft at 3 VA`,
    },
    circuits('Kitchen circuits', smallApplianceCircuits, '220.52(A)'),
    circuits('Laundry circuit', laundryCircuits, '220.52(B)'),
  ];
  for (const { id, words, va } of appliances) if (!isCharger(id)) lines.push({ label: words, va, clause: clause(edition, '220.83(A)') });
  return lines;
}

function chargerLines({ edition, volts, appliances }: DwellingLoads, existingVa: number, chargingAmps: number, newVa: number): SheetLine[] {
  const line = (label: string, va: number, ratedVa: number): SheetLine =>
    ({ label, va, clause: evseClause(edition), ...(va > ratedVa ? { note: 'counts at least 7,200 VA' } : {}) });
  const there = appliances.filter(({ id }) => isCharger(id));
  const lines = there.length === 0 ? [] : [line('Charger that is there', existingVa, there.reduce((sum, { va }) => sum + va, 0))];
  if (newVa > 0) lines.push(line(newChargerLabel(chargingAmps), newVa, chargingAmps * volts));
  return lines;
}

const seasonOf = ({ coolingVa, heatingVa, pooledHeatVa }: Seasons): Season =>
  (heatingVa + pooledHeatVa > coolingVa ? 'heating' : 'cooling');

function hvacLines(edition: CodeEdition, season: Season, seasons: Seasons, allInPool: boolean): { pool: SheetLine[]; full: SheetLine[] } {
  const label = season === 'heating' ? 'Heating' : 'Cooling';
  const note = 'the larger of heating and cooling counts';
  if (allInPool) {
    const va = largerSeasonVa(seasons);
    return { pool: va > 0 ? [{ label, va, clause: clause(edition, '220.60'), note }] : [], full: [] };
  }
  const fullVa = season === 'heating' ? seasons.heatingVa : seasons.coolingVa;
  const reference = clause(edition, '220.83(B)');
  const pooledVa = season === 'heating' ? seasons.pooledHeatVa : 0;
  return {
    pool: pooledVa > 0 ? [{ label: 'Room heaters, four or more', va: pooledVa, clause: reference }] : [],
    full: fullVa > 0 ? [{ label: `${label} in full`, va: fullVa, clause: reference, note }] : [],
  };
}

/**
 * A sheet with the charger in full, turned into one with a load manager: of the charger only what the manager permits beside the home's
 * peak counts. NEC 2020 and 2023 625.42(A).
 * @param sheet by the practice that counts the charger whole, outside of the tiers.
 */
export function managedSheet(edition: CodeEdition, sheet: readonly SheetLine[], chargingAmps: number, permittedVa: number): SheetLine[] {
  const charger = newChargerLabel(chargingAmps);
  const fullVa = sheet.find(({ label }) => label === charger)?.va ?? 0;
  return sheet.map((line) => {
    if (line.label === charger) {
      return { label: charger, va: permittedVa, clause: clause(edition, '625.42(A)'), note: 'what the load manager permits at the home’s peak' };
    }
    return line.label === TOTAL ? { ...line, va: line.va - fullVa + permittedVa } : line;
  });
}

/** Every figure of 220.87: the measured peak, its 125 %, the season by the exception, the charger. NEC 2020 and 2023. */
export function measuredSheet(edition: CodeEdition, demand: MeasuredDemand, load: MeasuredLoad, chargingAmps: number): SheetLine[] {
  const seasonalVa = demand.recorder && demand.days < 365 ? demand.recorder.seasonalVa : 0;
  const minutes = Math.round(demand.intervalSeconds / 60);
  return [
    { label: 'Highest measured demand', va: demand.peakW, clause: load.clause, note: `${demand.days} days of ${minutes}-minute readings` },
    { label: '125 % of it', va: load.existingVa - seasonalVa, clause: load.clause },
    ...(seasonalVa > 0 ? [{ label: 'Heating or cooling that did not run', va: seasonalVa, clause: load.clause }] : []),
    { label: newChargerLabel(chargingAmps), va: load.calculatedVa - load.existingVa, clause: evseClause(edition) },
    { label: TOTAL, va: load.calculatedVa, clause: load.clause },
  ];
}
