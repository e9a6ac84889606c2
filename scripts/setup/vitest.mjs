import path from 'node:path';
import { run } from './processes.mjs';

/**
 * Runs some vitest projects, shows what they print, and hands back the exit code.
 * @param {string} root
 * @param {readonly string[]} projects
 * @param {string} report where the json reporter writes
 */
export async function runVitest(root, projects, report) {
  const command = [process.execPath, path.join(root, 'node_modules/vitest/vitest.mjs'), 'run', '--passWithNoTests'];
  const reporters = ['--reporter=default', '--reporter=json', `--outputFile.json=${report}`];
  const chosen = projects.flatMap((name) => ['--project', name]);
  const env = { ...process.env, NODE_ENV: 'test', NEXT_TELEMETRY_DISABLED: '1' };
  const done = await run([...command, ...chosen, ...reporters], { cwd: root, env, show: true, mayInterrupt: true });
  return done.code;
}
