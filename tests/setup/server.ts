import { spawn, type ChildProcess } from 'node:child_process';
import { createWriteStream, readFileSync } from 'node:fs';
import { type TestProject } from 'vitest/node';
import { ensureBuild } from '../../scripts/setup/build.mjs';
import { productEnvironment } from '../../scripts/setup/environment.mjs';
import { inData, root } from '../../scripts/setup/place.mjs';
import { anyFreePort } from '../../scripts/setup/ports.mjs';
import { untilReady, webCommand, workerCommand } from '../../scripts/setup/web.mjs';
import { copyTemplate, dropDatabase, dropLeftovers, openDatabaseServer } from './database-server';
import { ensureTemplate } from './template';
import './provided';

const stopWithinMs = 8000;

function start(command: readonly string[], env: NodeJS.ProcessEnv, logFile: string): ChildProcess {
  const [program = '', ...args] = command;
  // The kernel ends the server with this run, even when the run is killed.
  const child = spawn('setpriv', ['--pdeathsig', 'KILL', '--', program, ...args], {
    cwd: root,
    env,
    stdio: ['ignore', 'pipe', 'pipe'],
  });
  const log = createWriteStream(logFile);
  child.stdout.pipe(log, { end: false });
  child.stderr.pipe(log, { end: false });
  return child;
}

async function stop(child: ChildProcess): Promise<void> {
  if (child.exitCode !== null || child.signalCode !== null) return;
  const ended = new Promise((resolve) => child.once('exit', resolve));
  child.kill('SIGTERM');
  const insist = setTimeout(() => child.kill('SIGKILL'), stopWithinMs);
  await ended;
  clearTimeout(insist);
}

/** Global set-up of the API and browser tiers: the built product and its worker over a demo database of their own. */
export default async function setup(project: TestProject) {
  const { dist, lease } = await ensureBuild('vitest');
  const server = await openDatabaseServer();
  await dropLeftovers(server.adminUrl);
  const databaseUrl = await copyTemplate(server.adminUrl, await ensureTemplate(server.adminUrl, 'demo'));
  const address = { host: '127.0.0.1', port: await anyFreePort() };
  const url = `http://localhost:${address.port}`;
  const env = await productEnvironment({ databaseUrl, url, mode: 'production', dist });
  const logFile = inData(`test-web-${project.name}.log`);
  const web = start(webCommand('start', address), env, logFile);
  const worker = start(workerCommand, env, inData(`test-worker-${project.name}.log`));
  const teardown = async () => {
    await Promise.all([stop(web), stop(worker)]);
    await dropDatabase(server.adminUrl, databaseUrl);
    lease.end();
    await server.release();
  };
  const isReady = await untilReady(url, { patienceMs: 60_000, mayGoOn: () => web.exitCode === null });
  if (!isReady) {
    await teardown();
    throw new Error(`The server under test does not answer at ${url}:\n${readFileSync(logFile, 'utf8')}`);
  }
  project.provide('baseUrl', url);
  project.provide('databaseUrl', databaseUrl);
  return teardown;
}
