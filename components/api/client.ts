import type { z } from 'zod';
import type { Endpoint } from '../../shared/api/endpoint';
import { NetworkError, ProblemError } from './problem-error';

export { failureWords, isProblem, NetworkError, problemByField, ProblemError } from './problem-error';

type Part = z.ZodType | undefined;
type Given<T> = T extends z.ZodType ? z.input<T> : undefined;
type Answered<T> = T extends z.ZodType ? z.output<T> : undefined;
type Needed<Name extends string, T> = T extends z.ZodType ? Record<Name, z.input<T>> : Partial<Record<Name, Given<T>>>;

export interface CallOptions {
  /** Sent as Idempotency-Key: the same attempt keeps the same key. */
  readonly idempotencyKey?: string;
  readonly headers?: Readonly<Record<string, string>>;
  /** Lets the request outlive the page (for saving on the way out). */
  readonly keepalive?: boolean;
  readonly signal?: AbortSignal;
}
export type RequestOptions<P extends Part, Q extends Part, B extends Part> = CallOptions & Needed<'params', P> & Needed<'query', Q> & Needed<'body', B>;

/** The options may be left out when nothing in them is needed. */
type OptionsArgument<O> = Partial<O> extends O ? [options?: O] : [options: O];

type Call = Pick<Endpoint, 'method' | 'path'>;
type Loose = CallOptions & { readonly params?: unknown; readonly query?: unknown; readonly body?: unknown };

/**
 * Calls one declared endpoint, typed by it. Answers are not parsed again in the browser: the server already did.
 * @throws ProblemError when the server refuses, NetworkError when no answer comes.
 */
export function request<P extends Part, Q extends Part, B extends Part, R extends Part>(
  endpoint: Endpoint<P, Q, B, R>, ...[options]: OptionsArgument<RequestOptions<P, Q, B>>
): Promise<Answered<R>> {
  return send<Answered<R>>(endpoint, options as Loose | undefined);
}

/** The same without the declaration's schemas, for pages that must not load zod. */
export async function send<T>({ method, path }: Call, options: Loose = {}): Promise<T> {
  const json = options.body !== undefined;
  let response: Response;
  try {
    response = await fetch(apiAddress(path, options.params, options.query), {
      method: method.toUpperCase(),
      credentials: 'same-origin',
      headers: {
        Accept: 'application/json, application/problem+json',
        ...(json ? { 'Content-Type': 'application/json' } : {}),
        ...(options.idempotencyKey ? { 'Idempotency-Key': options.idempotencyKey } : {}),
        ...options.headers,
      },
      ...(json ? { body: JSON.stringify(options.body) } : {}),
      ...(options.keepalive ? { keepalive: true } : {}),
      ...(options.signal ? { signal: options.signal } : {}),
    });
  } catch (error) {
    if (options.signal?.aborted) throw error;
    throw new NetworkError();
  }
  return readAnswer<T>(response.status, await response.text().catch(() => ''));
}

/** Turns a status and a body into the answer. @throws ProblemError when it is a refusal. */
export function readAnswer<T>(status: number, text: string): T {
  let body: unknown;
  try {
    body = text === '' ? undefined : JSON.parse(text);
  } catch {
    body = undefined;
  }
  if (status >= 200 && status < 300) return body as T;
  const given = typeof body === 'object' && body !== null && 'title' in body ? (body as ProblemError['problem']) : null;
  throw new ProblemError(given ?? { type: 'about:blank', title: 'Something went wrong on our side', status, detail: 'Nothing you typed is lost. Try again in a minute.' });
}

/** "/api/leads/7?sort=due" from an endpoint's path, its params and its query. Undefined entries are left out. */
export function apiAddress(path: string, params?: unknown, query?: unknown): string {
  const filled = path.replace(/\{(\w+)\}/g, (_, name: string) => encodeURIComponent(String((params as Record<string, unknown> | undefined)?.[name] ?? '')));
  const search = new URLSearchParams();
  for (const [name, value] of Object.entries((query ?? {}) as Record<string, unknown>)) {
    if (value !== undefined && value !== null && value !== '') search.set(name, String(value));
  }
  return `/api${filled}${search.size > 0 ? `?${search.toString()}` : ''}`;
}

/** A key for one attempt at something that makes money or mail. */
export const newIdempotencyKey = (): string =>
  Array.from(crypto.getRandomValues(new Uint8Array(16)), (byte) => byte.toString(16).padStart(2, '0')).join('');
