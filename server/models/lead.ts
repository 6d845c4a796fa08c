import type { Sequelize } from 'sequelize';
import type { LeadStage } from '../../shared/api/desk';
import type { Contact } from '../../shared/api/intakes';
import { column, table, type Row } from './table';

export interface LeadColumns {
  id: string;
  /** From 1001 on, given by the database. */
  jobNumber: number;
  intakeId: string;
  quoteId: string | null;
  optionId: string | null;
  depositId: string | null;
  name: string;
  email: string;
  phone: string | null;
  street: string;
  town: string;
  /** "Wall charger, 60 A" */
  work: string;
  /** "32 ft, EMT" */
  workNote: string;
  contactWays: Contact['contactWays'];
  consentAt: Date;
  consentWords: string;
  stage: LeadStage;
  /** Grows with every change; ETag and If-Match carry it. */
  version: number;
  dueAt: Date | null;
  assigneeId: string | null;
  lowCents: number | null;
  highCents: number | null;
  firmCents: number | null;
  createdAt: Date;
  updatedAt: Date;
}
type Given =
  | 'id' | 'jobNumber' | 'quoteId' | 'optionId' | 'depositId' | 'phone' | 'version' | 'dueAt' | 'assigneeId'
  | 'lowCents' | 'highCents' | 'firmCents' | 'createdAt' | 'updatedAt';
export type Lead = Row<LeadColumns, Given>;

/**
 * Jobs at the desk. The database also keeps the generated columns `search`, `sort_due_at`, `sort_name` and `sort_cents`,
 * which lists read in SQL and nobody writes.
 */
export const defineLead = (sequelize: Sequelize) => table<LeadColumns, Given>(sequelize, 'leads', {
  id: column.id, jobNumber: { ...column.integer, defaultValue: sequelize.literal(`nextval('lead_job_numbers')`) }, intakeId: column.uuid, quoteId: column.uuid,
  optionId: column.text, depositId: column.uuid, name: column.text, email: column.text,
  phone: column.text, street: column.text, town: column.text,
  work: column.text, workNote: column.text, contactWays: column.texts, consentAt: column.time, consentWords: column.text,
  stage: column.text,
  version: { ...column.integer, defaultValue: 1 }, dueAt: column.time, assigneeId: column.uuid,
  lowCents: column.integer, highCents: column.integer,
  firmCents: column.integer, createdAt: column.now, updatedAt: column.now,
});
