import { chmodSync, mkdirSync } from 'node:fs';
import { dirname, join, resolve } from 'node:path';
import { fileURLToPath } from 'node:url';

/** The repository's own folder. */
export const root = resolve(dirname(fileURLToPath(import.meta.url)), '..', '..', '..');

/** The exported web app. */
export const distDir = join(root, 'dist');

/** Where a running Tidyrun keeps everything; TIDYRUN_DATA_DIR lets a second one stand beside the first. */
export const defaultDataDir = resolve(root, process.env.TIDYRUN_DATA_DIR || '.data');

/**
 * Gives a folder, made when missing, that only its owner can read: demo data is invented, but a live one's is not.
 * @param {...string} parts
 */
export function folder(...parts) {
  const path = join(...parts);
  mkdirSync(path, { recursive: true, mode: 0o700 });
  return path;
}

/**
 * Gives a data folder, made when missing; others may pass through it (PostgreSQL's account must), but not look around.
 * @param {string} dataDir
 */
export function dataFolder(dataDir) {
  chmodSync(folder(dataDir), 0o711);
  return dataDir;
}
