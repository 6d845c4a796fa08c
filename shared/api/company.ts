import { z } from '../zod';
import { endpoint } from './endpoint';

/** The contractor as the public sees it. */
export const companySchema = z.object({
  name: z.string(), phone: z.string(), licence: z.string(), postalAddress: z.string(), email: z.string(),
  towns: z.array(z.object({ name: z.string(), zips: z.array(z.string()) })),
  /** The range before anything is answered. */
  openingLowCents: z.number().int(), openingHighCents: z.number().int(),
  depositCents: z.number().int(),
  /** True: everything is invented and the site says so. */
  demo: z.boolean(),
});
export type Company = z.infer<typeof companySchema>;

export const getCompany = endpoint({ method: 'get', path: '/company', summary: 'The contractor, the towns it serves and the opening range', response: companySchema });
export const getHealth = endpoint({ method: 'get', path: '/health', summary: 'Whether the server and its database answer', response: z.object({ status: z.literal('ok') }) });
export const askForArea = endpoint({
  method: 'post', path: '/outside-area', summary: 'Keeps the address of someone outside the area who asks to be told', idempotent: true,
  body: z.object({ zip: z.string().regex(/^\d{5}$/, { error: 'Type the five digits of the ZIP' }), email: z.email({ error: 'Type a full e-mail address, such as name@example.com' }).max(254) }),
});
