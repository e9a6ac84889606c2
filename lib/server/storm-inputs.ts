import { findForecast, type ForecastRecord } from '@/db/queries/forecasts';
import { listMaterials, type MaterialRecord } from '@/db/queries/materials';
import {
  listLoggedTreatments,
  listPassSegments,
  listPassStations,
  type PassSegment,
  type PassStation,
} from '@/db/queries/pass-inputs';
import { listPolicies } from '@/db/queries/policy';
import { listCurrentPlans, listPlanned, type PlannedRecord, type PlanRecord } from '@/db/queries/storm-plans';
import { listRouteLegs, listTreated, type StormRecord, type TreatedRecord } from '@/db/queries/storm-state';
import { listStormPasses, type StormPassRow } from '@/db/queries/storms';
import { readPolicy } from '@/lib/contracts/policy';
import { arrivalOffsetsMin } from '@/lib/routing/arrival-offsets';
import { stepAxis, type StepAxis } from '@/lib/time/step-axis';
import { type Policy } from '@/lib/treatment/policy';
import { type StormTreatment } from '@/lib/treatment/project-storm';

const hourMs = 3_600_000;
/** Before a storm begins, and beyond now while it runs. */
const leadMs = hourMs;
const aheadMs = 12 * hourMs;
const longestMs = 72 * hourMs;
/** From this many roads on, steps of 15 min keep the answer to a size that a browser takes at once. */
const manyRoads = 2000;

export interface Arrival {
  /** minutes after a pass set out */
  offsetMin: number;
  truckNumber: number | null;
}

export interface StormFacts {
  storm: StormRecord;
  /** what parts measured from forecast: now, or the end of a storm that is over */
  seenAt: number;
  axis: StepAxis;
  roads: PassSegment[];
  stations: PassStation[];
  forecastIssuedAt: number | null;
  passes: StormPassRow[];
  treated: TreatedRecord[];
  logged: StormTreatment[];
  /** the newest of each pass that is under way or to come, by pass */
  plans: PlanRecord[];
  planned: PlannedRecord[];
  /** by road */
  arrivals: Map<number, Arrival>;
  materials: Map<number, MaterialRecord>;
  policy: Policy;
}

function axisFor(storm: StormRecord, seen: { seenAt: number; forecastUntilAt: number; roads: number }): StepAxis {
  const { seenAt, forecastUntilAt } = seen;
  const fromAt = storm.fromAt.getTime() - leadMs;
  const endAt = storm.untilAt.getTime() + leadMs;
  const wantedAt = storm.closedAt
    ? endAt
    : Math.min(Math.max(endAt, seenAt + aheadMs), Math.max(forecastUntilAt, seenAt + hourMs));
  const untilAt = Math.min(Math.max(wantedAt, fromAt + hourMs), fromAt + longestMs);
  return stepAxis({ fromAt, untilAt, stepMin: seen.roads > manyRoads ? 15 : 10 });
}

async function arrivalsOfRoutes(): Promise<Map<number, Arrival>> {
  const legs = await listRouteLegs();
  const arrivals = new Map<number, Arrival>();
  for (const routeId of new Set(legs.map((leg) => leg.routeId))) {
    const own = legs.filter((leg) => leg.routeId === routeId);
    const truckNumber = own[0]?.truckNumber ?? null;
    for (const [segmentId, offsetMin] of arrivalOffsetsMin(own)) {
      const known = arrivals.get(segmentId);
      if (!known || offsetMin < known.offsetMin) arrivals.set(segmentId, { offsetMin, truckNumber });
    }
  }
  return arrivals;
}

/** The end of a storm that is over, else now. */
export function seenAtOf(storm: StormRecord, now: Date): Date {
  return storm.closedAt && storm.closedAt < now ? storm.closedAt : now;
}

async function weatherOf(forecast: ForecastRecord | null, span: { fromAt: Date; nowAt: Date }) {
  // No forecast has the id 0: the stations then come with their readings alone.
  return listPassStations({ ...span, forecastId: forecast?.id ?? 0 });
}

/** All that a storm's state is computed from, read at once: the same rows that a plan is worked out from. */
export async function readStormFacts(storm: StormRecord, now: Date): Promise<StormFacts> {
  const seen = seenAtOf(storm, now);
  const fromAt = new Date(storm.fromAt.getTime() - leadMs - hourMs);
  const [roads, forecast, passes, treated, logged, plans, policies, materials, arrivals] = await Promise.all([
    listPassSegments(),
    findForecast({ at: seen }),
    listStormPasses({ stormId: storm.id }),
    listTreated({ fromAt, untilAt: seen }),
    listLoggedTreatments({ fromAt, nowAt: seen }),
    storm.closedAt ? [] : listCurrentPlans({ stormId: storm.id, at: seen }),
    listPolicies(),
    listMaterials(),
    arrivalsOfRoutes(),
  ]);
  const [stations, planned] = await Promise.all([
    weatherOf(forecast, { fromAt, nowAt: seen }),
    listPlanned({ planIds: plans.map((plan) => plan.id) }),
  ]);
  const seenAt = seen.getTime();
  return {
    storm,
    seenAt,
    axis: axisFor(storm, { seenAt, forecastUntilAt: forecast?.untilAt?.getTime() ?? seenAt, roads: roads.length }),
    roads,
    stations,
    forecastIssuedAt: forecast?.issuedAt.getTime() ?? null,
    passes,
    treated,
    logged,
    plans,
    planned,
    arrivals,
    materials: new Map(materials.map((material) => [material.id, material])),
    policy: readPolicy(policies[0]?.rules ?? {}),
  };
}
