import type { Response } from 'express';
import { problemKinds, type Problem, type ProblemError, type ProblemKind } from '../../shared/problem';

/** A refusal that is meant for the caller: thrown anywhere below a handler, sent as it is. */
export class Refusal extends Error {
  readonly problem: Problem;
  readonly headers: Readonly<Record<string, string>>;
  constructor(problemSent: Problem, headers: Readonly<Record<string, string>>) {
    super(problemSent.title);
    this.name = 'Refusal';
    this.problem = problemSent;
    this.headers = headers;
  }
}

export const problemOf = (kind: ProblemKind, more: Pick<Problem, 'detail' | 'errors' | 'instance'> = {}): Problem => ({
  type: `/problems/${kind}`, ...problemKinds[kind],
  ...(more.detail === undefined ? {} : { detail: more.detail }),
  ...(more.instance === undefined ? {} : { instance: more.instance }),
  ...(more.errors === undefined ? {} : { errors: more.errors }),
});

/**
 * Makes the refusal to throw. `detail`: words for people on what to do now; `errors`: what is wrong, each with a JSON Pointer (RFC 6901)
 * into the body; `headers`: such as Retry-After.
 */
export const problem = (
  kind: ProblemKind, detail?: string, errors?: ProblemError[], headers: Readonly<Record<string, string>> = {},
): Refusal =>
  new Refusal(problemOf(kind, { detail, errors }), headers);

/** Sends a problem document, RFC 9457. */
export function sendProblem(response: Response, { problem: body, headers }: Pick<Refusal, 'problem' | 'headers'>): void {
  // Whatever a handler set for a success (caching, an ETag) does not hold for a refusal.
  for (const name of ['ETag', 'Content-Disposition']) response.removeHeader(name);
  response.set({ ...headers, 'Cache-Control': 'no-store' }).status(body.status).type('application/problem+json').send(JSON.stringify(body));
}

/** A JSON Pointer from a path of names and indexes. */
export const pointerOf = (path: readonly PropertyKey[]): string => path.map((part) => `/${String(part).replaceAll('~', '~0').replaceAll('/', '~1')}`).join('');
