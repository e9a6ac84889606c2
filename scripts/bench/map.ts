import { gzipSync } from 'node:zlib';
import pg from 'pg';
import { closeDatabase, database } from '@/db/connection';
import { createMigrator } from '@/db/migrate';
import { migrations } from '@/db/migrations/all';
import { env, resetEnv } from '@/lib/server/env';
import { readRoadMapText } from '@/lib/server/road-map-view';

const roads = 5000;
const rounds = 5;

/** Roads of eleven points each, about 400 m long, side by side over a county; every class, several names. */
const fill = `
  insert into nodes (position, source_key)
    select ST_SetSRID(ST_MakePoint(4 + (i % 71) * 0.008, 60 + (i / 71) * 0.004), 4326), 'bench-' || i
      from generate_series(0, ${roads}) i;
  insert into segments (source_key, from_node_id, to_node_id, name, road_class, service_class, lanes, width_m, surface,
                        speed_km_per_h, length_m, geometry)
    select 'bench-' || i, a.id, b.id, 'Bench Road ' || (i % 900), 'bench', (array['A', 'B', 'C', 'D'])[1 + i % 4], 2, 7,
           'asphalt', 50, 400,
           (select ST_MakeLine(ST_SetSRID(ST_MakePoint(4 + (i % 71) * 0.008 + k * 0.0007,
                                                       60 + (i / 71) * 0.004 + 0.0002 * sin(k + i)), 4326) order by k)
              from generate_series(0, 10) k)
      from generate_series(0, ${roads - 1}) i
      join nodes a on a.source_key = 'bench-' || i
      join nodes b on b.source_key = 'bench-' || (i + 1)`;

async function inScratchDatabase<T>(work: () => Promise<T>): Promise<T> {
  const given = env().DATABASE_URL;
  const name = `rimewright_bench_map_${process.pid}`;
  const admin = new pg.Client(given);
  await admin.connect();
  const url = new URL(given);
  url.pathname = `/${name}`;
  try {
    await admin.query(`create database ${name}`);
    await closeDatabase();
    process.env.DATABASE_URL = url.href;
    resetEnv();
    await createMigrator(database().sequelize, migrations).up();
    await database().sequelize.query(fill);
    return await work();
  } finally {
    await closeDatabase();
    process.env.DATABASE_URL = given;
    resetEnv();
    await admin.query(`drop database if exists ${name} with (force)`);
    await admin.end();
  }
}

async function timed<T>(work: () => Promise<T>): Promise<{ result: T; ms: number }> {
  const startedAt = performance.now();
  const result = await work();
  return { result, ms: performance.now() - startedAt };
}

const middle = (values: readonly number[]) => [...values].sort((a, b) => a - b)[Math.floor(values.length / 2)] ?? 0;
const kB = (bytes: number) => `${Math.round(bytes / 1000).toLocaleString('en-GB')} kB`;

/** The map of 5,000 roads as the browser gets it: its size as text and gzipped, how long it takes to make and to ask again. */
export async function benchMap(): Promise<void> {
  const { text, built, again } = await inScratchDatabase(async () => {
    const builds: number[] = [];
    let text = '';
    for (let round = 0; round < rounds; round += 1) {
      // Each round as the first after a change of the network: what was made before is not its answer.
      await database().sequelize.query(
        `update segments set updated_at = clock_timestamp() where source_key = 'bench-0'`,
      );
      const { result, ms } = await timed(readRoadMapText);
      text = result.text;
      builds.push(ms);
    }
    const unchanged = await timed(readRoadMapText);
    return { text, built: middle(builds), again: unchanged.ms };
  });
  console.log(`  map of ${roads.toLocaleString('en-GB')} roads, 11 points each, middle of ${rounds} rounds`);
  console.log(`  payload               ${kB(Buffer.byteLength(text))}, gzip ${kB(gzipSync(text).byteLength)}`);
  console.log(`  made from the tables  ${Math.round(built)} ms`);
  console.log(`  asked again, same tag ${Math.round(again)} ms`);
}
