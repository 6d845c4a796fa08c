import { SMTPServer } from 'smtp-server';
import type { Mailbox } from './mailbox';

const LARGEST_MAIL_BYTES = 5_000_000;

/** An SMTP server that takes every mail, sends none on, and keeps it in the mailbox. Not listening yet. */
export function createSmtpCatcher(mailbox: Mailbox): SMTPServer {
  return new SMTPServer({
    authOptional: true,
    disabledCommands: ['STARTTLS'],
    disableReverseLookup: true,
    size: LARGEST_MAIL_BYTES,
    onData(stream, session, done) {
      const parts: Buffer[] = [];
      stream.on('data', (part: Buffer) => parts.push(part));
      stream.on('error', done);
      stream.on('end', () => {
        if (stream.sizeExceeded) { done(Object.assign(new Error('Message too large'), { responseCode: 552 })); return; }
        const to = session.envelope.rcptTo.map(({ address }) => address);
        mailbox.keep(Buffer.concat(parts), to).then(() => done(), done);
      });
    },
  });
}
