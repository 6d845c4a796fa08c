import express, { type Express } from 'express';
import type { Mailbox } from './mailbox';
import { listPage, mailPage } from './page';

/** Shows what was caught: a list and each mail as pages, and all of it as JSON under /mails. */
export function createMailApp(mailbox: Mailbox): Express {
  const app = express().disable('x-powered-by');
  app.use((_request, response, next) => {
    response.set({ 'Cache-Control': 'no-store', 'Content-Security-Policy': "default-src 'none'; style-src 'unsafe-inline'; frame-src 'self'", 'Referrer-Policy': 'no-referrer' });
    next();
  });
  app.get('/', (_request, response) => { response.send(listPage(mailbox.list())); });
  app.get('/health', (_request, response) => { response.json({ status: 'ok' }); });
  app.get('/mails', (_request, response) => { response.json(mailbox.list()); });
  app.get(['/mails/:id', '/mails/:id/:form'], (request, response) => {
    const mail = mailbox.list().find(({ id }) => id === request.params.id);
    if (!mail) { response.status(404).send('There is no such mail'); return; }
    response.send(request.params.form === 'html' ? mail.html : mailPage(mail));
  });
  return app;
}
