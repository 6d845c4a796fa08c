import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { Intake } from '../../shared/api/intakes';
import { completeAnswers } from '../support/answers';
import { useTestDatabase } from '../support/database';
import { endLeftServers, runServer, startServer, type ServerProcess } from '../support/server-process';

const database = useTestDatabase();
const folder = mkdtempSync(join(tmpdir(), 'tidyrun-main-'));
afterEach(endLeftServers);
afterAll(() => rmSync(folder, { recursive: true, force: true }));

const env = () => ({ DATABASE_URL: database.url, SMTP_URL: 'smtp://127.0.0.1:1', MAIL_FROM: 'quotes@example.com', STORAGE_DIR: folder, PUBLIC_URL: 'http://127.0.0.1:4173' });
const api = (server: ServerProcess, method: string, path: string, cookie = '', body?: object) => fetch(`${server.url}/api${path}`, {
  method, headers: { 'Sec-Fetch-Site': 'same-origin', Cookie: cookie, ...(body ? { 'Content-Type': 'application/json' } : {}) }, ...(body ? { body: JSON.stringify(body) } : {}),
});

it('half a configuration: says which variable in plain lines and ends with 1', async () => {
  const { code, output } = await runServer({ ...env(), STRIPE_SECRET_KEY: 'sk_test_half' });
  expect(code).toBe(1);
  expect(output).toMatch(/^STRIPE_WEBHOOK_SECRET: /m);
  expect(output).not.toMatch(/sk_test_half|^\s+at /m);
}, 60_000);

it('a database that is not there: one plain line and 1', async () => {
  const { code, output } = await runServer({ ...env(), DATABASE_URL: 'postgres://nobody@127.0.0.1:1/none' });
  expect(code).toBe(1);
  expect(output).toMatch(/^The server could not start: /m);
}, 60_000);

it('two processes on one database are one product: a cookie of one works in the other, and answers meet', async () => {
  const [one, two] = await Promise.all([startServer(env()), startServer(env())]);
  const started = await api(one, 'POST', '/intakes');
  const cookie = started.headers.getSetCookie()[0]?.split(';')[0] ?? '';
  const entries = Object.entries(completeAnswers);
  const saved = await Promise.all(entries.map(([id, value], index) => api(index % 2 ? one : two, 'PATCH', '/intakes/current/answers', cookie, { answers: { [id]: value } })));
  expect(saved.map(({ status }) => status)).toEqual(entries.map(() => 200));
  const prices = await Promise.all([one, two, one, two].map(async (server) => (await api(server, 'POST', '/intakes/current/quote', cookie)).json() as Promise<{ id: string }>));
  expect(new Set(prices.map(({ id }) => id)).size).toBe(1);
  const intake = await (await api(two, 'GET', '/intakes/current', cookie)).json() as Intake;
  expect(intake).toMatchObject({ stage: 'priced', version: entries.length + 1, answers: completeAnswers });
  expect(await Promise.all([one.end(), two.end()])).toEqual([0, 0]);
}, 120_000);

it('SIGTERM under load: what was begun is answered, nothing acknowledged is lost, and it ends with 0', async () => {
  const server = await startServer(env());
  const started = await api(server, 'POST', '/intakes');
  const cookie = started.headers.getSetCookie()[0]?.split(';')[0] ?? '';
  const begun = Array.from({ length: 12 }, (_, index) => api(server, 'PATCH', '/intakes/current/answers', cookie, { answers: { floorAreaFt2: 1_000 + index * 100 } }));
  await begun[0];
  const ending = server.end();
  const answered = await Promise.allSettled(begun);
  const statuses = answered.flatMap((reply) => (reply.status === 'fulfilled' ? [reply.value.status] : []));
  expect(statuses).toHaveLength(begun.length);
  expect(new Set(statuses)).toEqual(new Set([200]));
  expect(await ending).toBe(0);
  const again = await startServer(env());
  expect(await (await api(again, 'GET', '/intakes/current', cookie)).json()).toHaveProperty('version', 13);
  await again.end();
}, 120_000);

it('kill -9 at any moment: every acknowledged answer is there', async () => {
  const first = await startServer(env());
  const started = await api(first, 'POST', '/intakes');
  const cookie = started.headers.getSetCookie()[0]?.split(';')[0] ?? '';
  const acknowledged: Record<string, unknown> = {};
  const saving = Object.entries(completeAnswers).map(async ([id, value]) => {
    const reply = await api(first, 'PATCH', '/intakes/current/answers', cookie, { answers: { [id]: value } });
    if (reply.ok) acknowledged[id] = value;
  });
  await Promise.race(saving);
  const killed = first.end('SIGKILL');
  await Promise.allSettled(saving);
  expect(await killed).toBe('SIGKILL');
  expect(Object.keys(acknowledged).length).toBeGreaterThan(0);
  const second = await startServer(env());
  const intake = await (await api(second, 'GET', '/intakes/current', cookie)).json() as Intake;
  expect(intake.answers).toMatchObject(acknowledged);
  await second.end();
}, 120_000);
