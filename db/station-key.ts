import { createHash, randomBytes } from 'node:crypto';

const prefix = 'rwk_';

/** A key of 256 random bits: nothing to guess, so a plain hash keeps it. */
export function makeStationKey(): string {
  return prefix + randomBytes(32).toString('base64url');
}

export function hashStationKey(key: string): string {
  return createHash('sha256').update(key).digest('hex');
}
