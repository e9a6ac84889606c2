import { createHash, randomBytes } from 'node:crypto';
import net from 'node:net';
import { beforeAll, describe, expect, inject, it } from 'vitest';
import pg from 'pg';
import { ImportProgressLine, ImportReadingsReply } from '@/lib/contracts/readings';
import { columnOf, mappingOf } from '@/lib/readings/test-mapping';
import { signedOut, signInOverHttp, type Session } from '../setup/http';
import { personOf } from '../setup/people';

/** The door for readings: from the screen, from a script with a station key, and what comes of a broken upload. */
let db: pg.Client;
let dispatcher: Session;
let personId = 0;
const mapping = mappingOf({ columns: [columnOf('air', 'airTempC', '°C'), columnOf('road', 'pavementTempC', '°C')] });
const file = 'time,air,road\n2026-01-05 06:00,-1,-2\n2026-01-05 06:10,-1.1,-2.1\n2026-01-05 06:20,abc,1\n';

const idOf = async (sql: string, values: unknown[]) => (await db.query<{ id: number }>(sql, values)).rows[0]?.id ?? 0;

async function makeStation({ isMapped = true } = {}): Promise<number> {
  const id = await idOf(
    `insert into stations (name, position, zone) values ($1, st_setsrid(st_makepoint(-1, 60), 4326), 'UTC') returning id`,
    [`Test ${randomBytes(4).toString('hex')}`],
  );
  if (isMapped)
    await db.query('insert into station_mappings values ($1, $2, now(), $3)', [id, JSON.stringify(mapping), personId]);
  return id;
}

async function makeKey(stationId: number): Promise<string> {
  const key = `rwk_${randomBytes(16).toString('hex')}`;
  await db.query(
    `insert into station_keys (station_id, key_hash, hint, issued_at, issued_by) values ($1, $2, $3, now(), $4)`,
    [stationId, createHash('sha256').update(key).digest('hex'), key.slice(-4), personId],
  );
  return key;
}

beforeAll(async () => {
  db = new pg.Client(inject('databaseUrl'));
  await db.connect();
  dispatcher = await signInOverHttp(personOf.dispatcher);
  personId = await idOf('select id from people where email = $1', [personOf.administrator.email]);
  return () => db.end();
});

const send = (session: Session, query: string, init: RequestInit = {}) =>
  session.fetch(`/api/import/readings?${query}`, {
    method: 'POST',
    body: file,
    ...init,
    headers: { 'content-type': 'text/csv', ...Object.fromEntries(new Headers(init.headers)) },
  });
const withKey = (key: string) => ({ headers: { authorization: `Bearer ${key}` } });
const readingsOf = async (stationId: number) =>
  Number(
    (await db.query<{ count: string }>('select count(*) from readings where station_id = $1', [stationId])).rows[0]
      ?.count,
  );

describe('the ladder', () => {
  it('signed out is 401, a role that may not is 403, with a sentence each', async () => {
    const stationId = await makeStation();
    const nobody = await send(signedOut(), `station=${stationId}`);
    expect([nobody.status, await nobody.json()]).toMatchObject([401, { code: 'not-signed-in' }]);
    const driver = await send(await signInOverHttp(personOf.driver), `station=${stationId}`);
    expect([driver.status, await driver.json()]).toMatchObject([
      403,
      { title: 'A driver may not load sensor readings.' },
    ]);
    expect(await readingsOf(stationId)).toBe(0);
  });

  it('no station is 400, none of that number 404, one whose files nobody has described 409', async () => {
    expect((await send(dispatcher, '')).status).toBe(400);
    expect((await send(dispatcher, 'station=99999')).status).toBe(404);
    const unmapped = await send(dispatcher, `station=${await makeStation({ isMapped: false })}`);
    expect([unmapped.status, await unmapped.json()]).toMatchObject([
      409,
      { title: 'Nobody has said yet how the files of this station are read.' },
    ]);
  });

  it('a mapping changed since the sender looked is 409', async () => {
    const answer = await send(dispatcher, `station=${await makeStation()}&mappingSavedAt=2026-01-01T00:00:00.000Z`);
    expect([answer.status, await answer.json()]).toMatchObject([409, { code: 'changed-meanwhile' }]);
  });
});

