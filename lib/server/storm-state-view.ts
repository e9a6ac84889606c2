import { findStorm, findStormDataVersion, listTrucksOut, type StormRecord } from '@/db/queries/storm-state';
import { salts, type Salt } from '@/lib/brine/salts';
import { type PlanRecord } from '@/db/queries/storm-plans';
import { packSteps, toStep } from '@/lib/contracts/packed-steps';
import { perUnit, plannedActions, precipitationWords, StormStateView } from '@/lib/contracts/storm-state';
import { Problem } from '@/lib/problem';
import { seriesOf } from '@/lib/treatment/project-storm';
import { projectRoads, type ProjectedRoad } from './storm-projection';
import { readStormFacts, seenAtOf, type StormFacts } from './storm-inputs';

interface Built {
  version: string;
  text: Promise<string>;
}

// One copy for pages and route handlers, which the bundler gives a module each.
const shared = globalThis as typeof globalThis & { rimewrightStormStates?: Map<number, Built> };
const mostKept = 4;

const at = (date: Date | null) => date?.getTime() ?? null;
const rowOf = (values: ArrayLike<number>, scale: number) =>
  packSteps(
    Int16Array.from(values, (value) => toStep(value, scale)),
    values.length,
  );

function joined(rows: readonly Int16Array[], rowLength: number): string {
  const all = new Int16Array(rows.length * rowLength);
  rows.forEach((row, index) => all.set(row, index * rowLength));
  return packSteps(all, rowLength);
}

function presentStations(facts: StormFacts): StormStateView['stations'] {
  return seriesOf({ ...facts, nowAt: facts.seenAt }).map((series, index) => ({
    id: series.stationId,
    name: facts.stations[index]?.name ?? '',
    status: series.status,
    newestAt: series.newestAt,
    tempC: rowOf(series.tempsC, perUnit.tempC),
    errorC: rowOf(series.errorC, perUnit.tempC),
    precipitationMm: rowOf(series.precipitationMm, perUnit.precipitationMm),
    precipitationTypes: series.precipitationTypes.map((type) => precipitationWords.indexOf(type)),
  }));
}

/** The plan that the screen speaks of: the newest version. */
const shownPlan = ({ plans }: StormFacts) =>
  plans.reduce<PlanRecord | null>((newest, plan) => (newest && newest.version > plan.version ? newest : plan), null);

const presentPlan = ({ id, version, passNumber, publishedAt }: PlanRecord) => ({
  id,
  version,
  passNumber,
  publishedAt: at(publishedAt),
});

function presentPlanned(facts: StormFacts): StormStateView['planned'] {
  const plan = shownPlan(facts);
  if (!plan) return null;
  const own = facts.planned.filter((planned) => planned.planId === plan.id);
  const bySegment = new Map(own.map((planned) => [planned.segmentId, planned]));
  const rows = facts.roads.map((road) => bySegment.get(road.id) ?? null);
  const materialIds = [...facts.materials.keys()];
  const reasonTexts = [...new Set(rows.map((row) => row?.reason ?? ''))];
  const placeOfReason = new Map(reasonTexts.map((text, index) => [text, index]));
  return {
    actions: rows.map((row) => (row ? plannedActions.indexOf(row.action) : -1)),
    materials: rows.map((row) => (row?.materialId ? materialIds.indexOf(row.materialId) : -1)),
    ratesGPerM2: rows.map((row) => row?.rateGPerM2 ?? null),
    ratesMlPerM2: rows.map((row) => row?.rateMlPerM2 ?? null),
    isPloughed: rows.map((row) => (row?.isPloughed ? 1 : 0)),
    reasons: rows.map((row) => placeOfReason.get(row?.reason ?? '') ?? 0),
    reasonTexts,
  };
}

function presentLast(facts: StormFacts): Pick<StormStateView, 'last' | 'treatedThisPass'> {
  const indexById = new Map(facts.roads.map((road, index) => [road.id, index]));
  const newest = new Map<number, StormStateView['last'][number]>();
  const passStart = facts.passes.findLast((pass) => pass.startsAt.getTime() <= facts.seenAt)?.startsAt;
  const treated = new Set<number>();
  for (const entry of facts.treated) {
    const index = indexById.get(entry.segmentId);
    if (index === undefined || entry.spreadAt < facts.storm.fromAt) continue;
    const { outcome, materialName, rateGPerM2, truckNumber } = entry;
    newest.set(index, { index, at: entry.spreadAt.getTime(), outcome, materialName, rateGPerM2, truckNumber });
    if (passStart && entry.spreadAt >= passStart && outcome !== 'skipped') treated.add(index);
  }
  return { last: [...newest.values()], treatedThisPass: treated.size };
}

