import { selectRows, type Tx } from '../transaction';

export interface RunRecord {
  id: string;
  stormId: number | null;
  planId: number | null;
  truckId: number;
  driverId: number;
  startedAt: Date;
  finishedAt: Date | null;
}

/** The run with this id, or null: what "own" is judged on. */
export async function findRun({ id }: { id: string }, tx?: Tx): Promise<RunRecord | null> {
  const rows = await selectRows<RunRecord>(
    `select id, storm_id as "stormId", plan_id as "planId", truck_id as "truckId", driver_id as "driverId",
            started_at as "startedAt", finished_at as "finishedAt"
       from runs where id = :id`,
    { id },
    tx,
  );
  return rows[0] ?? null;
}

export async function findOpenRunOf({ driverId }: { driverId: number }): Promise<RunRecord | null> {
  const rows = await selectRows<RunRecord>(
    `select id, storm_id as "stormId", plan_id as "planId", truck_id as "truckId", driver_id as "driverId",
            started_at as "startedAt", finished_at as "finishedAt"
       from runs where driver_id = :driverId and finished_at is null`,
    { driverId },
  );
  return rows[0] ?? null;
}

export interface RunHead {
  id: string;
  driverId: number;
  driverName: string;
  truckId: number;
  truckNumber: number;
  hopperKg: number;
  tankL: number;
  minRateGPerM2: number;
  maxRateGPerM2: number;
  calibratedOn: string | null;
  routeName: string | null;
  stormNumber: number | null;
  passNumber: number | null;
  planVersion: number | null;
  startedAt: Date;
  finishedAt: Date | null;
  loadedKg: number;
  spreadKg: number;
  roadsTotal: number;
  roadsDone: number;
}

const headSql = `
  select r.id, r.driver_id as "driverId", p.name as "driverName", r.truck_id as "truckId", t.number as "truckNumber",
         coalesce(s.hopper_kg, 0) as "hopperKg", coalesce(s.tank_l, 0) as "tankL",
         coalesce(s.min_rate_g_per_m2, 0) as "minRateGPerM2", coalesce(s.max_rate_g_per_m2, 0) as "maxRateGPerM2",
         s.calibrated_on as "calibratedOn", ro.name as "routeName", st.number as "stormNumber",
         pl.pass_number as "passNumber", pl.version as "planVersion",
         r.started_at as "startedAt", r.finished_at as "finishedAt",
         coalesce((select sum(l.mass_kg) from loads l where l.run_id = r.id), 0) as "loadedKg",
         coalesce((select sum(e.rate_g_per_m2 * e.area_m2) / 1000 from spread_entries e
                    where e.run_id = r.id and e.outcome = 'spread'
                      and not exists (select 1 from spread_entries a where a.amends_id = e.id)), 0) as "spreadKg",
         (select count(*) from run_segments rs where rs.run_id = r.id)::int as "roadsTotal",
         (select count(distinct e.segment_id) from spread_entries e where e.run_id = r.id)::int as "roadsDone"
    from runs r
    join people p on p.id = r.driver_id
    join trucks t on t.id = r.truck_id
    left join lateral (select * from spreaders where truck_id = t.id order by id desc limit 1) s on true
    left join routes ro on ro.id = r.route_id
    left join storms st on st.id = r.storm_id
    left join plans pl on pl.id = r.plan_id`;

export async function findRunHead({ id }: { id: string }): Promise<RunHead | null> {
  const rows = await selectRows<RunHead>(`${headSql} where r.id = :id`, { id });
  return rows[0] ?? null;
}

/** Runs of a storm, newest first; without a storm, the runs that are out now. */
export async function listRunHeads({ stormId }: { stormId: number | null }): Promise<RunHead[]> {
  const where = stormId === null ? 'where r.finished_at is null' : 'where r.storm_id = :stormId';
  return selectRows<RunHead>(`${headSql} ${where} order by r.started_at desc, t.number`, { stormId });
}

export interface RunRoadRecord {
  position: number;
  segmentId: number;
  name: string;
  serviceClass: 'A' | 'B' | 'C' | 'D';
  lanes: number;
  lengthM: number;
  areaM2: number;
  exposure: string;
  isBridge: boolean;
  isSensitive: boolean;
  action: string | null;
  materialId: number | null;
  materialName: string | null;
  rateGPerM2: number | null;
  rateMlPerM2: number | null;
  /** as stored with the plan: a contract of plans reads it */
  why: unknown;
  entryId: string | null;
  outcome: 'spread' | 'ploughed' | 'skipped' | null;
  loggedRateGPerM2: number | null;
  loggedMaterialName: string | null;
  spreadAt: Date | null;
}

/**
 * The roads of a run in order, each with what the plan in force asks for and
 * what was last logged on this run.
 */
export async function listRunRoads({ id }: { id: string }): Promise<RunRoadRecord[]> {
  return selectRows<RunRoadRecord>(
    `select rs.position, g.id as "segmentId", g.name, g.service_class as "serviceClass", g.lanes,
            g.length_m as "lengthM", g.length_m * g.width_m as "areaM2", g.exposure, g.is_bridge as "isBridge",
            g.is_sensitive as "isSensitive", pt.action, pt.material_id as "materialId", pm.name as "materialName",
            pt.rate_g_per_m2 as "rateGPerM2", pt.rate_ml_per_m2 as "rateMlPerM2", pt.why, e.id as "entryId",
            e.outcome, e.rate_g_per_m2 as "loggedRateGPerM2", em.name as "loggedMaterialName", e.spread_at as "spreadAt"
       from run_segments rs
       join runs r on r.id = rs.run_id
       join segments g on g.id = rs.segment_id
       left join plan_treatments pt
         on pt.segment_id = g.id and pt.plan_id = plan_in_force(r.storm_id, coalesce(r.finished_at, now()))
       left join materials pm on pm.id = pt.material_id
       left join lateral (
         select * from spread_entries e where e.run_id = r.id and e.segment_id = g.id
            and not exists (select 1 from spread_entries a where a.amends_id = e.id)
          order by e.spread_at desc limit 1) e on true
       left join materials em on em.id = e.material_id
      where rs.run_id = :id
      order by rs.position`,
    { id },
  );
}
