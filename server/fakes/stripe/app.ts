import express, { type Express } from 'express';
import Stripe from 'stripe';
import { apiRoutes } from './api';
import { controlRoutes } from './control';
import { payRoutes } from './pay-routes';
import { expireOverdue, type Provider } from './settle';
import { openStore } from './state';
import { startWebhooks, type WebhookTarget } from './webhooks';

export interface FakeStripeOptions {
  readonly dataDir: string;
  /** Where events go; null while the server is not up yet. */
  readonly webhookTarget: () => WebhookTarget | null;
  readonly clock?: () => Date;
}
export interface FakeStripe { readonly app: Express; readonly stop: () => void }

/** The payment provider's stand-in: the calls that we use under /v1, its payment page under /pay, controls for tests under /test. */
export function createFakeStripe({ dataDir, webhookTarget, clock = () => new Date() }: FakeStripeOptions): FakeStripe {
  const store = openStore(dataDir);
  const webhooks = startWebhooks(store, webhookTarget, clock, Stripe.API_VERSION);
  const provider: Provider = { store, webhooks, clock };
  let down = false;
  const app = express().disable('x-powered-by');
  app.get('/health', (_request, response) => { response.json({ status: 'ok' }); });
  app.use('/v1', apiRoutes(provider, () => down));
  app.use('/pay', payRoutes(provider));
  app.use('/test', controlRoutes(provider, (value) => { down = value; }));
  const sweep = setInterval(() => expireOverdue(provider), 30_000);
  return {
    app,
    stop() {
      clearInterval(sweep);
      webhooks.stop();
      store.save();
    },
  };
}
