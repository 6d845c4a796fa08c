import { hashPassword } from '../../../server/auth/passwords';
import { cookieNames } from '../../../server/http/cookies';
import { limits } from '../../../server/http/rate-limits';
import type { Session } from '../../../shared/api/desk';
import { startTestApp, type Agent, type TestApp } from '../../support/app';
import { expectProblem } from '../../support/problem';

let server: TestApp;
let now = new Date();
const password = 'correct horse battery';
beforeAll(async () => {
  server = await startTestApp({ clock: () => now });
  const passwordHash = await hashPassword(password);
  await server.deps.models.Staff.bulkCreate([
    { email: 'owner@example.com', name: 'Odell Finch', role: 'owner', passwordHash },
    { email: 'gone@example.com', name: 'Former Person', role: 'estimator', passwordHash, active: false },
  ]);
});
afterAll(() => server.stop());
afterEach(() => { now = new Date(); });

const signIn = (browser: Agent, email = 'owner@example.com', given = password) => browser.post('/api/session').send({ email, password: given });
const tokenOf = (browser: Agent): string => browser.jar.getCookie(cookieNames.desk, { path: '/api', domain: '127.0.0.1', secure: false, script: false })?.value ?? '';
const whoHolds = (token: string) => server.browser().get('/api/session').set('Cookie', `${cookieNames.desk}=${token}`);

it('without a session: sign in first', async () => {
  expectProblem(await server.browser().get('/api/session'), 'unauthenticated');
  expectProblem(await server.browser().delete('/api/session'), 'unauthenticated');
});

it('a wrong password, an unknown account and a deactivated person are told the same, and cost the same check', async () => {
  const replies = await Promise.all([signIn(server.browser(), 'owner@example.com', 'wrong'), signIn(server.browser(), 'nobody@example.com'), signIn(server.browser(), 'gone@example.com')]);
  for (const reply of replies) expectProblem(reply, 'unauthenticated');
  expect(new Set(replies.map(({ text }) => text)).size).toBe(1);
  expect(replies.every(({ headers }) => headers['set-cookie'] === undefined)).toBe(true);
});

it('empty fields have their own words', async () => {
  expect(expectProblem(await signIn(server.browser(), '', ''), 'validation')).toEqual(['/email', '/password']);
});

it('signs in whatever the case of the address, for as long as the browser is open', async () => {
  const browser = server.browser();
  const { body, headers } = await signIn(browser, ' Owner@Example.com ').expect(200);
  expect(body).toMatchObject({ name: 'Odell Finch', email: 'owner@example.com', role: 'owner' });
  const [cookie] = headers['set-cookie'] as unknown as string[];
  expect(cookie).toMatch(/^tidyrun_desk=[\w-]{43}; Path=\/api; HttpOnly; SameSite=Lax$/);
  expect((await browser.get('/api/session').expect(200)).body).toEqual(body);
});

it('passwords and tokens are stored only as hashes', async () => {
  const browser = server.browser();
  await signIn(browser).expect(200);
  const [rows] = await server.deps.sequelize.query(`SELECT staff::text || desk_sessions::text AS row FROM staff JOIN desk_sessions ON staff_id = staff.id`);
  expect(JSON.stringify(rows)).not.toContain(password);
  expect(JSON.stringify(rows)).not.toContain(tokenOf(browser));
  // OWASP's password storage cheat sheet: argon2id, 19 MiB (19,456 KiB), two passes, one lane. The PHC string names them.
  const [, cost] = /\$argon2id\$v=19\$([^$]+)\$/.exec(JSON.stringify(rows)) ?? [];
  expect(cost?.split(',').sort()).toEqual(['m=19456', 'p=1', 't=2']);
});

it('a new sign-in in the same browser ends the session before', async () => {
  const browser = server.browser();
  await signIn(browser).expect(200);
  const first = tokenOf(browser);
  await signIn(browser).expect(200);
  expect(tokenOf(browser)).not.toBe(first);
  expectProblem(await whoHolds(first), 'unauthenticated');
  await browser.get('/api/session').expect(200);
});

it('changes need the session’s CSRF token', async () => {
  const browser = server.browser();
  const { csrfToken } = (await signIn(browser).expect(200)).body as Session;
  const held = tokenOf(browser);
  expectProblem(await browser.delete('/api/session'), 'forbidden');
  expectProblem(await browser.delete('/api/session').set('X-CSRF-Token', `${csrfToken.slice(0, -1)}!`), 'forbidden');
  const other = server.browser();
  const { csrfToken: others } = (await signIn(other).expect(200)).body as Session;
  expectProblem(await browser.delete('/api/session').set('X-CSRF-Token', others), 'forbidden');
  await browser.delete('/api/session').set('X-CSRF-Token', csrfToken).expect(204);
  expectProblem(await whoHolds(held), 'unauthenticated');
});

it('ends after 12 hours, after 4 idle hours, and when the person may no longer sign in', async () => {
  const start = new Date();
  const browser = server.browser();
  await signIn(browser).expect(200);
  for (const hours of [3, 6, 9, 11.9]) {
    now = new Date(start.getTime() + hours * 3_600_000);
    await browser.get('/api/session').expect(200);
  }
  now = new Date(start.getTime() + 12.1 * 3_600_000);
  expectProblem(await browser.get('/api/session'), 'unauthenticated');

  now = start;
  const idle = server.browser();
  await signIn(idle).expect(200);
  now = new Date(start.getTime() + 4.1 * 3_600_000);
  expectProblem(await idle.get('/api/session'), 'unauthenticated');

  now = start;
  const leaving = server.browser();
  await signIn(leaving).expect(200);
  await server.deps.models.Staff.update({ active: false }, { where: { email: 'owner@example.com' } });
  expectProblem(await leaving.get('/api/session'), 'unauthenticated');
  await server.deps.models.Staff.update({ active: true }, { where: { email: 'owner@example.com' } });
});

it('guessing one account’s password ends after some tries, even with the right one then; being right forgets earlier tries', async () => {
  const strict = await startTestApp({}, { RATE_LIMIT_FACTOR: '1' });
  await strict.deps.models.Staff.create({ email: 'owner@example.com', name: 'Odell Finch', role: 'owner', passwordHash: await hashPassword(password) });
  const { most } = limits['sign-in-account'];
  for (let tries = 1; tries < most; tries += 1) expectProblem(await signIn(strict.browser(), 'owner@example.com', 'wrong'), 'unauthenticated');
  await signIn(strict.browser()).expect(200);
  for (let tries = 0; tries < most; tries += 1) expectProblem(await signIn(strict.browser(), 'owner@example.com', 'wrong'), 'unauthenticated');
  expectProblem(await signIn(strict.browser()), 'too-many');
  await strict.stop();
});
