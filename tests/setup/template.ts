import { execFile } from 'node:child_process';
import { promisify } from 'node:util';
import type pg from 'pg';
import { hashOf, root } from '../../scripts/setup/place.mjs';
import { databaseUrlOf, templateNameOf, withClient } from './database-server';

const script = promisify(execFile);
/** The demo's storm is under way now: an old copy would have blown over. */
const demoKeepsMs = 60 * 60_000;

interface Kind {
  name: string;
  inputs: readonly string[];
  scripts: readonly (readonly string[])[];
  keepsMs: number;
}

const migrate = ['scripts/migrate.ts'];
const kinds = {
  empty: { name: 'empty', inputs: ['db/migrations', 'db/migrate.ts'], scripts: [migrate], keepsMs: Infinity },
  demo: {
    name: 'demo',
    inputs: ['db', 'lib', 'scripts/seed.ts'],
    scripts: [migrate, ['scripts/seed.ts', 'demo']],
    keepsMs: demoKeepsMs,
  },
} satisfies Record<string, Kind>;

const markOf = (at: Date) => `whole since ${at.toISOString()}`;

async function isUsable(client: pg.Client, name: string, keepsMs: number): Promise<boolean> {
  const { rows } = await client.query<{ mark: string | null }>(
    `select shobj_description(oid, 'pg_database') as mark from pg_database where datname = $1`,
    [name],
  );
  const madeAt = /^whole since (.+)$/.exec(rows[0]?.mark ?? '')?.[1];
  return madeAt !== undefined && Date.now() - Date.parse(madeAt) < keepsMs;
}

async function make(client: pg.Client, adminUrl: string, name: string, kind: Kind): Promise<void> {
  const { rows } = await client.query<{ name: string }>(
    'select datname as name from pg_database where datname like $1',
    [`${templateNameOf(kind.name, '')}%`],
  );
  for (const old of rows) await client.query(`drop database if exists ${old.name} with (force)`);
  await client.query(`create database ${name}`);
  const env = {
    ...process.env,
    DATABASE_URL: databaseUrlOf(adminUrl, name),
    NODE_ENV: 'production' as const,
    NEXTAUTH_SECRET: 'these scripts sign no sessions',
  };
  for (const args of kind.scripts) {
    await script(process.execPath, ['--import', 'tsx', ...args], { cwd: root, env, maxBuffer: 64_000_000 });
  }
  await client.query(`comment on database ${name} is '${markOf(new Date())}'`);
}

/** Migrated (and seeded) once and copied from then on; made again when what it is made of has changed. */
export async function ensureTemplate(adminUrl: string, which: keyof typeof kinds): Promise<string> {
  const kind: Kind = kinds[which];
  const name = templateNameOf(
    kind.name,
    hashOf(kind.inputs, (file) => !file.endsWith('.test.ts')),
  );
  await withClient(adminUrl, async (client) => {
    // Two runs side by side want the same template: the second waits for the first and takes what it made.
    await client.query('select pg_advisory_lock(hashtext($1))', [templateNameOf(kind.name, '')]);
    if (!(await isUsable(client, name, kind.keepsMs))) await make(client, adminUrl, name, kind);
  });
  return name;
}
