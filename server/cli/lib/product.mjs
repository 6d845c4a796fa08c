import { deathOf, startChild, waitForAnswer } from './children.mjs';
import { distDir, folder } from './paths.mjs';
import { freePort } from './ports.mjs';
import { startCluster } from './postgres.mjs';
import { claimDataDir } from './processes.mjs';
import { endCommands, runOurs, tsx } from './run.mjs';
import { standInForMail, standInForPayments } from './stand-ins.mjs';
import { exportWebApp } from './web-export.mjs';

/** @typedef {import('./children.mjs').Child} Child */
/** @typedef {{ role: string, email: string, password: string, url?: string }} SignIn */
/** @typedef {ReturnType<typeof import('./console.mjs').countSteps>} Step */

/** How many steps `start` tells of. */
export const productSteps = 7;

const serverGraceMs = 12_000;
const database = 'tidyrun';

/**
 * The whole product as a set of programs on this machine: PostgreSQL, the stand-ins for payments and mail, the server.
 * `start` brings it up, `stop` takes it down in order, whenever it is called and however far the start had come.
 * @param {{ dataDir: string, wantedPort?: number, throwAway?: boolean, env?: NodeJS.ProcessEnv }} options
 *   throwAway: for tests; env: laid over this process's environment, for the server
 */
export function createProduct({ dataDir, wantedPort, throwAway = false, env: given = process.env }) {
  /** @type {(() => Promise<void> | void)[]} what to undo, latest last */
  const undo = [];
  let stopping = false;
  /** @type {(error: Error) => void} */
  let reportDeath = () => {};
  /** Rejects when one of the programs ends by itself. @type {Promise<never>} */
  const failed = new Promise((_, fail) => {
    reportDeath = fail;
  });
  failed.catch(() => {}); // whoever cares waits for it; until then it is not an unhandled one

  /** @param {Child} child */
  const watch = (child) => {
    void child.ended.then((how) => {
      if (!stopping) reportDeath(deathOf(child, how));
    });
  };

  /** @type {Promise<unknown>} */
  let starting = Promise.resolve();

  /** @param {Step} step */
  function start(step) {
    const started = bringUp(step);
    starting = started.catch(() => {});
    return started;
  }

  /** @param {Step} step */
  async function bringUp(step) {
    const claim = await claimDataDir(dataDir);
    undo.push(claim.release);
    const proceed = () => {
      if (stopping) throw new Error('Stopped while starting.');
    };
    /** @param {string} name @param {string} file @param {NodeJS.ProcessEnv} env @param {number} graceMs */
    const program = (name, file, env, graceMs) => {
      const [command, args] = tsx(file);
      const child = startChild({ name, command, args, dataDir, env });
      undo.push(() => child.stop(graceMs));
      watch(child);
      claim.remember(child.pid, file);
      return child;
    };

    const port = await freePort(wantedPort);
    const siteUrl = given.PUBLIC_URL || `http://127.0.0.1:${port}`;
    const demo = given.DEMO ?? (given.DATABASE_URL ? undefined : '1');
    /** @type {NodeJS.ProcessEnv} */
    const env = {
      ...given,
      NODE_ENV: given.NODE_ENV || 'production',
      PORT: String(port),
      PUBLIC_URL: siteUrl,
      STORAGE_DIR: given.STORAGE_DIR || folder(dataDir, 'storage'),
      MAIL_FROM: given.MAIL_FROM || 'Alder & Finch Electric <quotes@example.com>',
      WEB_DIST_DIR: distDir,
      ...(demo === undefined ? {} : { DEMO: demo }),
    };

    const stripe = await standInForPayments({ port, given, dataDir });
    const mail = await standInForMail({ given, dataDir });
    Object.assign(env, stripe?.serverEnv, mail?.serverEnv);
    await step('Settings', async () => {
      // Its own database has no address yet, and needs no checking.
      const checked = { ...env, DATABASE_URL: given.DATABASE_URL || 'postgres://127.0.0.1/own' };
      await runOurs('server/cli/settings.ts', [], checked, 'The settings in the environment do not fit:');
    }, () => '');
    proceed();
    env.DATABASE_URL = await step('PostgreSQL', async () => {
      if (given.DATABASE_URL) return given.DATABASE_URL;
      const cluster = await startCluster({ dataDir, throwAway });
      undo.push(cluster.stop);
      if (cluster.child) watch(cluster.child);
      cluster.ensureDatabase(database);
      return cluster.urlOf(database);
    }, () => (given.DATABASE_URL ? 'the one in DATABASE_URL' : ''));
    proceed();

    await step('Tables', () => runOurs('server/cli/migrate.ts', [], env), () => '');
    proceed();
    /** @type {SignIn[]} */
    const signIns = await step('Demo data', async () => {
      if (demo !== '1') return [];
      await runOurs('server/cli/seed.ts', [], env);
      const lines = await runOurs('server/cli/seed.ts', ['--show-sign-ins'], env);
      return lines.split('\n').filter((line) => line.startsWith('{')).map((line) => JSON.parse(line));
    }, () => (demo === '1' ? '' : 'none: DEMO is not 1'));
    proceed();
    await step('Web app', exportWebApp, (result) => (result === 'unchanged' ? 'unchanged' : ''));
    proceed();

    await step('Stand-ins for payments and mail', async () => {
      const children = [];
      if (stripe) children.push({ url: `${stripe.url}/health`, child: program('payments', 'server/fakes/stripe/main.ts', stripe.env, 2_000) });
      if (mail) children.push({ url: `${mail.url}/mails`, child: program('mail', 'server/fakes/mail/main.ts', mail.env, 2_000) });
      await Promise.all(children.map(({ url, child }) => waitForAnswer(url, child)));
    }, () => [stripe ? '' : 'payments are real', mail ? '' : 'mail is real'].filter(Boolean).join(', '));
    proceed();
    const server = await step('Server', async () => {
      const child = program('server', 'server/main.ts', env, serverGraceMs);
      await waitForAnswer(`http://127.0.0.1:${port}/api/health`, child);
      return child;
    }, () => '');
    return { siteUrl, port, mailUrl: mail?.url ?? null, paymentsUrl: stripe?.url ?? null, databaseUrl: env.DATABASE_URL, signIns, server };
  }

  async function stop() {
    if (stopping) return;
    stopping = true;
    endCommands();
    await starting; // what it is just starting must be known before it can be ended
    for (const action of undo.reverse()) await action();
  }

  return { start, stop, failed };
}
