import { createServer, type Server } from 'node:http';
import { createApp } from './app';
import { createDeps } from './create-deps';
import { readEnv, type Env } from './env';
import { sweepTries } from './http/rate-limits';
import { rangeOf } from './intakes/range-of';
import { createHandlers } from './jobs/handlers';

/** A balancer gives up on us after this; whoever is still being served then is cut off. */
const STOP_WITHIN_MS = 10_000;
const JOBS_STOP_WITHIN_MS = 5_000;
const SWEEP_EVERY_MS = 3_600_000;

const listening = (server: Server, { HOST, PORT }: Env): Promise<void> =>
  new Promise((resolve, reject) => { server.once('error', reject).listen(PORT, HOST, resolve); });

async function run(env: Env): Promise<void> {
  const { deps, jobs } = createDeps(env);
  const server = createServer(createApp(deps).app);
  const { logger, sequelize, mailer, pricing } = deps;
  let stopping = false;
  // A kept connection would otherwise send its next request into a server that is gone.
  server.prependListener('request', (_request, response) => { if (stopping) response.setHeader('Connection', 'close'); });

  const stop = async (signal: string): Promise<void> => {
    if (stopping) return;
    stopping = true;
    logger.info({ signal }, 'stopping');
    setTimeout(() => { logger.error('stopped before all was done'); process.exit(1); }, STOP_WITHIN_MS).unref();
    await new Promise<void>((closed) => { server.close(() => closed()); });
    await jobs.stop(JOBS_STOP_WITHIN_MS);
    mailer.close();
    await sequelize.close();
    logger.info('stopped');
  };
  for (const signal of ['SIGTERM', 'SIGINT'] as const) process.on(signal, () => { void stop(signal); });

  rangeOf(pricing, {}); // compiles the rulebook before the first visitor waits for it
  await jobs.start(createHandlers(deps));
  setInterval(() => { sweepTries(sequelize).catch(() => logger.warn('old counts of tries are swept later')); }, SWEEP_EVERY_MS).unref();
  await listening(server, env);
  const address = server.address();
  logger.info({ port: typeof address === 'object' ? address?.port : env.PORT, demo: env.DEMO }, 'listening');
}

function fail(lines: readonly string[]): void {
  process.stderr.write(`${lines.join('\n')}\n`);
  process.exitCode = 1;
}

const read = readEnv(process.env);
if ('problems' in read) fail(['The server does not start; mend these variables:', ...read.problems]);
else run(read.env).catch((error: unknown) => {
  fail([`The server could not start: ${error instanceof Error ? error.message : String(error)}`]);
  process.exit(1);
});
