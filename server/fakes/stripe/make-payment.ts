import type Stripe from 'stripe';
import { newId, seconds, type StoredSession } from './state';

/** The intent that stands behind a session from its first try on; nothing is received yet. */
export function makeIntent({ session, intentMetadata, lineName }: StoredSession, now: Date): Stripe.PaymentIntent {
  return {
    id: newId('pi_'), object: 'payment_intent', livemode: false, amount: session.amount_total ?? 0, amount_capturable: 0,
    amount_received: 0,
    currency: session.currency ?? 'usd', created: seconds(now), status: 'requires_payment_method', metadata: intentMetadata,
    description: lineName,
    allowed_payment_method_types: null, application: null, application_fee_amount: null, automatic_payment_methods: null, canceled_at: null,
    cancellation_reason: null, capture_method: 'automatic_async', client_secret: null, confirmation_method: 'automatic', customer: null,
    customer_account: null, excluded_payment_method_types: null, last_payment_error: null, latest_charge: null, managed_payments: null,
    next_action: null,
    on_behalf_of: null, payment_method: null, payment_method_configuration_details: null, payment_method_options: {},
    payment_method_types: ['card'], payment_record: null, processing: null, receipt_email: null, review: null,
    setup_future_usage: null, shipping: null,
    source: null, statement_descriptor: null, statement_descriptor_suffix: null, transfer_group: null,
  };
}

/** The charge of a paid intent. */
export function makeCharge(intent: Stripe.PaymentIntent, email: string | null, now: Date): Stripe.Charge {
  return {
    id: newId('ch_'), object: 'charge', livemode: false, amount: intent.amount, amount_captured: intent.amount,
    amount_refunded: 0, currency: intent.currency,
    created: seconds(now), captured: true, paid: true, refunded: false, disputed: false, status: 'succeeded',
    payment_intent: intent.id, metadata: intent.metadata,
    billing_details: { address: null, email, name: null, phone: null, tax_id: null },
    application: null, application_fee: null, application_fee_amount: null, balance_transaction: null,
    calculated_statement_descriptor: null, customer: null, description: intent.description, failure_balance_transaction: null,
    failure_code: null, failure_message: null,
    fraud_details: null, on_behalf_of: null,
    outcome: null, payment_method: newId('pm_'), payment_method_details: null, receipt_email: null, receipt_number: null,
    receipt_url: null, review: null,
    shipping: null, source: null, source_transfer: null, statement_descriptor: null, statement_descriptor_suffix: null,
    transfer_data: null, transfer_group: null,
  };
}

/** A refund that went through. */
export function makeRefund(
  charge: Stripe.Charge, amountCents: number, reason: Stripe.Refund.Reason | null, metadata: Stripe.Metadata, now: Date,
): Stripe.Refund {
  return {
    id: newId('re_'), object: 'refund', amount: amountCents, currency: charge.currency, created: seconds(now),
    status: 'succeeded', charge: charge.id,
    payment_intent: charge.payment_intent, reason, metadata, balance_transaction: null, customer: null, customer_account: null,
    payment_method: null,
    receipt_number: null, source_transfer_reversal: null, transfer_reversal: null,
  };
}
