import { listMaterials, type MaterialRecord } from '@/db/queries/materials';
import { listPolicies } from '@/db/queries/policy';
import { findCurrentPlan, listPlanned, type PlannedRecord, type PlanRecord } from '@/db/queries/storm-plans';
import {
  listForecastHours,
  listPasses,
  listRouteLegs,
  listStationReadings,
  listStormRoads,
  listStormStations,
  listTreated,
  type ForecastHourRecord,
  type PassRecord,
  type StationReadingRecord,
  type StationRecord,
  type StormRecord,
  type StormRoadRecord,
  type TreatedRecord,
} from '@/db/queries/storm-state';
import { readPolicy } from '@/lib/contracts/policy';
import { type Station } from '@/lib/pavement/station-series';
import { arrivalOffsetsMin } from '@/lib/routing/arrival-offsets';
import { stepAxis, type StepAxis } from '@/lib/time/step-axis';
import { type Material } from '@/lib/treatment/materials';
import { type Policy } from '@/lib/treatment/policy';

const hourMs = 3_600_000;
/** Before a storm begins, and beyond now while it runs. */
const leadMs = hourMs;
const aheadMs = 12 * hourMs;
const longestMs = 72 * hourMs;
/** From this many roads on, steps of 15 min keep the answer to a size that a browser takes at once. */
const manyRoads = 2000;

export interface StormFacts {
  storm: StormRecord;
  /** what parts measured from forecast: now, or the end of a storm that is over */
  seenAt: number;
  axis: StepAxis;
  roads: StormRoadRecord[];
  stationRecords: StationRecord[];
  stations: Station[];
  forecastIssuedAt: number | null;
  passes: PassRecord[];
  treated: TreatedRecord[];
  plan: PlanRecord | null;
  planned: PlannedRecord[];
  /** road → when a truck of its route is there after a pass set out, and which */
  arrivals: Map<number, { offsetMin: number; truckNumber: number | null }>;
  materials: Map<number, MaterialRecord>;
  policy: Policy;
}

/** A product of the database as the treatment model knows it. */
export function materialOf(record: MaterialRecord): Material {
  const { id, name, form, composition, waterMassFraction, densityKgPerM3, practicalMinimumC, costCentsPerTonne } =
    record;
  return {
    id: String(id),
    name,
    form,
    composition,
    waterMassFraction,
    densityKgPerM3,
    practicalMinimumC,
    costCentsPerTonne,
  };
}

export function stationsOf(
  records: readonly StationRecord[],
  readings: readonly StationReadingRecord[],
  hours: readonly ForecastHourRecord[],
): Station[] {
  return records.map(({ id, latDeg, lonDeg, heightM }) => ({
    id,
    latDeg,
    lonDeg,
    heightM,
    readings: readings
      .filter((reading) => reading.stationId === id)
      .map(({ observedAt, ...reading }) => ({ ...reading, at: observedAt.getTime() })),
    forecast: hours
      .filter((hour) => hour.stationId === id)
      .map(({ validAt, ...hour }) => ({ ...hour, validAt: validAt.getTime() })),
  }));
}

function axisFor(
  storm: StormRecord,
  seen: { seenAt: number; hours: readonly ForecastHourRecord[]; roads: number },
): StepAxis {
  const fromAt = storm.fromAt.getTime() - leadMs;
  const lastHour = seen.hours.reduce((last, hour) => Math.max(last, hour.validAt.getTime()), seen.seenAt);
  const wanted = storm.closedAt
    ? storm.untilAt.getTime() + leadMs
    : Math.min(
        Math.max(storm.untilAt.getTime() + leadMs, seen.seenAt + aheadMs),
        Math.max(lastHour, seen.seenAt + hourMs),
      );
  const untilAt = Math.min(Math.max(wanted, fromAt + hourMs), fromAt + longestMs);
  return stepAxis({ fromAt, untilAt, stepMin: seen.roads > manyRoads ? 15 : 10 });
}

async function arrivalsOfRoutes(): Promise<StormFacts['arrivals']> {
  const legs = await listRouteLegs();
  const arrivals: StormFacts['arrivals'] = new Map();
  for (const routeId of new Set(legs.map((leg) => leg.routeId))) {
    const own = legs.filter((leg) => leg.routeId === routeId);
    for (const [segmentId, offsetMin] of arrivalOffsetsMin(own)) {
      const known = arrivals.get(segmentId);
      if (!known || offsetMin < known.offsetMin)
        arrivals.set(segmentId, { offsetMin, truckNumber: own[0]?.truckNumber ?? null });
    }
  }
  return arrivals;
}

/** The end of a storm that is over, else now. */
export function seenAtOf(storm: StormRecord, now: Date): Date {
  return storm.closedAt && storm.closedAt < now ? storm.closedAt : now;
}

/** All that a storm's state is computed from, read at once. */
export async function readStormFacts(storm: StormRecord, now: Date): Promise<StormFacts> {
  const seen = seenAtOf(storm, now);
  const fromAt = new Date(storm.fromAt.getTime() - leadMs - hourMs);
  const [roads, stationRecords, hours, passes, treated, plan, policies, materials, arrivals] = await Promise.all([
    listStormRoads(),
    listStormStations(),
    listForecastHours({ at: seen }),
    listPasses({ stormId: storm.id }),
    listTreated({ fromAt, untilAt: seen }),
    findCurrentPlan({ stormId: storm.id }),
    listPolicies(),
    listMaterials(),
    arrivalsOfRoutes(),
  ]);
  const axis = axisFor(storm, { seenAt: seen.getTime(), hours, roads: roads.length });
  const [readings, planned] = await Promise.all([
    listStationReadings({ fromAt, untilAt: seen }),
    plan ? listPlanned({ planId: plan.id }) : [],
  ]);
  return {
    storm,
    seenAt: seen.getTime(),
    axis,
    roads,
    stationRecords,
    stations: stationsOf(stationRecords, readings, hours),
    forecastIssuedAt: hours[0]?.issuedAt.getTime() ?? null,
    passes,
    treated,
    plan,
    planned,
    arrivals,
    materials: new Map(materials.map((material) => [material.id, material])),
    policy: readPolicy(policies[0]?.rules ?? {}),
  };
}
