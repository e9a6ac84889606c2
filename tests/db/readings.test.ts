import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { ingestReadings, type IngestReadings } from '@/db/commands/ingest-readings';
import { issueStationKey, revokeStationKey } from '@/db/commands/issue-station-key';
import { saveReadingMapping } from '@/db/commands/save-reading-mapping';
import { saveStation } from '@/db/commands/save-station';
import { listReadings } from '@/db/queries/readings';
import { findStationByKey, findStationMapping, listStationKeys, listStations } from '@/db/queries/stations';
import { listRejects, listUploads } from '@/db/queries/uploads';
import { selectRows } from '@/db/transaction';
import { type Mapping } from '@/lib/readings/mapping';
import { columnOf, mappingOf } from '@/lib/readings/test-mapping';
import { testDatabase, type TestDatabase } from '../setup/database';

const now = new Date('2026-12-01T02:40:00Z');
const mapping = mappingOf({ columns: [columnOf('air', 'airTempC', '°C'), columnOf('road', 'pavementTempC', '°C')] });

let database: TestDatabase;
let by = 0;
let stationId = 0;
let stationCount = 0;

beforeAll(async () => {
  database = await testDatabase();
  const [row] = await selectRows<{ id: number }>(
    `insert into people (name, email, password_hash, role) values ('Ada First', 'ada@example.org', 'x', 'administrator') returning id`,
  );
  by = row?.id ?? 0;
});
afterAll(() => database.close());

/** Every test has a station of its own. */
beforeEach(async () => {
  stationCount += 1;
  const input = {
    id: null,
    name: `Station ${stationCount}`,
    longitudeDeg: -1,
    latitudeDeg: 60,
    heightM: 10,
    zone: 'UTC',
    isActive: true,
  };
  stationId = (await saveStation({ input, by, now })).id;
});

async function* piecesOf(text: string | Uint8Array, size = 50): AsyncGenerator<Uint8Array> {
  const bytes = typeof text === 'string' ? Buffer.from(text) : text;
  for (let at = 0; at < bytes.length; at += size) yield bytes.subarray(at, at + size);
}

const load = (text: string | Uint8Array, over: Partial<IngestReadings> = {}) =>
  ingestReadings({
    stationId,
    fileName: 'x.csv',
    body: piecesOf(text),
    mapping,
    from: { source: 'screen', personId: by },
    now,
    ...over,
  });

/** What is stored: hour and minute, air, road. */
async function stored(): Promise<string[]> {
  const readings = await listReadings({ stationId, fromAt: new Date(0), untilAt: new Date('2030-01-01') });
  return readings.map(
    ({ observedAt, airTempC, pavementTempC }) =>
      `${observedAt.toISOString().slice(11, 16)} ${airTempC ?? '-'} ${pavementTempC ?? '-'}`,
  );
}

const head = 'time,air,road\n';
const three = `${head}2026-01-05 06:00,-1,-2\n2026-01-05 06:10,-1.1,NA\n2026-01-05 06:20,-1.2,-2.2\n`;
const nothing = { rowsAdded: 0, rowsFilled: 0, rowsUnchanged: 0, rowsRejected: 0, rowsFlagged: 0, rowsEmpty: 0 };

