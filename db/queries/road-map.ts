import { selectRows } from '../transaction';

export interface NetworkVersionRecord {
  roads: number;
  changedAt: Date | null;
  newestId: number;
  features: number;
}

/** What changes when any road in use does: cheap to ask at every request. */
export async function findNetworkVersion(): Promise<NetworkVersionRecord> {
  const rows = await selectRows<NetworkVersionRecord>(
    `select count(*) filter (where retired_at is null)::int as roads, max(updated_at) as "changedAt",
            coalesce(max(id), 0) as "newestId", (select count(*) from base_features)::int as features
       from segments`,
  );
  return rows[0] ?? { roads: 0, changedAt: null, newestId: 0, features: 0 };
}

export interface RoadRecord {
  id: number;
  name: string;
  serviceClass: string;
  lanes: number;
  lengthM: number;
  surface: string;
  exposure: string;
  isBridge: boolean;
  isTunnel: boolean;
  isSensitive: boolean;
  isOneWay: boolean;
  /** encoded polyline, 1e-5 degrees */
  path: string;
}

/** Roads in use, by id. */
export async function listRoads(): Promise<RoadRecord[]> {
  return selectRows<RoadRecord>(
    `select id, name, service_class as "serviceClass", lanes, round(length_m)::int as "lengthM", surface, exposure,
            is_bridge as "isBridge", is_tunnel as "isTunnel", is_sensitive as "isSensitive", is_one_way as "isOneWay",
            ST_AsEncodedPolyline(geometry, 5) as path
       from segments where retired_at is null order by id`,
  );
}

export interface BaseFeatureRecord {
  kind: 'coast' | 'river' | 'lake' | 'contour' | 'town' | 'water-name';
  name: string;
  parts: string[];
}

/** What lies under the roads, as encoded lines: areas as their rings, places as a line of one point twice. */
export async function listBaseFeatures(): Promise<BaseFeatureRecord[]> {
  return selectRows<BaseFeatureRecord>(
    `select f.kind, f.name, array_agg(ST_AsEncodedPolyline(
              case ST_GeometryType(part.geom) when 'ST_Point' then ST_MakeLine(part.geom, part.geom) else part.geom end, 5)
              order by part.path) as parts
       from base_features f
       cross join lateral ST_Dump(
         case ST_Dimension(f.geometry) when 2 then ST_Boundary(f.geometry) else f.geometry end) part
      group by f.id order by f.id`,
  );
}
