import { type Network } from '@/lib/geo/network';
import { Problem } from '@/lib/problem';
import {
  chunksOf,
  incomingRows,
  type IncomingRow,
  incomingSql,
  listMissing,
  settledSql,
} from '../queries/network-compare';
import { findNetworkImport, networkOf } from '../queries/network-imports';
import { execute, inTransaction, selectRows, type Tx } from '../transaction';
import { recordAudit } from './audit';
import { findImportForChange, lockNetwork, refuseDiscarded } from './network-import-rules';

export interface ApplyNetworkImport {
  id: number;
  source: string;
  attribution: string;
  by: number;
  now: Date;
}

export interface AppliedNetworkImport {
  id: number;
  added: number;
  updated: number;
  retired: number;
  /** It had been saved before: nothing was done now. */
  wasApplied: boolean;
}

/** What undo needs: the rows as they were, and what was new. */
export interface BeforeImage {
  segments: unknown[];
  addedSegmentIds: number[];
  addedNodeIds: number[];
  retiredSegmentIds: number[];
}

/**
 * Writes the previewed roads into the network, in one transaction. Roads with the same source key are changed in place
 * and keep their id, what was set by hand, their exposure and their sensitivity; roads that an earlier file of the same
 * source had and this one lacks are retired, never deleted. Saving twice is harmless.
 */
export async function applyNetworkImport(given: ApplyNetworkImport): Promise<AppliedNetworkImport> {
  return inTransaction(async (tx) => {
    await lockNetwork(tx);
    const row = await findImportForChange(tx, given.id);
    refuseDiscarded(row);
    if (row.state === 'applied') return { id: given.id, added: 0, updated: 0, retired: 0, wasApplied: true };
    const detail = await findNetworkImport({ id: given.id }, tx);
    if (!detail?.payload) throw new Problem('not-found', { what: 'import of roads' });
    const network = networkOf(detail.payload, detail.mapping);
    refuseEmpty(network);
    const image = await writeNetwork(tx, network, given);
    await execute(
      tx,
      `update network_imports set state = 'applied', source = :source, attribution = :attribution, applied_at = :now,
              applied_by = :by, undone_at = null, undone_by = null, before_image = cast(:image as jsonb) where id = :id`,
      { ...given, image: JSON.stringify(image) },
    );
    const counts = {
      added: image.addedSegmentIds.length,
      updated: image.segments.length - image.retiredSegmentIds.length,
      retired: image.retiredSegmentIds.length,
    };
    await recordAudit(tx, {
      personId: given.by,
      action: 'setup.roads.apply',
      subjectKind: 'network-import',
      subjectId: given.id,
      detail: { fileName: detail.fileName, source: given.source, ...counts },
    });
    return { id: given.id, ...counts, wasApplied: false };
  });
}

/** An empty import would take every road of its source out of use. */
function refuseEmpty({ segments }: Network): void {
  if (segments.length > 0) return;
  throw new Problem('not-possible-now', {
    reason: 'No road is left of this file: every line is of a class that is left out, or has no length.',
    todo: 'Give at least one class a service class, or choose another file.',
  });
}

async function writeNetwork(tx: Tx, network: Network, given: ApplyNetworkImport): Promise<BeforeImage> {
  const rows = incomingRows(network);
  const keys = rows.map(({ source_key }) => String(source_key));
  const missing = await listMissing({ source: given.source, keys }, tx);
  const retiredSegmentIds = missing.map(({ id }) => id);
  const segments = await imageOf(tx, keys, retiredSegmentIds);
  const addedNodeIds: number[] = [];
  for (const nodes of chunksOf(network.nodes)) addedNodeIds.push(...(await insertNodes(tx, nodes)));
  const addedSegmentIds: number[] = [];
  for (const chunk of chunksOf(rows)) addedSegmentIds.push(...(await upsertSegments(tx, chunk, given)));
  if (retiredSegmentIds.length > 0) {
    await execute(tx, `update segments set retired_at = :now, updated_at = :now where id in (:ids)`, {
      now: given.now,
      ids: retiredSegmentIds,
    });
  }
  return { segments, addedSegmentIds, addedNodeIds, retiredSegmentIds };
}

