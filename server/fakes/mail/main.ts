import { z } from '../../../shared/zod';
import { createMailApp } from './app';
import { openMailbox } from './mailbox';
import { createSmtpCatcher } from './smtp';

const port = z.coerce.number().int().min(0).max(65_535);
const env = z.object({ FAKE_SMTP_PORT: port, FAKE_MAIL_HTTP_PORT: port, FAKE_MAIL_DATA_DIR: z.string().min(1) }).parse(process.env);

const mailbox = openMailbox(env.FAKE_MAIL_DATA_DIR);
const smtp = createSmtpCatcher(mailbox);
const server = createMailApp(mailbox).listen(env.FAKE_MAIL_HTTP_PORT, '127.0.0.1', () => console.log(`Caught mail on 127.0.0.1:${env.FAKE_MAIL_HTTP_PORT}`));
smtp.listen(env.FAKE_SMTP_PORT, '127.0.0.1');
const fail = (error: Error) => {
  console.error(error.message);
  process.exit(1);
};
server.once('error', fail);
smtp.once('error', (error) => {
  // Only an error before it listens is the end; a client that hangs up later is not.
  if (!smtp.server.listening) fail(error);
});
smtp.on('error', (error) => console.error(error.message));
for (const signal of ['SIGTERM', 'SIGINT'] as const) {
  process.once(signal, () => {
    smtp.close();
    server.close(() => process.exit(0));
    server.closeAllConnections();
  });
}
