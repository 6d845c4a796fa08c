/** `npm run export`: the web app into dist/, when its sources changed. */
import { failWith, say } from './lib/console.mjs';
import { exportWebApp } from './lib/web-export.mjs';

try {
  say((await exportWebApp()) === 'exported' ? 'The web app is in dist/.' : 'dist/ is up to date.');
} catch (error) {
  failWith(error);
}
