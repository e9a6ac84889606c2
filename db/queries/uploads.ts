import { type Mapping } from '@/lib/readings/mapping';
import { selectRows, type Tx } from '../transaction';

export interface UploadRecord {
  id: number;
  stationId: number;
  fileName: string;
  bytes: number;
  source: 'screen' | 'script';
  /** the person, or the hint of the station key */
  sentBy: string;
  startedAt: Date;
  finishedAt: Date;
  rowsRead: number;
  rowsAdded: number;
  rowsFilled: number;
  rowsUnchanged: number;
  rowsRejected: number;
  rowsFlagged: number;
  rowsEmpty: number;
}

const upload = `
  u.id, u.station_id as "stationId", u.file_name as "fileName", u.bytes, u.source,
  coalesce(p.name, 'key …' || k.hint) as "sentBy", u.started_at as "startedAt", u.finished_at as "finishedAt",
  u.rows_read as "rowsRead", u.rows_added as "rowsAdded", u.rows_filled as "rowsFilled",
  u.rows_unchanged as "rowsUnchanged", u.rows_rejected as "rowsRejected", u.rows_flagged as "rowsFlagged",
  u.rows_empty as "rowsEmpty"
  from uploads u left join people p on p.id = u.uploaded_by left join station_keys k on k.id = u.station_key_id`;

export async function listUploads({ stationId, limit }: { stationId: number; limit: number }): Promise<UploadRecord[]> {
  return selectRows<UploadRecord>(
    `select ${upload} where u.station_id = :stationId order by u.started_at desc, u.id desc limit :limit`,
    { stationId, limit },
  );
}

export async function findUpload({ id }: { id: number }): Promise<UploadRecord | null> {
  const [row] = await selectRows<UploadRecord>(`select ${upload} where u.id = :id`, { id });
  return row ?? null;
}

/** An earlier upload of the same bytes, read in the same way. */
export async function findSameUpload(
  { stationId, sha256, mapping }: { stationId: number; sha256: string; mapping: Mapping },
  tx: Tx,
): Promise<{ id: number; finishedAt: Date } | null> {
  const [row] = await selectRows<{ id: number; finishedAt: Date }>(
    `select id, finished_at as "finishedAt" from uploads
      where station_id = :stationId and sha256 = :sha256 and mapping = cast(:mapping as jsonb)
      order by id limit 1`,
    { stationId, sha256, mapping: JSON.stringify(mapping) },
    tx,
  );
  return row ?? null;
}

export interface RejectRecord {
  line: number;
  columnName: string;
  reason: string;
  raw: string;
}

/** Rejected rows in the order of the file, after the one given: read on from the last of a page. */
export async function listRejects(
  given: { uploadId: number; after?: Pick<RejectRecord, 'line' | 'columnName'> | undefined; limit: number },
  tx?: Tx,
): Promise<RejectRecord[]> {
  const { uploadId, after, limit } = given;
  return selectRows<RejectRecord>(
    `select line, column_name as "columnName", reason, raw from upload_rejects
      where upload_id = :uploadId and (line, column_name) > (:line, :columnName)
      order by line, column_name limit :limit`,
    { uploadId, line: after?.line ?? -1, columnName: after?.columnName ?? '', limit },
    tx,
  );
}
