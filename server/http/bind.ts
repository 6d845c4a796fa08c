import type { Request, Response, Router } from 'express';
import type { z } from '../../shared/zod';
import type { Endpoint } from '../../shared/api/endpoint';
import type { SignedIn } from '../auth/desk-sessions';
import type { Deps } from '../deps';
import { admit, type Caller } from './caller';
import { refuseOtherSites } from './csrf';
import { once, requestHash, type Reply } from './idempotency';
import { problem } from './problem';
import { addressOf, countTry, type LimitName } from './rate-limits';
import { readBody } from './read-body';
import { validate } from './validate';

/** Where endpoints are bound; `bound` lists them for OpenAPI and its test. */
export interface Api {
  readonly router: Router;
  readonly deps: Deps;
  readonly bound: Endpoint[];
}

type Part = z.ZodType | undefined;
type Read<T> = T extends z.ZodType ? z.output<T> : undefined;
type Given<T> = T extends z.ZodType ? z.input<T> : void;

/** One call of an endpoint, validated. `request` and `response` are for headers, cookies and files. */
export interface Call<P = undefined, Q = undefined, B = undefined> {
  readonly params: P;
  readonly query: Q;
  readonly body: B;
  readonly caller: Caller;
  /** The intake of the browser's cookie; only for endpoints with access 'intake' alone. */
  readonly intakeId: string;
  /** The intake of the homeowner's link; only for endpoints with access 'homeowner' alone. */
  readonly homeownerIntakeId: string;
  /** Who is signed in; only for endpoints of the desk alone. */
  readonly session: SignedIn;
  readonly request: Request;
  readonly response: Response;
}

export interface BindOptions {
  /** Counted by the caller's address. */
  readonly limit?: LimitName;
}

function required<T>(value: T | null, what: string): T {
  if (value === null) throw new TypeError(`This endpoint does not ask for ${what}`);
  return value;
}

const callOf = (parts: Pick<Call<unknown, unknown, unknown>, 'params' | 'query' | 'body' | 'caller' | 'request' | 'response'>): Call<unknown, unknown, unknown> => ({
  ...parts,
  get intakeId() { return required(parts.caller.intakeId, 'an intake'); },
  get homeownerIntakeId() { return required(parts.caller.homeownerIntakeId, 'a homeowner'); },
  get session() { return required(parts.caller.session, 'a session'); },
});

/** An address that cannot be one of ours is no mistake in an answer: there is nothing here. */
function readParams(endpoint: Endpoint, request: Request): unknown {
  const result = endpoint.params?.safeParse(request.params);
  if (result && !result.success) throw problem('not-found');
  return result?.data;
}

const whoOf = ({ intakeId, homeownerIntakeId, session }: Caller): string => session?.staff.id ?? intakeId ?? homeownerIntakeId ?? 'public';

/**
 * Binds a handler to a declared endpoint: refuses other sites, counts tries, lets in only who may, reads and validates every part,
 * does what is marked idempotent once, and sends what the handler gives. In tests the answer is held against its declaration too.
 */
export function bind<P extends Part, Q extends Part, B extends Part, R extends Part>(
  { router, deps, bound }: Api, endpoint: Endpoint<P, Q, B, R>,
  handle: (call: Call<Read<P>, Read<Q>, Read<B>>) => Promise<Given<R>>, options: BindOptions = {},
): void {
  const { method, path, bodyType, idempotent, status } = endpoint;
  bound.push(endpoint);
  const reply = async (call: Call<unknown, unknown, unknown>): Promise<Reply> => {
    const answer: unknown = await handle(call as Call<Read<P>, Read<Q>, Read<B>>);
    if (deps.env.NODE_ENV === 'test' && endpoint.response !== undefined) endpoint.response.parse(answer);
    return { status, body: answer };
  };
  router[method](path.replaceAll(/\{(\w+)\}/g, ':$1'), async (request, response) => {
    if (method !== 'get' && bodyType !== 'raw') refuseOtherSites(request, deps.env.PUBLIC_URL);
    if (options.limit) await countTry(deps.sequelize, options.limit, addressOf(request), deps.env.RATE_LIMIT_FACTOR);
    const params = readParams(endpoint, request);
    const caller = await admit(deps, request, endpoint);
    const query = validate(endpoint.query, request.query);
    const given = await readBody(request, response, endpoint);
    const body = bodyType === 'raw' ? given : validate(endpoint.body, given);
    const call = callOf({ params, query, body, caller, request, response });
    const { status: code, body: answer } = idempotent
      ? await once(deps.sequelize, `${method} ${path} ${whoOf(caller)}`, request.get('Idempotency-Key'), requestHash({ params, body }), () => reply(call))
      : await reply(call);
    if (response.headersSent) return;
    response.setHeader('Cache-Control', 'no-store');
    if (answer === undefined) response.status(code).end();
    else response.status(code).json(answer);
  });
}
