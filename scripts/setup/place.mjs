import { createHash, randomUUID } from 'node:crypto';
import {
  chmodSync,
  existsSync,
  mkdirSync,
  readFileSync,
  readdirSync,
  realpathSync,
  renameSync,
  statSync,
  writeFileSync,
} from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { fileURLToPath } from 'node:url';

/** The checkout, by its real path: processes are recognised by it. */
export const root = realpathSync(path.resolve(path.dirname(fileURLToPath(import.meta.url)), '../..'));
export const dataFolder = path.join(root, '.data');
/** @param {string} name */
export const inData = (name) => path.join(dataFolder, name);

/** Names this checkout on this machine, so that two copies never touch each other's things. */
export const checkoutKey = createHash('sha256').update(`${os.hostname()}:${root}`).digest('hex').slice(0, 10);

export function ensureDataFolder() {
  if (existsSync(dataFolder)) return;
  mkdirSync(dataFolder, { recursive: true });
  // The database's own user must be able to pass through, whatever the umask.
  chmodSync(dataFolder, 0o755);
}

/**
 * Whole or not at all: a reader never sees half a file.
 * @param {string} file
 * @param {string} text
 */
export function writePrivately(file, text) {
  const draft = `${file}.${randomUUID()}`;
  writeFileSync(draft, text, { mode: 0o600 });
  renameSync(draft, file);
}

/** @param {string} file */
export const readIfThere = (file) => {
  try {
    return readFileSync(file, 'utf8');
  } catch (error) {
    if (error.code === 'ENOENT' || error.code === 'ENOTDIR') return undefined;
    throw error;
  }
};

/** @param {string} entry */
function* filesUnder(entry) {
  const stat = statSync(entry, { throwIfNoEntry: false });
  if (!stat) return;
  if (stat.isFile()) yield entry;
  if (!stat.isDirectory()) return;
  for (const name of readdirSync(entry).sort()) yield* filesUnder(path.join(entry, name));
}

/**
 * One hash over the names and contents of files and folders of the checkout; what is missing counts as missing.
 * @param {readonly string[]} entries relative to the checkout
 * @param {(file: string) => boolean} [counts]
 */
export function hashOf(entries, counts = () => true) {
  const hash = createHash('sha256');
  for (const entry of entries) {
    for (const file of filesUnder(path.join(root, entry))) {
      if (!counts(file)) continue;
      hash
        .update(`${path.relative(root, file)}\0`)
        .update(readFileSync(file))
        .update('\0');
    }
  }
  return hash.digest('hex');
}
