import { spawn, spawnSync } from 'node:child_process';
import { createWriteStream, readFileSync } from 'node:fs';
import { basename, join } from 'node:path';
import { Advice } from './console.mjs';
import { folder, root } from './paths.mjs';

/** @typedef {{ env?: NodeJS.ProcessEnv, uid?: number, gid?: number, cwd?: string, input?: string }} RunOptions */

/**
 * Runs a command to its end and gives its output.
 * @param {string} command
 * @param {string[]} args
 * @param {RunOptions} [options]
 * @returns {string} standard output
 * @throws with the last lines of its output when it ends with another code than 0
 */
export function run(command, args, options = {}) {
  const result = spawnSync(command, args, { cwd: root, encoding: 'utf8', maxBuffer: 64 * 1024 * 1024, ...options });
  if (result.error) throw result.error;
  if (result.status !== 0) {
    throw new Error(`${basename(command)} ended with ${result.status ?? result.signal}:\n${lastLines(result.stdout + result.stderr, 30)}`);
  }
  return result.stdout;
}

/** @type {Set<import('node:child_process').ChildProcess>} */
const runningAside = new Set();

/** Ends the commands that `runAside` still waits for, as when a person ends us half-way. */
export function endCommands() {
  for (const child of runningAside) child.kill('SIGTERM');
}
process.on('exit', endCommands);

/**
 * The same without holding up this process; its output goes to `logFile` when given.
 * @param {string} command
 * @param {string[]} args
 * @param {RunOptions & { logFile?: string }} [options]
 * @returns {Promise<{ code: number, output: string }>}
 */
export function runAside(command, args, { logFile, input, ...options } = {}) {
  return new Promise((settle, fail) => {
    const child = spawn(command, args, { cwd: root, stdio: ['pipe', 'pipe', 'pipe'], ...options });
    const log = logFile === undefined ? null : createWriteStream(logFile);
    runningAside.add(child);
    let output = '';
    for (const stream of [child.stdout, child.stderr]) {
      stream.setEncoding('utf8');
      stream.on('data', (/** @type {string} */ text) => {
        output += text;
        log?.write(text);
      });
    }
    child.stdin.on('error', () => {}); // a command that reads no input may close it early
    child.stdin.end(input ?? '');
    child.once('error', fail);
    child.once('close', (code) => {
      runningAside.delete(child);
      log?.end();
      settle({ code: code ?? 1, output });
    });
  });
}

/**
 * Runs a TypeScript file of ours to its end and gives its output.
 * @param {string} file
 * @param {string[]} args
 * @param {NodeJS.ProcessEnv} env
 * @param {string} [failure] what to say above its last lines when it ends with another code than 0
 * @throws {Advice} then
 */
export async function runOurs(file, args, env, failure = `${file} failed:`) {
  const { code, output } = await runAside(...tsx(file, ...args), { env });
  if (code !== 0) throw new Advice(`${failure}\n${lastLines(output, 30)}`);
  return output;
}

/**
 * @param {string} text
 * @param {number} count
 */
export const lastLines = (text, count) => text.trimEnd().split('\n').slice(-count).join('\n');

/**
 * @param {string} file
 * @param {number} count
 */
export function lastLinesOfFile(file, count) {
  try {
    return lastLines(readFileSync(file, 'utf8'), count);
  } catch {
    return '';
  }
}

/**
 * The command that runs a TypeScript file of ours in one process, so that a signal reaches the program itself.
 * @param {string} file
 * @param {string[]} args
 * @returns {[string, string[]]}
 */
export const tsx = (file, ...args) => [process.execPath, ['--import', 'tsx', join(root, file), ...args]];

/** @param {string} dataDir */
export const logsDir = (dataDir) => folder(dataDir, 'logs');
