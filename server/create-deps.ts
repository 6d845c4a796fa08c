import { liveRange, openingRange, priceIntake } from '../pricing/quote';
import { editionOne } from '../pricing/rulebook/edition-1/index';
import { company } from './config/company';
import type { Deps } from './deps';
import type { Env } from './env';
import { createLogger } from './http/log';
import { serveWebApp } from './http/web-app';
import { createJobs, type Jobs } from './jobs/jobs';
import { createMailer } from './mail/mailer';
import { connect } from './models/connect';
import { defineModels } from './models/index';
import { createStripe } from './payments/stripe';
import { diskStorage } from './storage/disk';

/** The real parts by the configuration. Nothing is started: no connection is made and no job runs before it is asked for. */
export function createDeps(env: Env): { readonly deps: Deps; readonly jobs: Jobs } {
  const logger = createLogger(env.LOG_LEVEL);
  const sequelize = connect(env.DATABASE_URL, env.DATABASE_POOL);
  const models = defineModels(sequelize);
  const jobs = createJobs(env.DATABASE_URL, { sequelize, models }, logger);
  const stripe = env.STRIPE_SECRET_KEY === undefined ? null : createStripe({ secretKey: env.STRIPE_SECRET_KEY, apiBase: env.STRIPE_API_BASE });
  const deps: Deps = {
    env, logger, sequelize, models, stripe, jobs,
    clock: () => new Date(),
    storage: diskStorage(env.STORAGE_DIR),
    mailer: createMailer(env.SMTP_URL, env.MAIL_FROM, company.email, { ...company, demo: env.DEMO }),
    pricing: { priceIntake, liveRange, openingRange, edition: editionOne },
    ...(env.WEB_DIST_DIR === undefined ? {} : { web: serveWebApp(env.WEB_DIST_DIR) }),
  };
  return { deps, jobs };
}
