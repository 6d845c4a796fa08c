import { randomBytes } from 'node:crypto';
import { folder } from './paths.mjs';
import { freePort } from './ports.mjs';

/**
 * A program on loopback that takes the place of somebody else's service.
 * @typedef {object} StandIn
 * @property {string} url
 * @property {NodeJS.ProcessEnv} env its own settings
 * @property {Record<string, string>} serverEnv what the server has to know of it
 */

/**
 * @param {{ port: number, given: NodeJS.ProcessEnv, dataDir: string }} options
 * @returns {Promise<StandIn | null>} null when the real provider is configured, even by half: the server then says what is missing
 */
export async function standInForPayments({ port, given, dataDir }) {
  if (given.STRIPE_SECRET_KEY || given.STRIPE_WEBHOOK_SECRET) return null;
  const ownPort = await freePort();
  const url = `http://127.0.0.1:${ownPort}`;
  const webhookSecret = `whsec_${randomBytes(24).toString('hex')}`;
  return {
    url,
    env: {
      ...process.env,
      FAKE_STRIPE_PORT: String(ownPort),
      FAKE_STRIPE_WEBHOOK_URL: `http://127.0.0.1:${port}/api/webhooks/stripe`,
      FAKE_STRIPE_WEBHOOK_SECRET: webhookSecret,
      FAKE_STRIPE_DATA_DIR: folder(dataDir, 'payments'),
    },
    serverEnv: { STRIPE_SECRET_KEY: `sk_test_${randomBytes(24).toString('hex')}`, STRIPE_WEBHOOK_SECRET: webhookSecret, STRIPE_API_BASE: url },
  };
}

/**
 * @param {{ given: NodeJS.ProcessEnv, dataDir: string }} options
 * @returns {Promise<StandIn | null>}
 */
export async function standInForMail({ given, dataDir }) {
  if (given.SMTP_URL) return null;
  const smtpPort = await freePort();
  const httpPort = await freePort();
  return {
    url: `http://127.0.0.1:${httpPort}`,
    env: {
      ...process.env,
      FAKE_SMTP_PORT: String(smtpPort),
      FAKE_MAIL_HTTP_PORT: String(httpPort),
      FAKE_MAIL_DATA_DIR: folder(dataDir, 'mail'),
    },
    serverEnv: { SMTP_URL: `smtp://127.0.0.1:${smtpPort}` },
  };
}
