import net from 'node:net';

/**
 * @param {number} port
 * @param {string} [host]
 * @returns {Promise<boolean>}
 */
export function isFree(port, host = '127.0.0.1') {
  return new Promise((resolve) => {
    const probe = net.createServer();
    probe.once('error', () => resolve(false));
    probe.listen({ port, host, exclusive: true }, () => probe.close(() => resolve(true)));
  });
}

/**
 * The wanted port, or the next free one above it.
 * @param {number} wanted
 * @param {string} [host]
 */
export async function freePortFrom(wanted, host) {
  for (let port = wanted; port < wanted + 500 && port < 65_536; port += 1) {
    if (await isFree(port, host)) return port;
  }
  throw new Error(`No free port between ${wanted} and ${wanted + 499}.`);
}

/** A port that the system picks. @returns {Promise<number>} */
export function anyFreePort() {
  return new Promise((resolve, reject) => {
    const probe = net.createServer();
    probe.once('error', reject);
    probe.listen(0, '127.0.0.1', () => {
      const { port } = /** @type {net.AddressInfo} */ (probe.address());
      probe.close(() => resolve(port));
    });
  });
}
