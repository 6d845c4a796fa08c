import type { z } from '../../shared/zod';
import { pointerOf, problem } from './problem';

const MAX_DEPTH = 12;
const unstorableSign = /[\u0000\ud800-\udfff]/u;

/**
 * Finds text that PostgreSQL cannot store (a zero character, half of a pair) and nesting beyond reason.
 * Without recursion, so that depth cannot hurt.
 */
function unstorable(value: unknown): (string | number)[] | null {
  const open: { value: unknown; path: (string | number)[] }[] = [{ value, path: [] }];
  for (let entry = open.pop(); entry !== undefined; entry = open.pop()) {
    const { value: part, path } = entry;
    if (typeof part === 'string' && unstorableSign.test(part)) return path;
    if (typeof part !== 'object' || part === null || Buffer.isBuffer(part)) continue;
    if (path.length >= MAX_DEPTH) return path;
    for (const [key, inner] of Object.entries(part)) {
      if (unstorableSign.test(key)) return path;
      open.push({ value: inner, path: [...path, key] });
    }
  }
  return null;
}

/**
 * Checks one part of a request by its schema.
 * @throws problem validation, with a pointer to each thing that is wrong
 */
export function validate(schema: z.ZodType | undefined, value: unknown): unknown {
  const bad = unstorable(value);
  if (bad !== null) throw problem('validation', undefined, [{ pointer: pointerOf(bad), detail: 'There are signs in this that cannot be stored' }]);
  if (schema === undefined) return undefined;
  const result = schema.safeParse(value ?? {});
  if (result.success) return result.data;
  throw problem('validation', undefined, result.error.issues.map(({ path, message }) => ({ pointer: pointerOf(path), detail: message })));
}
