import { intakeInputSchema, type IntakeInput } from '../../shared/api/intake-input';
import { problemKinds, type Problem, type ProblemError } from '../../shared/problem';

/** An RFC 9457 document for a refused input. */
export const inputProblem = (kind: 'malformed' | 'validation', detail: string, errors: ProblemError[] = []): Problem => ({
  type: `/problems/${kind}`,
  ...problemKinds[kind],
  detail,
  ...(errors.length > 0 ? { errors } : {}),
});

/** A JSON Pointer (RFC 6901) from a path. */
const pointer = (path: readonly PropertyKey[]): string =>
  path.map((part) => `/${String(part).replaceAll('~', '~0').replaceAll('/', '~1')}`).join('');

/** Reads and checks one intake; everything wrong with it comes back in one problem document. */
export function parseIntake(text: string): { readonly input: IntakeInput } | { readonly problem: Problem } {
  let json: unknown;
  try {
    json = JSON.parse(text);
  } catch (error) {
    return { problem: inputProblem('malformed', error instanceof Error ? error.message : 'This is not JSON') };
  }
  const result = intakeInputSchema.safeParse(json);
  if (result.success) return { input: result.data };
  const errors = result.error.issues.flatMap((issue) =>
    issue.code === 'unrecognized_keys'
      ? issue.keys.map((key) => ({ pointer: pointer([...issue.path, key]), detail: 'There is no such fact' }))
      : [{ pointer: pointer(issue.path), detail: issue.message }],
  );
  return { problem: inputProblem('validation', 'The intake has facts that cannot be priced', errors) };
}
