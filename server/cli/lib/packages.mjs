import { createHash } from 'node:crypto';
import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { Advice } from './console.mjs';
import { dataFolder, root } from './paths.mjs';
import { lastLines, runAside } from './run.mjs';

/** @throws {Advice} when this Node.js is too old or too new for the packages */
export function checkNodeVersion() {
  const [major = 0, minor = 0] = process.versions.node.split('.').map(Number);
  if (major !== 20 || minor < 19) throw new Advice(`Tidyrun runs on Node.js 20.19 or a later 20; this is ${process.versions.node}.`);
}

/**
 * Installs the npm packages exactly as locked, when they are missing or were installed from another lock.
 * @param {string} dataDir where the lock's hash is remembered
 * @returns {Promise<'installed' | 'there'>}
 */
export async function ensurePackages(dataDir) {
  const lock = createHash('sha256').update(readFileSync(join(root, 'package-lock.json'))).digest('hex');
  const installedFrom = join(root, 'node_modules', '.package-lock.json');
  const stampFile = join(dataFolder(dataDir), 'packages.stamp');
  const state = () => `${lock} ${createHash('sha256').update(readFileSync(installedFrom)).digest('hex')}`;
  if (existsSync(stampFile) && existsSync(installedFrom) && readFileSync(stampFile, 'utf8') === state()) return 'there';
  if (existsSync(installedFrom) && samePackages(installedFrom)) {
    writeFileSync(stampFile, state());
    return 'there';
  }
  const { code, output } = await runAside('npm', ['ci', '--no-audit', '--no-fund'], { env: { ...process.env, NODE_ENV: 'development' } });
  if (code !== 0) throw new Advice(`npm ci failed:\n${lastLines(output, 20)}`);
  writeFileSync(stampFile, state());
  return 'installed';
}

/**
 * Whether packages that somebody installed by hand are those of the lock (optional ones for other systems are never there).
 * @param {string} installedFrom
 */
function samePackages(installedFrom) {
  const wanted = readLock(join(root, 'package-lock.json'));
  const found = readLock(installedFrom);
  return Object.entries(wanted).every(([path, { version, optional }]) => path === '' || optional || found[path]?.version === version);
}

/**
 * @param {string} file
 * @returns {Record<string, { version?: string, optional?: boolean }>}
 */
const readLock = (file) => JSON.parse(readFileSync(file, 'utf8')).packages;
