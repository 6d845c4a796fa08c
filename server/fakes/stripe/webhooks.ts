import { createHmac } from 'node:crypto';
import type Stripe from 'stripe';
import { newId, seconds, type Delivery, type Store } from './state';

export interface WebhookTarget { readonly url: string; readonly secret: string }

/** The `Stripe-Signature` header for a payload: HMAC-SHA256 of "timestamp.payload", as the provider's documentation has it. */
export const signatureFor = (payload: string, secret: string, atSeconds: number): string =>
  `t=${atSeconds},v1=${createHmac('sha256', secret).update(`${atSeconds}.${payload}`).digest('hex')}`;

/** Waits between tries: quick at first, so that a server that was away for a minute has caught up within 30 s of its return. */
const waitMs = (attempts: number) => Math.min(15_000, 500 * 2 ** attempts);
const GIVE_UP_AFTER = 400;

export interface Webhooks {
  /** Records an event and sends it to the target, again and again until it answers 2xx. */
  readonly emit: (type: Stripe.Event.Type, object: Stripe.Event.Data.Object) => Stripe.Event;
  /** Sends one recorded event once more, now; gives the target's status, 0 when it does not answer. */
  readonly send: (event: Stripe.Event, at?: Date, secret?: string) => Promise<number>;
  /** Holds events back, or lets them go. */
  readonly hold: (held: boolean) => void;
  readonly stop: () => void;
}

/** Keeps the queue of events in the store and works it off. `target` may still be null while the server is not up. */
export function startWebhooks({ state, save }: Store, target: () => WebhookTarget | null, clock: () => Date, apiVersion: string): Webhooks {
  let held = false;
  let stopped = false;

  const send = async (event: Stripe.Event, at = clock(), secret = target()?.secret): Promise<number> => {
    const to = target();
    if (!to || secret === undefined) return 0;
    const payload = JSON.stringify(event);
    try {
      const response = await fetch(to.url, {
        method: 'POST', body: payload, signal: AbortSignal.timeout(10_000),
        headers: { 'content-type': 'application/json; charset=utf-8', 'stripe-signature': signatureFor(payload, secret, seconds(at)) },
      });
      await response.arrayBuffer();
      return response.status;
    } catch {
      return 0;
    }
  };

  const attempt = async (delivery: Delivery): Promise<void> => {
    const event = state.events.find(({ id }) => id === delivery.eventId);
    if (!event) { delivery.done = true; return; }
    delivery.attempts += 1;
    delivery.nextAt = Number.POSITIVE_INFINITY;
    const status = await send(event);
    delivery.done = (status >= 200 && status < 300) || delivery.attempts >= GIVE_UP_AFTER;
    delivery.nextAt = Date.now() + waitMs(delivery.attempts);
    if (!stopped) save();
  };

  const tick = () => {
    if (held || stopped) return;
    for (const delivery of state.deliveries) if (!delivery.done && delivery.nextAt <= Date.now()) void attempt(delivery);
  };
  // A delivery that was on its way when the process ended (JSON keeps Infinity as null) is taken up again.
  for (const delivery of state.deliveries) delivery.nextAt ??= 0;
  const timer = setInterval(tick, 200);

  return {
    send,
    emit(type, object) {
      const event = {
        id: newId('evt_'), object: 'event', api_version: apiVersion, created: seconds(clock()), livemode: false, pending_webhooks: 1,
        request: { id: null, idempotency_key: null }, type, data: { object: structuredClone(object) },
      } as Stripe.Event;
      state.events.push(event);
      state.deliveries.push({ eventId: event.id, attempts: 0, nextAt: 0, done: false });
      save();
      setImmediate(tick);
      return event;
    },
    hold(now) {
      held = now;
      tick();
    },
    stop() {
      stopped = true;
      clearInterval(timer);
    },
  };
}
