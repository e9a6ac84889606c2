import { selectRows } from '../transaction';

export interface RouteRecord {
  id: number;
  name: string;
  yardId: number;
  yardName: string;
  truckId: number | null;
  truckNumber: number | null;
  segmentIds: number[];
  laneKm: number;
  centreKm: number;
  areaM2: number;
}

/** Standing routes in use with their roads in order. */
export async function listRoutes(): Promise<RouteRecord[]> {
  return selectRows<RouteRecord>(
    `select r.id, r.name, r.yard_id as "yardId", y.name as "yardName", r.truck_id as "truckId", t.number as "truckNumber",
            coalesce(array_agg(g.id order by rs.position) filter (where g.id is not null), '{}') as "segmentIds",
            coalesce(sum(g.length_m * g.lanes) / 1000, 0) as "laneKm",
            coalesce(sum(g.length_m) / 1000, 0) as "centreKm",
            coalesce(sum(g.length_m * g.width_m), 0) as "areaM2"
       from routes r
       join yards y on y.id = r.yard_id
       left join trucks t on t.id = r.truck_id
       left join route_segments rs on rs.route_id = r.id
       left join segments g on g.id = rs.segment_id and g.retired_at is null
      where r.is_active
      group by r.id, y.name, t.number order by r.name`,
  );
}

export interface UncoveredRoads {
  roads: number;
  laneKm: number;
}

/** Roads in use that no standing route treats. */
export async function findUncoveredRoads(): Promise<UncoveredRoads> {
  const rows = await selectRows<UncoveredRoads>(
    `select count(*)::int as roads, coalesce(sum(length_m * lanes) / 1000, 0) as "laneKm"
       from segments g
      where retired_at is null
        and not exists (select 1 from route_segments rs join routes r on r.id = rs.route_id
                         where rs.segment_id = g.id and r.is_active)`,
  );
  return rows[0] ?? { roads: 0, laneKm: 0 };
}
