import { z } from '../zod';
import { quoteDocumentSchema } from '../quote';
import { contactSchema } from './intakes';
import { endpoint } from './endpoint';

export const quoteSchema = z.object({
  id: z.uuid(),
  document: quoteDocumentSchema,
  /** What it shows, for the check-your-answers list. */
  answeredAt: z.string(),
});
export type Quote = z.infer<typeof quoteSchema>;

export const priceIntake = endpoint({ method: 'post', path: '/intakes/current/quote', summary: 'Freezes a price from the answers; the same answers give the same document back', access: ['intake'], response: quoteSchema });
export const getQuote = endpoint({ method: 'get', path: '/intakes/current/quote', summary: 'The frozen price, unless a changed answer has withdrawn it', access: ['intake'], response: quoteSchema });

export const startDeposit = endpoint({
  method: 'post', path: '/intakes/current/deposit', summary: 'Makes the payment page for the deposit of one option', access: ['intake'], idempotent: true,
  body: z.object({ quoteId: z.uuid(), optionId: z.string().max(60), contact: contactSchema }),
  response: z.object({ checkoutUrl: z.string() }), status: 201,
});

export const depositStates = ['pending', 'paid', 'expired', 'refunded'] as const;
export const depositSchema = z.object({
  state: z.enum(depositStates), amountCents: z.number().int(), optionTitle: z.string(), jobNumber: z.number().int().nullable(),
  email: z.string(), paidAt: z.string().nullable(),
  /** The homeowner's own page; present once paid. */
  myUrl: z.string().nullable(),
});
export type Deposit = z.infer<typeof depositSchema>;
export const getDeposit = endpoint({ method: 'get', path: '/intakes/current/deposit', summary: 'Where the deposit stands; also asks the provider when its message is late', access: ['intake'], response: depositSchema });
export const stripeWebhook = endpoint({ method: 'post', path: '/webhooks/stripe', summary: 'Signed events of the payment provider', bodyType: 'raw' });

/** The homeowner's page. */
export const mySchema = z.object({
  jobNumber: z.number().int(), name: z.string(), street: z.string(), town: z.string(), phone: z.string(),
  stage: z.string(), quote: quoteDocumentSchema, optionId: z.string().nullable(), deposit: depositSchema.omit({ myUrl: true }).nullable(),
  timeline: z.array(z.object({ id: z.string(), title: z.string(), detail: z.string(), state: z.enum(['done', 'now', 'next']) })),
});
export type My = z.infer<typeof mySchema>;
export const openMy = endpoint({ method: 'post', path: '/my', summary: 'Opens the homeowner’s page by its signed link; sets the cookie', body: z.object({ token: z.string().max(200) }), response: mySchema });
export const getMy = endpoint({ method: 'get', path: '/my', summary: 'The homeowner’s page', access: ['homeowner'], response: mySchema });
