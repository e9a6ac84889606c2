import { indexAt } from '@/lib/time/step-axis';
import { projectStorm, type SegmentProjection, type StormTreatment } from '@/lib/treatment/project-storm';
import { roadColumns, type RoadColumns } from './storm-columns';
import { materialOf, type StormFacts } from './storm-inputs';

const msPerMin = 60_000;

export interface ProjectedRoad {
  carried: SegmentProjection['carried'];
  columns: RoadColumns;
}

/** What was logged, as the projection takes it. */
export function loggedTreatments({ treated, materials }: Pick<StormFacts, 'treated' | 'materials'>): StormTreatment[] {
  return treated.flatMap((entry) => {
    if (entry.outcome === 'skipped') return [];
    const material = entry.materialId === null ? undefined : materials.get(entry.materialId);
    return {
      segmentId: entry.segmentId,
      at: entry.spreadAt.getTime(),
      isPloughed: entry.isPloughed || entry.outcome === 'ploughed',
      material: material ? materialOf(material) : null,
      rateGPerM2: entry.outcome === 'spread' ? (entry.rateGPerM2 ?? 0) : 0,
    };
  });
}

/**
 * What the current plan still has before it, at the time its truck is expected. A road already treated in that pass is
 * done; a truck that is late is expected at the next step.
 */
export function expectedTreatments(facts: StormFacts): StormTreatment[] {
  const { plan, planned, passes, treated, arrivals, materials, axis, seenAt, storm } = facts;
  const pass = passes.find(({ number }) => number === plan?.passNumber);
  if (!pass || storm.closedAt) return [];
  const startsAt = pass.startsAt.getTime();
  const done = new Set(treated.filter((entry) => entry.spreadAt.getTime() >= startsAt).map((entry) => entry.segmentId));
  return planned.flatMap((row): StormTreatment[] => {
    if (done.has(row.segmentId) || row.action === 'nothing' || row.action === 'undecided') return [];
    const arrival = arrivals.get(row.segmentId);
    if (!arrival) return [];
    const material = row.materialId === null ? undefined : materials.get(row.materialId);
    return [
      {
        segmentId: row.segmentId,
        at: Math.max(startsAt + arrival.offsetMin * msPerMin, seenAt + axis.stepMin * msPerMin),
        isPloughed: row.isPloughed,
        material: material ? materialOf(material) : null,
        rateGPerM2: row.rateGPerM2 ?? 0,
      },
    ];
  });
}

function indexesBySegment(treatments: readonly StormTreatment[], facts: StormFacts): Map<number, number[]> {
  const indexes = new Map<number, number[]>();
  for (const { segmentId, at } of treatments) {
    const known = indexes.get(segmentId) ?? [];
    known.push(indexAt(facts.axis, at));
    indexes.set(segmentId, known);
  }
  return indexes;
}

/** Every road through the storm: as it is if nobody comes, and as it will be when the plan is carried out. */
export function projectRoads(facts: StormFacts): ProjectedRoad[] {
  const { axis, roads, stations, policy, seenAt } = facts;
  const logged = loggedTreatments(facts);
  const expected = expectedTreatments(facts);
  const inputs = { axis, nowAt: seenAt, segments: roads, stations, policy };
  const alone = projectStorm({ ...inputs, treatments: logged });
  const expectedIds = new Set(expected.map(({ segmentId }) => segmentId));
  const visited = projectStorm({
    ...inputs,
    segments: roads.filter(({ id }) => expectedIds.has(id)),
    treatments: [...logged, ...expected],
  });
  const visitedById = new Map(visited.map((projection) => [projection.segmentId, projection]));
  const loggedIndexes = indexesBySegment(logged, facts);
  const expectedIndexes = indexesBySegment(expected, facts);
  return alone.map((projection) => {
    const id = projection.segmentId;
    const columns = roadColumns({
      alone: projection,
      withPlan: visitedById.get(id) ?? projection,
      plannedIndex: expectedIndexes.get(id)?.[0] ?? null,
      tempsC: projection.carried.tempsC,
      passIndexes: [...(loggedIndexes.get(id) ?? []), ...(expectedIndexes.get(id) ?? [])],
      workInSteps: Math.ceil(policy.workInMin / axis.stepMin),
    });
    return { carried: projection.carried, columns };
  });
}
