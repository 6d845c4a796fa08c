import { randomUUID } from 'node:crypto';
import type { ErrorRequestHandler } from 'express';
import multer from 'multer';
import type { Logger } from 'pino';
import { ConnectionError, DatabaseError } from 'sequelize';
import { problem, problemOf, Refusal, sendProblem } from './problem';

/** PostgreSQL's codes for "not now": shutting down, starting up, too many connections, cancelled by its own time limit. */
const awayCodes = new Set(['57P01', '57P02', '57P03', '53300', '57014', '08006', '08001', '08003']);
const networkCodes = new Set(['ECONNREFUSED', 'ECONNRESET', 'EPIPE', 'ENOTFOUND', 'ETIMEDOUT']);
/** The disk is full, read-only or gone. */
const storageCodes = new Set(['ENOSPC', 'EROFS', 'EIO', 'EDQUOT', 'EACCES', 'EMFILE']);

const fieldOf = (error: unknown, name: string): unknown => (typeof error === 'object' && error !== null ? (error as Record<string, unknown>)[name] : undefined);

function databaseIsAway(error: unknown): boolean {
  if (error instanceof ConnectionError) return true;
  const code = error instanceof DatabaseError ? fieldOf(error.parent, 'code') : undefined;
  const lost = error instanceof DatabaseError && /Connection terminated|not queryable/.test(error.message);
  return lost || (typeof code === 'string' && (awayCodes.has(code) || networkCodes.has(code)));
}

/** The refusal that an error stands for; null when it is our own fault. */
export function refusalFor(error: unknown): Refusal | null {
  if (error instanceof Refusal) return error;
  if (error instanceof multer.MulterError) {
    return error.code === 'LIMIT_FILE_SIZE'
      ? problem('too-large', 'A photo may have 25 MB at most. Take it again in a smaller size.')
      : problem('malformed', 'Send one picture in the field “photo” and its place in the field “slot”.');
  }
  if (databaseIsAway(error)) return problem('unavailable', 'Nothing you typed is lost. Try again in a minute.', undefined, { 'Retry-After': '5' });
  const code = fieldOf(error, 'code');
  if (typeof code === 'string' && storageCodes.has(code)) return problem('unavailable', 'We cannot keep files right now. Try again in a minute.', undefined, { 'Retry-After': '30' });
  // What express, its body parsers and the form reader throw about a request carries the status that it deserves.
  const status = fieldOf(error, 'status');
  if (status === 413) return problem('too-large', 'That is more than this address takes.');
  if (typeof status === 'number' && status >= 400 && status < 500) return problem('malformed');
  return error instanceof Error && /Malformed part|Unexpected end of form|Multipart: Boundary|Malformed content type|Malformed urlencoded/.test(error.message) ? problem('malformed') : null;
}

/**
 * What may be written down of an error. A database's words hold what people typed, so of those only names and codes are kept.
 */
export function errorForLog(error: unknown): Record<string, unknown> {
  if (!(error instanceof Error)) return { name: typeof error };
  const frames = (error.stack ?? '').split('\n').filter((line) => /^\s+at /.test(line)).slice(0, 12);
  const parent = fieldOf(error, 'parent') ?? error;
  const ours = !error.name.startsWith('Sequelize') && error.name !== 'ZodError' && fieldOf(error, 'severity') === undefined;
  return {
    name: error.name, code: fieldOf(parent, 'code'), table: fieldOf(parent, 'table'), constraint: fieldOf(parent, 'constraint'),
    ...(ours ? { message: error.message } : {}), frames,
  };
}

/** Turns whatever was thrown into a problem document. The last middleware. */
export const handleErrors = (logger: Logger): ErrorRequestHandler => (error: unknown, request, response, next) => {
  const refusal = refusalFor(error);
  if (refusal !== null && refusal.problem.status === 503) logger.warn({ err: errorForLog(error) }, 'not ready');
  if (response.headersSent) return next(error);
  if (refusal !== null) return sendProblem(response, refusal);
  // Who went away in the middle of sending gets nothing and is nobody's fault.
  if (request.aborted || fieldOf(error, 'type') === 'request.aborted') { response.destroy(); return undefined; }
  const instance = `urn:uuid:${randomUUID()}`;
  logger.error({ instance, err: errorForLog(error) }, 'failed');
  return sendProblem(response, { problem: problemOf('internal', { detail: 'Nothing you typed is lost. Try again in a minute.', instance }), headers: {} });
};
