import { spawnSync } from 'node:child_process';
import { Advice } from './console.mjs';
import { runAside, lastLines } from './run.mjs';

const aptOptions = ['-y', '-q', '--no-install-recommends', '-o', 'Dpkg::Options::=--force-confold', '-o', 'APT::Sandbox::User=root'];

/**
 * Installs Debian packages as root or through a sudo that asks nothing.
 * @param {string[]} packages
 * @param {{ purpose: string, before?: string[] }} options purpose: what they are for, in words; before: a root command to run first
 * @throws {Advice} with the one command to type, when it may not install or the system has no apt-get
 */
export async function installDebianPackages(packages, { purpose, before }) {
  const byHand = `apt-get update && apt-get install -y --no-install-recommends ${packages.join(' ')}`;
  const advice = (/** @type {string} */ why) => new Advice(`${purpose} is missing, and ${why}. As root, run:\n\n  ${byHand}\n\nthen start again.`);
  if (spawnSync('apt-get', ['--version']).status !== 0) throw advice('this system has no apt-get: install it the way this system does');
  const sudo = process.getuid?.() === 0 ? [] : ['sudo', '-n'];
  if (sudo.length > 0 && spawnSync('sudo', ['-n', 'true']).status !== 0) throw advice('this user may not install packages');

  const commands = [
    ...(before ? [before] : []),
    ['apt-get', 'update', '-q'],
    ['env', 'DEBIAN_FRONTEND=noninteractive', 'apt-get', 'install', ...aptOptions, ...packages],
  ];
  for (const parts of commands) {
    const [command = '', ...args] = [...sudo, ...parts];
    const { code, output } = await runAside(command, args);
    // An update may fail for one source among several; what counts is whether the package then installs.
    if (code !== 0 && !parts.includes('update')) throw advice(`installing it failed:\n${lastLines(output, 15)}\n`);
  }
}
