import { z } from './zod';

/** One thing that is wrong, with a JSON Pointer (RFC 6901) to the value in the request's body. */
export const problemErrorSchema = z.object({ pointer: z.string(), detail: z.string() });

/** RFC 9457 problem document, sent as application/problem+json. `title` and `detail` are words for people. */
export const problemSchema = z.object({
  type: z.string(),
  title: z.string(),
  status: z.number().int(),
  detail: z.string().optional(),
  instance: z.string().optional(),
  errors: z.array(problemErrorSchema).optional(),
});

export type Problem = z.infer<typeof problemSchema>;
export type ProblemError = z.infer<typeof problemErrorSchema>;

/** The kinds of refusal this product gives; `type` is "/problems/<id>". */
export const problemKinds = {
  validation: { status: 422, title: 'Some answers need another look' },
  malformed: { status: 400, title: 'We could not read that request' },
  unauthenticated: { status: 401, title: 'Sign in to go on' },
  forbidden: { status: 403, title: 'Your role does not allow this' },
  'not-found': { status: 404, title: 'There is nothing here' },
  conflict: { status: 409, title: 'Something changed in the meantime' },
  gone: { status: 410, title: 'This link has run out' },
  stale: { status: 412, title: 'Someone else changed this first' },
  'precondition-required': { status: 428, title: 'Say which version you are changing' },
  'too-large': { status: 413, title: 'That file is too large' },
  'unsupported-media': { status: 415, title: 'That is not a picture we can read' },
  'too-many': { status: 429, title: 'Too many tries' },
  'no-price': { status: 409, title: 'We cannot give a fair price from here' },
  'payment-unavailable': { status: 503, title: 'The payment service does not answer' },
  unavailable: { status: 503, title: 'We are not ready yet' },
  internal: { status: 500, title: 'Something went wrong on our side' },
} as const satisfies Record<string, { status: number; title: string }>;

export type ProblemKind = keyof typeof problemKinds;
