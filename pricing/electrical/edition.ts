/** Editions of the NEC (NFPA 70) that the calculations are written for. A jurisdiction names its own. */
export type CodeEdition = '2020' | '2023';

/** The code, or the makers, do not allow what was asked; the message says why and what would do, in words for the desk. */
export class ElectricalError extends Error {
  override readonly name = 'ElectricalError';
}

/** Subjects whose clause moved between editions, and where each stands. */
const moved = {
  floorArea: { '2020': '220.12', '2023': '220.5(C)' },
  lightingDemand: { '2020': 'Table 220.42', '2023': 'Table 220.45' },
  evseLoad: { '2020': '625.42', '2023': '220.57' },
  energyManagement: { '2020': '625.42(A), 750.30', '2023': '220.70, 750.30' },
  busbar: { '2020': '705.12(B)(3)(2)', '2023': '705.12(B)(2)' },
  cover: { '2020': 'Table 300.5', '2023': 'Table 300.5(A)' },
} as const satisfies Record<string, Record<CodeEdition, string>>;

export type MovedClause = keyof typeof moved;

/** "NEC 2023 210.20(A)": a clause with the edition that it was read in. */
export const clause = (edition: CodeEdition, reference: string): string => `NEC ${edition} ${reference}`;

/** The clause of a subject that has another number in each edition, e.g. `NEC 2020 220.12`. */
export const clauseOf = (edition: CodeEdition, subject: MovedClause): string => clause(edition, moved[subject][edition]);

/**
 * Reads an edition's year.
 * @throws ElectricalError for 2026, whose load articles are renumbered and only known from summaries, and for any other year.
 */
export function parseEdition(year: string): CodeEdition {
  if (year === '2020' || year === '2023') return year;
  if (year === '2026') {
    throw new ElectricalError(
      'The 2026 NEC moved and changed the load calculation (Article 220 became 120). Its text has not been confirmed here, ' +
      'so no circuit is designed to it. Use 2020 or 2023 where the permit office allows, or calculate by hand from the adopted text.',
    );
  }
  throw new ElectricalError(`The ${year} NEC is not one of the editions that can be used here: 2020 and 2023.`);
}
