import { addressOf, countTry, forgetTries, limits, sweepTries } from '../../../server/http/rate-limits';
import type { Request } from 'express';
import { startTestApp } from '../../support/app';
import { useDb } from '../../support/db';
import { expectProblem } from '../../support/problem';

const db = useDb();
const tooMany = expect.objectContaining({ problem: expect.objectContaining({ status: 429 }) as unknown, headers: { 'Retry-After': expect.stringMatching(/^\d+$/) as unknown } }) as unknown;
const count = (who: string) => countTry(db.sequelize, 'finish-later', who, 1);
const { most } = limits['finish-later'];

it('lets as many through as it says, then refuses with when to come back; others are not touched', async () => {
  for (let tries = 0; tries < most; tries += 1) await count('one');
  await expect(count('one')).rejects.toEqual(tooMany);
  await expect(count('other')).resolves.toBeUndefined();
});

it('tries at the same moment are all counted', async () => {
  const all = await Promise.allSettled(Array.from({ length: most * 2 }, () => count('many')));
  expect(all.filter(({ status }) => status === 'fulfilled')).toHaveLength(most);
});

it('starts anew when the time is over, and when the caller turned out to be right', async () => {
  for (let tries = 0; tries < most; tries += 1) { await count('late'); await count('right'); }
  await db.sequelize.query(`UPDATE rate_limits SET resets_at = now() - interval '1 second' WHERE tries = ${most}`);
  await expect(count('late')).resolves.toBeUndefined();
  await forgetTries(db.sequelize, 'finish-later', 'right');
  await expect(count('right')).resolves.toBeUndefined();
});

it('what is over is swept away, and who tried is stored only as a hash', async () => {
  await count('198.51.100.7');
  const [rows] = await db.sequelize.query('SELECT * FROM rate_limits');
  expect(JSON.stringify(rows)).not.toContain('198.51.100.7');
  await db.sequelize.query(`UPDATE rate_limits SET resets_at = now() - interval '1 second'`);
  await sweepTries(db.sequelize);
  expect((await db.sequelize.query('SELECT * FROM rate_limits'))[0]).toEqual([]);
});

it.each([
  ['198.51.100.7', '198.51.100.7'], ['::ffff:198.51.100.7', '::ffff:198.51.100.7'], ['2001:db8:1:2:3:4:5:6', '2001:db8:1:2'], [undefined, ''],
])('%s counts as %s', (ip, expected) => {
  expect(addressOf({ ip } as Request)).toBe(expected);
});

it('guessing links ends after some tries from one address', async () => {
  const server = await startTestApp({}, { RATE_LIMIT_FACTOR: '1' });
  const guess = (letter: string) => server.browser().post('/api/resume').send({ token: letter.repeat(43) });
  for (let tries = 0; tries < limits['open-link'].most; tries += 1) expectProblem(await guess('a'), 'not-found');
  const response = await guess('b');
  expectProblem(response, 'too-many');
  expect(Number(response.headers['retry-after'])).toBeGreaterThan(0);
  await server.stop();
});
