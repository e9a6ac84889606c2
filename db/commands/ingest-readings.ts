import { Problem } from '@/lib/problem';
import { type Mapping } from '@/lib/readings/mapping';
import { openTransaction } from '../connection';
import { openCopy } from '../copy';
import { hasAnyReading } from '../queries/readings';
import { findStation } from '../queries/stations';
import { findSameUpload, listRejects, type RejectRecord } from '../queries/uploads';
import { execute, inTransaction, selectRows, type Tx } from '../transaction';
import { recordAudit } from './audit';
import { incomingTable, mergeReadings } from './merge-readings';
import { UploadReader } from './read-upload';

export interface IngestReadings {
  stationId: number;
  fileName: string;
  /** the file's bytes as they come; throws when they break off */
  body: AsyncIterable<Uint8Array>;
  mapping: Mapping;
  from: { source: 'screen'; personId: number | null } | { source: 'script'; stationKeyId: number };
  now: Date;
  onProgress?: ((progress: { kind: 'reading' | 'storing'; rows: number; bytes: number }) => void) | undefined;
  /** aborted by a sender who has gone or thought better of it: nothing stays */
  signal?: AbortSignal;
}

export interface IngestedReadings {
  uploadId: number;
  /** the same file was read in the same way before: nothing was changed now */
  alreadyReadAt: Date | null;
  rowsRead: number;
  rowsAdded: number;
  rowsFilled: number;
  rowsUnchanged: number;
  rowsRejected: number;
  rowsFlagged: number;
  rowsEmpty: number;
  firstRejects: RejectRecord[];
}

const FIRST_REJECTS = 5;
const nothingCounted = {
  rowsAdded: 0,
  rowsFilled: 0,
  rowsUnchanged: 0,
  rowsRejected: 0,
  rowsFlagged: 0,
  rowsEmpty: 0,
  firstRejects: [],
};

/**
 * Reads a file of readings into the database, in one transaction and in constant memory: the bytes are decoded, parted,
 * understood and checked as they come and go out by one COPY into a temporary table, good rows and bad; only then are
 * the good ones merged and the bad ones kept. Whatever breaks off before the end leaves nothing.
 */
export async function ingestReadings(given: IngestReadings): Promise<IngestedReadings> {
  // Not in the transaction: having looked at the readings, it would keep `makeMonths` waiting for its own end.
  const hasReadings = await hasAnyReading({ stationId: given.stationId });
  return inTransaction(async (tx) => {
    if (!(await findStation({ id: given.stationId }, tx))) throw new Problem('not-found', { what: 'station' });
    // The sender sets the pace, not the database: a slow line is no slow query.
    await execute(tx, 'set local statement_timeout = 0');
    await execute(tx, incomingTable(given.mapping));
    const reader = new UploadReader(given.mapping, { nowMs: given.now.getTime(), hasReadings });
    await copyIncoming(tx, reader, given);
    const { sha256, tally } = reader;
    given.onProgress?.({ kind: 'storing', rows: tally.rowsRead, bytes: tally.bytes });
    await makeMonths(tally.months);
    await selectRows(
      `select pg_advisory_xact_lock(hashtext('readings-upload'), :stationId)`,
      { stationId: given.stationId },
      tx,
    );
    const same = await findSameUpload({ ...given, sha256 }, tx);
    if (same) {
      return { uploadId: same.id, alreadyReadAt: same.finishedAt, rowsRead: tally.rowsRead, ...nothingCounted };
    }
    const stored = await store(tx, { given, sha256, tally });
    refuseStopped(given.signal);
    return stored;
  });
}

function refuseStopped(signal: AbortSignal | undefined): void {
  if (!signal?.aborted) return;
  throw new Problem('unreadable-file', {
    reason: 'The upload was stopped.',
    todo: 'Send the file again when you want it read.',
  });
}

