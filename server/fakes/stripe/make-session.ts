import type Stripe from 'stripe';
import type { SessionParams } from './session-params';
import { newId, seconds, type StoredSession } from './state';

const DAY_SECONDS = 24 * 60 * 60;

/** A new open session, with every field that the SDK's type names. */
export function makeSession(params: SessionParams, baseUrl: string, now: Date): StoredSession {
  const id = newId('cs_test_');
  const total = params.line_items.reduce((sum, line) => sum + line.price_data.unit_amount * line.quantity, 0);
  const session: Stripe.Checkout.Session = {
    id, object: 'checkout.session', livemode: false, mode: 'payment', ui_mode: 'hosted_page', status: 'open', payment_status: 'unpaid',
    created: seconds(now), expires_at: params.expires_at ?? seconds(now) + DAY_SECONDS, url: `${baseUrl}/pay/${id}`,
    success_url: params.success_url.replaceAll('{CHECKOUT_SESSION_ID}', id), cancel_url: params.cancel_url ?? null,
    amount_subtotal: total, amount_total: total, currency: params.line_items[0]?.price_data.currency ?? null,
    client_reference_id: params.client_reference_id ?? null, metadata: params.metadata ?? {},
    customer: null, customer_account: null, customer_creation: 'if_required', customer_email: params.customer_email ?? null,
    customer_details: params.customer_email
      ? {
        email: params.customer_email, address: null, business_name: null, individual_name: null, name: null, phone: null, tax_exempt: null,
        tax_ids: null,
      }
      : null,
    total_details: { amount_discount: 0, amount_shipping: 0, amount_tax: 0 },
    payment_intent: null, payment_method_types: ['card'], payment_method_collection: 'if_required',
    payment_method_configuration_details: null, payment_method_options: {},
    allowed_payment_method_types: params.allowed_payment_method_types ?? null,
    automatic_tax: { enabled: false, liability: null, provider: null, status: null },
    custom_fields: [], custom_text: { after_submit: null, shipping_address: null, submit: null, terms_of_service_acceptance: null },
    locale: params.locale ?? null, submit_type: params.submit_type ?? null,
    adaptive_pricing: { enabled: false }, after_expiration: null, allow_promotion_codes: null, billing_address_collection: null,
    client_secret: null, collected_information: null, consent: null, consent_collection: null, currency_conversion: null, discounts: [],
    integration_identifier: null, invoice: null, invoice_creation: null, managed_payments: null, origin_context: null, payment_link: null,
    permissions: null, recovered_from: null,
    saved_payment_method_options: null, setup_intent: null, shipping_address_collection: null, shipping_cost: null, shipping_options: [],
    subscription: null, wallet_options: null,
  };
  return {
    session,
    lineName: params.line_items.map((line) => line.price_data.product_data.name).join(', '),
    intentMetadata: params.payment_intent_data?.metadata ?? {},
    tries: 0, refusal: null,
  };
}
