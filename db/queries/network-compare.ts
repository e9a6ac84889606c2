import { type Network } from '@/lib/geo/network';
import { selectRows, type Tx } from '../transaction';

/** A segment as it is sent to the database, in its column names. */
const columnTypes = {
  source_key: 'text',
  from_key: 'text',
  to_key: 'text',
  name: 'text',
  road_class: 'text',
  service_class: 'text',
  lanes: 'smallint',
  width_m: 'double precision',
  surface: 'text',
  is_bridge: 'boolean',
  is_tunnel: 'boolean',
  speed_km_per_h: 'double precision',
  is_one_way: 'boolean',
  height_m: 'double precision',
  length_m: 'double precision',
  geometry: 'text',
  assumed: 'text[]',
  tags: 'jsonb',
} as const;

export type IncomingRow = Record<keyof typeof columnTypes, unknown>;

/** `incoming` as a table expression over the replacement `:rows`. */
export const incomingSql = `jsonb_to_recordset(cast(:rows as jsonb)) as incoming (${Object.entries(columnTypes)
  .map(([name, type]) => `${name} ${type}`)
  .join(', ')})`;

export function incomingRows({ nodes, segments }: Network): IncomingRow[] {
  return segments.map((segment) => ({
    source_key: segment.sourceKey,
    from_key: nodes[segment.fromNode]?.sourceKey,
    to_key: nodes[segment.toNode]?.sourceKey,
    name: segment.name,
    road_class: segment.roadClass,
    service_class: segment.serviceClass,
    lanes: segment.lanes,
    width_m: segment.widthM,
    surface: segment.surface,
    is_bridge: segment.isBridge,
    is_tunnel: segment.isTunnel,
    speed_km_per_h: segment.speedKmPerH,
    is_one_way: segment.isOneWay,
    height_m: segment.heightM ?? 0,
    length_m: segment.lengthM,
    geometry: `LINESTRING(${segment.positions.map(([lon, lat]) => `${lon} ${lat}`).join(',')})`,
    assumed: segment.assumed,
    tags: segment.ref === '' ? segment.tags : { ...segment.tags, ref: segment.ref },
  }));
}

/** What an attribute set by hand keeps when the file says something else. */
export const settledSql = (column: string, attribute: string): string =>
  `case when '${attribute}' = any(s.edited) then s.${column} else incoming.${column} end`;

/** True when saving would leave the row as it is. */
const sameSql = `
  s.retired_at is null and s.road_class = incoming.road_class
  and s.name = ${settledSql('name', 'name')}
  and s.service_class = ${settledSql('service_class', 'serviceClass')}
  and s.lanes = ${settledSql('lanes', 'lanes')}
  and s.surface = ${settledSql('surface', 'surface')}
  and s.is_bridge = incoming.is_bridge and s.is_tunnel = incoming.is_tunnel
  and s.speed_km_per_h = incoming.speed_km_per_h and s.is_one_way = incoming.is_one_way
  and (s.width_m = incoming.width_m or 'lanes' = any(s.edited))
  and s.tags = incoming.tags and s.geometry = st_geomfromtext(incoming.geometry, 4326)`;

export interface NetworkComparison {
  /** source key → whether the road is there already; a key that is missing is new */
  known: Map<string, 'changed' | 'same'>;
}

/** Which of the network's roads are there already, and which of those would change. */
export async function compareNetwork(network: Network, tx?: Tx): Promise<NetworkComparison> {
  const known: NetworkComparison['known'] = new Map();
  for (const rows of chunksOf(incomingRows(network))) {
    const found = await selectRows<{ sourceKey: string; isSame: boolean }>(
      `select s.source_key as "sourceKey", (${sameSql}) as "isSame"
         from ${incomingSql} join segments s on s.source_key = incoming.source_key`,
      { rows: JSON.stringify(rows) },
      tx,
    );
    for (const { sourceKey, isSame } of found) known.set(sourceKey, isSame ? 'same' : 'changed');
  }
  return { known };
}

export interface RetiredRoad {
  id: number;
  sourceKey: string;
  name: string;
  serviceClass: 'A' | 'B' | 'C' | 'D';
  lanes: number;
  path: string;
}

/** Roads in use that came from a file of this source and are not among the keys: saving takes them out of use. */
export async function listMissing(given: { source: string; keys: readonly string[] }, tx?: Tx): Promise<RetiredRoad[]> {
  return selectRows<RetiredRoad>(
    `select s.id, s.source_key as "sourceKey", s.name, s.service_class as "serviceClass", s.lanes,
            st_asgeojson(s.geometry, 6) as path
       from segments s join network_imports i on i.id = s.import_id
       left join jsonb_array_elements_text(cast(:keys as jsonb)) as kept (key) on kept.key = s.source_key
      where i.source = :source and s.retired_at is null and kept.key is null
      order by s.id`,
    { source: given.source, keys: JSON.stringify(given.keys) },
    tx,
  );
}

/** Rows go to the database in parcels, so that no statement grows without limit. */
export function chunksOf<T>(list: readonly T[], size = 2000): T[][] {
  return Array.from({ length: Math.ceil(list.length / size) }, (_, at) => list.slice(at * size, (at + 1) * size));
}
