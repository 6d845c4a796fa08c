import { QueryTypes } from 'sequelize';
import { findLink, makeLink } from '../../../server/auth/public-links';
import { cookieNames } from '../../../server/http/cookies';
import { completeAnswers } from '../../support/answers';
import { browserOf, startSecondApp, startTestApp, type Agent, type TestApp } from '../../support/app';
import { expectProblem } from '../../support/problem';

let server: TestApp & { databaseUrl: string };
let now = new Date('2026-05-14T18:00:00Z');
beforeAll(async () => { server = await startTestApp({ clock: () => now }); });
afterAll(() => server.stop());
afterEach(() => { now = new Date('2026-05-14T18:00:00Z'); });

const start = async (): Promise<Agent> => {
  const browser = server.browser();
  await browser.post('/api/intakes').expect(200);
  return browser;
};
const save = (browser: Agent, answers: object) => browser.patch('/api/intakes/current/answers').send({ answers });
const tokenOf = (browser: Agent): string => browser.jar.getCookie(cookieNames.intake, { path: '/api', domain: '127.0.0.1', secure: false, script: false })?.value ?? '';
const idOf = async (browser: Agent): Promise<string> => (await findLink(server.deps.models, 'intake-cookie', tokenOf(browser), now))?.intakeId ?? '';

describe('starting', () => {
  it('gives an empty intake and a cookie that scripts cannot read', async () => {
    const response = await server.browser().post('/api/intakes').expect(200);
    expect(response.body).toMatchObject({ version: 1, answers: {}, town: null, served: null, photos: [], stage: 'open', savedTo: null });
    expect(response.body).toHaveProperty('range.outcome', 'too-early');
    const [cookie] = response.headers['set-cookie'] as unknown as string[];
    expect(cookie).toMatch(/^tidyrun_intake=[\w-]{43}; .*Path=\/api; .*HttpOnly; SameSite=Lax$/);
    expect(cookie).not.toContain('Secure');
  });

  it('sets the Secure mark when the public reaches us by https', async () => {
    const secure = await startTestApp({}, { PUBLIC_URL: 'https://quotes.example.com' });
    const response = await secure.browser().post('/api/intakes').expect(200);
    expect((response.headers['set-cookie'] as unknown as string[])[0]).toContain('; Secure');
    await secure.stop();
  });

  it('again in the same browser gives the same intake', async () => {
    const browser = await start();
    await save(browser, { zip: '00017' }).expect(200);
    const again = await browser.post('/api/intakes').expect(200);
    expect(again.body).toMatchObject({ version: 2, answers: { zip: '00017' } });
    expect(again.headers['set-cookie']).toBeUndefined();
  });
});

describe('reading', () => {
  it('is refused without a cookie, with a guessed one and after 90 days, all alike', async () => {
    expectProblem(await server.browser().get('/api/intakes/current'), 'not-found');
    expectProblem(await server.browser().get('/api/intakes/current').set('Cookie', `${cookieNames.intake}=${'a'.repeat(43)}`), 'not-found');
    const browser = await start();
    now = new Date(now.getTime() + 91 * 86_400_000);
    expectProblem(await browser.get('/api/intakes/current'), 'not-found');
  });
});

