import type { Transaction } from 'sequelize';
import { addTask } from '../jobs/outbox';
import type { Db } from '../models/db';

export const mailTemplates = ['resume-link', 'receipt', 'visit-asked', 'new-lead'] as const;
export type MailTemplate = (typeof mailTemplates)[number];

export interface MailToQueue {
  readonly template: MailTemplate;
  /** Says which mail this is; a second one with the same key is never sent. */
  readonly dedupeKey: string;
  readonly intakeId: string;
  /** Null for mails of an intake that is no lead yet. */
  readonly leadId: string | null;
}

/** Writes down, in the transaction of the change, that a mail is to be sent. What it says is read when it is sent. */
export async function queueMail(db: Db, transaction: Transaction, mail: MailToQueue): Promise<void> {
  const known = await db.models.Mail.findOne({ where: { dedupeKey: mail.dedupeKey }, transaction });
  if (known) return;
  const { id: mailId } = await db.models.Mail.create(mail, { transaction });
  await addTask(db, transaction, 'send-mail', `mail:${mail.dedupeKey}`, { mailId });
}
