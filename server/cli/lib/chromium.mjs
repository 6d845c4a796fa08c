import { existsSync } from 'node:fs';
import { chromiumPath } from './chromium-launch.cjs';
import { installDebianPackages } from './debian.mjs';

/** Installs Debian's Chromium when there is none. */
export async function ensureChromium() {
  if (existsSync(chromiumPath)) return;
  await installDebianPackages(['chromium'], { purpose: 'Chromium, for the tests in a real browser,' });
}
