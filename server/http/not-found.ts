import type { RequestHandler } from 'express';
import { problem } from './problem';

/** Every address and method under /api that nobody is bound to. */
export const notFound: RequestHandler = () => {
  throw problem('not-found');
};
