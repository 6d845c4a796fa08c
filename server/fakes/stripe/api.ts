import { Router, urlencoded } from 'express';
import type Stripe from 'stripe';
import { z } from '../../../shared/zod';
import { apiErrors, missing, refuse } from './api-error';
import { idempotency } from './idempotency';
import { makeRefund } from './make-payment';
import { makeSession } from './make-session';
import { readSessionParams } from './session-params';
import { expireOverdue, expireSession, type Provider } from './settle';
import { newId, seconds, type StoredSession } from './state';

const refundSchema = z.strictObject({
  payment_intent: z.string(),
  amount: z.coerce.number().int().positive().optional(),
  reason: z.enum(['duplicate', 'fraudulent', 'requested_by_customer']).optional(),
  metadata: z.record(z.string(), z.string()).optional(),
});
const listSchema = z.object({
  limit: z.coerce.number().int().min(1).max(100).default(10),
  type: z.string().optional(),
  starting_after: z.string().optional(),
});

/** The calls of the provider's API that we use, with its shapes and status codes. `isDown` makes it fail as a provider that is away. */
export function apiRoutes(provider: Provider, isDown: () => boolean): Router {
  const { store, webhooks, clock } = provider;
  const { state, save } = store;
  const router = Router();

  router.use((request, response, next) => {
    if (isDown()) throw refuse(503, { type: 'api_error', message: 'The practice provider is switched off.' });
    response.set('Request-Id', newId('req_'));
    const key = /^Bearer (\S+)$/.exec(request.get('authorization') ?? '')?.[1];
    if (key === undefined) throw refuse(401, { message: 'You did not provide an API key.' });
    if (!/^[sr]k_test_\w+$/.test(key)) throw refuse(401, { message: 'Invalid API Key provided. Only test keys work here.' });
    expireOverdue(provider);
    next();
  });
  router.use(urlencoded({ extended: true, limit: '200kb' }), idempotency(store));

  const sessionOf = (id: string): StoredSession => {
    const stored = state.sessions[id];
    if (!stored) throw missing('checkout.session', id, 'session');
    return stored;
  };

  router.post('/checkout/sessions', (request, response) => {
    const params = readSessionParams(request.body, seconds(clock()));
    const stored = makeSession(params, `${request.protocol}://${request.get('host') ?? ''}`, clock());
    state.sessions[stored.session.id] = stored;
    save();
    response.json(stored.session);
  });
  router.get('/checkout/sessions/:id', (request, response) => {
    response.json(sessionOf(request.params.id).session);
  });
  router.post('/checkout/sessions/:id/expire', (request, response) => {
    const stored = sessionOf(request.params.id);
    if (stored.session.status !== 'open') {
      throw refuse(400, { message: `Only Checkout Sessions with a status in ["open"] can be expired. This Checkout Session has a status of \`${stored.session.status ?? ''}\`.` });
    }
    expireSession(provider, stored);
    response.json(stored.session);
  });
  router.get('/payment_intents/:id', (request, response) => {
    const intent = state.paymentIntents[request.params.id];
    if (!intent) throw missing('payment_intent', request.params.id, 'intent');
    response.json(intent);
  });
  router.post('/refunds', (request, response) => {
    const params = refundSchema.safeParse(request.body);
    if (!params.success) throw refuse(400, { message: params.error.issues[0]?.message ?? 'Bad refund', param: String(params.error.issues[0]?.path[0] ?? '') });
    const intent = state.paymentIntents[params.data.payment_intent];
    if (!intent) throw missing('payment_intent', params.data.payment_intent, 'payment_intent');
    const charge = typeof intent.latest_charge === 'string' ? state.charges[intent.latest_charge] : undefined;
    if (!charge) throw refuse(400, { message: 'This PaymentIntent does not have a successful charge to refund.', param: 'payment_intent' });
    if (charge.refunded) throw refuse(400, { code: 'charge_already_refunded', message: `Charge ${charge.id} has already been refunded.` });
    const left = charge.amount - charge.amount_refunded;
    const amountCents = params.data.amount ?? left;
    if (amountCents > left) throw refuse(400, { message: `Refund amount (${amountCents}) is greater than unrefunded amount on charge (${left})`, param: 'amount' });
    const refund = makeRefund(charge, amountCents, params.data.reason ?? null, params.data.metadata ?? {}, clock());
    state.refunds[refund.id] = refund;
    charge.amount_refunded += amountCents;
    charge.refunded = charge.amount_refunded === charge.amount;
    webhooks.emit('charge.refunded', charge);
    response.json(refund);
  });
  router.get('/events', (request, response) => {
    const query = listSchema.safeParse(request.query);
    if (!query.success) throw refuse(400, { message: 'Invalid list parameters', param: String(query.error.issues[0]?.path[0] ?? '') });
    const { limit, type, starting_after: after } = query.data;
    const newestFirst = [...state.events].reverse().filter((event) => type === undefined || event.type === type);
    const rest = after === undefined ? newestFirst : newestFirst.slice(newestFirst.findIndex(({ id }) => id === after) + 1);
    const list: Pick<Stripe.ApiList<Stripe.Event>, 'object' | 'url' | 'has_more' | 'data'> = { object: 'list', url: '/v1/events', has_more: rest.length > limit, data: rest.slice(0, limit) };
    response.json(list);
  });
  router.use((request) => {
    throw refuse(404, { message: `Unrecognized request URL (${request.method}: ${request.originalUrl}).` });
  });
  router.use(apiErrors);
  return router;
}
