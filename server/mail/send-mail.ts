import type { Db } from '../models/db';
import type { Mail } from '../models/mail';
import type { MailContent } from './content';
import { mailIsRefused, type Mailer } from './mailer';

/** Reads what a mail says and to whom; null when there is nobody to write to any more. */
export type Compose = (mail: Mail) => Promise<{ to: string; content: MailContent } | null>;

/**
 * Sends one queued mail. The row is locked while it is sent, so that two workers never send it both; it is marked sent in the same
 * transaction. Only a crash between the SMTP server's acceptance and our commit can send it again; see messageIdFor.
 * @throws when the SMTP server is away, with no word of the mail or its address, so that the job is tried again
 */
export async function sendMail({ sequelize, models }: Db, mailer: Mailer, compose: Compose, mailId: string): Promise<void> {
  const failure = await sequelize.transaction(async (transaction) => {
    const mail = await models.Mail.findOne({ where: { id: mailId, state: 'queued' }, transaction, lock: transaction.LOCK.UPDATE });
    if (!mail) return null;
    const attempts = mail.attempts + 1;
    const composed = await compose(mail);
    if (!composed) {
      await mail.update({ state: 'failed', attempts }, { transaction });
      return null;
    }
    try {
      const messageId = await mailer.send({ ...composed, dedupeKey: mail.dedupeKey });
      await mail.update({ state: 'sent', messageId, sentAt: new Date(), attempts }, { transaction });
      return null;
    } catch (error) {
      const refused = mailIsRefused(error);
      await mail.update({ state: refused ? 'failed' : 'queued', attempts }, { transaction });
      // The client's own words may hold the address; only its code goes to the job's record and the log.
      return refused ? null : String((error as { code?: unknown }).code ?? 'unknown');
    }
  });
  if (failure !== null) throw new Error(`The mail server is away: ${failure}`);
}
