import { startTestApp, type TestApp } from '../../support/app';
import { expectProblem } from '../../support/problem';

let server: TestApp;
beforeAll(async () => { server = await startTestApp(); });
afterAll(() => server.stop());

it('tells the contractor, its towns, the opening range and the deposit of the rulebook', async () => {
  const { body } = await server.browser().get('/api/company').expect(200);
  expect(body).toMatchObject({ demo: true, depositCents: server.deps.pricing.edition.deposit.cents, towns: expect.arrayContaining([{ name: 'Harrow Bend', zips: ['00017', '00018'] }]) as unknown });
  const { openingLowCents, openingHighCents } = body as { openingLowCents: number; openingHighCents: number };
  expect(openingLowCents).toBeGreaterThan(0);
  expect(openingHighCents).toBeGreaterThan(openingLowCents);
});

it('is healthy while its database answers', async () => {
  expect((await server.browser().get('/api/health').expect(200)).body).toEqual({ status: 'ok' });
});

describe('someone outside the area', () => {
  const ask = (body: object, key: string | null = 'a-key-of-mine') => {
    const call = server.browser().post('/api/outside-area').send(body);
    return key === null ? call : call.set('Idempotency-Key', key);
  };

  it('is refused without a key, with a ZIP that is none and an address that is none', async () => {
    expectProblem(await ask({ zip: '99999', email: 'a@example.com' }, null), 'malformed');
    expect(expectProblem(await ask({ zip: '9999', email: 'somebody' }), 'validation')).toEqual(['/zip', '/email']);
  });

  it('is kept once, however often and in whatever case it is asked', async () => {
    await ask({ zip: '99999', email: 'Ione@example.com' }, 'key-one-1').expect(204);
    await ask({ zip: '99999', email: 'ione@example.com' }, 'key-two-2').expect(204);
    await ask({ zip: '99999', email: 'Ione@example.com' }, 'key-one-1').expect(204);
    const kept = await server.deps.models.OutsideAreaRequest.findAll();
    expect(kept.map(({ zip, email }) => ({ zip, email }))).toEqual([{ zip: '99999', email: 'ione@example.com' }]);
  });
});
