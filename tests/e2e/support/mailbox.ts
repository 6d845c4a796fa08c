import { expect } from '@playwright/test';
import { product } from './product';

export interface Mail {
  readonly to: readonly string[];
  readonly subject: string;
  readonly text: string;
  readonly html: string;
}

/** The mails caught so far for one address, newest first. */
export async function mailsFor(address: string): Promise<readonly Mail[]> {
  const response = await fetch(`${product.mailUrl}/mails`);
  return ((await response.json()) as Mail[]).filter((mail) => mail.to.includes(address));
}

/** Waits for a mail to an address whose subject fits. */
export async function waitForMail(address: string, subject: RegExp): Promise<Mail> {
  let found: Mail | undefined;
  await expect.poll(async () => {
    found = (await mailsFor(address)).find((mail) => subject.test(mail.subject));
    return found?.subject ?? null;
  }, { message: `a mail to ${address} with ${subject}`, timeout: 20_000 }).toMatch(subject);
  if (!found) throw new Error('unreachable: the poll above has found it');
  return found;
}

/** The first link in a mail's text that leads to `path` of the site. */
export function linkIn({ text }: Mail, path: string): string {
  const url = text.match(/https?:\/\/[^\s<>"]+/g)?.find((link) => new URL(link).pathname.startsWith(path));
  if (url === undefined) throw new Error(`The mail has no link to ${path}:\n${text}`);
  return url;
}
