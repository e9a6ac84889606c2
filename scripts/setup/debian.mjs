import { existsSync } from 'node:fs';
import { run } from './processes.mjs';
import { say, Stop } from './say.mjs';

const isRoot = () => process.getuid?.() === 0;
const clusterDefaults = '/etc/postgresql-common/createcluster.conf';

/** How to become root for apt: nothing, sudo without a password, or not at all. */
async function rootPrefix() {
  if (isRoot()) return [];
  const sudo = await run(['sudo', '-n', 'true']);
  return sudo.code === 0 ? ['sudo', '-n'] : undefined;
}

const hasApt = async () => (await run(['apt-get', '--version'])).code === 0;

/**
 * @param {string[]} prefix
 * @param {readonly string[]} args
 */
function apt(prefix, args) {
  const options = ['-o', 'DPkg::Lock::Timeout=300', '-o', 'Acquire::Retries=2', '-y', '-q'];
  return run([...prefix, 'env', 'DEBIAN_FRONTEND=noninteractive', 'apt-get', ...options, ...args], {
    show: true,
    cwd: '/',
  });
}

/**
 * Debian would make and start a cluster of its own on 5432; it is not wanted, and this file is read before the first install.
 * @param {string[]} prefix
 */
async function withoutMainCluster(prefix) {
  if (existsSync(clusterDefaults)) return;
  const write = 'mkdir -p /etc/postgresql-common && printf "create_main_cluster = false\\n" > "$0"';
  await run([...prefix, 'sh', '-c', write, clusterDefaults]);
}

/**
 * Installs Debian packages, or stops with the one command that a person with rights can run.
 * @param {readonly string[]} names
 * @param {string} purpose
 */
export async function installDebianPackages(names, purpose) {
  const command = `apt-get install --no-install-recommends ${names.join(' ')}`;
  const prefix = (await hasApt()) ? await rootPrefix() : undefined;
  if (!prefix) {
    throw new Stop(
      `${purpose} is missing, and this account may not install it.\nPlease run as root:  ${command}\nand then start again.` +
        (names.some((name) => name.startsWith('postgresql'))
          ? '\nOr set DATABASE_URL to a PostgreSQL server with PostGIS.'
          : ''),
      3,
    );
  }
  say(`  … ${[...prefix, command].join(' ')}`);
  if (names.some((name) => name.startsWith('postgresql'))) await withoutMainCluster(prefix);
  const install = ['install', '--no-install-recommends', ...names];
  if ((await apt(prefix, install)).code === 0) return;
  say('  … apt-get update, since the package lists may be missing or old');
  await apt(prefix, ['update']);
  if ((await apt(prefix, install)).code !== 0)
    throw new Stop(`${purpose} could not be installed. Please look above, then try:  ${command}`, 3);
}
