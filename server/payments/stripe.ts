import Stripe from 'stripe';

export interface StripeSettings {
  readonly secretKey: string;
  /** "http://127.0.0.1:4242" for the practice provider; absent: the provider's own address. */
  readonly apiBase?: string | undefined;
}

/** Calls that the provider does not answer in this time count as failed; the SDK tries them again with the same idempotency key. */
const TIMEOUT_MS = 8_000;

/** The payment provider's client. The API version is pinned, so that an upgrade of theirs never changes what we read. */
export function createStripe({ secretKey, apiBase }: StripeSettings): Stripe {
  const base = apiBase === undefined ? null : new URL(apiBase);
  return new Stripe(secretKey, {
    apiVersion: '2026-10-28.endive',
    maxNetworkRetries: 2,
    timeout: TIMEOUT_MS,
    telemetry: false,
    ...(base ? { host: base.hostname, port: base.port || (base.protocol === 'https:' ? 443 : 80), protocol: base.protocol === 'https:' ? 'https' : 'http' } : {}),
  });
}

/** True when a call failed because the provider was away, overloaded or refused our key: nothing was decided and it can be tried again. */
export const providerIsAway = (error: unknown): boolean =>
  error instanceof Stripe.errors.StripeConnectionError || error instanceof Stripe.errors.StripeAPIError ||
  error instanceof Stripe.errors.StripeRateLimitError || error instanceof Stripe.errors.StripeAuthenticationError;

/** A checkout session, or null when the provider does not know it (another account's, or a practice provider that was emptied). */
export async function findSession(stripe: Stripe, sessionId: string): Promise<Stripe.Checkout.Session | null> {
  try {
    return await stripe.checkout.sessions.retrieve(sessionId);
  } catch (error) {
    if (error instanceof Stripe.errors.StripeInvalidRequestError && error.code === 'resource_missing') return null;
    throw error;
  }
}
