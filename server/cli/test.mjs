/** `npm test`: sets up what it needs, then types, lint, jest and the browser. Its last line is "N passed, N failed". */
import { spawn } from 'node:child_process';
import { readFileSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { ensureChromium } from './lib/chromium.mjs';
import { countSteps, failWith, say } from './lib/console.mjs';
import { checkNodeVersion, ensurePackages } from './lib/packages.mjs';
import { defaultDataDir, folder, root } from './lib/paths.mjs';
import { ensurePostgresBinaries } from './lib/postgres-binaries.mjs';
import { exportWebApp } from './lib/web-export.mjs';

/** @typedef {{ passed: number, failed: number }} Count */

const bin = (/** @type {string} */ name) => join(root, 'node_modules', '.bin', name);

/**
 * Runs a command with its output on this terminal.
 * @param {string} command
 * @param {string[]} args
 * @param {NodeJS.ProcessEnv} [env]
 * @returns {Promise<number>} its exit code
 */
function show(command, args, env = process.env) {
  return new Promise((settle, fail) => {
    const child = spawn(command, args, { cwd: root, env, stdio: ['ignore', 'inherit', 'inherit'] });
    child.once('error', fail);
    child.once('exit', (code) => settle(code ?? 1));
  });
}

/** @param {number} code @returns {Count} */
const oneCheck = (code) => (code === 0 ? { passed: 1, failed: 0 } : { passed: 0, failed: 1 });

/**
 * Counts what a runner reports; a runner that failed without naming a failed test, or ran none, counts as a failure itself.
 * @param {{ name: string, command: string, args: string[], reportFile: string, env?: NodeJS.ProcessEnv,
 *   count: (report: unknown) => Count }} options
 * @returns {Promise<Count>}
 */
async function runTests({ name, command, args, reportFile, env, count }) {
  rmSync(reportFile, { force: true });
  const code = await show(command, args, env);
  try {
    const counted = count(JSON.parse(readFileSync(reportFile, 'utf8')));
    const crashed = counted.failed === 0 && (code !== 0 || counted.passed === 0);
    if (crashed) say(`${name} ended with code ${code} and ${counted.passed} passed: counted as a failure.`);
    return { passed: counted.passed, failed: counted.failed + (crashed ? 1 : 0) };
  } catch (error) {
    say(`${name} left no report (code ${code}): ${error instanceof Error ? error.message : error}`);
    return { passed: 0, failed: 1 };
  }
}

/** @param {unknown} report @returns {Count} */
function countJest(report) {
  const counts = /** @type {Record<string, number>} */ (report);
  // A test left out proves nothing, so it is no success.
  const failures = ['numFailedTests', 'numRuntimeErrorTestSuites', 'numPendingTests', 'numTodoTests'];
  return { passed: counts.numPassedTests ?? 0, failed: failures.reduce((sum, name) => sum + (counts[name] ?? 0), 0) };
}

/** @param {unknown} report @returns {Count} */
function countPlaywright(report) {
  const { stats, errors } = /** @type {{ stats: Record<string, number>, errors: unknown[] }} */ (report);
  return { passed: stats.expected ?? 0, failed: (stats.unexpected ?? 0) + (stats.flaky ?? 0) + (stats.skipped ?? 0) + errors.length };
}

async function setUp() {
  const step = countSteps(4);
  await step('Node.js', checkNodeVersion, () => process.versions.node);
  await step('Packages', () => ensurePackages(defaultDataDir), (result) => (result === 'installed' ? 'installed' : ''));
  await step('PostgreSQL', () => ensurePostgresBinaries());
  await step('Chromium', ensureChromium, () => '');
}

/** @returns {Promise<Count>} */
async function inTheBrowser() {
  try {
    await exportWebApp();
  } catch (error) {
    failWith(error);
    return { passed: 0, failed: 1 };
  }
  const reportFile = join(folder(defaultDataDir, 'reports'), 'playwright.json');
  return runTests({
    name: 'Playwright', command: bin('playwright'), args: ['test', '--config', 'tests/e2e/playwright.config.ts'],
    reportFile, env: { ...process.env, PLAYWRIGHT_JSON_OUTPUT_FILE: reportFile }, count: countPlaywright,
  });
}

/** @returns {Promise<Count>} */
function inJest() {
  const reportFile = join(folder(defaultDataDir, 'reports'), 'jest.json');
  return runTests({ name: 'jest', command: bin('jest'), args: ['--json', '--outputFile', reportFile], reportFile, count: countJest });
}

async function main() {
  await setUp();
  /** @type {[string, () => Promise<Count>][]} */
  const phases = [
    ['Types', async () => oneCheck(await show(bin('tsc'), ['--noEmit']))],
    ['Lint', async () => oneCheck(await show(bin('eslint'), ['.', '--max-warnings', '0']))],
    ['jest: screens, pricing, shared, server', inJest],
    ['Playwright: the whole product in a browser', inTheBrowser],
  ];
  const total = { passed: 0, failed: 0 };
  for (const [name, phase] of phases) {
    say(`\n== ${name}`);
    const { passed, failed } = await phase();
    say(`== ${name}: ${passed} passed, ${failed} failed`);
    total.passed += passed;
    total.failed += failed;
  }
  if (total.failed > 0) process.exitCode = 1;
  say(`\n${total.passed} passed, ${total.failed} failed`);
}

main().catch(failWith);
