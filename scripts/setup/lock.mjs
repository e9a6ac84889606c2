import { spawn } from 'node:child_process';
import { ensureDataFolder, inData } from './place.mjs';
import { say, Stop } from './say.mjs';

/**
 * Runs `work` while holding a lock file of the checkout. The lock is held by a `flock` whose input is a pipe
 * from this process: when this process ends, however it ends, the lock is free.
 * @template T
 * @param {string} name
 * @param {() => Promise<T>} work
 * @param {number} [waitS]
 * @returns {Promise<T>}
 */
export async function withLock(name, work, waitS = 900) {
  ensureDataFolder();
  const keeper = spawn(
    'flock',
    ['--exclusive', '--timeout', String(waitS), inData(`${name}.lock`), 'sh', '-c', 'echo locked; exec cat >/dev/null'],
    // Its own group: Ctrl-C must not free the lock before the work under it has ended.
    { detached: true, stdio: ['pipe', 'pipe', 'inherit'] },
  );
  keeper.stdin.on('error', () => undefined);
  const ended = new Promise((resolve) => keeper.on('close', resolve));
  const announce = setTimeout(() => say(`  … waiting for another command of this checkout (${name})`), 1500);
  const locked = await new Promise((resolve, reject) => {
    keeper.once('error', reject);
    keeper.stdout.once('data', () => resolve(true));
    keeper.once('close', () => resolve(false));
  });
  clearTimeout(announce);
  if (!locked) throw new Stop(`Another command of this checkout has held ${inData(`${name}.lock`)} for ${waitS} s.`);
  try {
    return await work();
  } finally {
    keeper.stdin.end();
    await ended;
  }
}
