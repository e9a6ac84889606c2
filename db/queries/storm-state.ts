import { selectRows } from '../transaction';

export interface StormRecord {
  id: number;
  number: number;
  name: string;
  fromAt: Date;
  untilAt: Date;
  closedAt: Date | null;
}

const stormColumns = `id, number, name, from_at as "fromAt", until_at as "untilAt", closed_at as "closedAt"`;

export async function findStorm({ id }: { id: number }): Promise<StormRecord | null> {
  const rows = await selectRows<StormRecord>(`select ${stormColumns} from storms where id = :id`, { id });
  return rows[0] ?? null;
}

/** The storm under way; null when all are closed. */
export async function findOpenStorm(): Promise<StormRecord | null> {
  const rows = await selectRows<StormRecord>(
    `select ${stormColumns} from storms where closed_at is null order by opened_at desc limit 1`,
  );
  return rows[0] ?? null;
}

/**
 * One text that changes whenever anything behind a storm's state does. Tables that only append are judged by their
 * newest row, readings by how many there are as well, since an upload may fill a gap.
 */
export async function findStormDataVersion({ stormId, fromAt }: { stormId: number; fromAt: Date }): Promise<string> {
  const rows = await selectRows<{ version: string }>(
    `select md5(concat_ws('|',
       (select concat(from_at, until_at, closed_at) from storms where id = :stormId),
       (select concat(count(*), max(starts_at)) from storm_passes where storm_id = :stormId),
       (select concat(max(id), max(published_at), max(worked_out_at)) from plans where storm_id = :stormId),
       (select concat(count(*), max(observed_at)) from readings where observed_at >= :fromAt),
       (select max(id) from uploads), (select max(id) from forecasts), (select max(version) from policies),
       (select concat(count(*), max(e.recorded_at)) from spread_entries e where e.spread_at >= :fromAt),
       (select concat(count(*), max(started_at), max(finished_at)) from runs where coalesce(finished_at, 'infinity') >= :fromAt),
       (select concat(count(*), max(updated_at)) from segments where retired_at is null),
       (select string_agg(concat(r.id, r.truck_id, r.is_active), ',' order by r.id) from routes r),
       (select count(*) from route_segments),
       (select string_agg(concat(id, is_active, composition), ',' order by id) from materials),
       (select string_agg(concat(id, is_active), ',' order by id) from stations))) as version`,
    { stormId, fromAt },
  );
  return rows[0]?.version ?? '';
}

export interface TreatedRecord {
  segmentId: number;
  spreadAt: Date;
  outcome: 'spread' | 'ploughed' | 'skipped';
  isPloughed: boolean;
  materialId: number | null;
  materialName: string | null;
  rateGPerM2: number | null;
  truckNumber: number;
}

/** What was logged from `fromAt` on, whichever run; an entry that an amendment replaces is left out. */
export async function listTreated({ fromAt, untilAt }: { fromAt: Date; untilAt: Date }): Promise<TreatedRecord[]> {
  return selectRows<TreatedRecord>(
    `select e.segment_id as "segmentId", e.spread_at as "spreadAt", e.outcome, e.is_ploughed as "isPloughed",
            e.material_id as "materialId", m.name as "materialName", e.rate_g_per_m2 as "rateGPerM2",
            t.number as "truckNumber"
       from spread_entries e
       join runs r on r.id = e.run_id
       join trucks t on t.id = r.truck_id
       left join materials m on m.id = e.material_id
      where e.spread_at between :fromAt and :untilAt
        and not exists (select 1 from spread_entries a where a.amends_id = e.id)
      order by e.spread_at`,
    { fromAt, untilAt },
  );
}

export interface RouteLegRecord {
  routeId: number;
  truckNumber: number | null;
  segmentId: number;
  lengthM: number;
  speedKmPerH: number;
}

/** Roads of the standing routes in the order driven. */
export async function listRouteLegs(): Promise<RouteLegRecord[]> {
  return selectRows<RouteLegRecord>(
    `select r.id as "routeId", t.number as "truckNumber", g.id as "segmentId", g.length_m as "lengthM",
            g.speed_km_per_h as "speedKmPerH"
       from routes r
       join route_segments rs on rs.route_id = r.id
       join segments g on g.id = rs.segment_id and g.retired_at is null
       left join trucks t on t.id = r.truck_id
      where r.is_active order by r.id, rs.position`,
  );
}

export interface TruckOutRecord {
  id: number;
  number: number;
  latDeg: number;
  lonDeg: number;
  lastRoad: string | null;
  lastLoggedAt: Date | null;
  yardName: string;
  /** loaded after it last logged a road */
  isLoading: boolean;
}

/** Trucks on a run, where they last logged a road, or else at their yard. */
export async function listTrucksOut(): Promise<TruckOutRecord[]> {
  return selectRows<TruckOutRecord>(
    `select t.id, t.number, ST_Y(place.point) as "latDeg", ST_X(place.point) as "lonDeg", last.name as "lastRoad",
            last.spread_at as "lastLoggedAt", y.name as "yardName",
            coalesce((select max(l.loaded_at) from loads l where l.run_id = r.id) > last.spread_at, false) as "isLoading"
       from runs r
       join trucks t on t.id = r.truck_id
       join yards y on y.id = t.yard_id
       left join lateral (
         select g.name, g.geometry, e.spread_at from spread_entries e join segments g on g.id = e.segment_id
          where e.run_id = r.id order by e.spread_at desc limit 1) last on true
       cross join lateral (select coalesce(ST_LineInterpolatePoint(last.geometry, 0.5), y.position) as point) place
      where r.finished_at is null order by t.number`,
  );
}

/** The storm closed last: something to look back at while none is under way. */
export async function findNewestClosedStorm(): Promise<StormRecord | null> {
  const rows = await selectRows<StormRecord>(
    `select ${stormColumns} from storms where closed_at is not null order by closed_at desc limit 1`,
  );
  return rows[0] ?? null;
}
