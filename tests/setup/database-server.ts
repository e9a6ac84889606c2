import { randomUUID } from 'node:crypto';
import pg from 'pg';
import { borrowCluster } from '../../scripts/setup/cluster.mjs';
import { checkoutKey } from '../../scripts/setup/place.mjs';
import { startOf } from '../../scripts/setup/processes.mjs';

export interface DatabaseServer {
  adminUrl: string;
  release: () => Promise<unknown>;
}

/** Databases of tests are told by this name, so that nothing else is ever dropped. */
const stem = `rimewright_t_${checkoutKey}`;

export const templateNameOf = (kind: string, hash: string) => `${stem}_${kind}_${hash.slice(0, 12)}`;

/** Carries the process that made it, so that a later run knows what was left over. */
function copyName(): string {
  return `${stem}_copy_${process.pid}_${startOf(process.pid) ?? 0}_${randomUUID().slice(0, 8)}`;
}

export function databaseUrlOf(adminUrl: string, name: string): string {
  const url = new URL(adminUrl);
  url.pathname = `/${name}`;
  return url.href;
}

/** The server that DATABASE_URL names, or the private cluster of this checkout. */
export async function openDatabaseServer(): Promise<DatabaseServer> {
  const given = process.env.DATABASE_URL;
  if (given) return { adminUrl: given, release: async () => undefined };
  const server = await borrowCluster('vitest');
  return { adminUrl: server.urlOf('postgres'), release: server.release };
}

export async function withClient<T>(url: string, work: (client: pg.Client) => Promise<T>): Promise<T> {
  const client = new pg.Client({ connectionString: url, connectionTimeoutMillis: 20_000 });
  client.on('error', () => undefined);
  await client.connect();
  try {
    return await work(client);
  } finally {
    await client.end();
  }
}

export async function copyTemplate(adminUrl: string, templateName: string): Promise<string> {
  const name = copyName();
  await withClient(adminUrl, (client) => client.query(`create database ${name} template ${templateName}`));
  return databaseUrlOf(adminUrl, name);
}

export async function dropDatabase(adminUrl: string, url: string): Promise<void> {
  const name = new URL(url).pathname.slice(1);
  if (!name.startsWith(stem)) throw new Error(`${name} is not a database of these tests.`);
  await withClient(adminUrl, (client) => client.query(`drop database if exists ${name} with (force)`));
}

/** Drops the copies of runs that are over, however they ended; those of a run beside this one stay. */
export async function dropLeftovers(adminUrl: string): Promise<void> {
  await withClient(adminUrl, async (client) => {
    const { rows } = await client.query<{ name: string }>(
      'select datname as name from pg_database where datname like $1',
      [`${stem}_copy_%`],
    );
    for (const { name } of rows) {
      const [pid, beganAt] = name.slice(`${stem}_copy_`.length).split('_');
      if (startOf(Number(pid)) !== beganAt) await client.query(`drop database if exists ${name} with (force)`);
    }
  });
}
