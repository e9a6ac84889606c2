import { randomUUID } from 'node:crypto';
import { beforeAll, describe, expect, inject, it } from 'vitest';
import pg from 'pg';
import { signInOverHttp, type Session } from '../setup/http';
import { personOf } from '../setup/people';

/** The ladder of the outbox's handler, and that sending twice is harmless. */
let driver: Session;
let dispatcher: Session;
let observer: Session;
let otherDriver: Session;
let db: pg.Client;
let truckId: number;
let segmentIds: number[];
let materialId: number;
let yardId: number;

beforeAll(async () => {
  [driver, dispatcher, observer, otherDriver] = await Promise.all([
    signInOverHttp({ email: 'i.sand@skerrow.example', password: 'skerrow-demo' }),
    signInOverHttp(personOf.dispatcher),
    signInOverHttp(personOf.observer),
    signInOverHttp({ email: 'r.garth@skerrow.example', password: 'skerrow-demo' }),
  ]);
  db = new pg.Client(inject('databaseUrl'));
  await db.connect();
  // a truck and a driver nobody else has out
  await db.query(`update runs set finished_at = now() where finished_at is null
    and driver_id in (select id from people where email in ('i.sand@skerrow.example', 'r.garth@skerrow.example'))`);
  const yard = await db.query<{ id: number }>('select id from yards order by id limit 1');
  yardId = yard.rows[0]?.id ?? 0;
  const truck = await db.query<{ id: number }>(
    `insert into trucks (number, name, yard_id) values (99, 'Truck 99', $1) returning id`,
    [yardId],
  );
  truckId = truck.rows[0]?.id ?? 0;
  segmentIds = (await db.query<{ id: number }>('select id from segments order by id limit 3')).rows.map(
    (row) => row.id,
  );
  materialId =
    (await db.query<{ id: number }>(`select id from materials where form = 'solid' limit 1`)).rows[0]?.id ?? 0;
  return () => db.end();
});

const at = () => new Date().toISOString();
const post = (session: Session, message: unknown) =>
  session.fetch('/api/outbox', {
    method: 'POST',
    body: JSON.stringify(message),
    headers: { 'content-type': 'application/json' },
  });

const startMessage = (id: string) => ({
  version: 1,
  id,
  madeAt: at(),
  kind: 'start-run',
  payload: { id, truckId, segmentIds, startedAt: at() },
});
const entryMessage = (runId: string, over: Record<string, unknown> = {}) => {
  const id = randomUUID();
  return {
    version: 1,
    id,
    madeAt: at(),
    kind: 'spread-entry',
    payload: {
      id,
      runId,
      segmentId: segmentIds[0],
      outcome: 'spread',
      materialId,
      rateGPerM2: 21,
      spreadAt: at(),
      ...over,
    },
  };
};
const countOf = async (table: string, id: string) =>
  (await db.query<{ count: string }>(`select count(*) from ${table} where id = $1`, [id])).rows[0]?.count;

