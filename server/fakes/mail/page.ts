import { escapeHtml } from '../../mail/escape-html';
import type { CaughtMail } from './mailbox';

const style = `
  body { margin: 0; background: #F5EFE2; color: #12302A; font: 400 16px/1.5 system-ui, sans-serif; }
  main { max-width: 46rem; margin: 0 auto; padding: 1.5rem; }
  li { border-top: 1px solid #DACFB9; padding: .75rem 0; } ul { list-style: none; padding: 0; }
  a { color: #2B5B7A; } pre { white-space: pre-wrap; overflow-wrap: anywhere; background: #FFFCF5; padding: 1rem; }
  iframe { width: 100%; height: 40rem; border: 1px solid #857A66; background: #fff; }`;

const page = (title: string, body: string) => `<!doctype html>
<html lang="en-US"><head><meta charset="utf-8"><meta name="viewport" content="width=device-width, initial-scale=1"><title>${escapeHtml(title)}</title><style>${style}</style></head><body><main>${body}</main></body></html>`;

export const listPage = (mails: readonly CaughtMail[]): string =>
  page('Caught mail', `<h1>Caught mail</h1><p>Nothing here was sent to anyone.</p>${mails.length === 0 ? '<p>No mail yet.</p>' : ''}
<ul>${mails.map((mail) => `<li><a href="/mails/${mail.id}">${escapeHtml(mail.subject)}</a><br>to ${escapeHtml(mail.to.join(', '))}, ${escapeHtml(mail.receivedAt)}</li>`).join('')}</ul>`);

export const mailPage = (mail: CaughtMail): string =>
  page(mail.subject, `<p><a href="/">All mail</a></p><h1>${escapeHtml(mail.subject)}</h1>
<p>From ${escapeHtml(mail.from)}<br>To ${escapeHtml(mail.to.join(', '))}<br>${escapeHtml(mail.receivedAt)}</p>
<h2>As text</h2><pre>${escapeHtml(mail.text).replace(/https?:\/\/[^\s<]+/g, (url) => `<a href="${url}">${url}</a>`)}</pre>
<h2>As a page</h2><iframe title="The mail as a page" src="/mails/${mail.id}/html" sandbox="allow-popups allow-top-navigation-by-user-activation"></iframe>`);
