import { spawn } from 'node:child_process';
import { closeSync, openSync } from 'node:fs';
import { join } from 'node:path';
import { setTimeout as wait } from 'node:timers/promises';
import { Advice } from './console.mjs';
import { root } from './paths.mjs';
import { lastLinesOfFile, logsDir } from './run.mjs';

/**
 * A program that runs beside this one, in a process group of its own, so that Ctrl-C reaches only us and we end all in order.
 * @typedef {object} Child
 * @property {string} name
 * @property {number} pid
 * @property {string} logFile
 * @property {() => boolean} running
 * @property {Promise<string>} ended settles with how it ended ("code 1", "signal SIGKILL"), whoever ended it
 * @property {(signal: NodeJS.Signals) => void} kill
 * @property {(graceMs: number, signal?: NodeJS.Signals) => Promise<void>} stop asks it to end, and ends it after the grace
 */

/**
 * @param {{ name: string, command: string, args: string[], dataDir: string, env?: NodeJS.ProcessEnv, uid?: number, gid?: number,
 *   cwd?: string }} options
 * @returns {Child}
 */
export function startChild({ name, command, args, dataDir, env, uid, gid, cwd = root }) {
  const logFile = join(logsDir(dataDir), `${name}.log`);
  const log = openSync(logFile, 'w');
  const child = spawn(command, args, { cwd, env: env ?? process.env, uid, gid, detached: true, stdio: ['ignore', log, log] });
  closeSync(log);
  /** @type {Promise<string>} */
  const ended = new Promise((settle) => {
    child.once('error', (error) => settle(error.message));
    child.once('exit', (code, signal) => settle(signal ? `signal ${signal}` : `code ${code}`));
  });
  const running = () => child.exitCode === null && child.signalCode === null && child.pid !== undefined;
  return {
    name,
    pid: child.pid ?? -1,
    logFile,
    running,
    ended,
    kill: (signal) => void child.kill(signal),
    async stop(graceMs, signal = 'SIGTERM') {
      if (!running()) return;
      child.kill(signal);
      const inTime = await Promise.race([ended.then(() => true), wait(graceMs, false, { ref: false })]);
      if (!inTime) killGroup(child.pid ?? -1);
      await ended;
    },
  };
}

/** @param {number} pid */
function killGroup(pid) {
  try {
    process.kill(-pid, 'SIGKILL');
  } catch {
    // It ended in this very moment.
  }
}

/**
 * Waits until an address answers with a success, or the program behind it ends, or the time is up.
 * @param {string} url
 * @param {Child} child
 */
export async function waitForAnswer(url, child) {
  const limitMs = 60_000;
  const deadline = Date.now() + limitMs;
  while (Date.now() < deadline) {
    if (!child.running()) throw deathOf(child, await child.ended);
    try {
      const response = await fetch(url, { signal: AbortSignal.timeout(2_000) });
      await response.arrayBuffer();
      if (response.ok) return;
    } catch (error) {
      if (error instanceof Error && error.cause instanceof Error && error.cause.message === 'bad port') {
        throw new Advice(`Browsers refuse to open port ${new URL(url).port} (it is on the Fetch standard's list of bad ports). Set PORT to another.`);
      }
      // Otherwise it is not listening yet.
    }
    await wait(100);
  }
  throw new Advice(`${child.name} gave no answer at ${url} within ${limitMs / 1000} s. Its last lines:\n${lastLinesOfFile(child.logFile, 20)}`);
}

/**
 * What to print when a program ended that should run.
 * @param {Child} child
 * @param {string} how
 */
export const deathOf = (child, how) =>
  new Advice(`${child.name} ended unexpectedly (${how}). Its last lines, from ${child.logFile}:\n${lastLinesOfFile(child.logFile, 20)}`);
