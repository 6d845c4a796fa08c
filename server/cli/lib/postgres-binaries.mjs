import { existsSync, readdirSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { Advice } from './console.mjs';
import { installDebianPackages } from './debian.mjs';

const debianDir = '/usr/lib/postgresql';
const needed = ['initdb', 'postgres', 'psql', 'pg_isready'];

/**
 * Finds the folder with PostgreSQL's server programs; installs Debian's package when there is none.
 * @param {string} [major] only this major version will do (that of an existing data folder)
 * @returns {Promise<string>}
 */
export async function ensurePostgresBinaries(major) {
  const found = findBinaries(major);
  if (found !== null) return found;
  if (major !== undefined && findBinaries() !== null) {
    throw new Advice(`The database in the data folder is of PostgreSQL ${major}, whose programs are not on this machine.
Install them, or move the data folder away to begin with an empty demo.`);
  }
  await installDebianPackages(['postgresql'], { purpose: 'The PostgreSQL server', before: refuseSystemCluster() });
  const installed = findBinaries(major);
  if (installed === null) throw new Advice(`PostgreSQL was installed, but no initdb is under ${debianDir} nor in PATH.`);
  return installed;
}

/** @param {string} [major] */
function findBinaries(major) {
  const versions = existsSync(debianDir) ? readdirSync(debianDir).sort((a, b) => Number(b) - Number(a)) : [];
  const folders = versions.filter((version) => major === undefined || version === major).map((version) => join(debianDir, version, 'bin'));
  // Programs in PATH cannot be told apart by folder name; an older data folder then fails with PostgreSQL's own clear words.
  folders.push(...(process.env.PATH ?? '').split(':').filter(Boolean));
  return folders.find((folder) => needed.every((program) => existsSync(join(folder, program)))) ?? null;
}

/**
 * Debian's package makes and starts a cluster for the whole machine unless told not to beforehand; we want only our own.
 * An existing file is somebody's decision and stays.
 */
function refuseSystemCluster() {
  const file = '/etc/postgresql-common/createcluster.conf';
  if (existsSync(file)) return undefined;
  return ['sh', '-c', `mkdir -p ${dirname(file)} && echo create_main_cluster = false > ${file}`];
}
