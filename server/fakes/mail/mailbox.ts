import { randomUUID } from 'node:crypto';
import { mkdirSync, readdirSync, readFileSync, renameSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { simpleParser, type AddressObject } from 'mailparser';

export interface CaughtMail {
  readonly id: string;
  readonly to: readonly string[];
  readonly from: string;
  readonly subject: string;
  readonly text: string;
  readonly html: string;
  readonly messageId: string;
  readonly receivedAt: string;
  /** Header names in lower case. */
  readonly headers: Readonly<Record<string, string>>;
}

export interface Mailbox {
  /** Keeps a message as it came, and gives it read. */
  readonly keep: (raw: Buffer, envelopeTo: readonly string[]) => Promise<CaughtMail>;
  /** Newest first. */
  readonly list: () => readonly CaughtMail[];
}

const addressesOf = (to: AddressObject | AddressObject[] | undefined): string[] =>
  [to ?? []].flat().flatMap(({ value }) => value.flatMap(({ address }) => address ?? []));

async function read(id: string, receivedAt: string, raw: Buffer, envelopeTo: readonly string[]): Promise<CaughtMail> {
  const mail = await simpleParser(raw, { skipImageLinks: true });
  return {
    id, receivedAt,
    to: envelopeTo.length > 0 ? envelopeTo : addressesOf(mail.to),
    from: mail.from?.text ?? '', subject: mail.subject ?? '', text: mail.text ?? '', html: mail.html || '', messageId: mail.messageId ?? '',
    headers: Object.fromEntries(mail.headerLines.map(({ key, line }) => [key, line.slice(line.indexOf(':') + 1).trim()])),
  };
}

/** Mails kept in `dataDir`, one JSON file each, so that a restart keeps them. */
export function openMailbox(dataDir: string, clock: () => Date = () => new Date()): Mailbox {
  mkdirSync(dataDir, { recursive: true });
  const mails = readdirSync(dataDir).filter((name) => name.endsWith('.json')).map((name) => JSON.parse(readFileSync(join(dataDir, name), 'utf8')) as CaughtMail);
  const newestFirst = (one: CaughtMail, other: CaughtMail) => other.receivedAt.localeCompare(one.receivedAt);
  mails.sort(newestFirst);
  return {
    async keep(raw, envelopeTo) {
      const mail = await read(randomUUID(), clock().toISOString(), raw, envelopeTo);
      const file = join(dataDir, `${mail.id}.json`);
      writeFileSync(`${file}.new`, JSON.stringify(mail));
      renameSync(`${file}.new`, file);
      mails.unshift(mail);
      return mail;
    },
    list: () => mails,
  };
}
