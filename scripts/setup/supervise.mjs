import { spawn } from 'node:child_process';
import { existsSync } from 'node:fs';
import { root } from './place.mjs';
import { pause, signal } from './processes.mjs';
import { say } from './say.mjs';

const steadyAfterMs = 30_000;
const longestPauseMs = 15_000;

/** The child dies with this process, however that ends: the kernel sees to it. @param {readonly string[]} command */
const tied = (command) =>
  existsSync('/usr/bin/setpriv') ? ['/usr/bin/setpriv', '--pdeathsig', 'KILL', '--', ...command] : command;

/**
 * Keeps one process of the product running: when it ends unasked it is started again, a little later each time.
 * @param {{ name: string, command: readonly string[], env: NodeJS.ProcessEnv, onLine?: (line: string) => void }} process
 */
export function keepRunning({ name, command, env, onLine = (line) => say(`  ${name} │ ${line}`) }) {
  let current = env;
  let isStopping = false;
  let failures = 0;
  /** @type {import('node:child_process').ChildProcess | undefined} */
  let child;

  const start = () => {
    const beganAt = Date.now();
    const [program, ...args] = tied(command);
    // A group of its own: Ctrl-C reaches this script alone, which then stops the rest in order.
    const started = spawn(program, args, {
      cwd: root,
      env: current,
      detached: true,
      stdio: ['ignore', 'pipe', 'pipe'],
    });
    child = started;
    for (const stream of [started.stdout, started.stderr]) forEachLine(stream, onLine);
    started.on('error', (error) => onLine(error.message));
    started.on('exit', (code, signalName) => {
      if (child === started) child = undefined;
      // What it may have started itself would hold the port.
      if (started.pid) signal(-started.pid, 'SIGKILL');
      if (!isStopping) void startAgain(Date.now() - beganAt, signalName ?? `exit code ${code}`);
    });
  };
  const startAgain = async (livedMs, how) => {
    failures = livedMs > steadyAfterMs ? 1 : failures + 1;
    const delayMs = Math.min(longestPauseMs, 250 * 2 ** failures);
    say(`  ! ${name} stopped (${how}); starting it again in ${delayMs / 1000} s`);
    await pause(delayMs);
    if (!isStopping && !child) start();
  };
  start();

  return {
    name,
    failures: () => failures,
    /** Ends the process; it comes back with the new environment. @param {NodeJS.ProcessEnv} changed */
    restartWith(changed) {
      current = changed;
      if (child?.pid) signal(child.pid, 'SIGKILL');
    },
    /** Ends it for good: asks, and after 8 s insists. */
    async stop() {
      isStopping = true;
      const last = child;
      if (!last?.pid) return;
      const closed = new Promise((resolve) => last.once('exit', resolve));
      signal(last.pid, 'SIGTERM');
      const insist = setTimeout(() => signal(-last.pid, 'SIGKILL'), 8000);
      await closed;
      clearTimeout(insist);
    },
    /** Ends it at once. */
    kill() {
      isStopping = true;
      if (child?.pid) signal(-child.pid, 'SIGKILL');
    },
  };
}

/** @param {import('node:stream').Readable} stream @param {(line: string) => void} onLine */
function forEachLine(stream, onLine) {
  let rest = '';
  stream.setEncoding('utf8').on('data', (text) => {
    const lines = (rest + text).split('\n');
    rest = lines.pop() ?? '';
    for (const line of lines) if (line.trim()) onLine(line);
  });
  stream.on('end', () => rest.trim() && onLine(rest));
}
