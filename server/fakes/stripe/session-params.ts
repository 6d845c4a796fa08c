import { z } from '../../../shared/zod';
import { refuse } from './api-error';

const word = z.string().min(1).max(5000);
const metadata = z.record(z.string().max(40), z.string().max(500));

/** What we send to make a session; anything else is refused, as the provider refuses what it does not know. Form values arrive as text. */
const schema = z.strictObject({
  mode: z.literal('payment'),
  line_items: z.array(z.strictObject({
    quantity: z.coerce.number().int().min(1),
    price_data: z.strictObject({
      currency: z.string().regex(/^[a-z]{3}$/),
      unit_amount: z.coerce.number().int().min(0).max(99_999_999),
      product_data: z.strictObject({ name: word, description: word.optional() }),
    }),
  })).min(1).max(100),
  success_url: z.url(),
  cancel_url: z.url().optional(),
  client_reference_id: z.string().max(200).optional(),
  customer_email: z.email().optional(),
  metadata: metadata.optional(),
  payment_intent_data: z.strictObject({ metadata: metadata.optional() }).optional(),
  allowed_payment_method_types: z.array(z.literal('card')).optional(),
  expires_at: z.coerce.number().int().optional(),
  locale: z.string().optional(),
  submit_type: z.enum(['auto', 'book', 'donate', 'pay']).optional(),
});
export type SessionParams = z.infer<typeof schema>;

/** "line_items[0][quantity]", as the provider names a parameter. */
const paramName = (path: readonly PropertyKey[]): string => path.map(String).reduce((name, part) => (name ? `${name}[${part}]` : part), '');

/** USD charges start at 50 cents. Source: the provider's documentation of minimum charge amounts (from memory). */
const LEAST_CENTS = 50;

/**
 * Checks the parameters of a new session.
 * @throws ApiError 400 in the provider's shape
 */
export function readSessionParams(body: unknown, nowSeconds: number): SessionParams {
  const result = schema.safeParse(body);
  if (!result.success) {
    const issue = result.error.issues[0];
    if (issue?.code === 'unrecognized_keys') {
      const param = paramName([...issue.path, issue.keys[0] ?? '']);
      throw refuse(400, { code: 'parameter_unknown', param, message: `Received unknown parameter: ${param}` });
    }
    const param = paramName(issue?.path ?? []);
    const missing = issue?.code === 'invalid_type' && issue.message.includes('undefined');
    throw refuse(400, {
      ...(missing ? { code: 'parameter_missing' } : {}), param,
      message: missing ? `Missing required param: ${param}.` : `Invalid ${param}: ${issue?.message ?? ''}`,
    });
  }
  const total = result.data.line_items.reduce((sum, line) => sum + line.price_data.unit_amount * line.quantity, 0);
  if (total < LEAST_CENTS) {
    throw refuse(400, { code: 'amount_too_small', message: "The Checkout Session's total amount due must add up to at least $0.50 usd" });
  }
  const { expires_at: expiresAt } = result.data;
  if (expiresAt !== undefined && (expiresAt < nowSeconds + 30 * 60 - 5 || expiresAt > nowSeconds + 24 * 60 * 60 + 5)) {
    throw refuse(400, { param: 'expires_at', message: 'The `expires_at` timestamp must be between 30 minutes and 24 hours from Checkout Session creation.' });
  }
  return result.data;
}
