import path from 'node:path';
import { freePortFrom, isFree } from './ports.mjs';
import { root } from './place.mjs';
import { pause } from './processes.mjs';
import { Stop } from './say.mjs';

const everywhere = ['0.0.0.0', '::'];

/**
 * Where to listen, and the address that people open: sessions belong to that host name and no other.
 * @param {number} usualPort
 */
export async function webAddress(usualPort) {
  const host = process.env.HOST ?? '127.0.0.1';
  const asked = process.env.PORT;
  if (asked !== undefined && !/^\d{1,5}$/.test(asked)) throw new Stop(`PORT is "${asked}", which is not a port.`);
  if (asked && !(await isFree(Number(asked), host))) {
    throw new Stop(
      `Port ${asked} on ${host} is taken or not allowed. Set PORT to another, or leave it out and a free one is found.`,
    );
  }
  const port = asked ? Number(asked) : await freePortFrom(usualPort, host);
  const named = host === '127.0.0.1' || everywhere.includes(host) ? 'localhost' : host;
  const url = process.env.NEXTAUTH_URL ?? `http://${named.includes(':') ? `[${named}]` : named}:${port}`;
  const probe = everywhere.includes(host) ? '127.0.0.1' : host;
  return { host, port, url, probeUrl: `http://${probe.includes(':') ? `[${probe}]` : probe}:${port}` };
}

/** @param {'start' | 'dev'} verb @param {{ host: string, port: number }} address */
export const webCommand = (verb, { host, port }) => [
  process.execPath,
  path.join(root, 'node_modules/next/dist/bin/next'),
  verb,
  '-H',
  host,
  '-p',
  String(port),
];

export const workerCommand = [process.execPath, '--import', 'tsx', 'scripts/worker.ts'];

/**
 * Waits until the health route answers that it is ready.
 * @param {string} probeUrl
 * @param {{ patienceMs: number, mayGoOn?: () => boolean }} limits
 */
export async function untilReady(probeUrl, { patienceMs, mayGoOn = () => true }) {
  const endsAt = Date.now() + patienceMs;
  while (Date.now() < endsAt && mayGoOn()) {
    try {
      const answer = await fetch(`${probeUrl}/api/health`, { signal: AbortSignal.timeout(30_000) });
      await answer.arrayBuffer();
      if (answer.ok) return true;
    } catch {
      // not listening yet
    }
    await pause(100);
  }
  return false;
}
