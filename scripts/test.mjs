import { mkdirSync, rmSync } from 'node:fs';
import path from 'node:path';
import { ensureBuild } from './setup/build.mjs';
import { ensureChromium } from './setup/chromium.mjs';
import { borrowCluster } from './setup/cluster.mjs';
import { loadLocalSettings } from './setup/environment.mjs';
import { checkNodeVersion } from './setup/node-version.mjs';
import { ensurePackages } from './setup/packages.mjs';
import { inData, root } from './setup/place.mjs';
import { explain, say, step, Stop } from './setup/say.mjs';
import { onStopSignal } from './setup/stop-signal.mjs';
import { addCounts, countsOf, lastLine } from './setup/test-counts.mjs';
import { runVitest } from './setup/vitest.mjs';

const tiers = ['unit', 'dom', 'db', 'api', 'browser'];
// One after another: two servers and a browser side by side would make the slow tests of two cores fail by the clock.
/** @type {{ tiers: string[], after?: () => Promise<void> }[]} */
const groups = [{ tiers: ['unit', 'dom', 'db'] }, { tiers: ['api'] }, { tiers: ['browser'] }];
const label = 'npm test';
const stopping = onStopSignal();
/** @type {(() => Promise<unknown>)[]} */
const undo = [];

function askedTiers() {
  const asked = process.argv.slice(2);
  const unknown = asked.filter((name) => !tiers.includes(name));
  if (unknown.length > 0)
    throw new Stop(`There is no tier "${unknown.join('", "')}". The tiers are ${tiers.join(', ')}.`, 2);
  return asked.length > 0 ? asked : tiers;
}

/** @param {readonly string[]} asked */
async function prepare(asked) {
  await step(`Node ${checkNodeVersion()}`, () => undefined);
  await step('Packages', async (note) => note(await ensurePackages()));
  stopping.check();
  if (asked.includes('browser')) process.env.CHROMIUM_PATH = await step('Chromium', () => ensureChromium());
  stopping.check();
  if (process.env.DATABASE_URL || !asked.some((name) => ['db', 'api', 'browser'].includes(name))) return;
  // Borrowed for the whole run, so that it is not stopped and started between the tiers.
  const server = await step('Database server', () => borrowCluster(label));
  undo.push(() => server.release());
  stopping.check();
}

/** The tiers over HTTP need a build; the cheap tiers have had their say by then. */
async function build() {
  await step('Build', async (note) => {
    const { dist, isNew, lease } = await ensureBuild(label);
    undo.push(async () => lease.end());
    note(`${isNew ? 'made' : 'up to date'}, in ${dist}`);
  });
}

/** @param {readonly string[]} asked */
async function runTiers(asked) {
  const reports = inData('test-reports');
  rmSync(reports, { recursive: true, force: true });
  mkdirSync(reports, { recursive: true });
  if (asked.includes('api') || asked.includes('browser')) groups[0].after = build;
  for (const { tiers: group, after } of groups) {
    const names = group.filter((name) => asked.includes(name));
    stopping.check();
    if (names.length > 0) {
      say(`\n── ${names.join(', ')}`);
      const report = path.join(reports, `${names.join('-')}.json`);
      const exitCode = await runVitest(root, names, report);
      stopping.check();
      total = addCounts(total, countsOf(report, exitCode));
    }
    stopping.check();
    await after?.();
  }
}

let total = { passed: 0, failed: 0, skipped: 0 };
try {
  loadLocalSettings();
  const asked = askedTiers();
  await prepare(asked);
  await runTiers(asked);
  if (total.passed + total.failed === 0) say('\nNo test ran.');
  process.exitCode = total.failed > 0 || total.passed === 0 || stopping.asked() ? 1 : 0;
} catch (error) {
  process.exitCode = stopping.asked() ? 130 : explain(error);
  // What could not be set up was not tested: that is a failure, whatever passed before.
  total.failed += 1;
} finally {
  for (const each of undo.reverse()) await each().catch(explain);
}
say(`\n${lastLine(total)}`);
process.exit();
