import { selectRows } from '../transaction';

export interface CrewTruck {
  truckId: number;
  truckNumber: number;
  truckName: string;
  yardName: string;
  /** the run it is on; null when it stands in the yard */
  runId: string | null;
  driverName: string | null;
  routeName: string | null;
  startedAt: Date | null;
  roadsTotal: number;
  roadsDone: number;
  lastRoad: string | null;
  lastLoggedAt: Date | null;
  lastLoadAt: Date | null;
}

/** Every truck in use with the run it is on. */
export async function listCrew(): Promise<CrewTruck[]> {
  return selectRows<CrewTruck>(
    `select t.id as "truckId", t.number as "truckNumber", t.name as "truckName", y.name as "yardName",
            r.id as "runId", p.name as "driverName", ro.name as "routeName", r.started_at as "startedAt",
            coalesce((select count(*) from run_segments rs where rs.run_id = r.id), 0)::int as "roadsTotal",
            coalesce((select count(distinct e.segment_id) from spread_entries e where e.run_id = r.id), 0)::int as "roadsDone",
            last.name as "lastRoad", last.spread_at as "lastLoggedAt",
            (select max(l.loaded_at) from loads l where l.run_id = r.id) as "lastLoadAt"
       from trucks t
       join yards y on y.id = t.yard_id
       left join runs r on r.truck_id = t.id and r.finished_at is null
       left join people p on p.id = r.driver_id
       left join routes ro on ro.id = r.route_id
       left join lateral (
         select g.name, e.spread_at from spread_entries e join segments g on g.id = e.segment_id
          where e.run_id = r.id order by e.spread_at desc limit 1) last on true
      where t.is_active order by r.id is null, t.number`,
  );
}

export interface CrewPerson {
  id: number;
  name: string;
  role: string;
  outSince: Date | null;
}

/** Drivers, and since when each is out. Hours of service follow local rules; nothing here approves them. */
export async function listDrivers(): Promise<CrewPerson[]> {
  return selectRows<CrewPerson>(
    `select p.id, p.name, p.role, r.started_at as "outSince"
       from people p left join runs r on r.driver_id = p.id and r.finished_at is null
      where p.role = 'driver' and not p.is_disabled order by r.started_at nulls last, p.name`,
  );
}
