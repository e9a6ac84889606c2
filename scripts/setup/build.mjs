import { existsSync, rmSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { leases, takeLease } from './leases.mjs';
import { withLock } from './lock.mjs';
import { hashOf, readIfThere, root } from './place.mjs';
import { run } from './processes.mjs';
import { say, Stop } from './say.mjs';

// A list, not "all but": coverage, screenshots and data must not ask for a build.
const inputs = [
  ...['app', 'components', 'lib', 'db', 'public'],
  ...['next.config.mjs', 'tailwind.config.ts', 'postcss.config.mjs', 'tsconfig.json', 'package-lock.json'],
  ...['proxy.ts', 'instrumentation.ts', 'next-auth.d.ts'],
];
// Two places: a build never goes where a running server reads.
const places = /** @type {const} */ (['.next', '.next-spare']);

const stampOf = (dist) => path.join(root, dist, 'rimewright-stamp');
const isTest = (file) => /\.test\.tsx?$/.test(file);

/** A build reads no database and signs nothing: what it gets here only satisfies the check of the environment. */
const buildSettings = {
  NODE_ENV: 'production',
  NEXT_TELEMETRY_DISABLED: '1',
  DATABASE_URL: 'postgres://nobody@127.0.0.1:9/none',
  NEXTAUTH_URL: 'http://localhost:3000',
  NEXTAUTH_SECRET: 'never used outside the build',
};

/** @param {string} dist @param {string} wanted */
async function build(dist, wanted) {
  say(`  … next build into ${dist}: about a minute`);
  rmSync(stampOf(dist), { force: true });
  // next build writes the folder of its types into the tsconfig it uses; the committed one knows only .next.
  if (dist !== '.next') writeFileSync(path.join(root, 'tsconfig.spare.json'), '{ "extends": "./tsconfig.json" }\n');
  const command = [process.execPath, path.join(root, 'node_modules/next/dist/bin/next'), 'build'];
  const env = { ...process.env, ...buildSettings, RIMEWRIGHT_DIST: dist };
  const done = await run(command, { cwd: root, env, mayInterrupt: true });
  if (done.code !== 0) throw new Stop(`The build failed.\n${done.stdout}${done.stderr}`);
  if (!existsSync(path.join(root, dist, 'BUILD_ID'))) throw new Stop(`The build left nothing usable in ${dist}.`);
  writeFileSync(stampOf(dist), wanted);
}

/**
 * A build of the files as they are now: the one that is there, or a new one in a place that no server reads.
 * The place counts as read by this process until its lease ends.
 * @param {string} label
 * @returns {Promise<{ dist: string, isNew: boolean, lease: ReturnType<typeof takeLease> }>}
 */
export const ensureBuild = (label) =>
  withLock('build', async () => {
    const wanted = hashOf(inputs, (file) => !isTest(file));
    const fresh = places.find((dist) => readIfThere(stampOf(dist)) === wanted);
    const served = leases('server').filter((lease) => lease.pid !== String(process.pid));
    const dist = fresh ?? places.find((place) => !served.some((lease) => lease.dist === place));
    if (!dist) {
      const users = served.map((lease) => `${lease.label} (process ${lease.pid})`).join(', ');
      throw new Stop(`The files have changed, and both builds are in use by ${users}. Please stop one of them.`);
    }
    if (!fresh) await build(dist, wanted);
    return { dist, isNew: !fresh, lease: takeLease('server', { label, dist }) };
  });

/** Running commands of this checkout that serve pages, with the place they read. */
export const servers = () => leases('server');
