import { createServer } from 'node:net';

/**
 * Gives a port on 127.0.0.1 that nobody listens on: the wanted one, or the next free one after it, or any when none is wanted.
 * @param {number} [wantedPort]
 * @returns {Promise<number>}
 */
export async function freePort(wantedPort = 0) {
  for (let port = wantedPort; port <= Math.min(wantedPort + 100, 65_535); port += 1) {
    const found = await tryPort(port);
    if (found !== null) return found;
  }
  throw new Error(`No free port from ${wantedPort} on.`);
}

/**
 * @param {number} port
 * @returns {Promise<number | null>}
 */
function tryPort(port) {
  return new Promise((settle, fail) => {
    const server = createServer();
    server.once('error', (error) => {
      if ('code' in error && (error.code === 'EADDRINUSE' || error.code === 'EACCES')) settle(null);
      else fail(error);
    });
    server.listen({ host: '127.0.0.1', port, exclusive: true }, () => {
      const address = server.address();
      server.close(() => settle(typeof address === 'object' && address !== null ? address.port : null));
    });
  });
}
