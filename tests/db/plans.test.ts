import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { closeStorm } from '@/db/commands/close-storm';
import { openStorm } from '@/db/commands/open-storm';
import { publishPlan } from '@/db/commands/publish-plan';
import { recordSpreadEntry } from '@/db/commands/record-spread-entry';
import { startRun } from '@/db/commands/start-run';
import { workOutPlan } from '@/db/commands/work-out-plan';
import { listPlans, listPlanTreatments } from '@/db/queries/plans';
import { listStormPasses, listStorms } from '@/db/queries/storms';
import { seedMinimal, type MinimalIds } from '@/db/seeds/minimal';
import { execute, inTransaction, selectRows } from '@/db/transaction';
import { PlanInputs, PlanOptions, PlanSummary, PlanWhy } from '@/lib/contracts/plans';
import { OpenStormInput } from '@/lib/contracts/storms';
import { testDatabase, type TestDatabase } from '../setup/database';

const hourMs = 3_600_000;
const now = new Date('2026-12-01T02:40:00Z');
const hours = (count: number) => new Date(now.getTime() + count * hourMs);

let database: TestDatabase;
let ids: MinimalIds;
let stormId = 0;

/** Readings of −3 °C with light snow every ten minutes until now, and a forecast of the same for a day. */
async function addWeather(stationId: number): Promise<void> {
  await inTransaction(async (tx) => {
    await execute(tx, 'select ensure_readings_partition(:now)', { now });
    await execute(tx, 'select ensure_readings_partition(:before)', { before: hours(-6) });
    await execute(
      tx,
      `insert into readings (station_id, observed_at, pavement_temp_c, precipitation_mm, precipitation_type, wind_speed_m_per_s)
       select :stationId, at, -3, 0.05, 'snow', 3 from generate_series(:fromAt::timestamptz, :now::timestamptz, interval '10 minutes') at`,
      { stationId, now, fromAt: hours(-4) },
    );
    await execute(
      tx,
      `with made as (insert into forecasts (source, issued_at, received_at) values ('test', :issuedAt, :issuedAt) returning id)
       insert into forecast_hours (forecast_id, station_id, valid_at, pavement_temp_c, pavement_error_c, precipitation_mm, precipitation_type, wind_speed_m_per_s)
       select id, :stationId, at, -4, 1, 0.3, 'snow', 3
         from made, generate_series(:fromAt::timestamptz, :untilAt::timestamptz, interval '1 hour') at`,
      { stationId, issuedAt: hours(-0.66), fromAt: '2026-12-01T03:00:00Z', untilAt: hours(24) },
    );
  });
}

const open = (name: string, passesH: readonly number[]) =>
  openStorm({
    input: OpenStormInput.parse({
      name,
      fromAt: hours(-4).toISOString(),
      untilAt: hours(9).toISOString(),
      passStartsAt: passesH.map((hour) => hours(hour).toISOString()),
    }),
    by: ids.people.dispatcher,
    now,
  });
const workOut = (passNumber: number, at = now) =>
  workOutPlan({ stormId, passNumber, by: ids.people.dispatcher, now: at });
const publish = (planId: number) => publishPlan({ planId, by: ids.people.supervisor, now });

beforeAll(async () => {
  database = await testDatabase();
  ids = await seedMinimal({ now });
  stormId = (await open('Light snow', [-3, 0.5, 2.5, 4.5])).id;
});
afterAll(() => database.close());

describe('a storm', () => {
  it('is opened under the next number with its passes in order', async () => {
    const second = await open('Another', [1]);
    const storms = await listStorms();
    expect(storms.find(({ id }) => id === second.id)).toMatchObject({ number: 2, passes: 1, publishedPlans: 0 });
    expect((await listStormPasses({ stormId })).map(({ number }) => number)).toEqual([1, 2, 3, 4]);
    await closeStorm({ stormId: second.id, by: ids.people.dispatcher, now });
    await closeStorm({ stormId: second.id, by: ids.people.dispatcher, now: hours(1) });
    expect((await listStorms()).find(({ id }) => id === second.id)?.closedAt).toEqual(now);
    const command = { stormId: second.id, passNumber: 1, by: ids.people.dispatcher, now };
    await expect(workOutPlan(command)).rejects.toMatchObject({ code: 'not-possible-now' });
  });

  it('is refused without a pass, backwards, or with passes out of order', () => {
    const input = { name: 'X', fromAt: hours(0).toISOString(), untilAt: hours(9).toISOString() };
    const fieldsOf = (change: object) =>
      OpenStormInput.safeParse({ ...input, passStartsAt: [hours(1).toISOString()], ...change }).error?.issues.map(
        ({ path }) => path[0],
      );
    expect(fieldsOf({})).toBeUndefined();
    expect(fieldsOf({ passStartsAt: [] })).toEqual(['passStartsAt']);
    expect(fieldsOf({ untilAt: hours(-1).toISOString() })).toContain('untilAt');
    expect(fieldsOf({ passStartsAt: [hours(2).toISOString(), hours(1).toISOString()] })).toEqual(['passStartsAt']);
  });
});