describe('a file of readings', () => {
  it('lands; bad rows are kept with line, column, reason and text', async () => {
    const reply = await load(`${three}2026-01-05 06:30,abc,1\n2026-01-05 06:40\n`);
    expect(reply).toMatchObject({ rowsRead: 5, rowsAdded: 3, rowsRejected: 2, alreadyReadAt: null });
    expect(await stored()).toEqual(['06:00 -1 -2', '06:10 -1.1 -', '06:20 -1.2 -2.2']);
    expect(await listRejects({ uploadId: reply.uploadId, limit: 10 })).toEqual([
      { line: 5, columnName: 'air', reason: '“abc” is not a number.', raw: '2026-01-05 06:30,abc,1' },
      { line: 6, columnName: 'air', reason: 'The row has 1 columns; 3 are needed.', raw: '2026-01-05 06:40' },
    ]);
    const [upload] = await listUploads({ stationId, limit: 1 });
    expect(upload).toMatchObject({ rowsRead: 5, rowsAdded: 3, rowsRejected: 2, sentBy: 'Ada First', source: 'screen' });
  });

  it('twice changes nothing, and says so', async () => {
    const first = await load(three);
    const second = await load(three);
    expect(second).toMatchObject({ ...nothing, uploadId: first.uploadId, rowsRead: 3 });
    expect(second.alreadyReadAt).toBeInstanceOf(Date);
    expect(await listUploads({ stationId, limit: 10 })).toHaveLength(1);
  });

  it('twice at once is read once', async () => {
    const replies = await Promise.all([load(three), load(three)]);
    expect(replies.map(({ rowsAdded }) => rowsAdded).sort((a, b) => a - b)).toEqual([0, 3]);
  });

  it('that overlaps an earlier one: same stays, missing is filled, another value is rejected and the first stays', async () => {
    await load(three);
    const reply = await load(
      `${head}2026-01-05 06:00,-1,-2\n2026-01-05 06:10,-1.1,-2.1\n2026-01-05 06:20,-1.2,-9\n2026-01-05 06:30,-1.3,-2.3\n`,
    );
    expect(reply).toMatchObject({ rowsRead: 4, rowsAdded: 1, rowsFilled: 1, rowsUnchanged: 1, rowsRejected: 1 });
    expect(await stored()).toEqual(['06:00 -1 -2', '06:10 -1.1 -2.1', '06:20 -1.2 -2.2', '06:30 -1.3 -2.3']);
    expect(await listRejects({ uploadId: reply.uploadId, limit: 10 })).toEqual([
      {
        line: 4,
        columnName: 'road',
        reason: '2026-01-05 06:20 UTC already has -2.20 °C, and this row says -9.00 °C. The first stays.',
        raw: '2026-01-05 06:20,-1.2,-9',
      },
    ]);
  });

  it('with a column in another zone becomes one reading an instant', async () => {
    const shifted: Mapping = {
      ...mapping,
      clock: { kind: 'offset', offsetMin: -60 },
      columns: [
        columnOf('air', 'airTempC', '°C'),
        columnOf('road', 'pavementTempC', '°C', { clock: { kind: 'offset', offsetMin: 0 } }),
      ],
    };
    const text = `${head}2026-01-05 06:00,1,10\n2026-01-05 07:00,2,11\n2026-01-05 08:00,3,12\n`;
    expect(await load(text, { mapping: shifted })).toMatchObject({ rowsRead: 3, rowsAdded: 4, rowsRejected: 0 });
    expect(await stored()).toEqual(['06:00 - 10', '07:00 1 11', '08:00 2 12', '09:00 3 -']);
  });

  it('that repeats an instant: the first value stays, a later other one is rejected with its line', async () => {
    const reply = await load(`${head}2026-01-05 06:00,-1,\n2026-01-05 06:00,-1,-2\n2026-01-05 06:00,-5,-2\n`);
    expect(reply).toMatchObject({ rowsRead: 3, rowsAdded: 1, rowsRejected: 1 });
    expect(await stored()).toEqual(['06:00 -1 -2']);
    expect(reply.firstRejects).toMatchObject([{ line: 4, columnName: 'air', raw: '2026-01-05 06:00,-5,-2' }]);
  });

  it('with the newest row first lands as well, over a turn of the year', async () => {
    await load(`${head}2026-01-01 00:10,-1,1\n2026-01-01 00:00,-2,2\n2025-12-31 23:50,-3,3\n`);
    expect(await stored()).toEqual(['23:50 -3 3', '00:00 -2 2', '00:10 -1 1']);
    const rows = await selectRows<{ name: string }>(
      `select distinct tableoid::regclass::text as name from readings where station_id = :stationId order by 1`,
      { stationId },
    );
    expect(rows.map(({ name }) => name)).toEqual(['readings_2025_12', 'readings_2026_01']);
  });

  it('a spike is kept and flagged; what is filled later keeps its own flags', async () => {
    await load(`${head}2026-01-05 06:00,-1,\n2026-01-05 06:10,14,\n2026-01-05 06:20,-1,\n`);
    await load(`${head}2026-01-05 06:00,,-2\n2026-01-05 06:10,,80\n`);
    const [, spike] = await listReadings({ stationId, fromAt: new Date(0), untilAt: new Date('2030-01-01') });
    expect(spike).toMatchObject({ airTempC: 14, pavementTempC: 80 });
    expect(spike?.flags).toEqual({ airTempC: ['step'], pavementTempC: ['range'] });
    const [status] = (await listStations({ now })).filter(({ id }) => id === stationId);
    expect(status).toMatchObject({ airTempC: -1, flaggedCount: 1 });
  });

  it('keeps words and Windows-1252 heads', async () => {
    const german: Mapping = {
      ...mapping,
      encoding: 'windows-1252',
      delimiter: ';',
      decimalMark: ',',
      columns: [columnOf('Böe', 'windGustMPerS', 'km/h'), columnOf('Zustand', 'surfaceStatus', 'word')],
    };
    const bytes = Uint8Array.from('time;Böe;Zustand\r\n2026-01-05 06:00;36,0;naß\r\n', (letter) =>
      letter.charCodeAt(0),
    );
    await load(bytes, { mapping: german });
    const [reading] = await listReadings({ stationId, fromAt: new Date(0), untilAt: new Date('2030-01-01') });
    expect(reading).toMatchObject({ windGustMPerS: 10, surfaceStatus: 'wet' });
  });
});

