import { type PlanInputs, type PlanSummary } from '@/lib/contracts/plans';
import { readPolicy } from '@/lib/contracts/policy';
import { readingStatus } from '@/lib/pavement/station-series';
import { Problem } from '@/lib/problem';
import { stepAxis } from '@/lib/time/step-axis';
import { planPass, type PassInputs, type PlannedRoad } from '@/lib/treatment/plan-pass';
import { defaultPolicy } from '@/lib/treatment/policy';
import { type Wording } from '@/lib/treatment/reason';
import { summarisePlan } from '@/lib/treatment/summarise-plan';
import { database } from '../connection';
import { findForecast, type ForecastRecord } from '../queries/forecasts';
import {
  listLoggedTreatments,
  listPassMaterials,
  listPassSegments,
  listPassStations,
  listPlannedTreatments,
  type PassSegment,
  type PassStation,
} from '../queries/pass-inputs';
import { listStormPasses } from '../queries/storms';
import { execute, inTransaction, selectRows, type Tx } from '../transaction';
import { recordAudit } from './audit';
import { planRow } from './plan-rows';

interface WorkOutPlan {
  stormId: number;
  passNumber: number;
  by: number;
  now: Date;
}

export interface WorkedOut {
  planId: number;
  version: number;
}

const STEP_MIN = 10;
const stepMs = STEP_MIN * 60_000;
/** Holds are looked for this long after the pass, where the forecast reaches. */
const LOOK_AHEAD_MS = 12 * 3_600_000;

const refuse = (reason: string, todo: string) => new Problem('not-possible-now', { reason, todo });

interface Span {
  passAt: number;
  nextPassAt: number;
  hasNextPass: boolean;
}

/** The storm, locked: versions are numbered one after the other, and a close cannot come in between. */
async function lockStorm(tx: Tx, stormId: number) {
  const storm = await database().models.Storm.findByPk(stormId, { transaction: tx, lock: tx.LOCK.UPDATE });
  if (!storm) throw new Problem('not-found', { what: 'storm' });
  return storm;
}

async function spanOf(tx: Tx, command: WorkOutPlan, untilAt: Date): Promise<Span> {
  const passes = await listStormPasses({ stormId: command.stormId }, tx);
  const position = passes.findIndex(({ number }) => number === command.passNumber);
  const pass = passes[position];
  if (!pass) throw new Problem('not-found', { what: 'pass' });
  const next = passes[position + 1];
  const nextPassAt = (next?.startsAt ?? untilAt).getTime();
  const passAt = Math.max(pass.startsAt.getTime(), command.now.getTime());
  if (nextPassAt - passAt < stepMs) {
    throw refuse(`Pass ${command.passNumber} is over.`, 'Work out the next pass.');
  }
  return { passAt, nextPassAt, hasNextPass: next !== undefined };
}

async function forecastFor(tx: Tx, { now }: WorkOutPlan, nextPassAt: number): Promise<ForecastRecord> {
  const forecast = await findForecast({ at: now }, tx);
  if (!forecast) throw refuse('No forecast has come in yet.', 'Wait for the first forecast, then work it out again.');
  if ((forecast.untilAt?.getTime() ?? 0) < nextPassAt) {
    throw refuse(
      'The newest forecast ends before the next pass.',
      'Wait for a newer forecast, or set an earlier pass.',
    );
  }
  return forecast;
}

async function policyInForce(tx: Tx, { by, now }: WorkOutPlan) {
  const [row] = await selectRows<{ version: number; rules: unknown }>(
    `select version, rules from policies
      order by adopted_at <= :now desc, case when adopted_at <= :now then version end desc, version limit 1`,
    { now },
    tx,
  );
  if (row) return { version: row.version, policy: readPolicy(row.rules) };
  // An agency that has adopted none works under the default, which is kept as its first version.
  const first = { version: 1, rules: defaultPolicy, adoptedAt: now, adoptedBy: null };
  await database().models.Policy.create(first, { transaction: tx });
  await recordAudit(tx, { personId: by, action: 'setup.policy.adopt', subjectKind: 'policy', subjectId: 1 });
  return { version: 1, policy: defaultPolicy };
}

interface Gathered extends PassInputs {
  segments: readonly PassSegment[];
  stations: readonly PassStation[];
  treatmentsLogged: number;
  treatmentsPlanned: number;
  policyVersion: number;
  forecast: ForecastRecord;
}

async function gather(
  tx: Tx,
  command: WorkOutPlan,
  storm: { fromAt: Date; untilAt: Date; span: Span },
): Promise<Gathered> {
  const { stormId, now } = command;
  const { passAt, nextPassAt } = storm.span;
  const forecast = await forecastFor(tx, command, nextPassAt);
  const { version: policyVersion, policy } = await policyInForce(tx, command);
  const fromAt = new Date(Math.min(storm.fromAt.getTime(), now.getTime(), passAt));
  const aheadAt = Math.min(passAt + LOOK_AHEAD_MS, forecast.untilAt?.getTime() ?? 0);
  const untilAt = Math.max(nextPassAt + policy.marginMin * 60_000, aheadAt);
  const logged = await listLoggedTreatments({ fromAt, nowAt: now }, tx);
  const planned = await listPlannedTreatments({ stormId, nowAt: now, untilAt: new Date(passAt) }, tx);
  return {
    axis: stepAxis({ fromAt, untilAt, stepMin: STEP_MIN }),
    nowAt: now.getTime(),
    passAt,
    nextPassAt,
    policy,
    policyVersion,
    forecast,
    segments: await listPassSegments(tx),
    stations: await listPassStations({ fromAt, nowAt: now, forecastId: forecast.id }, tx),
    materials: await listPassMaterials(tx),
    treatments: [...logged, ...planned],
    treatmentsLogged: logged.length,
    treatmentsPlanned: planned.length,
  };
}