describe('working out a pass', () => {
  it('is refused before a forecast has come, and says what to do', async () => {
    await expect(workOut(2)).rejects.toMatchObject({
      code: 'not-possible-now',
      details: { reason: 'No forecast has come in yet.' },
    });
    await addWeather(ids.stationId);
  });

  it('keeps every road with its rate, reason, why and every material’s own answer', async () => {
    const { planId, version } = await workOut(2);
    expect(version).toBe(1);
    const rows = await listPlanTreatments({ planId });
    expect(rows.map(({ segmentId }) => segmentId).sort((a, b) => a - b)).toEqual(
      [...ids.segments.values()].sort((a, b) => a - b),
    );
    const north = rows.find(({ roadName }) => roadName === 'North Road');
    expect(north?.rateGPerM2).toBeGreaterThan(1);
    expect(north?.reason).toMatch(/^\d\.\d\d mm of .* at −4\.0 °C until 05:10; \d+ % allowed for scatter and traffic/);
    const kept = await selectRows<{ why: unknown; options: unknown }>(
      'select why, options from plan_treatments where plan_id = :planId',
      { planId },
    );
    for (const { why, options } of kept) {
      expect(PlanOptions.parse(options)).toHaveLength(3);
      expect(PlanWhy.parse(why)).toMatchObject({ carried: { status: 'current', source: 'measured' } });
    }
  });

  it('freezes what was known: forecast, readings and their age, policy', async () => {
    const [plan] = await listPlans({ stormId });
    expect(PlanInputs.parse(plan?.inputs)).toMatchObject({
      policyVersion: 1,
      hasNextPass: true,
      forecast: { source: 'test' },
      stations: [{ name: 'Station', ageMin: 0, status: 'current' }],
    });
    const summary = PlanSummary.parse(plan?.summary);
    expect(summary.roads).toBe(4);
    expect(summary.massKg).toBeGreaterThan(0);
    expect(summary.groups.reduce((sum, { roads }) => sum + roads, 0)).toBe(4);
  });

  it('again gives the next version and leaves the first as it was', async () => {
    const { version } = await workOut(2);
    expect(version).toBe(2);
    expect((await listPlans({ stormId })).map((plan) => plan.version)).toEqual([2, 1]);
  });

  it('two at once get two versions, one after the other', async () => {
    const worked = await Promise.all([workOut(3), workOut(3)]);
    expect(worked.map(({ version }) => version).sort((a, b) => a - b)).toEqual([3, 4]);
  });

  it('a pass that is over, one that is not there, and a time beyond the forecast are refused', async () => {
    await expect(workOut(1, hours(0.5))).rejects.toMatchObject({ details: { reason: 'Pass 1 is over.' } });
    await expect(workOut(9)).rejects.toMatchObject({ code: 'not-found' });
    await inTransaction((tx) =>
      execute(tx, `update storms set until_at = :untilAt where id = :stormId`, { stormId, untilAt: hours(30) }),
    );
    const reason = 'The newest forecast ends before the next pass.';
    await expect(workOut(4)).rejects.toMatchObject({ details: { reason } });
  });

  it('salt that was logged lowers the rate; what was logged after the moment asked about does not', async () => {
    const north = ids.segments.get('north') ?? 0;
    const rateOfNorth = async (at: Date) => {
      const { planId } = await workOut(2, at);
      return (await listPlanTreatments({ planId })).find(({ segmentId }) => segmentId === north)?.rateGPerM2 ?? 0;
    };
    const before = await rateOfNorth(now);
    const runId = '018c1f6e-0000-7000-8000-000000000001';
    const by = ids.people.driver;
    const run = { id: runId, truckId: ids.truckId, routeId: null, segmentIds: [north], driverId: null, startedAt: now };
    await startRun({ input: run, by, now });
    const entry = {
      id: '018c1f6e-0000-7000-8000-000000000002',
      runId,
      segmentId: north,
      outcome: 'spread' as const,
      materialId: ids.materials.get('Rock salt') ?? 0,
      rateGPerM2: 5,
      isPloughed: false,
      rateSource: 'as-shown' as const,
      note: '',
      spreadAt: hours(0.1),
      amendsId: null,
    };
    await recordSpreadEntry({ entry, by, now: hours(0.1) });
    expect(await rateOfNorth(now)).toBeCloseTo(before, 9);
    expect(await rateOfNorth(hours(0.2))).toBeLessThan(before);
  });
});

describe('publishing', () => {
  it('only the newest version, once, and never changed again', async () => {
    const first = await workOut(2);
    const second = await workOut(2);
    await expect(publish(first.planId)).rejects.toMatchObject({ code: 'not-possible-now' });
    await publish(second.planId);
    await expect(publish(second.planId)).rejects.toMatchObject({ code: 'plan-published' });
    const change = (sql: string) => inTransaction((tx) => execute(tx, sql, { planId: second.planId }));
    const refused = { code: 'plan-published' };
    await expect(change('update plan_treatments set rate_g_per_m2 = 1 where plan_id = :planId')).rejects.toMatchObject(
      refused,
    );
    await expect(change('delete from plan_treatments where plan_id = :planId')).rejects.toMatchObject(refused);
    await expect(change(`update plans set summary = '{}' where id = :planId`)).rejects.toMatchObject(refused);
    const [plan] = await listPlans({ stormId });
    expect(plan).toMatchObject({ version: second.version, publishedByName: 'A supervisor' });
  });

  it('what a published pass will do is counted when a later one is worked out', async () => {
    await workOut(3);
    const [plan] = await listPlans({ stormId });
    expect(PlanInputs.parse(plan?.inputs).treatmentsPlanned).toBeGreaterThan(0);
  });

  it('is written in the audit log with who did it', async () => {
    const rows = await selectRows<{ personId: number }>(
      `select person_id as "personId" from audit_log where action = 'plans.publish'`,
    );
    expect(rows).toEqual([{ personId: ids.people.supervisor }]);
  });

  it('a closed storm publishes nothing', async () => {
    const { planId } = await workOut(3);
    await closeStorm({ stormId, by: ids.people.dispatcher, now });
    await expect(publish(planId)).rejects.toMatchObject({ code: 'not-possible-now' });
  });
});
