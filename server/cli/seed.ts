import { createDeps } from '../create-deps';
import { readEnv } from '../env';
import { seedDemo } from '../seeders/demo';
import { demoPassword, demoStaff } from '../seeders/demo-staff';

/** Fills an empty database with the demo; with --show-sign-ins prints its sign-ins instead, one JSON line each. Only when DEMO is 1. */
async function main(): Promise<number> {
  const read = readEnv({ ...process.env, WEB_DIST_DIR: '' });
  if ('problems' in read) {
    process.stderr.write(`${read.problems.join('\n')}\n`);
    return 1;
  }
  const { env } = read;
  if (!env.DEMO) {
    process.stderr.write('DEMO: is not 1, so nothing invented is put into this database\n');
    return 1;
  }
  if (process.argv.includes('--show-sign-ins')) {
    for (const { role, email } of demoStaff) process.stdout.write(`${JSON.stringify({ role, email, password: demoPassword, url: `${env.PUBLIC_URL}/desk` })}\n`);
    return 0;
  }
  const { deps } = createDeps(env);
  try {
    const made = await seedDemo(deps);
    process.stdout.write(made === 0 ? 'The demo is already there.\n' : `Made ${made} invented intakes.\n`);
    return 0;
  } finally {
    deps.mailer.close();
    await deps.sequelize.close();
  }
}

main().then(
  (code) => { process.exitCode = code; },
  (error: unknown) => {
    process.stderr.write(`The demo could not be made: ${error instanceof Error ? (error.stack ?? error.message) : String(error)}\n`);
    process.exitCode = 1;
  },
);
