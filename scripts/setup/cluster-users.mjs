import { mkdirSync, readFileSync, readdirSync, rmSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { inData, readIfThere } from './place.mjs';
import { startOf } from './processes.mjs';

// Who uses the cluster now, one file a process; all of this is read and written under the cluster's lock.
const folder = inData('pg.users');
const startedFile = inData('pg.started-by');
const own = () => `${process.pid}-${startOf(process.pid)}`;

/** @param {string} label */
export function join(label) {
  mkdirSync(folder, { recursive: true });
  writeFileSync(path.join(folder, own()), `${label} (process ${process.pid})`);
}

/** The commands that use the cluster and are alive; what the dead left is swept. */
export function isUsed() {
  mkdirSync(folder, { recursive: true });
  return readdirSync(folder).flatMap((name) => {
    const [pid, beganAt] = name.split('-');
    if (startOf(Number(pid)) === beganAt) return [readFileSync(path.join(folder, name), 'utf8')];
    rmSync(path.join(folder, name), { force: true });
    return [];
  });
}

export const startedForRun = () => writeFileSync(startedFile, 'run\n');
export const keepRunning = () => writeFileSync(startedFile, 'kept\n');

/** Leaves, and tells whether the server may stop now. */
export function leave() {
  rmSync(path.join(folder, own()), { force: true });
  return isUsed().length === 0 && readIfThere(startedFile)?.trim() === 'run';
}
