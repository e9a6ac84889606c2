import { randomBytes } from 'node:crypto';
import { existsSync } from 'node:fs';
import path from 'node:path';
import { withLock } from './lock.mjs';
import { inData, readIfThere, root, writePrivately } from './place.mjs';

const secretsFile = inData('secrets.json');

/** Settings of this checkout; what the environment already says stands. */
export function loadLocalSettings() {
  for (const name of ['.env.local', '.env']) {
    const file = path.join(root, name);
    if (existsSync(file)) process.loadEnvFile(file);
  }
  // An empty line in the file means "not set".
  for (const name of [
    'DATABASE_URL',
    'NEXTAUTH_URL',
    'NEXTAUTH_SECRET',
    'HOST',
    'PORT',
    'LOG_LEVEL',
    'TILE_URL',
    'CHROMIUM_PATH',
  ]) {
    if (process.env[name] === '') delete process.env[name];
  }
}

/** The key that signs sessions: made once, so that a restart signs nobody out. */
async function sessionSecret() {
  if (process.env.NEXTAUTH_SECRET) return process.env.NEXTAUTH_SECRET;
  return withLock('secrets', async () => {
    const known = JSON.parse(readIfThere(secretsFile) ?? '{}');
    if (typeof known.nextauth === 'string') return known.nextauth;
    const nextauth = randomBytes(32).toString('base64url');
    writePrivately(secretsFile, `${JSON.stringify({ ...known, nextauth }, null, 2)}\n`);
    return nextauth;
  });
}

/**
 * What every process of the product gets.
 * @param {{ databaseUrl: string, url: string, mode: 'production' | 'development', dist?: string }} settings
 * @returns {Promise<NodeJS.ProcessEnv>}
 */
export async function productEnvironment({ databaseUrl, url, mode, dist }) {
  return {
    ...process.env,
    NODE_ENV: mode,
    DATABASE_URL: databaseUrl,
    NEXTAUTH_URL: url,
    NEXTAUTH_SECRET: await sessionSecret(),
    NEXT_TELEMETRY_DISABLED: '1',
    RIMEWRIGHT_DIST: dist ?? '.next',
  };
}
