import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { Express } from 'express';
import { Writable } from 'node:stream';
import request from 'supertest';
import { liveRange, openingRange, priceIntake } from '../../pricing/quote';
import { editionOne } from '../../pricing/rulebook/edition-1/index';
import { createApp } from '../../server/app';
import type { Deps } from '../../server/deps';
import { readEnv, type Env } from '../../server/env';
import { createLogger } from '../../server/http/log';
import type { Mailer } from '../../server/mail/mailer';
import { connect } from '../../server/models/connect';
import { defineModels } from '../../server/models/index';
import { diskStorage } from '../../server/storage/disk';
import { createTestDatabase } from './database';

export const testOrigin = 'http://127.0.0.1:4173';

/** A configuration that starts, with anything laid over it. */
export function testEnv(changes: Readonly<Record<string, string>> = {}): Env {
  const read = readEnv({
    NODE_ENV: 'test', DATABASE_URL: 'postgres://nobody@127.0.0.1:1/none', SMTP_URL: 'smtp://127.0.0.1:1', MAIL_FROM: 'quotes@example.com', PUBLIC_URL: testOrigin,
    RATE_LIMIT_FACTOR: '1000', DEMO: '1', ...changes,
  });
  if ('problems' in read) throw new Error(read.problems.join('\n'));
  return read.env;
}

export type Agent = ReturnType<typeof request.agent>;
export interface TestApp {
  readonly app: Express;
  readonly deps: Deps;
  readonly bound: ReturnType<typeof createApp>['bound'];
  /** Everything that was logged so far. */
  readonly log: () => string;
  /** A browser of our own site: keeps cookies and says where it comes from. */
  readonly browser: () => Agent;
  readonly stop: () => Promise<void>;
}

const noMail: Mailer = { send: () => Promise.reject(new Error('This test has no mail server')), close: () => {} };

/** Another server process on the same database: its own pool, its own memory. */
export function startSecondApp({ deps }: Pick<TestApp, 'deps'>, databaseUrl: string): { app: Express; stop: () => Promise<void> } {
  const sequelize = connect(databaseUrl, 4);
  const { app } = createApp({ ...deps, sequelize, models: defineModels(sequelize) });
  return { app, stop: () => sequelize.close() };
}

export const browserOf = (app: Express): Agent => request.agent(app).set('Sec-Fetch-Site', 'same-origin') as Agent;

/**
 * The whole API on a database of its own, without a payment provider and without mail unless given.
 * @param changes laid over the dependencies; `env`: over the configuration
 */
export async function startTestApp(
  changes: Partial<Deps> = {}, env: Readonly<Record<string, string>> = {},
): Promise<TestApp & { databaseUrl: string }> {
  const database = await createTestDatabase();
  const folder = mkdtempSync(join(tmpdir(), 'tidyrun-storage-'));
  const sequelize = connect(database.url, 5);
  let logged = '';
  const sink = new Writable({ write: (chunk: Buffer, _encoding, done) => { logged += chunk.toString(); done(); } });
  const deps: Deps = {
    env: testEnv({ DATABASE_URL: database.url, STORAGE_DIR: folder, ...env }), sequelize, models: defineModels(sequelize), logger: createLogger('debug', sink),
    clock: () => new Date(), storage: diskStorage(folder), stripe: null, mailer: noMail, jobs: { nudge: () => {} },
    pricing: { priceIntake, liveRange, openingRange, edition: editionOne }, ...changes,
  };
  const { app, bound } = createApp(deps);
  return {
    app, deps, bound, databaseUrl: database.url, log: () => logged, browser: () => browserOf(app),
    stop: async () => {
      await sequelize.close();
      await database.drop();
      rmSync(folder, { recursive: true, force: true });
    },
  };
}
