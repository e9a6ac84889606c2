import { driveRoute, type Ask, type DrivenRun } from '@/lib/skerrow/drive';
import { trucks } from '@/lib/skerrow/people';
import { type Random } from '@/lib/skerrow/random';
import { type RoadSegment } from '@/lib/skerrow/roads';
import { departuresOf, type SkerrowStorm } from '@/lib/skerrow/storms';
import { type Tx } from '../transaction';
import { type SeededRoute } from './demo-network';
import { idOf, insertRows } from './insert-rows';

type Ids = ReadonlyMap<string, number>;

export interface RunSetting {
  storm: SkerrowStorm;
  stormId: number;
  pass: number;
  planId: number;
  leavesAt: Date;
  /** when each truck was back from its last run, by number; written on */
  backAt: Map<number, Date>;
  anchorAt: Date;
  /** by segment key */
  asks: ReadonlyMap<string, Ask>;
  routes: readonly SeededRoute[];
  roads: ReadonlyMap<string, RoadSegment>;
  ids: Record<'people' | 'trucks' | 'yards' | 'materials' | 'segments', Ids>;
}

/** Between coming back and leaving again at the soonest. */
const turnRoundMs = 4 * 60_000;

interface Taken {
  run: DrivenRun;
  route: SeededRoute;
  driverId: number;
  truckId: number;
}

function driveOne(setting: RunSetting, route: SeededRoute, random: Random): Taken[] {
  const truck = trucks.find(({ number }) => number === route.truckNumber);
  if (!truck) return [];
  const departure = departuresOf(setting.storm.number, setting.pass, truck.number);
  const soonestMs = (setting.backAt.get(truck.number)?.getTime() ?? 0) + turnRoundMs;
  const run = driveRoute(
    {
      roads: route.segmentKeys.flatMap((key) => setting.roads.get(key) ?? []),
      asks: setting.asks,
      truck,
      departure,
      leavesAt: new Date(Math.max(setting.leavesAt.getTime(), soonestMs)),
      untilAt: setting.anchorAt,
    },
    random,
  );
  if (run.finishedAt) setting.backAt.set(truck.number, run.finishedAt);
  return [
    {
      run,
      route,
      driverId: idOf(setting.ids.people, departure.reliefDriver ?? truck.driver),
      truckId: idOf(setting.ids.trucks, String(truck.number)),
    },
  ];
}

function entryRows({ run, driverId }: Taken, { asks, roads, planId, ids }: RunSetting) {
  const materialId = (name: string | null | undefined) => (name ? idOf(ids.materials, name) : null);
  return run.entries.map(({ segmentKey, materialName, ...entry }) => {
    const road = roads.get(segmentKey);
    const ask = asks.get(segmentKey);
    return {
      ...entry,
      runId: run.id,
      segmentId: idOf(ids.segments, segmentKey),
      materialId: materialId(materialName),
      planId,
      recommendedMaterialId: materialId(ask?.materialName),
      recommendedRateGPerM2: ask?.rateGPerM2 ?? null,
      areaM2: (road?.lengthM ?? 1) * (road?.widthM ?? 1),
      recordedBy: driverId,
    };
  });
}

const loadRows = ({ run, driverId, route }: Taken, { ids }: RunSetting) =>
  run.loads.map(({ materialName, ...load }) => ({
    ...load,
    runId: run.id,
    yardId: idOf(ids.yards, route.yardName),
    materialId: idOf(ids.materials, materialName),
    recordedAt: load.loadedAt,
    recordedBy: driverId,
  }));

function auditRows({ run, driverId, truckId }: Taken, { stormId }: RunSetting) {
  const row = (recordedAt: Date, action: string, subject: readonly [kind: string, id: string], detail: object) => ({
    recordedAt,
    personId: driverId,
    action,
    subjectKind: subject[0],
    subjectId: subject[1],
    detail,
  });
  return [
    row(run.startedAt, 'run.start', ['run', run.id], { truckId, stormId }),
    ...run.loads.map(({ id, loadedAt, massKg }) =>
      row(loadedAt, 'load.record', ['load', id], { runId: run.id, massKg }),
    ),
    ...run.entries.map(({ id, recordedAt, outcome, rateGPerM2 }) =>
      row(recordedAt, 'run.log', ['spread-entry', id], { runId: run.id, outcome, rateGPerM2 }),
    ),
    ...(run.finishedAt ? [row(run.finishedAt, 'run.finish', ['run', run.id], {})] : []),
  ];
}

/** Every truck's run of one pass as far as it has come, with its roads, entries, loads and audit rows. */
export async function seedRunsOfPass(tx: Tx, setting: RunSetting, random: Random): Promise<void> {
  const taken = setting.routes
    .flatMap((route) => driveOne(setting, route, random))
    .filter(({ run }) => run.startedAt <= setting.anchorAt);
  await insertRows(tx, {
    table: 'runs',
    rows: taken.map(({ run, route, driverId, truckId }) => ({
      id: run.id,
      stormId: setting.stormId,
      planId: setting.planId,
      routeId: route.id,
      truckId,
      driverId,
      startedAt: run.startedAt,
      finishedAt: run.finishedAt,
      recordedAt: run.startedAt,
    })),
  });
  await insertRows(tx, {
    table: 'run_segments',
    rows: taken.flatMap(({ run, route }) =>
      route.segmentKeys.map((key, index) => ({
        runId: run.id,
        position: index + 1,
        segmentId: idOf(setting.ids.segments, key),
      })),
    ),
  });
  await insertRows(tx, { table: 'spread_entries', rows: taken.flatMap((each) => entryRows(each, setting)) });
  await insertRows(tx, { table: 'loads', rows: taken.flatMap((each) => loadRows(each, setting)) });
  await insertRows(tx, { table: 'audit_log', rows: taken.flatMap((each) => auditRows(each, setting)) });
}
