import { z } from '../../shared/zod';
import type { Access, Endpoint } from '../../shared/api/endpoint';
import { problemKinds, problemSchema, type ProblemKind } from '../../shared/problem';

type Json = Record<string, unknown>;

/** JSON Schema 2020-12, which OpenAPI 3.1 takes as it is. What is sent is described before, what is answered after its transformations. */
const schemaOf = (schema: z.ZodType, io: 'input' | 'output'): Json => {
  const { $schema: _dialect, ...rest } = z.toJSONSchema(schema, { io, unrepresentable: 'any' });
  return rest;
};

const deskAccess: readonly Access[] = ['owner', 'estimator', 'sales', 'desk'];
const cookieOf = (access: Access): string => (access === 'intake' ? 'intakeCookie' : access === 'homeowner' ? 'homeownerCookie' : 'deskCookie');

function security({ access, method }: Endpoint): Json[] {
  return [...new Set(access)].map((kind) => {
    if (kind === 'public') return {};
    return { [cookieOf(kind)]: [], ...(method !== 'get' && deskAccess.includes(kind) ? { deskCsrf: [] } : {}) };
  }).filter((entry, index, all) => all.findIndex((other) => JSON.stringify(other) === JSON.stringify(entry)) === index);
}

/** The refusals that an endpoint may give; those without a reason of their own come under `default`. */
function refusals({ access, method, body, query, bodyType, idempotent, params }: Endpoint): ProblemKind[] {
  const stranger = access.includes('public') ? [] : access.every((kind) => deskAccess.includes(kind)) ? ['unauthenticated' as const] : ['not-found' as const];
  return [
    ...stranger,
    ...(params ? ['not-found' as const] : []),
    ...(method !== 'get' && bodyType !== 'raw' || deskAccess.some((kind) => access.includes(kind)) ? ['forbidden' as const] : []),
    ...(body !== undefined || idempotent || bodyType === 'raw' ? ['malformed' as const] : []),
    ...(body !== undefined || bodyType === 'raw' ? ['too-large' as const] : []),
    ...(body ?? query ? ['validation' as const] : []),
    ...(bodyType === 'multipart' ? ['unsupported-media' as const] : []),
    ...(idempotent ? ['conflict' as const] : []),
  ];
}

const problemContent = { 'application/problem+json': { schema: { $ref: '#/components/schemas/Problem' } } };

function requestBody({ body, bodyType }: Endpoint): Json | undefined {
  if (bodyType === 'raw') return { required: true, content: { 'application/json': { schema: { type: 'object' } } } };
  if (body === undefined) return undefined;
  const schema = schemaOf(body, 'input');
  if (bodyType === 'json') return { required: true, content: { 'application/json': { schema } } };
  const photo = { type: 'string', contentMediaType: 'application/octet-stream' };
  return { required: true, content: { 'multipart/form-data': { schema: { ...schema, properties: { ...(schema.properties as Json), photo }, required: [...(schema.required as string[] ?? []), 'photo'] } } } };
}

/** Parameters from an object's schema, one by one. */
function parametersOf(schema: z.ZodType | undefined, place: 'path' | 'query'): Json[] {
  if (schema === undefined) return [];
  const { properties = {}, required = [] } = schemaOf(schema, 'input') as { properties?: Record<string, Json>; required?: string[] };
  return Object.entries(properties).map(([name, inner]) => ({ name, in: place, required: place === 'path' || required.includes(name), schema: inner }));
}

function answer({ response, responseType, summary }: Endpoint): Json {
  if (responseType === 'image') return { description: summary, content: { 'image/jpeg': { schema: { type: 'string', contentMediaType: 'image/jpeg' } } } };
  return { description: summary, ...(response === undefined ? {} : { content: { 'application/json': { schema: schemaOf(response, 'output') } } }) };
}

function operation(id: string, endpoint: Endpoint): Json {
  const parameters = [
    ...parametersOf(endpoint.params, 'path'), ...parametersOf(endpoint.query, 'query'),
    ...(endpoint.idempotent ? [{ name: 'Idempotency-Key', in: 'header', required: true, schema: { type: 'string', minLength: 8, maxLength: 200 } }] : []),
  ];
  const body = requestBody(endpoint);
  const refused = Object.fromEntries(refusals(endpoint).map((kind) => {
    const { status, title } = problemKinds[kind];
    return [String(status), { description: title, content: problemContent }];
  }));
  return {
    operationId: id, summary: endpoint.summary, security: security(endpoint),
    ...(parameters.length > 0 ? { parameters } : {}),
    ...(body ? { requestBody: body } : {}),
    responses: { [String(endpoint.status)]: answer(endpoint), ...refused, default: { description: 'Any other refusal', content: problemContent } },
  };
}

/** The OpenAPI 3.1 document of these endpoints, by operation id. */
export function buildOpenApi(endpoints: ReadonlyMap<string, Endpoint>): Json {
  const paths: Record<string, Json> = {};
  for (const [id, endpoint] of endpoints) (paths[endpoint.path] ??= {})[endpoint.method] = operation(id, endpoint);
  const cookie = (name: string) => ({ type: 'apiKey', in: 'cookie', name });
  return {
    openapi: '3.1.0',
    info: { title: 'Tidyrun', version: '1', description: 'Refusals are problem documents (RFC 9457). Changes must come from the site itself (Sec-Fetch-Site or Origin).' },
    servers: [{ url: '/api' }],
    paths,
    components: {
      schemas: { Problem: schemaOf(problemSchema, 'output') },
      securitySchemes: {
        intakeCookie: cookie('tidyrun_intake'), homeownerCookie: cookie('tidyrun_my'), deskCookie: cookie('tidyrun_desk'),
        deskCsrf: { type: 'apiKey', in: 'header', name: 'X-CSRF-Token' },
      },
    },
  };
}