async function copyIncoming(tx: Tx, reader: UploadReader, { body, onProgress, signal }: IngestReadings): Promise<void> {
  const sink = openCopy(tx, 'copy incoming from stdin (format binary)');
  try {
    for await (const piece of body) {
      refuseStopped(signal);
      const rows = reader.push(piece);
      if (rows) await sink.write(rows);
      onProgress?.({ kind: 'reading', rows: reader.tally.rowsRead, bytes: reader.tally.bytes });
    }
    await sink.write(reader.finish());
    await sink.finish();
  } catch (error) {
    await sink.abort();
    throw error;
  }
}

/**
 * In a transaction of its own: making a partition locks the whole table for its moment, and the upload's transaction
 * would hold that lock to its end. An empty month left by an upload that fails afterwards harms nobody.
 */
function makeMonths(months: ReadonlySet<number>): Promise<void> {
  return openTransaction.exit(() =>
    inTransaction(async (tx) => {
      for (const month of [...months].sort((a, b) => a - b)) {
        await execute(tx, 'select ensure_readings_partition(:month)', { month: new Date(month) });
      }
    }),
  );
}

interface Storing {
  given: IngestReadings;
  sha256: string;
  tally: UploadReader['tally'];
}

async function store(tx: Tx, { given, sha256, tally }: Storing): Promise<IngestedReadings> {
  const { stationId, mapping } = given;
  const uploadId = await openUpload(tx, { given, sha256, tally });
  const { readings, isStrictlyOrdered } = tally;
  const merged = await mergeReadings(tx, { stationId, uploadId, mapping, readings, isStrictlyOrdered });
  const counts = {
    rowsRead: tally.rowsRead,
    rowsAdded: merged.added,
    rowsFilled: merged.filled,
    rowsUnchanged: merged.unchanged,
    rowsRejected: await countRejected(tx, uploadId),
    rowsFlagged: tally.rowsFlagged,
    rowsEmpty: tally.rowsEmpty,
  };
  await execute(
    tx,
    `update uploads set finished_at = clock_timestamp(), rows_added = :rowsAdded, rows_filled = :rowsFilled,
            rows_unchanged = :rowsUnchanged, rows_rejected = :rowsRejected where id = :uploadId`,
    { uploadId, ...counts },
  );
  await recordAudit(tx, {
    personId: given.from.source === 'screen' ? given.from.personId : null,
    action: 'readings.import',
    subjectKind: 'upload',
    subjectId: uploadId,
    detail: { stationId, fileName: given.fileName, sha256, ...counts, ...given.from },
  });
  const firstRejects = await listRejects({ uploadId, limit: FIRST_REJECTS }, tx);
  return { uploadId, alreadyReadAt: null, ...counts, firstRejects };
}

async function openUpload(tx: Tx, { given, sha256, tally }: Storing): Promise<number> {
  const { from } = given;
  const [row] = await selectRows<{ id: number }>(
    `insert into uploads (station_id, file_name, sha256, bytes, mapping, source, uploaded_by, station_key_id, started_at,
            finished_at, rows_read, rows_added, rows_filled, rows_unchanged, rows_rejected, rows_flagged, rows_empty)
     values (:stationId, :fileName, :sha256, :bytes, cast(:mapping as jsonb), :source, :personId, :stationKeyId, :now,
            :now, :rowsRead, 0, 0, 0, 0, :rowsFlagged, :rowsEmpty)
     returning id`,
    {
      stationId: given.stationId,
      fileName: given.fileName,
      now: given.now,
      source: from.source,
      personId: from.source === 'screen' ? from.personId : null,
      stationKeyId: from.source === 'script' ? from.stationKeyId : null,
      mapping: JSON.stringify(given.mapping),
      sha256,
      bytes: tally.bytes,
      rowsRead: tally.rowsRead,
      rowsFlagged: tally.rowsFlagged,
      rowsEmpty: tally.rowsEmpty,
    },
    tx,
  );
  return row?.id ?? 0;
}

async function countRejected(tx: Tx, uploadId: number): Promise<number> {
  const [row] = await selectRows<{ count: number }>(
    'select count(distinct line)::int as count from upload_rejects where upload_id = :uploadId',
    { uploadId },
    tx,
  );
  return row?.count ?? 0;
}
