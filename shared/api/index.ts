import * as company from './company';
import * as desk from './desk';
import * as intakes from './intakes';
import * as quotes from './quotes';
import type { Endpoint } from './endpoint';

const isEndpoint = (value: unknown): value is Endpoint => typeof value === 'object' && value !== null && 'path' in value && 'method' in value && 'summary' in value;

/** Every endpoint, for OpenAPI and for the test that each route has one. */
export const endpoints: ReadonlyMap<string, Endpoint> = new Map(
  [company, intakes, quotes, desk].flatMap((module) => Object.entries(module).filter((entry): entry is [string, Endpoint] => isEndpoint(entry[1]))),
);
