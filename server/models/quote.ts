import type { Sequelize } from 'sequelize';
import type { QuoteDocument } from '../../shared/quote';
import { column, table, type Row } from './table';

export interface QuoteColumns {
  id: string;
  intakeId: string;
  intakeVersion: number;
  /** SHA-256 of what was priced: the same answers, edition and day give the same document back. */
  inputHash: string;
  /** The quote document as JSON, frozen word for word. */
  document: string;
  outcome: QuoteDocument['outcome'];
  rulebookEdition: number;
  /** Of the recommended option; null for a visit. */
  lowCents: number | null;
  highCents: number | null;
  createdAt: Date;
  withdrawnAt: Date | null;
}
type Given = 'id' | 'createdAt' | 'withdrawnAt';
export type Quote = Row<QuoteColumns, Given>;

/** Frozen prices; at most one of an intake stands. */
export const defineQuote = (sequelize: Sequelize) => table<QuoteColumns, Given>(sequelize, 'quotes', {
  id: column.id, intakeId: column.uuid, intakeVersion: column.integer, inputHash: column.text, document: column.text, outcome: column.text,
  rulebookEdition: column.integer, lowCents: column.integer, highCents: column.integer, createdAt: column.now, withdrawnAt: column.time,
});
