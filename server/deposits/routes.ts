import Stripe from 'stripe';
import * as endpoints from '../../shared/api/quotes';
import { makeLink } from '../auth/public-links';
import { bind, type Api } from '../http/bind';
import { problem } from '../http/problem';
import { handleEvent } from './handle-event';
import { readDeposit } from './read-deposit';
import { startDeposit } from './start-deposit';

/** Reads a signed event. @throws problem malformed when the signature is not the provider's, or is older than five minutes */
function readEvent(body: unknown, signature: string | undefined, secret: string): Stripe.Event {
  try {
    return Stripe.webhooks.constructEvent(Buffer.isBuffer(body) ? body : Buffer.alloc(0), signature ?? '', secret);
  } catch {
    throw problem('malformed', 'The signature does not fit this event.');
  }
}

export function depositRoutes(api: Api): void {
  const { deps } = api;
  const { env, models, clock, jobs, logger } = deps;

  bind(api, endpoints.startDeposit, async ({ intakeId, body }) => ({ checkoutUrl: await startDeposit(deps, { intakeId, ...body }) }), { limit: 'deposits' });

  bind(api, endpoints.getDeposit, ({ intakeId }) => readDeposit(deps, intakeId, async () => `${env.PUBLIC_URL}/my/${(await makeLink(models, 'my', intakeId, clock())).token}`));

  bind(api, endpoints.stripeWebhook, async ({ body, request }) => {
    if (env.STRIPE_WEBHOOK_SECRET === undefined) throw problem('not-found');
    const event = readEvent(body, request.get('Stripe-Signature'), env.STRIPE_WEBHOOK_SECRET);
    const result = await handleEvent(deps, event, clock());
    logger.info({ event: event.id, type: event.type, result }, 'payment event');
    jobs.nudge();
    return undefined;
  });
}
