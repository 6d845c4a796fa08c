import { z } from '../../shared/zod';
import { problem } from '../http/problem';

const placeSchema = z.tuple([z.string().max(200), z.uuid()]);
/** The last row of a page: its sort value as PostgreSQL writes it, and its id. */
export type Place = z.infer<typeof placeSchema>;

export const writeCursor = (place: Place): string => Buffer.from(JSON.stringify(place)).toString('base64url');

/** @throws a validation problem when the cursor is none of ours */
export function readCursor(cursor: string): Place {
  try {
    return placeSchema.parse(JSON.parse(Buffer.from(cursor, 'base64url').toString('utf8')));
  } catch {
    throw problem('validation', 'This page of the list no longer fits. Start from the first page.', [{ pointer: '/cursor', detail: 'Not a cursor of this list' }]);
  }
}
