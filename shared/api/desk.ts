import { z } from '../zod';
import { factSources } from '../facts';
import { quoteDocumentSchema } from '../quote';
import { roles } from '../roles';
import { photoSchema } from './intakes';
import { endpoint } from './endpoint';

export const leadStages = ['check-photos', 'waiting-on-photo', 'needs-a-visit', 'firm-price-sent', 'accepted', 'booked', 'closed'] as const;
export type LeadStage = (typeof leadStages)[number];
export const leadStageWords: Record<LeadStage, string> = {
  'check-photos': 'Check photos', 'waiting-on-photo': 'Waiting on photo', 'needs-a-visit': 'Needs a visit', 'firm-price-sent': 'Firm price sent',
  accepted: 'Accepted', booked: 'Booked', closed: 'Closed',
};

export const sessionSchema = z.object({ name: z.string(), email: z.string(), role: z.enum(roles), csrfToken: z.string() });
export type Session = z.infer<typeof sessionSchema>;
export const signIn = endpoint({ method: 'post', path: '/session', summary: 'Signs in at the desk', body: z.object({ email: z.string().min(1, { error: 'Type your e-mail address' }).max(254), password: z.string().min(1, { error: 'Type your password' }).max(200) }), response: sessionSchema });
export const getSession = endpoint({ method: 'get', path: '/session', summary: 'Who is signed in', access: ['desk'], response: sessionSchema });
export const signOut = endpoint({ method: 'delete', path: '/session', summary: 'Signs out', access: ['desk'] });

export const leadRowSchema = z.object({
  id: z.uuid(), jobNumber: z.number().int(), name: z.string(), town: z.string(), work: z.string(), workNote: z.string(),
  lowCents: z.number().int().nullable(), highCents: z.number().int().nullable(), firmCents: z.number().int().nullable(),
  stage: z.enum(leadStages), dueAt: z.string().nullable(), timeNote: z.string(), assignee: z.string().nullable(), depositPaid: z.boolean(), createdAt: z.string(),
});
export type LeadRow = z.infer<typeof leadRowSchema>;

export const leadSorts = ['due', 'newest', 'oldest', 'name', 'price'] as const;
export const leadListQuerySchema = z.object({
  stage: z.enum(leadStages).optional(), search: z.string().trim().max(100).optional(), sort: z.enum(leadSorts).default('due'),
  cursor: z.string().max(300).optional(), limit: z.coerce.number().int().min(1).max(100).default(25),
});
export const leadListSchema = z.object({
  leads: z.array(leadRowSchema), nextCursor: z.string().nullable(), total: z.number().int(),
  counts: z.array(z.object({ stage: z.enum(leadStages), count: z.number().int() })),
});
export type LeadList = z.infer<typeof leadListSchema>;

export const historyEntrySchema = z.object({ id: z.string(), at: z.string(), who: z.string(), what: z.string(), before: z.string().nullable(), after: z.string().nullable() });
export const leadSchema = leadRowSchema.extend({
  version: z.number().int(), email: z.string(), phone: z.string().nullable(), street: z.string(), contactWays: z.array(z.string()), consentAt: z.string(),
  facts: z.array(z.object({ name: z.string(), label: z.string(), words: z.string(), source: z.enum(factSources) })),
  photos: z.array(photoSchema), quote: quoteDocumentSchema.nullable(), optionId: z.string().nullable(),
  deposit: z.object({ state: z.string(), amountCents: z.number().int(), paidAt: z.string().nullable() }).nullable(),
  /** Answers that were changed after the price was frozen or paid, in words. */
  differences: z.array(z.object({ label: z.string(), before: z.string(), after: z.string() })),
  history: z.array(historyEntrySchema),
  /** Stages to which the person who asks may move it now; the controls show these and no others. */
  moves: z.array(z.enum(leadStages)),
});
export type Lead = z.infer<typeof leadSchema>;

export const listLeads = endpoint({ method: 'get', path: '/leads', summary: 'Leads by stage, search and sort, page by page', access: ['owner', 'estimator', 'sales'], query: leadListQuerySchema, response: leadListSchema });
export const getLead = endpoint({ method: 'get', path: '/leads/{id}', summary: 'One lead with facts, photos, price and history', access: ['owner', 'estimator', 'sales'], params: z.object({ id: z.uuid() }), response: leadSchema });
export const moveLead = endpoint({ method: 'patch', path: '/leads/{id}', summary: 'Moves a lead to another stage; If-Match carries its version', access: ['owner', 'estimator'], params: z.object({ id: z.uuid() }), body: z.object({ stage: z.enum(leadStages), note: z.string().trim().max(500).optional() }), response: leadSchema });
