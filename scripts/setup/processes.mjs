import { spawn } from 'node:child_process';
import { readFileSync, readdirSync, readlinkSync } from 'node:fs';

/** @param {number} ms */
export const pause = (ms) => new Promise((resolve) => setTimeout(resolve, ms));

/** What libpq would read from the environment must not lead our own commands elsewhere. */
export function withoutPgSettings() {
  return Object.fromEntries(Object.entries(process.env).filter(([name]) => !/^PG[A-Z]+$/.test(name)));
}

/** @type {Set<import('node:child_process').ChildProcess>} */
const interruptible = new Set();

/** Ends the long commands that are running now: packages, build, seed. */
export function interrupt() {
  for (const child of interruptible) child.kill('SIGTERM');
}

/**
 * Runs a command to its end and hands back what it printed; never throws for its exit code.
 * @param {readonly string[]} command
 * @param {{ input?: string, env?: NodeJS.ProcessEnv, cwd?: string, show?: boolean, timeoutMs?: number, mayInterrupt?: boolean }} [options]
 * @returns {Promise<{ code: number, stdout: string, stderr: string }>}
 */
export function run(
  [program, ...args],
  { input, env = process.env, cwd, show = false, timeoutMs, mayInterrupt = false } = {},
) {
  return new Promise((resolve) => {
    const child = spawn(program, args, {
      cwd,
      env,
      timeout: timeoutMs,
      killSignal: 'SIGKILL',
      stdio: [input === undefined ? 'ignore' : 'pipe', show ? 'inherit' : 'pipe', show ? 'inherit' : 'pipe'],
    });
    if (mayInterrupt) interruptible.add(child);
    let stdout = '';
    let stderr = '';
    child.stdout?.setEncoding('utf8').on('data', (text) => (stdout += text));
    child.stderr?.setEncoding('utf8').on('data', (text) => (stderr += text));
    child.stdin?.on('error', () => undefined);
    child.stdin?.end(input);
    child.on('error', (error) => resolve({ code: 127, stdout, stderr: `${stderr}${error.message}` }));
    child.on('close', (code, signal) => {
      interruptible.delete(child);
      resolve({ code: code ?? (signal ? 128 : 1), stdout, stderr });
    });
  });
}

/** @param {() => string} read */
function orUndefined(read) {
  try {
    return read();
  } catch {
    return undefined;
  }
}

/**
 * State and start time of a process, or undefined when there is none; a zombie is none.
 * The start time tells a process from a later one with the same number.
 * @param {number} pid
 */
export function startOf(pid) {
  const stat = orUndefined(() => readFileSync(`/proc/${pid}/stat`, 'utf8'));
  if (!stat) return undefined;
  const fields = stat.slice(stat.lastIndexOf(')') + 2).split(' ');
  return fields[0] === 'Z' || fields[0] === 'X' ? undefined : fields[19];
}

/**
 * @param {number} pid
 * @param {string} folder
 */
export function worksIn(pid, folder) {
  if (startOf(pid) === undefined) return false;
  const program = orUndefined(() => readlinkSync(`/proc/${pid}/exe`)) ?? '';
  return orUndefined(() => readlinkSync(`/proc/${pid}/cwd`)) === folder && /\/postgres( \(deleted\))?$/.test(program);
}

/**
 * Server processes whose working folder is this one.
 * @param {string} folder
 */
export function serverProcessesIn(folder) {
  return readdirSync('/proc')
    .filter((name) => /^\d+$/.test(name))
    .map(Number)
    .filter((pid) => worksIn(pid, folder));
}

/**
 * @param {number} pid
 * @param {NodeJS.Signals} signal
 */
export function signal(pid, signal) {
  try {
    process.kill(pid, signal);
  } catch (error) {
    if (error.code !== 'ESRCH') throw error;
  }
}

/**
 * @param {() => boolean} holds
 * @param {number} timeoutMs
 */
export async function until(holds, timeoutMs) {
  const endsAt = Date.now() + timeoutMs;
  while (!holds()) {
    if (Date.now() > endsAt) return false;
    await pause(50);
  }
  return true;
}
