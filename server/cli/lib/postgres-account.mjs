import { spawnSync } from 'node:child_process';
import { Advice } from './console.mjs';

/** @typedef {{ uid: number, gid: number }} Account */

/**
 * The account that PostgreSQL's server runs as when not as the user who started us: it refuses to run as root, so then it
 * is Debian's `postgres`.
 * @returns {Account | null} null: no other account is needed
 * @throws {Advice} when we are root and there is no such account
 */
export function accountFor() {
  if (process.getuid?.() !== 0) return null;
  const uid = idOf('-u');
  const gid = idOf('-g');
  if (uid === null || gid === null) throw new Advice('PostgreSQL must not run as root, and there is no account named postgres. Make one: useradd --system postgres');
  return { uid, gid };
}

/** @param {'-u' | '-g'} kind */
function idOf(kind) {
  const { status, stdout } = spawnSync('id', [kind, 'postgres'], { encoding: 'utf8' });
  return status === 0 ? Number(stdout) : null;
}

/**
 * Whether the account may pass through every folder on the way.
 * @param {string} path
 * @param {Account} account
 */
export const canEnter = (path, account) => spawnSync('test', ['-x', path], { ...account, cwd: '/' }).status === 0;
