import { randomUUID } from 'node:crypto';
import { mkdirSync, readdirSync, rmSync } from 'node:fs';
import path from 'node:path';
import { inData, readIfThere, writePrivately } from './place.mjs';
import { startOf } from './processes.mjs';

// Who uses a thing now: one file a use below `.data`, named so that a dead process is told from a later one with its
// number. Where a lease decides over a thing, it is read and taken under the lock of that thing.

/** @param {string} kind */
function folderOf(kind) {
  const folder = inData(`${kind}.users`);
  mkdirSync(folder, { recursive: true });
  return folder;
}

/**
 * @param {string} kind
 * @param {Record<string, string>} details
 */
export function takeLease(kind, details) {
  const use = randomUUID().slice(0, 8);
  const file = path.join(folderOf(kind), `${process.pid}-${startOf(process.pid)}-${use}`);
  const write = (/** @type {Record<string, string>} */ known) =>
    writePrivately(file, JSON.stringify({ ...known, pid: String(process.pid) }));
  write(details);
  return { change: write, end: () => rmSync(file, { force: true }) };
}

/**
 * The leases of living processes; what the dead left is swept.
 * @param {string} kind
 * @returns {Record<string, string>[]}
 */
export function leases(kind) {
  return readdirSync(folderOf(kind)).flatMap((name) => {
    const file = path.join(folderOf(kind), name);
    const [pid, beganAt] = name.split('-');
    const isAlive = startOf(Number(pid)) === beganAt;
    if (!isAlive) rmSync(file, { force: true });
    // a name with a dot is a draft that is about to be renamed
    const text = isAlive && !name.includes('.') ? readIfThere(file) : undefined;
    return text ? [JSON.parse(text)] : [];
  });
}