describe('from the screen', () => {
  it('good rows land, bad rows can be fetched, and the same file again changes nothing', async () => {
    const stationId = await makeStation();
    const first = ImportReadingsReply.parse(await (await send(dispatcher, `station=${stationId}`)).json());
    expect(first).toMatchObject({ rowsRead: 3, rowsAdded: 2, rowsRejected: 1, alreadyReadAt: null });
    const rejects = await dispatcher.fetch(`/api/uploads/${first.uploadId}/rejects.csv`);
    expect(rejects.headers.get('content-disposition')).toContain('attachment');
    expect(await rejects.text()).toBe(
      'line,column,reason,row\r\n4,air,“abc” is not a number.,"2026-01-05 06:20,abc,1"\r\n',
    );
    const again = ImportReadingsReply.parse(await (await send(dispatcher, `station=${stationId}`)).json());
    expect(again).toMatchObject({ uploadId: first.uploadId, rowsAdded: 0, rowsRejected: 0 });
    expect(again.summary).toMatch(/^This file was already read on .*: nothing was changed\.$/);
    expect(await readingsOf(stationId)).toBe(2);
  });

  it('is followed line by line when asked', async () => {
    const answer = await send(dispatcher, `station=${await makeStation()}`, {
      headers: { accept: 'application/x-ndjson' },
    });
    const lines = (await answer.text())
      .trim()
      .split('\n')
      .map((line) => ImportProgressLine.parse(JSON.parse(line)));
    expect(lines.map(({ kind }) => kind)).toEqual(['reading', 'storing', 'done']);
  });

  it('a refusal comes as the last line, with its words', async () => {
    const answer = await send(dispatcher, `station=${await makeStation()}`, {
      headers: { accept: 'application/x-ndjson' },
      body: 'time;air;road\n2026-01-05 06:00;1;2\n',
    });
    const last = (await answer.text()).trim().split('\n').at(-1) ?? '';
    expect(JSON.parse(last)).toMatchObject({
      kind: 'problem',
      problem: { title: 'The file has no column “time”, “air”, “road”.' },
    });
  });

  it('rejected rows are for those who may load', async () => {
    const { uploadId } = ImportReadingsReply.parse(
      await (await send(dispatcher, `station=${await makeStation()}`)).json(),
    );
    const observer = await signInOverHttp(personOf.observer);
    expect((await observer.fetch(`/api/uploads/${uploadId}/rejects.csv`)).status).toBe(403);
    expect((await signedOut().fetch(`/api/uploads/${uploadId}/rejects.csv`)).status).toBe(401);
    expect((await dispatcher.fetch('/api/uploads/99999/rejects.csv')).status).toBe(404);
  });
});

describe('from a script', () => {
  it('a key opens its own station and no other, until it is revoked', async () => {
    const stationId = await makeStation();
    const other = await makeStation();
    const key = await makeKey(stationId);
    expect((await send(signedOut(), '', withKey(key))).status).toBe(200);
    expect(await readingsOf(stationId)).toBe(2);
    expect((await send(signedOut(), `station=${other}`, withKey(key))).status).toBe(403);
    await db.query('update station_keys set revoked_at = now() where station_id = $1', [stationId]);
    const revoked = await send(signedOut(), '', withKey(key));
    expect([revoked.status, await revoked.json()]).toMatchObject([401, { code: 'key-unknown' }]);
    expect(await readingsOf(other)).toBe(0);
  });

  it('a file wrapped in a form is told how to come', async () => {
    const key = await makeKey(await makeStation());
    const body = new FormData();
    body.set('file', new Blob([file]));
    const answer = await signedOut().fetch('/api/import/readings', { method: 'POST', body, ...withKey(key) });
    expect([answer.status, await answer.json()]).toMatchObject([422, { title: 'The file came wrapped in a form.' }]);
  });

  it('a connection cut in the middle leaves nothing, and the whole file lands afterwards', async () => {
    const stationId = await makeStation();
    const key = await makeKey(stationId);
    await cutOff(key);
    await expect.poll(() => openUploads(), { timeout: 10_000 }).toBe(0);
    expect(await readingsOf(stationId)).toBe(0);
    const uploads = await db.query('select 1 from uploads where station_id = $1', [stationId]);
    expect(uploads.rowCount).toBe(0);
    expect((await send(signedOut(), '', withKey(key))).status).toBe(200);
    expect(await readingsOf(stationId)).toBe(2);
  });
});

/** Sends a part of what it announced, then goes away without a word. */
function cutOff(key: string): Promise<void> {
  const { hostname, port } = new URL(inject('baseUrl'));
  return new Promise((resolve, reject) => {
    const socket = net.connect(Number(port), hostname, () => {
      socket.write(
        `POST /api/import/readings HTTP/1.1\r\nhost: ${hostname}:${port}\r\nauthorization: Bearer ${key}\r\ncontent-type: text/csv\r\ncontent-length: 100000\r\n\r\n${file}`,
      );
      setTimeout(() => socket.destroy(), 1000);
    });
    socket.on('error', reject);
    socket.on('close', () => resolve());
  });
}

async function openUploads(): Promise<number> {
  const { rows } = await db.query<{ count: string }>(
    `select count(*) from pg_stat_activity where datname = current_database() and state like 'idle in transaction%'`,
  );
  return Number(rows[0]?.count);
}
