import { ensureBuild, servers } from './setup/build.mjs';
import { clusterWatch } from './setup/cluster.mjs';
import { showDemoSignIns } from './setup/demo-sign-ins.mjs';
import { loadLocalSettings, productEnvironment } from './setup/environment.mjs';
import { takeLease } from './setup/leases.mjs';
import { checkNodeVersion } from './setup/node-version.mjs';
import { ensurePackages } from './setup/packages.mjs';
import { pause } from './setup/processes.mjs';
import { openProductDatabase, prepareProductDatabase } from './setup/product-database.mjs';
import { explain, say, seconds, step, Stop } from './setup/say.mjs';
import { onStopSignal } from './setup/stop-signal.mjs';
import { keepRunning } from './setup/supervise.mjs';
import { untilReady, webAddress, webCommand, workerCommand } from './setup/web.mjs';

const isDev = process.argv.includes('--dev');
const label = isDev ? 'npm run dev' : 'npm start';
const beganAt = performance.now();
const stopping = onStopSignal();
/** What was begun, undone in the opposite order. @type {(() => Promise<unknown>)[]} */
const undo = [];

/** A second start without a port of its own would only be a second copy of the first. */
function alreadyServing() {
  return process.env.PORT ? undefined : servers().find((server) => server.label === label && server.url);
}

async function prepare() {
  await step(`Node ${checkNodeVersion()}`, () => undefined);
  await step('Packages', async (note) => note(await ensurePackages()));
  stopping.check();
  const database = await openProductDatabase(label);
  undo.push(async () => (await database.release()) && say('  ✓ database stopped'));
  stopping.check();
  await prepareProductDatabase(database);
  stopping.check();
  return database;
}

async function built() {
  // next dev keeps to a folder of its own
  if (isDev) return { dist: '.next', lease: takeLease('server', { label, dist: '' }) };
  return step('Build', async (note) => {
    const build = await ensureBuild(label);
    note(build.isNew ? 'made' : 'up to date');
    return build;
  });
}

/** @param {string} databaseUrl @param {string} dist */
async function startProcesses(databaseUrl, dist) {
  const address = await webAddress(isDev ? 3100 : 3000);
  const mode = /** @type {const} */ (isDev ? 'development' : 'production');
  const environment = (/** @type {string} */ url) =>
    productEnvironment({ databaseUrl: url, url: address.url, mode, dist });
  const env = await environment(databaseUrl);
  /** @type {string[] | undefined} */
  let unsaid = [];
  const onLine = (/** @type {string} */ line) => (unsaid ? unsaid.push(line) : say(`  web │ ${line}`));
  const web = keepRunning({ name: 'web', command: webCommand(isDev ? 'dev' : 'start', address), env, onLine });
  const worker = keepRunning({ name: 'worker', command: workerCommand, env });
  const processes = [web, worker];
  undo.push(() => Promise.all(processes.map((each) => each.stop())));
  stopping.onInsist(() => processes.forEach((each) => each.kill()));
  const limits = { patienceMs: 120_000, mayGoOn: () => !stopping.asked() && web.failures() < 4 };
  const isReady = await step('Web and worker', () => untilReady(address.probeUrl, limits));
  stopping.check();
  if (!isReady) throw new Stop(`The web process does not answer at ${address.probeUrl}.\n${unsaid.join('\n')}`);
  unsaid = undefined;
  const moveTo = async (/** @type {string} */ url) => {
    const changed = await environment(url);
    for (const each of processes) each.restartWith(changed);
  };
  return { address, moveTo };
}

/**
 * Brings the database back when it goes; when it had to move to another port, the others follow.
 * @param {string} databaseUrl @param {(url: string) => Promise<void>} moveTo
 */
async function watchDatabase(databaseUrl, moveTo) {
  const watch = await clusterWatch();
  let known = new URL(databaseUrl);
  while (!stopping.asked()) {
    await Promise.race([pause(1000), stopping.promise]);
    if (stopping.asked() || watch.isRunning()) continue;
    say('  ! the database stopped; starting it again');
    try {
      const server = await watch.revive();
      say(`  ✓ the database is back on port ${server.port}`);
      const now = new URL(server.urlOf(known.pathname.slice(1)));
      if (now.href !== known.href) await moveTo(now.href);
      known = now;
    } catch (error) {
      explain(error);
      await pause(5000);
    }
  }
}

async function main() {
  loadLocalSettings();
  // A line for each request would push the address off the screen; in development it is wanted.
  if (!isDev) process.env.LOG_LEVEL ??= 'error';
  const running = alreadyServing();
  if (running) return say(`Rimewright is running already, from process ${running.pid}:  ${running.url}`);
  say(isDev ? 'Rimewright, for development' : 'Rimewright');
  const database = await prepare();
  const { dist, lease } = await built();
  undo.push(async () => lease.end());
  stopping.check();
  const { address, moveTo } = await startProcesses(database.url, dist);
  lease.change({ label, dist: isDev ? '' : dist, url: address.url });
  await showDemoSignIns(database.url);
  say(`\n  Ready after ${seconds(performance.now() - beganAt)}. Open  ${address.url}   (Ctrl-C stops it)\n`);
  await (database.server ? watchDatabase(database.url, moveTo) : stopping.promise);
}

try {
  await main();
} catch (error) {
  process.exitCode = stopping.asked() ? 130 : explain(error);
} finally {
  if (stopping.asked()) say('\nStopping');
  for (const each of undo.reverse()) await each().catch(explain);
  if (stopping.asked()) say('Stopped.');
  // A pause before a restart must not hold up the end.
  process.exit();
}
