import { problemKinds } from '../../../shared/problem';
import { endpoints } from '../../../shared/api/index';
import { startTestApp, type TestApp } from '../../support/app';

interface Operation {
  readonly operationId: string;
  readonly security: readonly Record<string, unknown>[];
  readonly parameters?: readonly { name: string; in: string; required: boolean }[];
  readonly requestBody?: { content: Record<string, { schema: { properties?: Record<string, unknown>; required?: string[] } }> };
  readonly responses: Record<string, { content?: Record<string, { schema: unknown }> }>;
}
interface Document { readonly openapi: string; readonly paths: Record<string, Record<string, Operation>> }

let server: TestApp;
let document: Document;
beforeAll(async () => {
  server = await startTestApp();
  document = (await server.browser().get('/api/openapi.json').expect(200)).body as Document;
});
afterAll(() => server.stop());

const operations = () => Object.entries(document.paths).flatMap(([path, methods]) =>
  Object.entries(methods).map(([method, operation]) => ({ path, method, operation })));
const named = (list: readonly { method: string; path: string }[]) => list.map(({ method, path }) => `${method} ${path}`).sort();

it('is OpenAPI 3.1', () => { expect(document.openapi).toBe('3.1.0'); });

it('lists every bound route and only those, each bound once', () => {
  expect(named(server.bound)).toEqual(named(operations()));
  expect(named(server.bound)).toEqual(named([...endpoints.values()]));
  expect(new Set(named(server.bound)).size).toBe(server.bound.length);
});

it('every operation has a name of its own, an answer and problem documents', () => {
  const ids = operations().map(({ operation }) => operation.operationId);
  expect(new Set(ids).size).toBe(ids.length);
  const statuses = new Set<string>(Object.values(problemKinds).map(({ status }) => String(status)));
  for (const { operation } of operations()) {
    const codes = Object.keys(operation.responses);
    expect(codes.filter((code) => code.startsWith('2'))).toHaveLength(1);
    expect(operation.responses.default?.content).toHaveProperty(['application/problem+json']);
    for (const code of codes.filter((one) => /^[45]/.test(one))) {
      expect(statuses).toContain(code);
      expect(operation.responses[code]?.content).toHaveProperty(['application/problem+json']);
    }
  }
});

it('names every parameter of a path, and the keys and marks that a call needs', () => {
  for (const { path, operation } of operations()) {
    const inPath = [...path.matchAll(/\{(\w+)\}/g)].map(([, name]) => name);
    expect((operation.parameters ?? []).filter((parameter) => parameter.in === 'path').map(({ name }) => name).sort()).toEqual(inPath.sort());
  }
  const { patch } = document.paths['/leads/{id}'] ?? {};
  expect(patch?.security).toEqual([{ deskCookie: [], deskCsrf: [] }]);
  expect(document.paths['/intakes/current/deposit']?.post?.parameters).toContainEqual(expect.objectContaining({ name: 'Idempotency-Key', in: 'header', required: true }));
  expect(document.paths['/intakes']?.post?.security).toEqual([{}, { intakeCookie: [] }]);
  expect(document.paths['/intakes/current/photos']?.post?.requestBody?.content['multipart/form-data']?.schema.required).toEqual(['slot', 'photo']);
});

it('every reference leads somewhere', () => {
  const text = JSON.stringify(document);
  const references = [...text.matchAll(/"\$ref":"#\/([^"]+)"/g)].map(([, path]) => path ?? '');
  expect(references.length).toBeGreaterThan(0);
  for (const reference of new Set(references)) expect(document).toHaveProperty(reference.split('/'));
});
