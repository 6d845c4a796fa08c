import { createHash } from 'node:crypto';
import { existsSync, readdirSync, readFileSync, readlinkSync, renameSync, rmSync, symlinkSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { setTimeout as wait } from 'node:timers/promises';
import { compressFiles } from './compress.mjs';
import { distDir, folder, root } from './paths.mjs';
import { isOurs } from './processes.mjs';
import { lastLines, runAside } from './run.mjs';

const sources = ['app', 'components', 'shared', 'assets', 'metro', 'app.json', 'babel.config.js', 'metro.config.js', 'package-lock.json'];

/**
 * Exports the web app to dist/ with its compressed forms, when the sources changed since the last time.
 * @returns {Promise<'exported' | 'unchanged'>}
 */
export async function exportWebApp() {
  const unlock = await lock();
  try {
    const stamp = hashOfSources();
    const stampFile = join(distDir, '.stamp');
    if (existsSync(stampFile) && readFileSync(stampFile, 'utf8') === stamp) return 'unchanged';
    const fresh = join(folder(root, '.expo'), 'export');
    rmSync(fresh, { recursive: true, force: true });
    await runExpo(fresh);
    await compressFiles(fresh);
    writeFileSync(join(fresh, '.stamp'), stamp);
    // Put in place at once, so that a crash half-way leaves either the old app or the new one.
    rmSync(distDir, { recursive: true, force: true });
    renameSync(fresh, distDir);
    return 'exported';
  } finally {
    unlock();
  }
}

/** @param {string} outputDir */
async function runExpo(outputDir) {
  const env = /** @type {NodeJS.ProcessEnv} */ ({
    ...process.env,
    CI: '1',
    NODE_ENV: 'production',
    EXPO_NO_TELEMETRY: '1',
    EXPO_OFFLINE: '1',
    // Metro keeps its cache in the temporary folder; one left there by another user of the machine could not be written.
    TMPDIR: folder(root, '.expo', 'tmp'),
  });
  const args = [join(root, 'node_modules', 'expo', 'bin', 'cli'), 'export', '-p', 'web', '--output-dir', outputDir];
  const { code, output } = await runAside(process.execPath, args, { env });
  if (code !== 0 || !existsSync(join(outputDir, 'index.html'))) throw new Error(`The export of the web app failed:\n${lastLines(output, 40)}`);
}

function hashOfSources() {
  const hash = createHash('sha256');
  for (const source of sources) {
    for (const file of filesOf(source)) hash.update(`${file}\0`).update(readFileSync(join(root, file))).update('\0');
  }
  return hash.digest('hex');
}

/** @param {string} source @returns {string[]} */
function filesOf(source) {
  if (source.includes('.')) return [source];
  return readdirSync(join(root, source), { recursive: true, withFileTypes: true })
    .filter((entry) => entry.isFile())
    .map((entry) => join(entry.parentPath, entry.name).slice(root.length + 1))
    .sort();
}

/** One export at a time: a second waits for the first, and then finds its work done. The lock is a link that names its owner. */
async function lock() {
  const file = join(folder(root, '.expo'), 'export.lock');
  for (;;) {
    try {
      symlinkSync(String(process.pid), file);
      return () => rmSync(file, { force: true });
    } catch {
      if (!isOurs(ownerOf(file), 'node')) rmSync(file, { force: true });
      await wait(300);
    }
  }
}

/** @param {string} lockFile */
function ownerOf(lockFile) {
  try {
    return Number(readlinkSync(lockFile));
  } catch {
    return -1; // just given back
  }
}
