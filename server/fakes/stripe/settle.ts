import type Stripe from 'stripe';
import { makeCharge, makeIntent } from './make-payment';
import { seconds, type Store, type StoredSession } from './state';
import type { Webhooks } from './webhooks';

export interface Provider { readonly store: Store; readonly webhooks: Webhooks; readonly clock: () => Date }

const CARDS: Record<string, 'paid' | 'declined' | 'second-try'> = {
  '4242424242424242': 'paid',
  '4000000000000002': 'declined',
  '4000000000000341': 'second-try',
};

const refusals = {
  unknown: 'That is none of the practice cards. Nothing was taken.',
  declined: 'Your card was declined. Nothing was taken. Use another card.',
  again: 'The card did not answer. Nothing was taken. Try once more.',
} as const;

/**
 * Tries a card on an open session. A paid one becomes complete and its event goes out.
 * @returns true when it is paid
 */
export function tryCard({ store, webhooks, clock }: Provider, stored: StoredSession, cardNumber: string): boolean {
  const { session } = stored;
  if (session.status !== 'open') return session.payment_status === 'paid';
  const kind = CARDS[cardNumber.replace(/\D/g, '')];
  const intent = intentOf(store, stored, clock());
  if (kind === 'second-try') stored.tries += 1;
  const paid = kind === 'paid' || (kind === 'second-try' && stored.tries > 1);
  if (!paid) {
    stored.refusal = kind === undefined ? refusals.unknown : kind === 'declined' ? refusals.declined : refusals.again;
    store.save();
    return false;
  }
  const charge = makeCharge(intent, session.customer_email, clock());
  store.state.charges[charge.id] = charge;
  Object.assign(intent, { status: 'succeeded', amount_received: intent.amount, latest_charge: charge.id, payment_method: charge.payment_method });
  Object.assign(session, { status: 'complete', payment_status: 'paid', url: null });
  stored.refusal = null;
  webhooks.emit('checkout.session.completed', session);
  return true;
}

function intentOf({ state }: Store, { session, ...rest }: StoredSession, now: Date): Stripe.PaymentIntent {
  const known = typeof session.payment_intent === 'string' ? state.paymentIntents[session.payment_intent] : undefined;
  if (known) return known;
  const intent = makeIntent({ session, ...rest }, now);
  state.paymentIntents[intent.id] = intent;
  session.payment_intent = intent.id;
  return intent;
}

/** Closes an open session without payment; its event goes out. */
export function expireSession({ webhooks }: Provider, { session }: StoredSession): void {
  Object.assign(session, { status: 'expired', url: null });
  webhooks.emit('checkout.session.expired', session);
}

/** Closes every open session whose time is up. */
export function expireOverdue(provider: Provider): void {
  const now = seconds(provider.clock());
  for (const stored of Object.values(provider.store.state.sessions)) {
    if (stored.session.status === 'open' && stored.session.expires_at <= now) expireSession(provider, stored);
  }
}
