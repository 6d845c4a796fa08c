import { DataTypes, type Sequelize } from 'sequelize';
import { column, table, type Row } from './table';

export interface HistoryColumns {
  /** A 64 bit number as text. */
  id: string;
  leadId: string | null;
  intakeId: string | null;
  at: Date;
  staffId: string | null;
  /** Who, in words: a name of the staff, "Homeowner", "Tidyrun". */
  who: string;
  what: string;
  before: string | null;
  after: string | null;
}
type Given = 'id' | 'leadId' | 'intakeId' | 'at' | 'staffId' | 'before' | 'after';
export type History = Row<HistoryColumns, Given>;

/** What happened, when and by whom. The database refuses any change or removal. */
export const defineHistory = (sequelize: Sequelize) => table<HistoryColumns, Given>(sequelize, 'history', {
  id: { type: DataTypes.BIGINT, primaryKey: true, autoIncrement: true },
  leadId: column.uuid, intakeId: column.uuid, at: column.now, staffId: column.uuid,
  who: column.text, what: column.text, before: column.text, after: column.text,
});
