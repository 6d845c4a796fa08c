import { clauseOf, type CodeEdition } from './edition';

/** Least value of a charger in a load calculation of the 2023 edition, 220.57. */
const EVSE_FLOOR_VA = 7200;

/**
 * What a charger counts in a load calculation, in VA. NEC 2023 220.57: its nameplate or 7,200 VA, the larger. NEC 2020 has no floor:
 * the nameplate. An adjusted setting behind restricted access counts as the nameplate, 625.42(B); the floor of 2023 stays.
 */
export const evseVa = (edition: CodeEdition, nameplateVa: number): number =>
  edition === '2023' && nameplateVa > 0 ? Math.max(nameplateVa, EVSE_FLOOR_VA) : nameplateVa;

/** The clause that gives a charger's value: 625.42 (2020), 220.57 (2023). */
export const evseClause = (edition: CodeEdition): string => clauseOf(edition, 'evseLoad');
