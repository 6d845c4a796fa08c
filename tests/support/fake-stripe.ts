import { mkdtempSync, rmSync } from 'node:fs';
import type { AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type Stripe from 'stripe';
import { createFakeStripe } from '../../server/fakes/stripe/app';
import { createStripe } from '../../server/payments/stripe';

export const WEBHOOK_SECRET = 'whsec_test_of_the_tests';

export interface FakeStripeServer {
  readonly url: string;
  readonly stripe: Stripe;
  /** Where events go; none are sent before this is set. */
  readonly sendEventsTo: (url: string | null) => void;
  /** Sends the form of the payment page as a browser without scripts does; gives where it is sent on to. */
  readonly pay: (checkoutUrl: string, cardNumber: string) => Promise<string>;
  readonly setMode: (mode: { down?: boolean; hold?: boolean }) => Promise<void>;
  /** Sends an event again; gives the statuses of the answers. */
  readonly resend: (eventId: string, options?: { times?: number; ageSeconds?: number; secret?: string }) => Promise<number[]>;
  readonly close: () => Promise<void>;
}

/** The practice payment provider on a free port, with its state in a folder that is removed at the end unless one is given. */
export async function startFakeStripe(givenDir?: string): Promise<FakeStripeServer> {
  const dataDir = givenDir ?? mkdtempSync(join(tmpdir(), 'fake-stripe-'));
  let target: string | null = null;
  const fake = createFakeStripe({ dataDir, webhookTarget: () => (target === null ? null : { url: target, secret: WEBHOOK_SECRET }) });
  const server = fake.app.listen(0, '127.0.0.1');
  await new Promise((ready) => server.once('listening', ready));
  const url = `http://127.0.0.1:${(server.address() as AddressInfo).port}`;
  const send = (path: string, method: string, body: unknown) =>
    fetch(`${url}${path}`, { method, headers: { 'content-type': 'application/json' }, body: JSON.stringify(body) });
  return {
    url,
    stripe: createStripe({ secretKey: 'sk_test_tests', apiBase: url }),
    sendEventsTo: (to) => { target = to; },
    async pay(checkoutUrl, cardNumber) {
      const response = await fetch(checkoutUrl, { method: 'POST', redirect: 'manual', body: new URLSearchParams({ card: cardNumber }) });
      return response.headers.get('location') ?? '';
    },
    setMode: async (mode) => { await send('/test/mode', 'PUT', mode); },
    async resend(eventId, options = {}) {
      const response = await send(`/test/events/${eventId}/send`, 'POST', options);
      return ((await response.json()) as { statuses: number[] }).statuses;
    },
    async close() {
      fake.stop();
      server.closeAllConnections();
      await new Promise((done) => server.close(done));
      if (givenDir === undefined) rmSync(dataDir, { recursive: true, force: true });
    },
  };
}
