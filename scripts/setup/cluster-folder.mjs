import { randomUUID } from 'node:crypto';
import { accessSync, constants, existsSync, mkdirSync, readdirSync, renameSync, rmSync, statSync } from 'node:fs';
import path from 'node:path';
import { checkoutKey, dataFolder, ensureDataFolder, inData, readIfThere } from './place.mjs';
import { run } from './processes.mjs';
import { Stop } from './say.mjs';

const isRoot = () => process.getuid?.() === 0;
const markerIn = (folder) => path.join(folder, 'rimewright-cluster');

/** The identity written inside a cluster once it was made whole; without it the folder is not a cluster. */
export const identityOf = (folder) => readIfThere(markerIn(folder))?.trim() || undefined;

/** The program version that made the cluster. */
export const versionOf = (folder) =>
  identityOf(folder) ? Number(readIfThere(path.join(folder, 'PG_VERSION'))) : undefined;

/** @param {string} folder */
async function accountOf(folder) {
  const { uid } = statSync(folder);
  const name = (await run(['id', '-nu', String(uid)])).stdout.trim();
  if (uid !== 0 && name) return name;
  await run(['chown', '-R', 'postgres:postgres', folder]);
  return 'postgres';
}

/**
 * The account that owns and runs the server: this one, or as root an unprivileged one, since PostgreSQL refuses root.
 * @param {string} folder
 */
export async function ownerOf(folder) {
  if (isRoot()) return existsSync(folder) ? accountOf(folder) : 'postgres';
  if (existsSync(folder) && statSync(folder).uid !== process.getuid?.()) {
    throw new Stop(`${folder} belongs to another account. Start as that account, or remove the folder to begin anew.`);
  }
  return undefined;
}

/**
 * Runs a program of PostgreSQL as the owner of the cluster.
 * @param {string | undefined} owner
 * @param {readonly string[]} command
 * @param {Parameters<typeof run>[1]} [options]
 */
export function runAs(owner, command, options) {
  return run(owner ? ['runuser', '-u', owner, '--', ...command] : command, { cwd: '/', ...options });
}

/**
 * Where the cluster lives: below `.data`, or, when postgres may not pass through a parent of the checkout (a home
 * folder, say), below postgres's own home under a name made from the checkout's path.
 */
export async function clusterFolder() {
  ensureDataFolder();
  try {
    accessSync(dataFolder, constants.W_OK | constants.X_OK);
  } catch {
    throw new Stop(
      `${dataFolder} belongs to another account. Start as that account, or remove the folder to begin anew.`,
    );
  }
  const near = inData('pg');
  if (!isRoot() || identityOf(near)) return near;
  const home = (await run(['sh', '-c', 'getent passwd postgres | cut -d: -f6'])).stdout.trim() || '/var/lib/postgresql';
  const far = path.join(home, `rimewright-${checkoutKey}`);
  if (identityOf(far)) return far;
  return (await runAs('postgres', ['test', '-x', dataFolder])).code === 0 ? near : far;
}

/**
 * Makes the cluster beside its place and moves it there when it is whole, so that a cut leaves nothing half made.
 * @param {{ folder: string, programs: string, owner: string | undefined, password: string }} cluster
 */
export async function makeCluster({ folder, programs, owner, password }) {
  const parent = path.dirname(folder);
  const stem = `${path.basename(folder)}.new-`;
  for (const name of readdirSync(parent)) {
    if (name.startsWith(stem)) rmSync(path.join(parent, name), { recursive: true, force: true });
  }
  const draft = path.join(parent, `${stem}${randomUUID().slice(0, 8)}`);
  mkdirSync(draft, { mode: 0o700 });
  if (owner) await run(['chown', `${owner}:`, draft]);
  const made = await runAs(owner, ['sh', '-c', initScript, programs, draft, randomUUID()], { input: password });
  if (made.code !== 0) throw new Stop(`The database cluster could not be made:\n${made.stdout}${made.stderr}`);
  rmSync(folder, { recursive: true, force: true });
  renameSync(draft, folder);
}

// $0 programs, $1 folder, $2 identity; the password comes on standard input, never in an argument
const initScript = `
set -eu
umask 077
unset PGDATA PGHOST PGPORT PGUSER PGOPTIONS || true
password=$(mktemp)
trap 'rm -f "$password"' EXIT
cat >"$password"
"$0/initdb" -D "$1" -U rimewright --pwfile="$password" --auth=scram-sha-256 -E UTF8 --locale=C.UTF-8 --data-checksums
cat >>"$1/postgresql.conf" <<'SETTINGS'
listen_addresses = '127.0.0.1'
unix_socket_directories = ''
wal_level = minimal
max_wal_senders = 0
timezone = 'UTC'
log_timezone = 'UTC'
SETTINGS
sync -f "$1" 2>/dev/null || true
printf '%s\\n' "$2" >"$1/rimewright-cluster"
`;
