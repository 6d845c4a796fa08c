/** The words on the terminal while Tidyrun is made ready: plain lines, each step with its time. */

/** A problem whose message is meant for the person at the terminal: printed without a stack. */
export class Advice extends Error {}

/** @param {string} line */
export const say = (line) => process.stdout.write(`${line}\n`);

/**
 * Numbers steps: `[2/8] PostgreSQL … 0.6 s`. The function of a step may give words that are put behind its time.
 * @param {number} total
 */
export function countSteps(total) {
  let done = 0;
  /**
   * @template Result
   * @param {string} label
   * @param {() => Promise<Result> | Result} work
   * @param {(result: Result) => string} [describe]
   * @returns {Promise<Result>}
   */
  return async (label, work, describe) => {
    done += 1;
    const startedAt = performance.now();
    process.stdout.write(`[${done}/${total}] ${label} … `);
    try {
      const result = await work();
      const words = describe?.(result);
      say(`${((performance.now() - startedAt) / 1000).toFixed(1)} s${words ? `  ${words}` : ''}`);
      return result;
    } catch (error) {
      say('failed');
      throw error;
    }
  };
}

/**
 * Ends the process with what a person can use: advice as it is, anything else with its stack.
 * @param {unknown} error
 */
export function failWith(error) {
  const words = error instanceof Advice ? error.message : error instanceof Error ? (error.stack ?? error.message) : String(error);
  process.stderr.write(`\n${words}\n`);
  process.exitCode = 1;
}
