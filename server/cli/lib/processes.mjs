import { existsSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { basename, join } from 'node:path';
import { setTimeout as wait } from 'node:timers/promises';
import { Advice } from './console.mjs';
import { dataFolder } from './paths.mjs';

/**
 * Whether a process lives and was started with these words in its command line; a number alone may by now be another program's.
 * @param {number} pid
 * @param {string} words
 */
export function isOurs(pid, words) {
  if (!Number.isInteger(pid) || pid <= 1) return false;
  try {
    const commandLine = readFileSync(`/proc/${pid}/cmdline`, 'utf8').split('\0').join(' ');
    return commandLine !== '' && commandLine.includes(words);
  } catch {
    return false;
  }
}

/** @typedef {{ owner: number, ownerWords: string, children: { pid: number, words: string }[] }} Running */

/**
 * Claims a data folder for this process: two on one folder would fight over the database's port and the demo's files.
 * Programs left over from an owner that was killed are ended first.
 * @param {string} dataDir
 * @returns {Promise<{ remember: (pid: number, words: string) => void, release: () => void }>}
 * @throws {Advice} when another Tidyrun runs on it
 */
export async function claimDataDir(dataDir) {
  const file = join(dataFolder(dataDir), 'running.json');
  if (existsSync(file)) {
    const before = readRunning(file);
    if (before.owner !== process.pid && isOurs(before.owner, before.ownerWords)) {
      throw new Advice(`Tidyrun already runs on ${dataDir} (process ${before.owner}). End it first, or give this one a folder of its own:

  TIDYRUN_DATA_DIR=.data/second npm start`);
    }
    await endLeftOvers(before);
  }
  /** @type {Running} */
  const running = { owner: process.pid, ownerWords: basename(process.argv[1] ?? ''), children: [] };
  const write = () => writeFileSync(file, JSON.stringify(running));
  write();
  return {
    remember(pid, words) {
      running.children.push({ pid, words });
      write();
    },
    release: () => rmSync(file, { force: true }),
  };
}

/**
 * @param {string} file
 * @returns {Running}
 */
function readRunning(file) {
  try {
    return JSON.parse(readFileSync(file, 'utf8'));
  } catch {
    return { owner: -1, ownerWords: '', children: [] }; // cut off while it was written: then nothing had been started yet
  }
}

/** @param {Running} before */
async function endLeftOvers(before) {
  const alive = () => before.children.filter(({ pid, words }) => isOurs(pid, words));
  for (const { pid } of alive()) process.kill(pid, 'SIGTERM');
  const deadline = Date.now() + 12_000;
  while (alive().length > 0 && Date.now() < deadline) await wait(50);
  for (const { pid } of alive()) process.kill(pid, 'SIGKILL');
}