const statusDigit = { current: '0', stale: '1', missing: '2' } as const;

function presentRoads(projected: readonly ProjectedRoad[], { axis, arrivals, roads, stations }: StormFacts) {
  const stationIds = stations.map((station) => station.id);
  const column = (of: (road: ProjectedRoad) => Int16Array) => joined(projected.map(of), axis.count);
  return {
    marginC: column((road) => road.columns.marginC),
    pavementC: column((road) => Int16Array.from(road.carried.tempsC, (tempC) => toStep(tempC, perUnit.tempC))),
    waterMm: column((road) => road.columns.waterMm),
    massFraction: column((road) => road.columns.massFraction),
    holdSteps: column((road) => road.columns.holdSteps),
    statuses: projected.map((road) => statusDigit[road.carried.status]).join(''),
    stationOf: projected.map((road) => stationIds.indexOf(road.carried.stationIds[0] ?? -1)),
    arrivalMin: roads.map((road) => {
      const offsetMin = arrivals.get(road.id)?.offsetMin;
      return offsetMin === undefined ? null : Math.round(offsetMin);
    }),
    truckOf: roads.map((road) => arrivals.get(road.id)?.truckNumber ?? null),
  };
}

function mainSaltOf(composition: Readonly<Partial<Record<Salt, number>>>): Salt | null {
  return salts.reduce<Salt | null>(
    (main, salt) => ((composition[salt] ?? 0) > (main ? (composition[main] ?? 0) : 0) ? salt : main),
    null,
  );
}

async function present(storm: StormRecord, now: Date, dataVersion: string): Promise<string> {
  const [facts, trucks] = await Promise.all([readStormFacts(storm, now), storm.closedAt ? [] : listTrucksOut()]);
  const plan = shownPlan(facts);
  const view: StormStateView = {
    stormId: storm.id,
    number: storm.number,
    name: storm.name,
    isClosed: storm.closedAt !== null,
    dataVersion,
    nowAt: facts.seenAt,
    axis: facts.axis,
    segmentIds: facts.roads.map((road) => road.id),
    ...presentRoads(projectRoads(facts), facts),
    stations: presentStations(facts),
    forecastIssuedAt: facts.forecastIssuedAt,
    passes: facts.passes.map(({ number, startsAt }) => ({ number, startsAt: startsAt.getTime() })),
    materials: [...facts.materials.values()].map(({ id, name, form, composition }) => ({
      id,
      name,
      form,
      mainSalt: mainSaltOf(composition),
    })),
    plan: plan && presentPlan(plan),
    plans: facts.plans.map(presentPlan),
    planned: presentPlanned(facts),
    ...presentLast(facts),
    trucksOut: trucks.map((truck) => ({ ...truck, lastLoggedAt: at(truck.lastLoggedAt) })),
  };
  return JSON.stringify(StormStateView.parse(view));
}

/**
 * A storm's state as JSON text, computed once for each version of its data and each ten minutes of the clock. Those who
 * ask meanwhile wait for the same computation.
 */
export async function readStormStateText({ id, now }: { id: number; now: Date }): Promise<Built> {
  const storm = await findStorm({ id });
  if (!storm) throw new Problem('not-found', { what: 'storm' });
  const seen = seenAtOf(storm, now);
  const data = await findStormDataVersion({ stormId: id, fromAt: new Date(storm.fromAt.getTime() - 3 * 3_600_000) });
  const version = `${id}-${data}-${Math.floor(seen.getTime() / 600_000)}`;
  const states = (shared.rimewrightStormStates ??= new Map<number, Built>());
  const known = states.get(id);
  if (known?.version === version) return known;
  const built = { version, text: present(storm, now, version) };
  states.delete(id);
  states.set(id, built);
  for (const oldest of [...states.keys()].slice(0, Math.max(0, states.size - mostKept))) states.delete(oldest);
  // A failure is not kept: the next one who asks tries again.
  built.text.catch(() => states.get(id) === built && states.delete(id));
  return built;
}
