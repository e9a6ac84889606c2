import { type MaterialRecord } from '@/db/queries/materials';
import { indexAt } from '@/lib/time/step-axis';
import { type Material } from '@/lib/treatment/materials';
import { projectStorm, type SegmentProjection, type StormTreatment } from '@/lib/treatment/project-storm';
import { roadColumns, type RoadColumns } from './storm-columns';
import { type StormFacts } from './storm-inputs';

const msPerMin = 60_000;

export interface ProjectedRoad {
  carried: SegmentProjection['carried'];
  columns: RoadColumns;
}

const materialOf = (record: MaterialRecord): Material => ({ ...record, id: String(record.id) });

/**
 * What the plans still have before them, each road at the time its truck is expected. A road already logged in a pass
 * is done; a truck that is late is expected at the next step.
 */
export function expectedTreatments(facts: StormFacts): StormTreatment[] {
  const { plans, planned, passes, treated, arrivals, materials, axis, seenAt } = facts;
  return plans.flatMap((plan) => {
    const startsAt = passes.find(({ number }) => number === plan.passNumber)?.startsAt.getTime();
    if (startsAt === undefined) return [];
    const logged = treated.filter((entry) => entry.spreadAt.getTime() >= startsAt);
    const done = new Set(logged.map((entry) => entry.segmentId));
    return planned.flatMap((row): StormTreatment[] => {
      const arrival = arrivals.get(row.segmentId);
      const isAsked = row.planId === plan.id && row.action !== 'nothing' && row.action !== 'undecided';
      if (!isAsked || !arrival || done.has(row.segmentId)) return [];
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
  });
}

function indexesBySegment(treatments: readonly StormTreatment[], { axis }: StormFacts): Map<number, number[]> {
  const indexes = new Map<number, number[]>();
  for (const { segmentId, at } of treatments) {
    const known = indexes.get(segmentId) ?? [];
    known.push(indexAt(axis, at));
    indexes.set(segmentId, known);
  }
  return indexes;
}

/** Every road through the storm: as it is if nobody comes, and as it will be when the plans are carried out. */
export function projectRoads(facts: StormFacts): ProjectedRoad[] {
  const { axis, roads, stations, policy, seenAt, logged } = facts;
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
    const coming = expectedIndexes.get(id) ?? [];
    const columns = roadColumns({
      alone: projection,
      withPlan: visitedById.get(id) ?? projection,
      plannedIndex: coming.length > 0 ? Math.min(...coming) : null,
      tempsC: projection.carried.tempsC,
      passIndexes: [...(loggedIndexes.get(id) ?? []), ...coming],
      workInSteps: Math.ceil(policy.workInMin / axis.stepMin),
    });
    return { carried: projection.carried, columns };
  });
}