describe('saving answers', () => {
  it('refuses a question that does not exist, a value out of limits and a body without answers; nothing of it is kept', async () => {
    const browser = await start();
    const pointers = expectProblem(await save(browser, { zip: '00017', nothing: 1, floorAreaFt2: 12, parking: 'boat' }), 'validation');
    expect([...pointers].sort()).toEqual(['/answers/floorAreaFt2', '/answers/nothing', '/answers/parking']);
    expect(expectProblem(await browser.patch('/api/intakes/current/answers').send({}), 'validation')).toEqual(['/answers']);
    expect((await browser.get('/api/intakes/current')).body).toMatchObject({ version: 1, answers: {} });
  });

  it('keeps them, names the town, says what is not served, and takes one back with null', async () => {
    const browser = await start();
    expect((await save(browser, { zip: '00021', floorAreaFt2: 'unsure' }).expect(200)).body).toMatchObject({ version: 2, town: 'Pell Landing', served: true });
    expect((await save(browser, { zip: '99999' }).expect(200)).body).toMatchObject({ version: 3, town: null, served: false });
    expect((await save(browser, { zip: null }).expect(200)).body).toEqual(expect.objectContaining({ version: 4, served: null, answers: { floorAreaFt2: 'unsure' } }));
    expect((await browser.get('/api/intakes/current')).body).toHaveProperty('answers', { floorAreaFt2: 'unsure' });
  });

  it('keeps answers inside an answer that say "not sure"', async () => {
    const browser = await start();
    const loads = { range: { present: null, amount: null }, dryer: { present: true, amount: null } };
    await save(browser, { loads }).expect(200);
    expect((await browser.get('/api/intakes/current')).body).toHaveProperty('answers.loads', loads);
  });

  it('the same answers again change nothing', async () => {
    const browser = await start();
    await save(browser, { zip: '00017' });
    expect((await save(browser, { zip: '00017' }).expect(200)).body).toHaveProperty('version', 2);
  });

  it('shows a range once the home and the car are answered, and the first open step is kept', async () => {
    const browser = await start();
    const { zip, homeKind, tenure, parking } = completeAnswers;
    expect((await save(browser, { zip, homeKind, tenure, parking })).body).toHaveProperty('range.outcome', 'too-early');
    const saved = await save(browser, completeAnswers).expect(200);
    const body = saved.body as { range: { outcome: string; lowCents: number; highCents: number } };
    expect(body.range.outcome).toMatch(/range|firm/);
    expect(body.range.lowCents).toBeGreaterThan(0);
    expect(body.range.highCents).toBeGreaterThanOrEqual(body.range.lowCents);
    const intake = await server.deps.models.Intake.findByPk(await idOf(browser));
    expect(intake).toMatchObject({ currentStep: 'price', jurisdictionId: 'harrow-bend' });
  });

  it('two tabs and two server processes never lose each other’s answers', async () => {
    const browser = await start();
    const second = startSecondApp(server, server.databaseUrl);
    const link = await makeLink(server.deps.models, 'intake-cookie', await idOf(browser), now);
    const other = browserOf(second.app).set('Cookie', `${cookieNames.intake}=${link.token}`) as Agent;
    const entries = Object.entries(completeAnswers).slice(0, 12);
    const replies = await Promise.all(entries.map(([id, value], index) => save(index % 2 === 0 ? browser : other, { [id]: value })));
    expect(replies.map(({ status }) => status)).toEqual(entries.map(() => 200));
    expect((await browser.get('/api/intakes/current')).body).toMatchObject({ version: 13, answers: Object.fromEntries(entries) });
    await second.stop();
  });
});

describe('the mailed link', () => {
  it('opens the same answers on another device, and only there', async () => {
    const browser = await start();
    await save(browser, { zip: '00017' });
    const { token } = await makeLink(server.deps.models, 'resume', await idOf(browser), now);
    const elsewhere = server.browser();
    expect((await elsewhere.post('/api/resume').send({ token }).expect(200)).body).toHaveProperty('answers.zip', '00017');
    await save(elsewhere, { tenure: 'own' }).expect(200);
    expect((await browser.get('/api/intakes/current')).body).toHaveProperty('answers', { zip: '00017', tenure: 'own' });
  });

  it('guessed or of another purpose: not found; run out: gone; too long: refused', async () => {
    const id = await idOf(await start());
    const { models } = server.deps;
    const resume = (token: string) => server.browser().post('/api/resume').send({ token });
    expectProblem(await resume('a'.repeat(43)), 'not-found');
    expectProblem(await resume((await makeLink(models, 'my', id, now)).token), 'not-found');
    expect(expectProblem(await resume('a'.repeat(201)), 'validation')).toEqual(['/token']);
    const { token } = await makeLink(models, 'resume', id, now);
    now = new Date(now.getTime() + 31 * 86_400_000);
    expectProblem(await resume(token), 'gone');
  });

  it('tokens are nowhere in the database', async () => {
    const { token } = await makeLink(server.deps.models, 'resume', await idOf(await start()), now);
    const [row] = await server.deps.sequelize.query<{ found: boolean }>(
      'SELECT bool_or(links::text LIKE $like) AS found FROM links', { type: QueryTypes.SELECT, bind: { like: `%${token}%` } });
    expect(row).toEqual({ found: false });
  });
});

it('forgetting ends this browser’s hold; the answers stay for who has the link', async () => {
  const browser = await start();
  const { token } = await makeLink(server.deps.models, 'resume', await idOf(browser), now);
  const held = tokenOf(browser);
  expect(held).toHaveLength(43);
  const response = await browser.delete('/api/intakes/current').expect(204);
  expect((response.headers['set-cookie'] as unknown as string[])[0]).toMatch(/^tidyrun_intake=;/);
  expectProblem(await server.browser().get('/api/intakes/current').set('Cookie', `${cookieNames.intake}=${held}`), 'not-found');
  await server.browser().post('/api/resume').send({ token }).expect(200);
});
