import { hashPassword } from '../../../server/auth/passwords';
import { makeLink } from '../../../server/auth/public-links';
import { errorForLog } from '../../../server/http/errors';
import { startTestApp } from '../../support/app';

/** What must be nowhere in the log: each given once in some place where a log could pick it up. */
const personal = {
  email: 'maren.oakes@example.com', name: 'Maren Oakes', street: '41 Millrace Road', phone: '555-0117', password: 'correct horse battery', zip: '00017',
  query: 'words-in-the-query', header: 'words-in-a-header', path: 'words-in-the-path', body: 'words-in-a-body',
};

it('one line a request with route, method and status, and nothing that people typed or are', async () => {
  const server = await startTestApp();
  const { models } = server.deps;
  await models.Staff.create({ email: personal.email, name: personal.name, role: 'owner', passwordHash: await hashPassword(personal.password) });
  const browser = server.browser().set('User-Agent', personal.header).set('Referer', `https://${personal.header}.example`) as ReturnType<typeof server.browser>;
  await browser.post('/api/intakes').expect(200);
  const contact = { name: personal.name, email: personal.email, phone: personal.phone, street: personal.street, contactWays: ['email'], consent: true };
  await browser.patch('/api/intakes/current/answers').send({ answers: { zip: personal.zip } }).expect(200);
  await browser.patch('/api/intakes/current/answers').send({ answers: { zip: personal.body } }).expect(422);
  await browser.patch('/api/intakes/current/answers').set('Content-Type', 'application/json').send(`{"${personal.body}`).expect(400);
  await browser.post('/api/intakes/current/visit').set('Idempotency-Key', 'a-key-for-this').send(contact);
  await browser.post('/api/intakes/current/finish-later').set('Idempotency-Key', 'a-key-for-that').send({ email: personal.email });
  await browser.post('/api/session').send({ email: personal.email, password: personal.password }).expect(200);
  await browser.post('/api/session').send({ email: personal.email, password: personal.body }).expect(401);
  await browser.get(`/api/leads?search=${personal.query}`);
  await browser.get(`/api/${personal.path}`).expect(404);
  await browser.get(`/my/${personal.path}`).expect(404);
  const intake = await models.Intake.findOne();
  const { token } = await makeLink(models, 'resume', intake?.id ?? '', new Date());
  await browser.post('/api/resume').send({ token }).expect(200);

  const lines = server.log().trim().split('\n').map((line) => JSON.parse(line) as Record<string, unknown>);
  const requests = lines.filter(({ msg }) => msg === 'request');
  expect(requests.length).toBe(12);
  expect(requests).toContainEqual(expect.objectContaining({ method: 'PATCH', route: '/intakes/current/answers', status: 422, ms: expect.any(Number) as unknown }));
  expect(requests).toContainEqual(expect.objectContaining({ method: 'GET', route: 'unknown', status: 404 }));
  expect(requests).toContainEqual(expect.objectContaining({ method: 'GET', route: 'page', status: 404 }));
  for (const [what, words] of Object.entries({ ...personal, token })) {
    expect({ what, logged: server.log().includes(words) }).toEqual({ what, logged: false });
  }
  expect(server.log()).not.toMatch(/tidyrun_(intake|desk|my)=|127\.0\.0\.1/);
  await server.stop();
});

it('of a database’s error only names and codes are kept, because its words hold what people typed', async () => {
  const server = await startTestApp();
  const { models } = server.deps;
  const columns = { email: personal.email, name: personal.name, role: 'owner', passwordHash: 'x' } as const;
  await models.Staff.create(columns);
  for (const attempt of [() => models.Staff.create(columns), () => server.deps.sequelize.query(`SELECT '${personal.name}'::integer`)]) {
    const error: unknown = await attempt().catch((caught: unknown) => caught);
    expect(error).toBeInstanceOf(Error);
    const kept = JSON.stringify(errorForLog(error));
    expect(kept).toMatch(/23505|22P02/); // PostgreSQL, appendix A: unique_violation, invalid_text_representation
    expect(kept).not.toMatch(/maren|oakes/i);
  }
  expect(errorForLog(new TypeError('ours'))).toMatchObject({ name: 'TypeError', message: 'ours' });
  await server.stop();
});
