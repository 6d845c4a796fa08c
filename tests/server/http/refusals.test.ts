import express, { Router } from 'express';
import sharp from 'sharp';
import request from 'supertest';
import { createApp } from '../../../server/app';
import { cookieNames } from '../../../server/http/cookies';
import { handleErrors } from '../../../server/http/errors';
import { problem } from '../../../server/http/problem';
import { connect } from '../../../server/models/connect';
import { defineModels } from '../../../server/models/index';
import { startTestApp, type Agent, type TestApp } from '../../support/app';
import { expectProblem } from '../../support/problem';

let server: TestApp;
beforeAll(async () => { server = await startTestApp(); });
afterAll(() => server.stop());

const start = async (): Promise<Agent> => {
  const browser = server.browser();
  await browser.post('/api/intakes').expect(200);
  return browser;
};

describe('addresses', () => {
  it.each([['get', '/api/nothing'], ['delete', '/api/company'], ['get', '/api/photos/not-an-id/full'], ['get', '/api/photos/%E0%A4%A/full'], ['get', '/nothing']] as const)(
    '%s %s is a problem document', async (method, path) => {
      const response = await server.browser()[method](path);
      expectProblem(response, path.includes('%E0') ? 'malformed' : 'not-found');
    });
});

describe('changes that another site asks for', () => {
  it.each([
    ['no word of where it comes from', {}],
    ['another site', { 'Sec-Fetch-Site': 'cross-site' }],
    ['a neighbor of ours', { 'Sec-Fetch-Site': 'same-site' }],
    ['another site’s origin', { Origin: 'https://evil.example' }],
    ['an origin of no site', { Origin: 'null' }],
    ['our origin, but the browser says otherwise', { Origin: 'http://127.0.0.1:4173', 'Sec-Fetch-Site': 'cross-site' }],
  ])('%s: forbidden', async (_name, headers) => {
    const response = await request(server.app).post('/api/intakes').set(headers as Record<string, string>);
    expectProblem(response, 'forbidden');
    expect(response.headers['set-cookie']).toBeUndefined();
  });

  it('our own origin will do where a browser sends nothing else', async () => {
    await request(server.app).post('/api/intakes').set('Origin', 'http://127.0.0.1:4173').expect(200);
  });

  it('reading is free', async () => {
    await request(server.app).get('/api/company').set('Sec-Fetch-Site', 'cross-site').expect(200);
  });
});

describe('bodies', () => {
  const patch = async (body: string, type = 'application/json') => (await start()).patch('/api/intakes/current/answers').set('Content-Type', type).send(body);

  it('that are no JSON, no object, or of another type: malformed', async () => {
    expectProblem(await patch('{"answers":'), 'malformed');
    expectProblem(await patch('"words"'), 'malformed');
    expectProblem(await patch('answers=1', 'application/x-www-form-urlencoded'), 'malformed');
    expectProblem(await patch('{}', 'application/json; charset=utf-77'), 'malformed');
  });

  it('larger than 256 KB: too large', async () => {
    expectProblem(await patch(JSON.stringify({ answers: { zip: 'x'.repeat(300_000) } })), 'too-large');
  });

  it('with signs that PostgreSQL cannot store, or nested beyond reason: validation, with the place', async () => {
    expect(expectProblem(await patch('{"answers":{"zip":"0001\\u0000"}}'), 'validation')).toEqual(['/answers/zip']);
    expect(expectProblem(await patch('{"answers":{"zip":"0001\\ud800"}}'), 'validation')).toEqual(['/answers/zip']);
    expect(expectProblem(await patch('{"answers":{"a/b~c":"\\u0000"}}'), 'validation')).toEqual(['/answers/a~1b~0c']);
    const deep = `${'{"a":'.repeat(30_000)}1${'}'.repeat(30_000)}`;
    expectProblem(await patch(`{"answers":${deep}}`), 'validation');
  });
});

describe('cookies', () => {
  it('of any other shape are nobody’s', async () => {
    for (const value of ['', 'short', 'a'.repeat(44), '%00', `${'a'.repeat(42)}"`]) {
      expectProblem(await server.browser().get('/api/intakes/current').set('Cookie', `other=1; ${cookieNames.intake}=${value}`), 'not-found');
    }
  });
});

describe('what goes wrong on our side', () => {
  it('is logged under an id that the caller gets, and nothing of it is told', async () => {
    const broken = await startTestApp({ pricing: { ...server.deps.pricing, openingRange: () => { throw new TypeError('the inside of the house'); } } });
    const response = await broken.browser().get('/api/company');
    expectProblem(response, 'internal');
    const { instance } = JSON.parse(response.text) as { instance: string };
    expect(instance).toMatch(/^urn:uuid:/);
    expect(response.text).not.toContain('inside of the house');
    expect(broken.log()).toContain(instance);
    expect(broken.log()).toContain('the inside of the house');
    await broken.stop();
  });

  it('a database that is away: unavailable, with when to come back', async () => {
    // Port 1 of this machine: nobody listens there.
    const sequelize = connect('postgres://nobody@127.0.0.1:1/none', 2);
    const { app } = createApp({ ...server.deps, sequelize, models: defineModels(sequelize) });
    for (const call of [request(app).get('/api/health'), request(app).post('/api/intakes').set('Sec-Fetch-Site', 'same-origin')]) {
      const response = await call;
      expectProblem(response, 'unavailable');
      expect(Number(response.headers['retry-after'])).toBeGreaterThan(0);
    }
    await request(app).get('/api/company').expect(200);
    await sequelize.close();
  });

  it('a storage that is full: unavailable', async () => {
    const full = await startTestApp({ storage: { put: () => Promise.reject(Object.assign(new Error('full'), { code: 'ENOSPC' })), get: () => Promise.resolve(null), remove: () => Promise.resolve() } });
    const browser = full.browser();
    await browser.post('/api/intakes');
    const picture = await sharp({ create: { width: 700, height: 700, channels: 3, background: '#888' } }).jpeg().toBuffer();
    expectProblem(await browser.post('/api/intakes/current/photos').field('slot', 'panel').attach('photo', picture, 'a.jpg'), 'unavailable');
    await full.stop();
  });
});

describe('headers of every reply', () => {
  it('say that nothing may be framed, guessed or kept', async () => {
    const { headers } = await server.browser().get('/api/company');
    expect(headers).toMatchObject({ 'x-content-type-options': 'nosniff', 'referrer-policy': 'no-referrer', 'cache-control': 'no-store' });
    expect(headers['content-security-policy']).toContain("frame-ancestors 'none'");
    expect(headers['x-powered-by']).toBeUndefined();
  });

  it('a refusal carries nothing of the success that was begun', async () => {
    const router = Router().get('/', (_request, response) => { response.set('ETag', '"7"'); throw problem('stale'); });
    const response = await request(express().use(router).use(handleErrors(server.deps.logger))).get('/');
    expectProblem(response, 'stale');
    expect(response.headers.etag).not.toBe('"7"');
  });
});