describe('a broken upload leaves nothing', () => {
  const many =
    head +
    Array.from(
      { length: 5000 },
      (_, index) => `${new Date(Date.UTC(2026, 0, 5) + index * 60_000).toISOString()},1,2\n`,
    ).join('');
  const isUntouched = async () => {
    expect(await stored()).toEqual([]);
    expect(await listUploads({ stationId, limit: 10 })).toEqual([]);
    // and the connection is sound: the next upload lands
    expect((await load(three)).rowsAdded).toBe(3);
  };

  it('when the connection is cut', async () => {
    async function* cut() {
      yield* piecesOf(many.slice(0, 100_000), 16_384);
      throw new Error('cut');
    }
    await expect(load('', { body: cut() })).rejects.toThrow('cut');
    await isUntouched();
  });

  it('when bytes midway are no UTF-8', async () => {
    const bytes = Buffer.from(many);
    bytes[120_000] = 0xff;
    await expect(load('', { body: piecesOf(bytes, 16_384) })).rejects.toMatchObject({
      code: 'unreadable-file',
      message: expect.stringMatching(/^After line \d+ the file is not UTF-8\.$/),
    });
    await isUntouched();
  });

  it('when bytes midway are no text', async () => {
    const bytes = Buffer.from(many);
    bytes[120_000] = 0;
    await expect(load('', { body: piecesOf(bytes, 16_384) })).rejects.toMatchObject({ code: 'unreadable-file' });
    await isUntouched();
  });

  it('when it is stopped at the last moment', async () => {
    const stop = new AbortController();
    const onProgress: IngestReadings['onProgress'] = ({ kind }) => {
      if (kind === 'storing') stop.abort();
    };
    await expect(load(many, { body: piecesOf(many, 16_384), signal: stop.signal, onProgress })).rejects.toMatchObject({
      code: 'unreadable-file',
    });
    await isUntouched();
  });

  it.each([
    ['an empty file', '', 'The file is empty.'],
    ['heads alone', head, 'The file has no rows of readings.'],
    ['another delimiter', three.replaceAll(',', ';'), 'The file has no column “time”, “air”, “road”.'],
    [
      'a quotation mark never closed',
      `${three}"2026-01-05 06:30,1,2\n`,
      'A quotation mark on line 5 is never closed, so the rest of the file cannot be read.',
    ],
  ])('%s is refused in a sentence', async (_, text, message) => {
    await expect(load(text)).rejects.toMatchObject({ code: 'unreadable-file', message });
    await isUntouched();
  });
});

describe('how a station’s files are read', () => {
  it('is remembered; saying the same again changes nothing', async () => {
    const first = await saveReadingMapping({ input: { stationId, mapping }, by, now });
    const later = new Date(now.getTime() + 60_000);
    expect(await saveReadingMapping({ input: { stationId, mapping }, by, now: later })).toEqual(first);
    const changed = { ...mapping, decimalMark: ',' as const, delimiter: ';' as const };
    expect(await saveReadingMapping({ input: { stationId, mapping: changed }, by, now: later })).toEqual({
      savedAt: later.toISOString(),
    });
    expect((await findStationMapping({ stationId }))?.mapping).toEqual(changed);
  });
});

describe('a station key', () => {
  it('opens its station until it is revoked, and is not stored itself', async () => {
    const { id, key, hint } = await issueStationKey({ input: { stationId }, by, now });
    expect(await findStationByKey({ key })).toEqual({ keyId: id, stationId });
    expect(await findStationByKey({ key: `${key}x` })).toBeNull();
    const rows = await selectRows<{ row: string }>('select k::text as row from station_keys k where id = :id', { id });
    expect(rows[0]?.row).not.toContain(key);
    await revokeStationKey({ input: { keyId: id }, by, now });
    expect(await findStationByKey({ key })).toBeNull();
    expect(await listStationKeys({ stationId })).toMatchObject([{ hint, issuedByName: 'Ada First', revokedAt: now }]);
  });

  it('names its upload', async () => {
    const { id, hint } = await issueStationKey({ input: { stationId }, by, now });
    await load(three, { from: { source: 'script', stationKeyId: id } });
    expect(await listUploads({ stationId, limit: 1 })).toMatchObject([{ source: 'script', sentBy: `key …${hint}` }]);
    expect((await listStationKeys({ stationId }))[0]?.lastUsedAt).toBeInstanceOf(Date);
  });
});
