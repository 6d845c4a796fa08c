import { readEnv } from '../env';

/** Checks the environment before anything is started: ends with 1 and a line for each variable that does not fit. */
const result = readEnv(process.env);
if ('problems' in result) {
  process.stderr.write(`${result.problems.map((problem) => `  ${problem}`).join('\n')}\n`);
  process.exitCode = 1;
}
