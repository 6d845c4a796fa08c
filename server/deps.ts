import type { Logger } from 'pino';
import type { Sequelize } from 'sequelize';
import type Stripe from 'stripe';
import type { liveRange, openingRange, priceIntake } from '../pricing/quote';
import type { Edition } from '../pricing/rulebook/schema';
import type { Env } from './env';
import type { WebApp } from './http/web-app';
import type { Jobs } from './jobs/jobs';
import type { Mailer } from './mail/mailer';
import type { Models } from './models/index';
import type { Storage } from './storage/storage';

export interface Pricing {
  readonly priceIntake: typeof priceIntake;
  readonly liveRange: typeof liveRange;
  readonly openingRange: typeof openingRange;
  readonly edition: Edition;
}

/** Everything that a handler may reach; made once by main.ts, or by a test. */
export interface Deps {
  readonly env: Env;
  readonly sequelize: Sequelize;
  readonly models: Models;
  readonly logger: Logger;
  readonly clock: () => Date;
  readonly storage: Storage;
  /** Null where no payment provider is set up. */
  readonly stripe: Stripe | null;
  readonly mailer: Mailer;
  readonly jobs: Pick<Jobs, 'nudge'>;
  readonly pricing: Pricing;
  /** Absent: the API alone. */
  readonly web?: WebApp;
}
