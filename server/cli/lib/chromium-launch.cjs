/** How Chromium is started; CommonJS, because Playwright reads it before it can read modules. */

/** Where Chromium is; CHROMIUM_PATH names another. */
const chromiumPath = process.env.CHROMIUM_PATH || '/usr/bin/chromium';

/** What it needs to run as root and without a graphics card, and so as not to ask its maker's hosts at every start. */
const chromiumFlags = [
  '--no-sandbox', '--disable-gpu', '--disable-quic', '--no-first-run', '--disable-background-networking', '--disable-component-update', '--disable-sync',
];

module.exports = { chromiumPath, chromiumFlags };
