import type { Sequelize } from 'sequelize';
import { column, table, type Row } from './table';

export interface MailColumns {
  id: string;
  dedupeKey: string;
  template: string;
  intakeId: string | null;
  leadId: string | null;
  state: 'queued' | 'sent' | 'failed';
  messageId: string | null;
  attempts: number;
  createdAt: Date;
  sentAt: Date | null;
}
type Given = 'id' | 'intakeId' | 'leadId' | 'state' | 'messageId' | 'attempts' | 'createdAt' | 'sentAt';
export type Mail = Row<MailColumns, Given>;

/** Mails to send and sent; what they say is made from the facts when they go. */
export const defineMail = (sequelize: Sequelize) => table<MailColumns, Given>(sequelize, 'mails', {
  id: column.id, dedupeKey: column.text, template: column.text, intakeId: column.uuid, leadId: column.uuid,
  state: { ...column.text, defaultValue: 'queued' }, messageId: column.text, attempts: { ...column.integer, defaultValue: 0 }, createdAt: column.now, sentAt: column.time,
});
