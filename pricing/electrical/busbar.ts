import { clauseOf, type CodeEdition } from './edition';
import { tidy } from './trace';

export interface BusbarInput {
  readonly edition: CodeEdition;
  readonly busAmps: number;
  readonly mainAmps: number;
  /** Continuous output of the inverters; its 125 % is compared. Of the breaker alone, 80 %. 0 without solar. */
  readonly inverterAmps: number;
}

export interface BusbarVerdict {
  readonly maxBackfeedAmps: number;
  readonly neededAmps: number;
  readonly fits: boolean;
  readonly clause: string;
}

/**
 * The 120 % rule of a panel that solar feeds from the far end of the bus: main plus 125 % of the inverters within 120 % of the bus.
 * A charger's breaker is a load and does not count. NEC 2020 705.12(B)(3)(2), 2023 705.12(B)(2).
 */
export function busbarVerdict({ edition, busAmps, mainAmps, inverterAmps }: BusbarInput): BusbarVerdict {
  const maxBackfeedAmps = Math.max(0, tidy(busAmps * 1.2 - mainAmps));
  const neededAmps = tidy(inverterAmps * 1.25);
  return { maxBackfeedAmps, neededAmps, fits: neededAmps <= maxBackfeedAmps, clause: clauseOf(edition, 'busbar') };
}
