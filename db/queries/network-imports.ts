import { buildNetwork } from '@/lib/geo/build-network';
import { type ClassMapping } from '@/lib/geo/assumed';
import { type Bounds } from '@/lib/geo/position';
import { type Network, type NetworkReport, type NetworkWarning, type SourceLine } from '@/lib/geo/network';
import { selectRows, type Tx } from '../transaction';

export type ImportState = 'previewed' | 'applied' | 'undone' | 'discarded';

export interface NetworkImportRecord {
  id: number;
  state: ImportState;
  fileName: string;
  source: string;
  attribution: string;
  segments: number;
  lengthKm: number;
  createdAt: Date;
  createdByName: string;
  appliedAt: Date | null;
  appliedByName: string | null;
  undoneAt: Date | null;
  undoneByName: string | null;
}

/** The lines of the file, kept so that classes can be mapped anew and saving needs no second upload. */
export interface ImportPayload {
  lines: readonly SourceLine[];
  skipped: Readonly<Record<string, number>>;
  warnings: readonly NetworkWarning[];
}

export interface NetworkImportDetail extends NetworkImportRecord {
  mapping: ClassMapping;
  report: NetworkReport;
  /** null once discarded */
  payload: ImportPayload | null;
}

const columns = `
  i.id, i.state, i.file_name as "fileName", i.source, i.attribution,
  coalesce((i.report->>'segments')::int, 0) as segments, coalesce((i.report->>'lengthKm')::float8, 0) as "lengthKm",
  i.created_at as "createdAt", coalesce(c.name, 'someone') as "createdByName",
  i.applied_at as "appliedAt", a.name as "appliedByName", i.undone_at as "undoneAt", u.name as "undoneByName"`;
const tables = `
  network_imports i left join people c on c.id = i.created_by
  left join people a on a.id = i.applied_by left join people u on u.id = i.undone_by`;

/** Imports of the network, the newest first; previews that were discarded are left out. */
export async function listNetworkImports(): Promise<NetworkImportRecord[]> {
  return selectRows<NetworkImportRecord>(
    `select ${columns} from ${tables} where i.state <> 'discarded' order by i.id desc limit 100`,
  );
}

export async function findNetworkImport({ id }: { id: number }, tx?: Tx): Promise<NetworkImportDetail | null> {
  const rows = await selectRows<NetworkImportDetail>(
    `select ${columns}, i.class_mapping as mapping, i.report, nullif(i.payload, 'null') as payload
       from ${tables} where i.id = :id`,
    { id },
    tx,
  );
  return rows[0] ?? null;
}

/** How classes were mapped when a file of this source was last saved. */
export async function findLastMapping({ source }: { source: string }): Promise<ClassMapping> {
  const rows = await selectRows<{ mapping: ClassMapping }>(
    `select class_mapping as mapping from network_imports
      where source = :source and applied_at is not null order by applied_at desc limit 1`,
    { source },
  );
  return rows[0]?.mapping ?? {};
}

/** Whose data the roads in use are: the notices given when they were imported. */
export async function listNetworkAttributions(): Promise<string[]> {
  const rows = await selectRows<{ attribution: string }>(
    `select distinct i.attribution from network_imports i
      where i.attribution <> '' and exists
        (select 1 from segments s where s.import_id = i.id and s.retired_at is null)
      order by i.attribution`,
  );
  return rows.map(({ attribution }) => attribution);
}

/** The same lines and mapping always give the same network, so it is built anew rather than stored twice. */
export function networkOf(payload: ImportPayload, mapping: ClassMapping): Network {
  return buildNetwork(payload.lines, { mapping, skipped: payload.skipped, warnings: payload.warnings });
}

/** The box around the roads in use, or null while there are none. */
export async function findNetworkBounds(): Promise<Bounds | null> {
  const rows = await selectRows<{ west: number | null; south: number; east: number; north: number }>(
    `select st_xmin(box) as west, st_ymin(box) as south, st_xmax(box) as east, st_ymax(box) as north
       from (select st_extent(geometry) as box from segments where retired_at is null) as extent`,
  );
  const row = rows[0];
  return row && row.west !== null ? [row.west, row.south, row.east, row.north] : null;
}
