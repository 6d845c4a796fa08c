import type { Response } from 'supertest';
import { problemKinds, problemSchema, type ProblemKind } from '../../shared/problem';

/** Expects a problem document of this kind, RFC 9457, and gives its pointers. */
export function expectProblem(response: Response, kind: ProblemKind): readonly string[] {
  expect({ status: response.status, type: response.headers['content-type'] as unknown }).toEqual({
    status: problemKinds[kind].status, type: expect.stringMatching(/^application\/problem\+json/) as unknown,
  });
  const problem = problemSchema.parse(JSON.parse(response.text));
  expect(problem).toMatchObject({ type: `/problems/${kind}`, status: problemKinds[kind].status, title: problemKinds[kind].title });
  return (problem.errors ?? []).map(({ pointer }) => pointer);
}