/** Geometry as the text that PostGIS reads back bit for bit: GeoJSON would round it. */
async function imageOf(tx: Tx, keys: readonly string[], retiredIds: readonly number[]): Promise<unknown[]> {
  const rows = await selectRows<{ image: unknown }>(
    `select to_jsonb(s) || jsonb_build_object('geometry', s.geometry::text) as image from segments s
      where s.source_key in (select jsonb_array_elements_text(cast(:keys as jsonb)))
         or s.id in (select jsonb_array_elements_text(cast(:ids as jsonb))::int)
      order by s.id for update`,
    { keys: JSON.stringify(keys), ids: JSON.stringify(retiredIds) },
    tx,
  );
  return rows.map(({ image }) => image);
}

async function insertNodes(tx: Tx, nodes: Network['nodes']): Promise<number[]> {
  const rows = await selectRows<{ id: number }>(
    `insert into nodes (source_key, position)
     select n.key, st_setsrid(st_makepoint(n.lon, n.lat), 4326)
       from jsonb_to_recordset(cast(:rows as jsonb)) as n (key text, lon double precision, lat double precision)
     on conflict (source_key) do nothing returning id`,
    { rows: JSON.stringify(nodes.map(({ sourceKey, position: [lon, lat] }) => ({ key: sourceKey, lon, lat }))) },
    tx,
  );
  return rows.map(({ id }) => id);
}

const takenOver = [
  'from_node_id',
  'to_node_id',
  'road_class',
  'is_bridge',
  'is_tunnel',
  'speed_km_per_h',
  'is_one_way',
  'length_m',
  'geometry',
  'tags',
  'import_id',
];

/** Returns the ids of rows that were new; of the others `xmax` shows that they were updated. */
async function upsertSegments(tx: Tx, rows: readonly IncomingRow[], given: ApplyNetworkImport): Promise<number[]> {
  const written = await selectRows<{ id: number; isNew: boolean }>(
    `insert into segments as s (source_key, import_id, from_node_id, to_node_id, name, road_class, service_class, lanes,
            width_m, surface, is_bridge, is_tunnel, speed_km_per_h, is_one_way, height_m, length_m, geometry, assumed,
            tags, updated_at)
     select incoming.source_key, :id, f.id, t.id, incoming.name, road_class, service_class, lanes, width_m, surface,
            is_bridge, is_tunnel, speed_km_per_h, is_one_way, height_m, length_m, st_geomfromtext(geometry, 4326),
            assumed, tags, :now
       from ${incomingSql}
       join nodes f on f.source_key = incoming.from_key join nodes t on t.source_key = incoming.to_key
     on conflict (source_key) do update set
            ${takenOver.map((column) => `${column} = excluded.${column}`).join(', ')},
            ${mendedSql}, retired_at = null, updated_at = :now
     returning s.id, (xmax = 0) as "isNew"`,
    { rows: JSON.stringify(rows), id: given.id, now: given.now },
    tx,
  );
  return written.filter(({ isNew }) => isNew).map(({ id }) => id);
}

/** Columns where a value set by hand stays; heights too, where the file has none. */
const mendedSql = [
  ...[
    ['name', 'name'],
    ['service_class', 'serviceClass'],
    ['lanes', 'lanes'],
    ['surface', 'surface'],
  ].map(([column = '', attribute = '']) => `${column} = ${settledSql(column, attribute)}`),
  `width_m = case when 'lanes' = any(s.edited) then s.width_m else incoming.width_m end`,
  `height_m = case when incoming.height_m = 0 then s.height_m else incoming.height_m end`,
  `assumed = array(select unnest(incoming.assumed) except select unnest(s.edited))`,
]
  .join(', ')
  .replaceAll('incoming.', 'excluded.');
