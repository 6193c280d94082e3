import { createServer } from 'node:net';

/** A free port on loopback, chosen by the kernel. @returns {Promise<number>} */
export function findFreePort() {
  return listenBriefly(0);
}

/** @param {number} port */
export async function isPortFree(port) {
  try {
    await listenBriefly(port);
    return true;
  } catch {
    return false;
  }
}

/** The first free port from the wished one upwards. @param {number} wishedPort */
export async function findFreePortFrom(wishedPort) {
  for (let port = wishedPort; port < Math.min(wishedPort + 200, 65_536); port += 1) {
    if (await isPortFree(port)) return port;
  }
  return findFreePort();
}

/** @param {number} port @returns {Promise<number>} */
function listenBriefly(port) {
  return new Promise((resolve, reject) => {
    const server = createServer();
    server.once('error', reject);
    server.listen({ port, host: '127.0.0.1', exclusive: true }, () => {
      const address = server.address();
      const chosen = typeof address === 'object' && address ? address.port : port;
      server.close(() => resolve(chosen));
    });
  });
}
