/** `npm start`: from a bare clone to a served page, and everything down again on Ctrl-C. Plain Node until packages are there. */
import { Advice, countSteps, failWith, say } from './lib/console.mjs';
import { checkNodeVersion, ensurePackages } from './lib/packages.mjs';
import { defaultDataDir } from './lib/paths.mjs';
import { createProduct, productSteps } from './lib/product.mjs';

const defaultPort = 4173;

/** @param {string | undefined} text */
function readPort(text) {
  if (text === undefined || text === '') return defaultPort;
  const port = Number(text);
  if (!Number.isInteger(port) || port < 1 || port > 65_535) throw new Advice(`PORT must be a whole number from 1 to 65535, not "${text}".`);
  return port;
}

/** @param {Awaited<ReturnType<ReturnType<typeof createProduct>['start']>>} product @param {number} wantedPort */
function tell({ siteUrl, port, mailUrl, signIns }, wantedPort) {
  say('');
  if (port !== wantedPort) say(`Port ${wantedPort} is taken; this is ${port}.`);
  say(`  The site      ${siteUrl}`);
  say(`  The desk      ${siteUrl}/desk`);
  if (mailUrl) say(`  Caught mail   ${mailUrl}`);
  if (signIns.length > 0) {
    say('\n  Demo sign-ins for the desk');
    for (const { role, email, password } of signIns) say(`  ${role.padEnd(12)}  ${email}  ${password}`);
  }
  say('\n  Ctrl-C ends everything.');
}

async function main() {
  const wantedPort = readPort(process.env.PORT);
  const product = createProduct({ dataDir: defaultDataDir, wantedPort });
  let asked = false;
  /** @type {Promise<void>} */
  const askedToEnd = new Promise((settle) => {
    for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) {
      process.on(signal, () => {
        if (!asked) say('\nEnding …');
        asked = true;
        settle();
      });
    }
  });
  try {
    const step = countSteps(productSteps + 2);
    await step('Node.js', checkNodeVersion, () => process.versions.node);
    await step('Packages', () => ensurePackages(defaultDataDir), (result) => (result === 'installed' ? 'installed' : ''));
    const started = await Promise.race([product.start(step), product.failed, askedToEnd]);
    if (started) tell(started, wantedPort);
    await Promise.race([product.failed, askedToEnd]);
  } catch (error) {
    if (!asked) failWith(error);
  } finally {
    await product.stop();
  }
}

main().then(() => process.exit(), (error) => {
  failWith(error);
  process.exit();
});
