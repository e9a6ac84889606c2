import { execFile } from 'node:child_process';
import { createReadStream, existsSync } from 'node:fs';
import { mkdtemp, rm, stat, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { promisify } from 'node:util';
import pg from 'pg';
import { ingestReadings } from '@/db/commands/ingest-readings';
import { saveStation } from '@/db/commands/save-station';
import { closeDatabase, database } from '@/db/connection';
import { createMigrator } from '@/db/migrate';
import { migrations } from '@/db/migrations/all';
import { readingColumns } from '@/db/queries/readings';
import { resetEnv } from '@/lib/server/env';
import { columnOf, mappingOf } from '@/lib/readings/test-mapping';
import { borrowCluster } from '../setup/cluster.mjs';

interface IngestBench {
  rows: number;
  fileMb: number;
  ingestRowsPerS: number;
  copyRowsPerS: number;
  /** ours against psql's; the aim is a half or more */
  ratio: number;
}

const rounds = 5;
const startMs = Date.UTC(2022, 0, 1);
const stepMs = 600_000;

const header = 'time,pavement,air,dew_point,humidity,wind,gust,direction,precipitation';
const mapping = mappingOf({
  clock: { kind: 'zone', zone: 'UTC' },
  time: { kind: 'one', column: 'time', pattern: 'yyyy-MM-dd HH:mm' },
  columns: [
    columnOf('pavement', 'pavementTempC', '°C'),
    columnOf('air', 'airTempC', '°C'),
    columnOf('dew_point', 'dewPointC', '°C'),
    columnOf('humidity', 'relativeHumidity', '%'),
    columnOf('wind', 'windSpeedMPerS', 'm/s'),
    columnOf('gust', 'windGustMPerS', 'm/s'),
    columnOf('direction', 'windDirectionDeg', '°'),
    columnOf('precipitation', 'precipitationMm', 'mm'),
  ],
});

/** Ten-minute readings with days and seasons in them. */
function rowOf(index: number): string {
  const at = new Date(startMs + index * stepMs).toISOString();
  const day = Math.sin((index / 144) * 2 * Math.PI);
  const ripple = ((index * 7919) % 100) / 100;
  const air = -2 + 6 * day + ripple;
  const wind = 4 + 3 * ripple;
  const figures = [air + 1.5 * day, air, air - 2 - ripple].map((value) => value.toFixed(1));
  const rest = [85 + 10 * ripple, wind, wind + 2.5].map((value) => value.toFixed(1));
  const rain = index % 40 < 6 ? (0.4 * ripple).toFixed(2) : '0';
  return `${at.slice(0, 10)} ${at.slice(11, 16)},${figures.join(',')},${rest.join(',')},${index % 360},${rain}`;
}

async function writeCsv(file: string, rows: number): Promise<void> {
  const lines = [header];
  for (let index = 0; index < rows; index += 1) lines.push(rowOf(index));
  await writeFile(file, `${lines.join('\n')}\n`);
}

/** A database of the bench's own on the same server, gone afterwards. */
async function inScratchDatabase<T>(work: (url: string) => Promise<T>): Promise<T> {
  const { adminUrl: given, release } = await openServer();
  const before = process.env.DATABASE_URL;
  const name = `rimewright_bench_${process.pid}`;
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
    return await work(url.href);
  } finally {
    await closeDatabase();
    if (before === undefined) delete process.env.DATABASE_URL;
    else process.env.DATABASE_URL = before;
    resetEnv();
    await admin.query(`drop database if exists ${name} with (force)`);
    await admin.end();
    await release();
  }
}

/** The server that DATABASE_URL names, or the private cluster of this checkout. */
async function openServer(): Promise<{ adminUrl: string; release: () => Promise<unknown> }> {
  const given = process.env.DATABASE_URL;
  if (given) return { adminUrl: given, release: async () => undefined };
  const cluster = await borrowCluster('bench');
  return { adminUrl: cluster.urlOf('postgres'), release: cluster.release };
}

const copied = ['observed_at', ...mapping.columns.map(({ quantity }) => readingColumns[quantity])].join(', ');
const psqlPlaces = ['/usr/bin/psql', '/usr/lib/postgresql/15/bin/psql'];
const run = promisify(execFile);

