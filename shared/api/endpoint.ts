import type { z } from '../zod';

/** Who may call: anyone; the browser that holds an intake; the holder of a homeowner's link; someone signed in at the desk. */
export type Access = 'public' | 'intake' | 'homeowner' | 'owner' | 'estimator' | 'sales' | 'desk';

export interface Endpoint<
  Params extends z.ZodType | undefined = z.ZodType | undefined,
  Query extends z.ZodType | undefined = z.ZodType | undefined,
  Body extends z.ZodType | undefined = z.ZodType | undefined,
  Response extends z.ZodType | undefined = z.ZodType | undefined,
> {
  readonly method: 'get' | 'post' | 'put' | 'patch' | 'delete';
  /** Under /api, with {names} as OpenAPI writes them. */
  readonly path: string;
  readonly summary: string;
  readonly access: readonly Access[];
  readonly params: Params;
  readonly query: Query;
  readonly body: Body;
  /** undefined: 204 without a body. */
  readonly response: Response;
  readonly status: number;
  /** The call must carry an Idempotency-Key header. */
  readonly idempotent: boolean;
  /** 'json' unless the body is a form with a file. */
  readonly bodyType: 'json' | 'multipart' | 'raw';
  /** 'json' unless the answer is a picture. */
  readonly responseType: 'json' | 'image';
}

type Part = z.ZodType | undefined;

/** Declares one endpoint: the server validates by it, OpenAPI is made from it, the browser's hooks are typed by it. */
export function endpoint<P extends Part = undefined, Q extends Part = undefined, B extends Part = undefined, R extends Part = undefined>(
  declaration: Pick<Endpoint, 'method' | 'path' | 'summary'> & {
    access?: readonly Access[]; params?: P; query?: Q; body?: B; response?: R; status?: number; idempotent?: boolean; bodyType?: Endpoint['bodyType']; responseType?: Endpoint['responseType'];
  },
): Endpoint<P, Q, B, R> {
  return {
    access: ['public'], status: declaration.response === undefined ? 204 : 200, idempotent: false, bodyType: 'json', responseType: 'json', ...declaration,
    params: declaration.params as P, query: declaration.query as Q, body: declaration.body as B, response: declaration.response as R,
  };
}
