import type Stripe from 'stripe';
import type { Cents } from '../../shared/money';

export interface CheckoutFacts {
  readonly depositId: string;
  readonly intakeId: string;
  readonly amountCents: Cents;
  readonly email: string;
  /** "Wall charger, 60 A" */
  readonly optionTitle: string;
  readonly companyName: string;
  /** Where the public reaches us, without a slash at its end. */
  readonly publicUrl: string;
}

/**
 * Makes the provider's payment page for a deposit. The deposit's id is the idempotency key: however often it is called, one session
 * is made.
 * Only ids leave with the metadata; the provider gets the address for its own receipt and nothing else of the homeowner.
 */
export function createCheckoutSession(stripe: Stripe, facts: CheckoutFacts): Promise<Stripe.Checkout.Session> {
  const metadata = { depositId: facts.depositId, intakeId: facts.intakeId };
  return stripe.checkout.sessions.create(
    {
      mode: 'payment',
      allowed_payment_method_types: ['card'],
      submit_type: 'pay',
      line_items: [{ quantity: 1, price_data: { currency: 'usd', unit_amount: facts.amountCents, product_data: { name: `Deposit to ${facts.companyName}: ${facts.optionTitle}` } } }],
      client_reference_id: facts.depositId,
      customer_email: facts.email,
      metadata,
      payment_intent_data: { metadata },
      success_url: `${facts.publicUrl}/quote/deposit`,
      cancel_url: `${facts.publicUrl}/quote/price?deposit=cancelled`,
    },
    { idempotencyKey: facts.depositId },
  );
}
