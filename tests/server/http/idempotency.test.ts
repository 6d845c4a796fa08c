import { once, requestHash } from '../../../server/http/idempotency';
import { useDb } from '../../support/db';

const db = useDb();
let number = 0;
const newKey = () => `key-number-${(number += 1)}`;
const hash = requestHash({ a: 1 });
const refusal = (kind: string) => expect.objectContaining({ problem: expect.objectContaining({ type: `/problems/${kind}` }) as unknown }) as unknown;

it.each([undefined, '', 'short', 'with space in it', 'x'.repeat(201), 'ключ-ключ'])('the key %p is refused', async (key) => {
  await expect(once(db.sequelize, 'a', key, hash, () => Promise.resolve({ status: 200, body: 1 }))).rejects.toEqual(refusal('malformed'));
});

it('the same request again gets the first reply, and the work is done once', async () => {
  const work = jest.fn(() => Promise.resolve({ status: 201, body: { url: 'x' } }));
  const key = newKey();
  expect(await once(db.sequelize, 'a', key, hash, work)).toEqual({ status: 201, body: { url: 'x' } });
  expect(await once(db.sequelize, 'a', key, hash, work)).toEqual({ status: 201, body: { url: 'x' } });
  expect(work).toHaveBeenCalledTimes(1);
});

it('a reply without a body stays without one', async () => {
  const key = newKey();
  const work = () => Promise.resolve({ status: 204, body: undefined });
  await once(db.sequelize, 'a', key, hash, work);
  expect(await once(db.sequelize, 'a', key, hash, work)).toEqual({ status: 204, body: undefined });
});

it('with another body it is refused; another caller’s key is another', async () => {
  const key = newKey();
  await once(db.sequelize, 'a', key, hash, () => Promise.resolve({ status: 200, body: 1 }));
  await expect(once(db.sequelize, 'a', key, requestHash({ a: 2 }), () => Promise.resolve({ status: 200, body: 2 }))).rejects.toEqual(refusal('validation'));
  expect(await once(db.sequelize, 'b', key, requestHash({ a: 2 }), () => Promise.resolve({ status: 200, body: 2 }))).toEqual({ status: 200, body: 2 });
});

it('a second one while the first is at work waits for its reply, but not for ever', async () => {
  const key = newKey();
  let finish = () => {};
  const first = once(db.sequelize, 'a', key, hash, () => new Promise((resolve) => { finish = () => resolve({ status: 200, body: 1 }); }));
  await new Promise((resolve) => { setTimeout(resolve, 200); });
  const never = () => Promise.resolve({ status: 200, body: 2 });
  await expect(once(db.sequelize, 'a', key, hash, never, 0)).rejects.toEqual(refusal('conflict'));
  const second = once(db.sequelize, 'a', key, hash, never);
  finish();
  expect(await second).toEqual({ status: 200, body: 1 });
  expect(await first).toEqual({ status: 200, body: 1 });
});

it('of many at the same moment one does the work', async () => {
  const key = newKey();
  const work = jest.fn(() => Promise.resolve({ status: 200, body: 1 }));
  expect(await Promise.all(Array.from({ length: 8 }, () => once(db.sequelize, 'a', key, hash, work)))).toEqual(Array(8).fill({ status: 200, body: 1 }));
  expect(work).toHaveBeenCalledTimes(1);
});

it('a refusal is not kept: the same key may try again', async () => {
  const key = newKey();
  await expect(once(db.sequelize, 'a', key, hash, () => Promise.reject(new Error('no')))).rejects.toThrow('no');
  expect(await once(db.sequelize, 'a', key, hash, () => Promise.resolve({ status: 200, body: 1 }))).toEqual({ status: 200, body: 1 });
});

it('a key whose process died is taken over after a minute, not before', async () => {
  const key = newKey();
  const claim = (age: string) => db.sequelize.query(
    `INSERT INTO idempotency_keys (scope, key, request_hash, created_at) VALUES ('a', $key, $hash, now() - $age::interval)`, { bind: { key: `${key}${age[0]}`, hash, age } });
  await claim('30 seconds');
  await claim('90 seconds');
  const work = () => Promise.resolve({ status: 200, body: 1 });
  await expect(once(db.sequelize, 'a', `${key}3`, hash, work, 0)).rejects.toEqual(refusal('conflict'));
  expect(await once(db.sequelize, 'a', `${key}9`, hash, work)).toEqual({ status: 200, body: 1 });
});

it('keys of the day before yesterday are swept away', async () => {
  await db.sequelize.query(`INSERT INTO idempotency_keys (scope, key, request_hash, created_at) VALUES ('a', 'old-old-old', 'x', now() - interval '3 days')`);
  await once(db.sequelize, 'a', newKey(), hash, () => Promise.resolve({ status: 200, body: 1 }));
  const [rows] = await db.sequelize.query(`SELECT key FROM idempotency_keys WHERE key = 'old-old-old'`);
  expect(rows).toEqual([]);
});
