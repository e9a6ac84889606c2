import { createHash } from 'node:crypto';
import { readFileSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { withLock } from './lock.mjs';
import { readIfThere, root } from './place.mjs';
import { run } from './processes.mjs';
import { Stop } from './say.mjs';

const lockFile = path.join(root, 'package-lock.json');
const installedFile = path.join(root, 'node_modules/.package-lock.json');
const stampFile = path.join(root, 'node_modules/.rimewright-stamp');

const wanted = () =>
  createHash('sha256')
    .update(readFileSync(lockFile))
    .update(`node ${process.versions.node.split('.')[0]}`)
    .digest('hex');

/** Whether npm's own record of node_modules is what the lock asks for: so it is after somebody's `npm install`. */
function isInstalledByHand() {
  const installedText = readIfThere(installedFile);
  if (!installedText) return false;
  const installed = JSON.parse(installedText).packages;
  const locked = JSON.parse(readFileSync(lockFile, 'utf8')).packages;
  const isAsLocked = ([place, { version }]) => locked[place]?.version === version;
  const isThere = ([place, { optional, devOptional }]) => place === '' || optional || devOptional || place in installed;
  return Object.entries(installed).every(isAsLocked) && Object.entries(locked).every(isThere);
}

async function install() {
  // NODE_ENV=production, or npm set to leave them out, would drop the packages that build and test.
  const env = { ...process.env, NODE_ENV: 'development' };
  const command = ['npm', 'ci', '--include=dev', '--no-audit', '--no-fund'];
  const done = await run(command, { cwd: root, env, show: true, mayInterrupt: true });
  if (done.code !== 0)
    throw new Stop('The packages could not be installed (npm ci). Please look above; starting again is safe.', 4);
}

/**
 * Installs the locked packages where node_modules is not what the lock asks for.
 * @returns {Promise<'as locked' | 'installed'>}
 */
export async function ensurePackages() {
  if (readIfThere(stampFile) === wanted()) return 'as locked';
  return withLock('packages', async () => {
    if (readIfThere(stampFile) === wanted()) return 'as locked';
    const byHand = isInstalledByHand();
    if (!byHand) await install();
    writeFileSync(stampFile, wanted());
    return byHand ? 'as locked' : 'installed';
  });
}
