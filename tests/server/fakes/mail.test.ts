import { mkdtempSync, rmSync } from 'node:fs';
import type { AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import request from 'supertest';
import { createMailApp } from '../../../server/fakes/mail/app';
import { openMailbox } from '../../../server/fakes/mail/mailbox';
import { createSmtpCatcher } from '../../../server/fakes/mail/smtp';
import { createMailer, mailIsRefused, messageIdFor, type Mailer } from '../../../server/mail/mailer';
import { button, caution, list, rows, text, type MailContent } from '../../../server/mail/content';

// The outside check: mailparser reads what nodemailer wrote (RFC 5322, RFC 2047, MIME).
const sender = { name: 'Alder & Finch Electric', phone: '555-0142', postalAddress: 'Demo address, 1 Example Lane, Harrow Bend', demo: true };
const content: MailContent = {
  subject: 'Your charger range, $1,640 – $2,080', title: 'Your answers are kept',
  blocks: [
    text('Hello Ione <b>Vasari</b> & co.'), rows(['Range', '$1,640\u00a0–\u00a0$2,080']), list(['One', 'Two']), caution('Never remove the metal cover of the panel.'),
    button('Open my answers', `http://127.0.0.1:4173/resume/${'a'.repeat(43)}`),
  ],
};

describe('a mail, sent by SMTP and caught', () => {
  const dataDir = mkdtempSync(join(tmpdir(), 'fake-mail-'));
  const mailbox = openMailbox(dataDir);
  const smtp = createSmtpCatcher(mailbox);
  let mailer: Mailer;

  beforeAll(async () => {
    await new Promise<void>((ready) => { smtp.listen(0, '127.0.0.1', ready); });
    mailer = createMailer(`smtp://127.0.0.1:${(smtp.server.address() as AddressInfo).port}`, 'Alder & Finch <office@example.com>', 'office@example.com', sender);
  });
  afterAll(async () => {
    mailer.close();
    await new Promise<void>((done) => { smtp.close(done); });
    rmSync(dataDir, { recursive: true });
  });

  it('arrives with subject, text, page, link in one piece and sender’s foot', async () => {
    const messageId = await mailer.send({ to: 'ione@example.com', content, dedupeKey: 'resume:1' });
    const [mail] = mailbox.list();
    expect(mail).toMatchObject({ to: ['ione@example.com'], subject: content.subject, messageId, from: '"Alder & Finch" <office@example.com>' });
    expect(mail?.headers['auto-submitted']).toBe('auto-generated');
    expect(mail?.text).toContain(`http://127.0.0.1:4173/resume/${'a'.repeat(43)}\n`);
    expect(mail?.text).toContain('Demo address, 1 Example Lane, Harrow Bend');
    expect(mail?.text).toContain('CAUTION. Never remove the metal cover of the panel.');
    expect(mail?.html).toContain('Hello Ione &lt;b&gt;Vasari&lt;/b&gt; &amp; co.');
    expect(mail?.html).toContain(`href="http://127.0.0.1:4173/resume/${'a'.repeat(43)}"`);
    expect(mail?.html).not.toMatch(/<(img|script|table|link)/);
  });

  it('carries the same Message-ID when it is sent again', async () => {
    const [one, other] = [await mailer.send({ to: 'a@example.com', content, dedupeKey: 'k' }), await mailer.send({ to: 'a@example.com', content, dedupeKey: 'k' })];
    expect(one).toBe(other);
    expect(messageIdFor('k', 'x@example.com')).toBe(one);
    expect(messageIdFor('other', 'x@example.com')).not.toBe(one);
  });

  it('tells a refusal for good from a server that is away or refuses the sign-in', async () => {
    const away = createMailer('smtp://127.0.0.1:1', 'a@example.com', 'a@example.com', sender);
    const error: unknown = await away.send({ to: 'a@example.com', content, dedupeKey: 'away' }).catch((caught: unknown) => caught);
    expect(error).toMatchObject({ code: 'ESOCKET' });
    expect(mailIsRefused(error)).toBe(false);
    // Codes as nodemailer gives them, replies of RFC 5321 (550) and RFC 4954 (535).
    expect(mailIsRefused(Object.assign(new Error(), { code: 'EENVELOPE', responseCode: 550 }))).toBe(true);
    expect(mailIsRefused(Object.assign(new Error(), { code: 'EENVELOPE', responseCode: 451 }))).toBe(false);
    expect(mailIsRefused(Object.assign(new Error(), { code: 'EAUTH', responseCode: 535 }))).toBe(false);
  });

  it('is listed as JSON and on pages, newest first, and is kept over a restart', async () => {
    const app = createMailApp(openMailbox(dataDir));
    const { body } = (await request(app).get('/mails').expect(200)) as { body: { id: string; subject: string }[] };
    expect(body).toHaveLength(3);
    expect((await request(app).get('/').expect(200)).text).toContain('Your charger range, $1,640 – $2,080');
    expect((await request(app).get(`/mails/${body[0]?.id}`).expect(200)).text).toContain(`<a href="http://127.0.0.1:4173/resume/${'a'.repeat(43)}">`);
    await request(app).get('/mails/none').expect(404);
  });
});
