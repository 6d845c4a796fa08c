import type { ErrorRequestHandler } from 'express';

interface ErrorBody { readonly type: string; readonly message: string; readonly code?: string; readonly param?: string }

/** A refusal in the provider's own shape. */
export class ApiError extends Error {
  constructor(readonly status: number, readonly body: ErrorBody) {
    super(body.message);
  }
}

/** An ApiError of the usual type, `invalid_request_error`, unless another is given. */
export const refuse = (status: number, error: Omit<ErrorBody, 'type'> & { type?: string }): ApiError =>
  new ApiError(status, { type: 'invalid_request_error', ...error });

export const missing = (kind: string, id: string, param: string): ApiError =>
  refuse(404, { code: 'resource_missing', message: `No such ${kind}: '${id}'`, param });

/** Sends ApiErrors as the provider does; anything else is its 500. */
export const apiErrors: ErrorRequestHandler = (error: unknown, _request, response, _next) => {
  const known = error instanceof ApiError ? error : new ApiError(500, { type: 'api_error', message: error instanceof Error ? error.message : String(error) });
  response.status(known.status).json({ error: known.body });
};
