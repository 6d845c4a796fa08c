import { dollars } from '../../../shared/money';
import { escapeHtml } from '../../mail/escape-html';
import type { StoredSession } from './state';

const style = `
  body { margin: 0; background: #ECE4D3; color: #12302A; font: 400 17px/1.5 system-ui, sans-serif; }
  main { max-width: 30rem; margin: 0 auto; padding: 1.5rem; }
  .note { background: #12302A; color: #F5EFE2; margin: 0; padding: .75rem 1.5rem; text-align: center; font-weight: 700; }
  .refused { background: #FADFDA; color: #12302A; border-left: .375rem solid #A1272B; padding: .75rem 1rem; }
  label, dt { font-weight: 700; } dd { margin: 0 0 .75rem; }
  input { display: block; box-sizing: border-box; width: 100%; min-height: 3rem; margin: .25rem 0 1rem; padding: 0 .75rem; font: inherit; border: 2px solid #857A66; border-radius: .5rem; background: #fff; color: inherit; }
  button { width: 100%; min-height: 3.25rem; font: inherit; font-weight: 800; border: 0; border-radius: .5rem; background: #12302A; color: #F5EFE2; cursor: pointer; }
  a { display: inline-block; padding: .7rem 0; color: #2B5B7A; }
  :focus-visible { outline: 3px solid #2B5B7A; outline-offset: 2px; }`;

const page = (title: string, body: string) => `<!doctype html>
<html lang="en-US"><head><meta charset="utf-8"><meta name="viewport" content="width=device-width, initial-scale=1"><title>${title}</title><style>${style}</style></head>
<body><header class="note">Practice payment page. No card is charged.</header><main>${body}</main></body></html>`;

/** The page of one session: what is paid and a field for the card; or that it is over. Works without scripts. */
export function payPage({ session, lineName, refusal }: StoredSession): string {
  const back = session.cancel_url === null ? '' : `<p><a href="${escapeHtml(session.cancel_url)}">Cancel and go back</a></p>`;
  if (session.status === 'expired') return page('This payment page has run out', `<h1>This payment page has run out</h1><p>Nothing was taken. Go back and start the payment once more.</p>${back}`);
  if (session.status === 'complete') {
    return page('Already paid', `<h1>Already paid</h1><p>Nothing more is taken.</p><p><a href="${escapeHtml(session.success_url ?? '')}">Go on</a></p>`);
  }
  const amount = dollars(session.amount_total ?? 0);
  return page(refusal === null ? `Pay ${amount}` : `Not paid: ${refusal}`, `
<h1>Pay ${amount}</h1>
<dl><dt>For</dt><dd>${escapeHtml(lineName)}</dd>${session.customer_email === null ? '' : `<dt>E-mail</dt><dd>${escapeHtml(session.customer_email)}</dd>`}</dl>
${refusal === null ? '' : `<p class="refused" id="refused" role="alert">${escapeHtml(refusal)}</p>`}
<form method="post" action="/pay/${session.id}">
<label for="card">Card number</label>
<input id="card" name="card" inputmode="numeric" autocomplete="off" required maxlength="23"${refusal === null ? '' : ' aria-describedby="refused" aria-invalid="true"'}>
<button type="submit">Pay ${amount}</button>
</form>${back}
<h2>Practice cards</h2>
<dl><dt>4242 4242 4242 4242</dt><dd>is paid</dd><dt>4000 0000 0000 0002</dt><dd>is declined</dd><dt>4000 0000 0000 0341</dt><dd>needs a second try</dd></dl>`);
}

export const noSuchPage = (): string => page('No such payment page', '<h1>There is no such payment page</h1>');