/** psql's `\copy` into a table like the readings: as wide, partitioned by month, with the same key. */
async function timeCopy(url: string, file: string, months: readonly string[]): Promise<number> {
  const client = new pg.Client(url);
  await client.connect();
  await client.query(`drop table if exists copied;
    create table copied (like readings including all) partition by range (observed_at);
    alter table copied alter column station_id set default 1`);
  for (const month of months) {
    await client.query(`create table "copied_${month}" partition of copied
      for values from ('${month}-01Z') to (timestamptz '${month}-01Z' + interval '1 month')`);
  }
  const psql = psqlPlaces.find(existsSync) ?? 'psql';
  const startedAt = performance.now();
  await run(
    psql,
    [url, '-q', '-v', 'ON_ERROR_STOP=1', '-c', `\\copy copied (${copied}) from '${file}' with (format csv, header)`],
    {
      env: { ...process.env, PGTZ: 'UTC' },
    },
  );
  const ms = performance.now() - startedAt;
  await client.end();
  return ms;
}

async function timeIngest(file: string, round: number): Promise<number> {
  const { id } = await saveStation({
    input: {
      id: null,
      name: `Bench ${round}`,
      longitudeDeg: 0,
      latitudeDeg: 60,
      heightM: 0,
      zone: 'UTC',
      isActive: true,
    },
    by: null,
    now: new Date(),
  });
  const startedAt = performance.now();
  await ingestReadings({
    stationId: id,
    fileName: path.basename(file),
    body: createReadStream(file),
    mapping,
    from: { source: 'screen', personId: null },
    now: new Date(startMs + 30 * 365 * 86_400_000),
  });
  return performance.now() - startedAt;
}

function monthsOf(rows: number): string[] {
  const months = new Set<string>();
  for (let ms = startMs; ms < startMs + rows * stepMs; ms += 86_400_000)
    months.add(new Date(ms).toISOString().slice(0, 7));
  months.add(new Date(startMs + (rows - 1) * stepMs).toISOString().slice(0, 7));
  return [...months];
}

/**
 * Rows a second of a sensor file through the product's own reader (parted, understood, checked, merged, bad rows kept),
 * beside psql's `\copy` of the same file in turn with it; the middle one of five rounds of each.
 */
export async function benchIngest({ rows = 200_000 }: { rows?: number } = {}): Promise<void> {
  for (const line of linesOf(await measure(rows))) console.log(line);
}

async function measure(rows: number): Promise<IngestBench> {
  const folder = await mkdtemp(path.join(tmpdir(), 'rimewright-bench-'));
  const file = path.join(folder, 'readings.csv');
  try {
    await writeCsv(file, rows);
    const { size } = await stat(file);
    const times = await inScratchDatabase(async (url) => {
      const copied: number[] = [];
      const ingested: number[] = [];
      for (let round = 0; round < rounds; round += 1) {
        ingested.push(await timeIngest(file, round));
        copied.push(await timeCopy(url, file, monthsOf(rows)));
      }
      return { copied, ingested };
    });
    const rate = (ms: readonly number[]) => (rows / middleOf(ms)) * 1000;
    const ingestRowsPerS = rate(times.ingested);
    const copyRowsPerS = rate(times.copied);
    const ratio = middleOf(times.copied.map((ms, round) => ms / (times.ingested[round] ?? Infinity)));
    return { rows, fileMb: size / 1e6, ingestRowsPerS, copyRowsPerS, ratio };
  } finally {
    await rm(folder, { recursive: true });
  }
}

const middleOf = (values: readonly number[]) => [...values].sort((a, b) => a - b)[Math.floor(values.length / 2)] ?? 0;

function linesOf({ rows, fileMb, ingestRowsPerS, copyRowsPerS, ratio }: IngestBench): string[] {
  const perS = (value: number) => `${Math.round(value).toLocaleString('en-GB')} rows/s`;
  return [
    `  CSV of ${rows.toLocaleString('en-GB')} rows, ${fileMb.toFixed(1)} MB, middle of ${rounds} rounds in turn`,
    `  loaded by Rimewright  ${perS(ingestRowsPerS)}`,
    `  psql \\copy            ${perS(copyRowsPerS)}`,
    `  ratio, round by round ${ratio.toFixed(2)} (aim: 0.5 or more)`,
  ];
}
