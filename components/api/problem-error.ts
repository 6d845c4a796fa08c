import type { Problem } from '../../shared/problem';

/** The server refused, and said why in a problem document (RFC 9457). */
export class ProblemError extends Error {
  constructor(readonly problem: Problem) {
    super(problem.detail ?? problem.title);
    this.name = 'ProblemError';
  }

  get status(): number {
    return this.problem.status;
  }
}

/** No answer came: no connection, or the server was away. Nothing is known about what it did. */
export class NetworkError extends Error {
  constructor() {
    super('No answer came. Check the connection, then try again.');
    this.name = 'NetworkError';
  }
}

/** True for refusals with one of these statuses. */
export const isProblem = (error: unknown, ...statuses: readonly number[]): error is ProblemError =>
  error instanceof ProblemError && (statuses.length === 0 || statuses.includes(error.status));

/** One calm sentence on a failure, for places without words of their own. */
export function failureWords(error: unknown): string {
  if (error instanceof ProblemError) return error.problem.detail ?? error.problem.title;
  if (error instanceof NetworkError) return error.message;
  return 'Something went wrong on this page. Your answers are kept. Try again.';
}

/** What the server said about single fields: the last part of each pointer to its detail. */
export const problemByField = (error: unknown): Readonly<Record<string, string>> =>
  error instanceof ProblemError
    ? Object.fromEntries((error.problem.errors ?? []).map((entry) => [entry.pointer.split('/').pop() ?? '', entry.detail]))
    : {};
