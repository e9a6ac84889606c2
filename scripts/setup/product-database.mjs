import { writeFileSync } from 'node:fs';
import path from 'node:path';
import { borrowCluster, ensureCluster, ensureDatabase } from './cluster.mjs';
import { hashOf, inData, readIfThere, root } from './place.mjs';
import { run } from './processes.mjs';
import { step, Stop } from './say.mjs';

const name = 'rimewright';
const preparedFile = inData('prepared.json');

/**
 * @typedef {{ url: string, release: () => Promise<boolean>, server?: import('./cluster.mjs').Server }} ProductDatabase
 */

/**
 * Asks a server that was given by address for what the product needs.
 * @param {string} url
 */
async function checkGivenServer(url) {
  // The packages are there by now; psql need not be.
  const { default: pg } = await import('pg');
  const client = new pg.Client({ connectionString: url, connectionTimeoutMillis: 10_000 });
  client.on('error', () => undefined);
  const where = new URL(url);
  const named = `DATABASE_URL (${where.host}${where.pathname})`;
  try {
    await client.connect();
    await client.query('create extension if not exists postgis');
    const { rows } = await client.query('select postgis_lib_version() as version');
    return `${named}, PostGIS ${rows[0].version}`;
  } catch (error) {
    throw new Stop(
      `${named} cannot be used: ${error.message || error.code}\nIt must be a running PostgreSQL database with PostGIS.`,
      5,
    );
  } finally {
    await client.end().catch(() => undefined);
  }
}

/**
 * The database of the product: the one DATABASE_URL names, or one in the cluster of this checkout.
 * @param {string} label who uses it; without a label the cluster is left running
 * @returns {Promise<ProductDatabase>}
 */
export function openProductDatabase(label) {
  return step('Database', async (note) => {
    const given = process.env.DATABASE_URL;
    if (given) {
      note(await checkGivenServer(given));
      return { url: given, release: async () => false };
    }
    const server = label ? await borrowCluster(label) : { ...(await ensureCluster()), release: async () => false };
    await ensureDatabase(server, name);
    note(`PostgreSQL on 127.0.0.1:${server.port}${server.wasStarted ? '' : ', already running'}`);
    return { url: server.urlOf(name), release: server.release, server };
  });
}

/**
 * Runs a script of the product to its end.
 * @param {string} script
 * @param {readonly string[]} args
 * @param {string} databaseUrl
 */
export async function runScript(script, args, databaseUrl) {
  const env = {
    ...process.env,
    DATABASE_URL: databaseUrl,
    NODE_ENV: 'production',
    NEXTAUTH_SECRET: 'these scripts sign no sessions',
  };
  const command = [process.execPath, '--import', 'tsx', path.join('scripts', script), ...args];
  const done = await run(command, { cwd: root, env, mayInterrupt: true });
  if (done.code !== 0) throw new Stop(`scripts/${script} ${args.join(' ')} failed:\n${done.stdout}${done.stderr}`);
  return done.stdout.trim();
}

/** What the database says of itself; the same answer as last time means that nothing is to do. @param {ProductDatabase} database */
async function stateOf({ server }) {
  if (!server) return undefined;
  const migrated = await server.sql(name, 'select count(*), max(name) from migrations');
  const people = await server.sql(name, 'select count(*) > 0 from people');
  if (migrated.code !== 0 || people.stdout.trim() !== 't') return undefined;
  const schema = hashOf(['db/migrations', 'db/migrate.ts', 'scripts/migrate.ts']);
  return JSON.stringify({ cluster: server.identity, schema, migrated: migrated.stdout.trim() });
}

/**
 * Migrates, and seeds the demo on the first run.
 * @param {ProductDatabase} database
 */
export async function prepareProductDatabase(database) {
  const state = await step('Migrations', async (note) => {
    const before = await stateOf(database);
    if (before && before === readIfThere(preparedFile)) {
      note('up to date');
      return before;
    }
    note((await runScript('migrate.ts', [], database.url)).split('\n').at(-1) ?? '');
    return undefined;
  });
  await step('Demo data', async (note) => {
    if (state) return note('there already');
    note((await runScript('seed.ts', ['demo', '--if-empty'], database.url)).split('\n').at(-1) ?? '');
    const after = await stateOf(database);
    if (after) writeFileSync(preparedFile, after);
  });
}
