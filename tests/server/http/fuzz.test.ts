import fc from 'fast-check';
import request from 'supertest';
import { hashPassword } from '../../../server/auth/passwords';
import { problemSchema } from '../../../shared/problem';
import { endpoints } from '../../../shared/api/index';
import { fieldsById } from '../../../shared/wizard/index';
import type { Session } from '../../../shared/api/desk';
import { startTestApp, type Agent, type TestApp } from '../../support/app';

/** Requests in all; the wide run over every input is left to a longer test. */
const RUNS = 400;

let server: TestApp;
let visitor: Agent;
let desk: Agent;
beforeAll(async () => {
  server = await startTestApp();
  visitor = server.browser();
  await visitor.post('/api/intakes').expect(200);
  await server.deps.models.Staff.create({ email: 'owner@example.com', name: 'Odell Finch', role: 'owner', passwordHash: await hashPassword('a long password') });
  desk = server.browser();
  const { csrfToken } = (await desk.post('/api/session').send({ email: 'owner@example.com', password: 'a long password' }).expect(200)).body as Session;
  desk.set('X-CSRF-Token', csrfToken);
});
afterAll(() => server.stop());

const nasty = fc.oneof(
  fc.string({ unit: 'binary', maxLength: 60 }), fc.constantFrom('', '\u0000', '\ud800', '__proto__', "'; DROP TABLE leads; --", '%00', '../../etc/passwd', '1e999', 'NaN', '00017', 'unsure'),
  fc.double(), fc.maxSafeInteger(), fc.boolean(), fc.constant(null),
);
const keys = fc.oneof(fc.constantFrom(...fieldsById.keys(), 'answers', 'email', 'zip', 'token', 'password', 'contact', 'quoteId', 'optionId', 'stage', 'note', 'slot', 'name', 'street', 'consent', '__proto__'), fc.string({ maxLength: 10 }));
const { tree } = fc.letrec((tie) => ({
  tree: fc.oneof({ maxDepth: 3 }, nasty, fc.array(tie('tree'), { maxLength: 4 }), fc.dictionary(keys, tie('tree'), { maxKeys: 6 })),
}));
const body = fc.oneof(tree, fc.dictionary(keys, tree, { maxKeys: 6 }), fc.record({ answers: fc.dictionary(keys, tree, { maxKeys: 4 }) }));
// Health and company read nothing of the caller's.
const targets = [...endpoints.values()].filter(({ params, query, body: declared, bodyType }) => params ?? query ?? declared ?? (bodyType === 'raw' ? true : undefined));

const call = fc.record({
  endpoint: fc.constantFrom(...targets), words: fc.array(fc.oneof(fc.string({ unit: 'binary', minLength: 1, maxLength: 20 }), fc.uuid()), { minLength: 2, maxLength: 2 }),
  query: fc.dictionary(fc.constantFrom('search', 'cursor', 'sort', 'limit', 'stage'), fc.oneof(fc.string({ unit: 'binary', maxLength: 30 }), fc.constantFrom('due', '1', '0', 'eyJ9')), { maxKeys: 3 }),
  body, signedIn: fc.boolean(), ifMatch: fc.constantFrom('"1"', '*', 'x'),
});

it(`${RUNS} requests that make no sense: no failure on our side, and every refusal is a problem document`, async () => {
  await fc.assert(fc.asyncProperty(call, async ({ endpoint, words, query, body: sent, signedIn, ifMatch }) => {
    const [first = '', second = ''] = words.map((word) => encodeURIComponent(word.replaceAll(/[\ud800-\udfff]/gu, '?')));
    const path = endpoint.path.replace('{id}', first).replace('{size}', second);
    const address = `/api${path}?${new URLSearchParams(query).toString()}`;
    // Leave the intake of the visitor in place, or nothing after it would be reached.
    const holdsNothing = endpoint.method === 'delete' && /^\/(intakes\/current|session)$/.test(endpoint.path);
    const agent = holdsNothing ? request(server.app) : signedIn ? desk : visitor;
    const made = agent[endpoint.method](address).set('Idempotency-Key', 'a-key-for-fuzz').set('If-Match', ifMatch);
    const response = endpoint.method === 'get' || endpoint.method === 'delete' ? await made : await made.set('Content-Type', 'application/json').send(JSON.stringify(sent) ?? '');
    if (response.status >= 400) {
      expect(response.headers['content-type']).toMatch(/^application\/problem\+json/);
      const told = problemSchema.parse(JSON.parse(response.text));
      // Without a payment provider a well-formed request for one is the only thing that we may not be ready for.
      expect(told.status === response.status && (response.status < 500 || told.type === '/problems/payment-unavailable')).toBe(true);
    } else expect(response.status).toBeLessThan(300);
  }), { numRuns: RUNS });
}, 300_000);
