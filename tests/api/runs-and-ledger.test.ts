import { randomUUID } from 'node:crypto';
import pg from 'pg';
import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest';
import { LedgerView } from '@/lib/contracts/ledger';
import { RunView } from '@/lib/contracts/runs';
import { signedOut, signInOverHttp, type Session } from '../setup/http';
import { personOf } from '../setup/people';

/** The ladder of the routes that read a run and a ledger. */
let db: pg.Client;
let supervisor: Session;
let yardHand: Session;
let driverOfRun: Session;
let otherDriver: Session;
let runId = '';
let stormId = 0;

beforeAll(async () => {
  db = new pg.Client(inject('databaseUrl'));
  await db.connect();
  const { rows } = await db.query<{ id: string; storm_id: number; email: string }>(
    `select r.id, r.storm_id, p.email from runs r join people p on p.id = r.driver_id
      where p.email = 'm.aldous@skerrow.example' order by r.started_at limit 1`,
  );
  runId = rows[0]?.id ?? '';
  stormId = rows[0]?.storm_id ?? 0;
  supervisor = await signInOverHttp(personOf.supervisor);
  yardHand = await signInOverHttp(personOf.yard);
  driverOfRun = await signInOverHttp({ email: rows[0]?.email ?? '', password: 'skerrow-demo' });
  otherDriver = await signInOverHttp(personOf.driver);
});
afterAll(() => db.end());

describe('GET /api/runs/[id]', () => {
  it('climbs the ladder: 401, 400, 403, 404, 200', async () => {
    expect((await signedOut().fetch(`/api/runs/${runId}`)).status).toBe(401);
    expect((await supervisor.fetch('/api/runs/seven')).status).toBe(400);
    expect((await otherDriver.fetch(`/api/runs/${runId}`)).status).toBe(403);
    expect((await supervisor.fetch(`/api/runs/${randomUUID()}`)).status).toBe(404);
    const response = await driverOfRun.fetch(`/api/runs/${runId}`);
    expect(response.status).toBe(200);
    const run = RunView.parse(await response.json());
    expect(run.roads.length).toBeGreaterThan(10);
    expect(run.roads.some((road) => road.outcome === 'spread' && road.loggedRateGPerM2 !== null)).toBe(true);
  });

  it('says why in the reader’s own units', async () => {
    const reasonsOf = async () =>
      RunView.parse(await (await driverOfRun.fetch(`/api/runs/${runId}`)).json()).roads.map(
        (road) => road.reason ?? '',
      );
    const metric = (await reasonsOf()).join(' ');
    await db.query(`update people set unit_system = 'us' where email = 'm.aldous@skerrow.example'`);
    const us = (await reasonsOf()).join(' ');
    expect(metric).toMatch(/°C/);
    expect(us).toMatch(/°F/);
    expect(us).not.toMatch(/°C/);
  });
});

describe('GET /api/storms/[id]/ledger', () => {
  it('climbs the ladder: 401, 400, 403, 404, 200', async () => {
    const path = `/api/storms/${stormId}/ledger`;
    expect((await signedOut().fetch(path)).status).toBe(401);
    expect((await supervisor.fetch('/api/storms/first/ledger')).status).toBe(400);
    expect((await yardHand.fetch(path)).status).toBe(403);
    expect((await supervisor.fetch('/api/storms/4711/ledger')).status).toBe(404);
    expect((await supervisor.fetch(path)).status).toBe(200);
  });

  it('its sums are those of its rows, counted here by the database', async () => {
    const ledger = LedgerView.parse(await (await supervisor.fetch(`/api/storms/${stormId}/ledger`)).json());
    const { rows } = await db.query<{ spread: number; recommended: number; roads: number }>(
      `select sum(case when e.outcome = 'spread' then e.rate_g_per_m2 * e.area_m2 / 1000 else 0 end) as spread,
              sum(coalesce(e.recommended_rate_g_per_m2, 0) * e.area_m2 / 1000) as recommended, count(*)::int as roads
         from spread_entries e join runs r on r.id = e.run_id
        where r.storm_id = $1 and not exists (select 1 from spread_entries a where a.amends_id = e.id)`,
      [stormId],
    );
    expect(ledger.total.roads).toBe(rows[0]?.roads);
    expect(ledger.total.spreadKg).toBeCloseTo(rows[0]?.spread ?? 0, 3);
    expect(ledger.total.recommendedKg).toBeCloseTo(rows[0]?.recommended ?? 0, 3);
    const byRun = ledger.runs.reduce((sum, run) => sum + run.account.spreadKg, 0);
    expect(byRun).toBeCloseTo(ledger.total.spreadKg, 6);
  });

  it('comes as a file with a row a road', async () => {
    const response = await supervisor.fetch(`/api/storms/${stormId}/ledger.csv`);
    expect(response.headers.get('content-disposition')).toMatch(/attachment; filename="storm-\d\d-ledger.csv"/);
    const lines = (await response.text()).trimEnd().split('\r\n');
    const { rows } = await db.query<{ roads: number }>(
      `select count(*)::int as roads from spread_entries e join runs r on r.id = e.run_id
        where r.storm_id = $1 and not exists (select 1 from spread_entries a where a.amends_id = e.id)`,
      [stormId],
    );
    expect(lines).toHaveLength((rows[0]?.roads ?? 0) + 1);
  });
});
