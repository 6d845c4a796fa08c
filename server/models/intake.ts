import type { Sequelize } from 'sequelize';
import type { Intake as IntakeSeen } from '../../shared/api/intakes';
import { column, table, type Row } from './table';

export type IntakeStage = IntakeSeen['stage'];
export interface IntakeColumns {
  id: string;
  /** Grows with every saved answer. */
  version: number;
  answers: Record<string, unknown>;
  /** Town of the ZIP; null: not served or not answered. */
  jurisdictionId: string | null;
  stage: IntakeStage;
  /** Where the link to finish later was sent. */
  email: string | null;
  /** The first step with something left to ask. */
  currentStep: string | null;
  createdAt: Date;
  updatedAt: Date;
}
type Given = keyof IntakeColumns;
export type Intake = Row<IntakeColumns, Given>;

/** A homeowner's answers. The column `zip` is generated from them by the database. */
export const defineIntake = (sequelize: Sequelize) => table<IntakeColumns, Given>(sequelize, 'intakes', {
  id: column.id, version: { ...column.integer, defaultValue: 1 }, answers: { ...column.json, defaultValue: {} },
  jurisdictionId: column.text, stage: { ...column.text, defaultValue: 'open' }, email: column.text, currentStep: column.text, createdAt: column.now, updatedAt: column.now,
});
