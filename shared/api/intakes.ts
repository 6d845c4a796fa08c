import { z } from '../zod';
import { liveRangeSchema } from '../quote';
import { photoSlotIds } from '../wizard/steps/photos';
import { fieldsById } from '../wizard/index';
import { endpoint } from './endpoint';

export const photoSchema = z.object({
  id: z.uuid(), slot: z.enum(photoSlotIds), widthPx: z.number().int(), heightPx: z.number().int(),
  /** Hints, never a refusal: 'good', or why another try is worth it. */
  verdict: z.enum(['good', 'dark', 'blurred', 'small']),
  /** Under /api; sent only to who may see this intake. */
  thumbUrl: z.string(), url: z.string(),
});
export type Photo = z.infer<typeof photoSchema>;

export const contactWays = ['email', 'text', 'phone'] as const;

export const emailSchema = z.email({ error: 'Type a full e-mail address, such as name@example.com' }).max(254);
/** Contact is asked when it is needed and no earlier. */
export const contactSchema = z.object({
  name: z.string().trim().min(1, { error: 'Type the name we should ask for' }).max(100, { error: '100 letters at most' }),
  email: emailSchema,
  phone: z.string().trim().max(30).regex(/^[\d\s().+-]*$/, { error: 'Digits, spaces and + ( ) - only' }).optional(),
  street: z.string().trim().min(1, { error: 'Type the house number and street' }).max(200, { error: '200 letters at most' }),
  contactWays: z.array(z.enum(contactWays)).max(3),
  consent: z.literal(true, { error: 'Tick this so that we may use your details for this job' }),
});
export type Contact = z.infer<typeof contactSchema>;

export const intakeSchema = z.object({
  /** Grows with every saved answer. */
  version: z.number().int(),
  answers: z.record(z.string(), z.unknown()),
  /** Null until a ZIP is answered. */
  town: z.string().nullable(),
  served: z.boolean().nullable(),
  photos: z.array(photoSchema),
  range: liveRangeSchema,
  /** Where this intake stands: the wizard is open, a price is frozen, the deposit is paid, handed to the estimator without a price. */
  stage: z.enum(['open', 'priced', 'paid', 'visit-asked']),
  /** Where the link to finish later was sent, masked; null when it was not asked for. */
  savedTo: z.string().nullable(),
});
export type Intake = z.infer<typeof intakeSchema>;

/** Fields by id; null takes an answer back. Each value is checked by its field's own schema, all or nothing. */
export const answersPatchSchema = z.object({
  answers: z.record(z.string(), z.unknown()).refine((answers) => Object.keys(answers).length > 0 && Object.keys(answers).length <= 60, { error: 'Between 1 and 60 answers at a time' }),
}).superRefine((body, context) => {
  for (const [id, value] of Object.entries(body.answers)) {
    const field = fieldsById.get(id);
    if (!field) { context.addIssue({ code: 'custom', path: ['answers', id], message: 'There is no such question' }); continue; }
    if (value === null) continue;
    const result = field.schema.safeParse(value);
    for (const issue of result.error?.issues ?? []) context.addIssue({ code: 'custom', path: ['answers', id, ...issue.path], message: issue.message });
  }
});

export const startIntake = endpoint({ method: 'post', path: '/intakes', summary: 'Starts an intake, or returns the one this browser holds; sets its cookie', access: ['public', 'intake'], response: intakeSchema });
export const getIntake = endpoint({ method: 'get', path: '/intakes/current', summary: 'The intake this browser holds', access: ['intake'], response: intakeSchema });
export const saveAnswers = endpoint({ method: 'patch', path: '/intakes/current/answers', summary: 'Saves answers field by field and returns the range that follows', access: ['intake'], body: answersPatchSchema, response: intakeSchema });
export const finishLater = endpoint({ method: 'post', path: '/intakes/current/finish-later', summary: 'Mails a link that resumes on any device', access: ['intake'], body: z.object({ email: emailSchema }), idempotent: true,
  /** The masked address, and the day (ISO) until which the link opens the answers. */
  response: z.object({ sentTo: z.string(), openUntil: z.string() }) });
export const resumeIntake = endpoint({ method: 'post', path: '/resume', summary: 'Opens an intake by its mailed link; sets the cookie', body: z.object({ token: z.string().max(200) }), response: intakeSchema });
export const forgetIntake = endpoint({ method: 'delete', path: '/intakes/current', summary: 'Ends this browser’s hold on the intake; the answers stay for who has the link', access: ['intake'] });
export const askForVisit = endpoint({ method: 'post', path: '/intakes/current/visit', summary: 'Hands the intake to the estimator without a price', access: ['intake'], body: contactSchema, response: intakeSchema, idempotent: true });

export const addPhoto = endpoint({ method: 'post', path: '/intakes/current/photos', summary: 'Stores a picture (form field “photo”, with “slot”), re-encoded without metadata', access: ['intake'], bodyType: 'multipart', body: z.object({ slot: z.enum(photoSlotIds) }), response: photoSchema, status: 201 });
export const removePhoto = endpoint({ method: 'delete', path: '/intakes/current/photos/{id}', summary: 'Takes a picture back', access: ['intake'], params: z.object({ id: z.uuid() }) });
export const getPhoto = endpoint({ method: 'get', path: '/photos/{id}/{size}', summary: 'A stored picture; only for who may see its intake', access: ['intake', 'homeowner', 'desk'], responseType: 'image', status: 200, params: z.object({ id: z.uuid(), size: z.enum(['thumb', 'full']) }) });