function inputsOf(gathered: Gathered, hasNextPass: boolean): PlanInputs {
  const { passAt, nextPassAt, forecast, policyVersion, stations, nowAt, materials } = gathered;
  return {
    passAt,
    nextPassAt,
    hasNextPass,
    forecast: { id: forecast.id, source: forecast.source, issuedAt: forecast.issuedAt.getTime() },
    policyVersion,
    stations: stations.map(({ id, name, readings }) => {
      const newest = readings.findLast(({ pavementTempC, isFlagged }) => pavementTempC !== null && !isFlagged);
      const newestReadingAt = newest?.at ?? null;
      return { id, name, newestReadingAt, ...readingStatus(newestReadingAt, nowAt) };
    }),
    materialIds: materials.map(({ id }) => Number(id)),
    treatmentsLogged: gathered.treatmentsLogged,
    treatmentsPlanned: gathered.treatmentsPlanned,
  };
}

const lastsMin = ({ treatment }: PlannedRoad) => treatment.shorterCycle?.holdMin ?? 0;

function summaryOf(gathered: Gathered, planned: readonly PlannedRoad[]): PlanSummary {
  const { segments: roads, materials } = gathered;
  const byId = new Map(roads.map((road) => [road.id, road]));
  // Roads of the first class first, and of a class those that give out soonest.
  const soonest = [...planned].sort((a, b) => lastsMin(a) - lastsMin(b));
  const exceptions = soonest.flatMap(({ segmentId, treatment, parts }) => {
    const road = byId.get(segmentId);
    const isException = treatment.shorterCycle !== null || ['abrasives', 'undecided'].includes(treatment.action);
    if (!road || !isException) return [];
    const { name: roadName, serviceClass } = road;
    return [{ segmentId, roadName, serviceClass, action: treatment.action, parts: [...parts] }];
  });
  exceptions.sort((a, b) => a.serviceClass.localeCompare(b.serviceClass));
  return { ...summarisePlan({ roads, planned, materials }), exceptions };
}

async function store(tx: Tx, command: WorkOutPlan, worked: { gathered: Gathered; span: Span }): Promise<WorkedOut> {
  const { gathered, span } = worked;
  const planned = planPass(gathered);
  const [agency] = await selectRows<{ zone: string }>('select zone from agency', {}, tx);
  const wording: Wording = { zone: agency?.zone ?? 'UTC', system: 'metric', startAt: span.passAt };
  const [last] = await selectRows<{ version: number }>(
    'select coalesce(max(version), 0)::int as version from plans where storm_id = :stormId',
    { stormId: command.stormId },
    tx,
  );
  const version = (last?.version ?? 0) + 1;
  const plan = await database().models.Plan.create(
    {
      stormId: command.stormId,
      passNumber: command.passNumber,
      version,
      forecastId: gathered.forecast.id,
      policyVersion: gathered.policyVersion,
      workedOutAt: command.now,
      workedOutBy: command.by,
      inputs: inputsOf(gathered, span.hasNextPass),
      summary: summaryOf(gathered, planned),
    },
    { transaction: tx },
  );
  const times = { passAt: span.passAt, untilAt: span.nextPassAt };
  const rows = planned.map((road) => planRow(road, { planId: plan.id, wording, times }));
  await execute(
    tx,
    'insert into plan_treatments select * from jsonb_populate_recordset(null::plan_treatments, :rows)',
    { rows: JSON.stringify(rows) },
  );
  return { planId: plan.id, version };
}

/** In a transaction of the caller's own: see `workOutPlan`. */
export async function workOutPlanIn(tx: Tx, command: WorkOutPlan): Promise<WorkedOut> {
  const storm = await lockStorm(tx, command.stormId);
  if (storm.closedAt && storm.closedAt <= command.now) {
    throw refuse(`Storm ${storm.number} is closed.`, 'Open a storm before working out a plan.');
  }
  const span = await spanOf(tx, command, storm.untilAt);
  const gathered = await gather(tx, command, { fromAt: storm.fromAt, untilAt: storm.untilAt, span });
  if (gathered.segments.length === 0) throw refuse('There are no roads yet.', 'Load a road network in Set-up, Roads.');
  const worked = await store(tx, command, { gathered, span });
  await recordAudit(tx, {
    personId: command.by,
    action: 'plans.work-out',
    subjectKind: 'plan',
    subjectId: worked.planId,
    detail: { stormId: command.stormId, passNumber: command.passNumber, version: worked.version },
    recordedAt: command.now,
  });
  return worked;
}

/**
 * Works out a pass for every road in use from what is known at `now` (readings, the newest forecast, what was logged,
 * what published plans of later passes will do) and keeps it as the next version of the storm's plan, a draft, with its
 * inputs frozen beside it. Nothing known after `now` is looked at.
 */
export async function workOutPlan(command: WorkOutPlan): Promise<WorkedOut> {
  return inTransaction((tx) => workOutPlanIn(tx, command));
}