describe('outbox', () => {
  const runId = randomUUID();

  it('starts a run once, however often it is sent', async () => {
    const message = startMessage(runId);
    expect(await (await post(driver, message)).json()).toEqual({ id: runId, result: 'recorded' });
    expect(await (await post(driver, message)).json()).toEqual({ id: runId, result: 'already-recorded' });
    expect(await countOf('runs', runId)).toBe('1');
    const roads = await db.query('select segment_id from run_segments where run_id = $1 order by position', [runId]);
    expect(roads.rows.map((row: { segment_id: number }) => row.segment_id)).toEqual(segmentIds);
  });

  it('refuses what is malformed with a sentence for the field, and keeps nothing', async () => {
    const message = entryMessage(runId, { rateGPerM2: 4000 });
    const response = await post(driver, message);
    expect(response.status).toBe(400);
    const problem = (await response.json()) as { fields: Record<string, string> };
    expect(problem.fields['payload.rateGPerM2']).toBe('The rate cannot be over 1000 g/m²: check the unit.');
    expect(await countOf('spread_entries', message.id)).toBe('0');
  });

  it('refuses a body that is no JSON, one that is missing a time, and one with a field nobody knows', async () => {
    const notJson = await driver.fetch('/api/outbox', { method: 'POST', body: 'rate=20' });
    expect(notJson.status).toBe(400);
    expect((await post(driver, entryMessage(runId, { spreadAt: 'ten past four' }))).status).toBe(400);
    expect((await post(driver, entryMessage(runId, { gritty: true }))).status).toBe(400);
  });

  it('refuses a role that never logs, and another driver’s run', async () => {
    expect((await post(observer, entryMessage(runId))).status).toBe(403);
    const response = await post(otherDriver, entryMessage(runId));
    expect(response.status).toBe(403);
    expect(await response.json()).toMatchObject({ title: 'A driver may log what was spread only for themselves.' });
  });

  it('answers 404 for a run that is not there', async () => {
    expect((await post(driver, entryMessage(randomUUID()))).status).toBe(404);
  });

  it('records an entry once under ten sendings at once', async () => {
    const message = entryMessage(runId);
    const answers = await Promise.all(Array.from({ length: 10 }, () => post(driver, message)));
    expect(answers.map((answer) => answer.status)).toEqual(Array.from({ length: 10 }, () => 200));
    const results = (await Promise.all(answers.map((answer) => answer.json()))) as { result: string }[];
    expect(results.filter(({ result }) => result === 'recorded')).toHaveLength(1);
    expect(await countOf('spread_entries', message.id)).toBe('1');
  });

  it('tells the sender when an id comes again with another content', async () => {
    const message = entryMessage(runId);
    await post(driver, message);
    const changed = { ...message, payload: { ...message.payload, rateGPerM2: 35 } };
    const response = await post(driver, changed);
    expect(response.status).toBe(409);
    const row = await db.query<{ rate_g_per_m2: number }>('select rate_g_per_m2 from spread_entries where id = $1', [
      message.id,
    ]);
    expect(row.rows[0]?.rate_g_per_m2).toBe(21);
  });

  it('lets a dispatcher log for a driver, keeps an amendment beside the first entry, and takes a load', async () => {
    const first = entryMessage(runId);
    await post(driver, first);
    const amendment = entryMessage(runId, { rateGPerM2: 18, amendsId: first.id });
    expect((await post(dispatcher, amendment)).status).toBe(200);
    expect(await countOf('spread_entries', first.id)).toBe('1');
    const loadId = randomUUID();
    const load = {
      version: 1,
      id: loadId,
      madeAt: at(),
      kind: 'load',
      payload: { id: loadId, runId, yardId, materialId, massKg: 6000, loadedAt: at() },
    };
    expect((await post(driver, load)).status).toBe(200);
    expect((await post(driver, load)).status).toBe(200);
    expect(await countOf('loads', loadId)).toBe('1');
  });

  it('finishes the run, and still takes an entry that was kept on the tablet', async () => {
    const finish = {
      version: 1,
      id: randomUUID(),
      madeAt: at(),
      kind: 'finish-run',
      payload: { runId, finishedAt: at() },
    };
    expect((await post(driver, finish)).status).toBe(200);
    expect(await (await post(driver, finish)).json()).toMatchObject({ result: 'already-recorded' });
    expect((await post(driver, entryMessage(runId))).status).toBe(200);
  });

  it('the database itself refuses to change or remove what was logged', async () => {
    await expect(db.query('update spread_entries set rate_g_per_m2 = 1 where run_id = $1', [runId])).rejects.toThrow(
      /never changed/,
    );
    await expect(db.query('delete from loads where run_id = $1', [runId])).rejects.toThrow(/never changed/);
    await expect(db.query('truncate audit_log')).rejects.toThrow(/never changed/);
  });
});
