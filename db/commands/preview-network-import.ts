import { type ClassMapping } from '@/lib/geo/assumed';
import { Problem } from '@/lib/problem';
import { findNetworkImport, type ImportPayload, networkOf } from '../queries/network-imports';
import { execute, inTransaction, selectRows, type Tx } from '../transaction';
import { recordAudit } from './audit';
import { findImportForChange, lockNetwork, refuseDiscarded } from './network-import-rules';

export interface PreviewNetworkImport {
  fileName: string;
  sha256: string;
  source: string;
  attribution: string;
  mapping: ClassMapping;
  payload: ImportPayload;
  by: number;
  now: Date;
}

/** Keeps a file's roads beside the network, changing nothing of it. The same file again is the same preview. */
export async function previewNetworkImport(given: PreviewNetworkImport): Promise<{ id: number }> {
  const { report } = networkOf(given.payload, given.mapping);
  return inTransaction(async (tx) => {
    await lockNetwork(tx);
    const id = (await findSamePreview(tx, given)) ?? (await insertPreview(tx, given));
    await execute(
      tx,
      `update network_imports set class_mapping = cast(:mapping as jsonb), report = cast(:report as jsonb),
              payload = cast(:payload as jsonb), attribution = :attribution, file_name = :fileName where id = :id`,
      {
        id,
        mapping: JSON.stringify(given.mapping),
        report: JSON.stringify(report),
        payload: withoutNul(JSON.stringify(given.payload)),
        attribution: given.attribution,
        fileName: given.fileName,
      },
    );
    await recordAudit(tx, {
      personId: given.by,
      action: 'setup.roads.preview',
      subjectKind: 'network-import',
      subjectId: id,
      detail: { fileName: given.fileName, source: given.source, segments: report.segments },
    });
    return { id };
  });
}

/** PostgreSQL's text knows no NUL, which JSON may hold as an escape. */
function withoutNul(json: string): string {
  return json.replace(/(?<!\\)((?:\\\\)*)\\u0000/g, '$1');
}

async function findSamePreview(tx: Tx, { sha256, source, by }: PreviewNetworkImport): Promise<number | undefined> {
  const rows = await selectRows<{ id: number }>(
    `select id from network_imports
      where state = 'previewed' and sha256 = :sha256 and source = :source and created_by = :by limit 1`,
    { sha256, source, by },
    tx,
  );
  return rows[0]?.id;
}

async function insertPreview(tx: Tx, given: PreviewNetworkImport): Promise<number> {
  const rows = await selectRows<{ id: number }>(
    `insert into network_imports (state, file_name, sha256, source, class_mapping, report, payload, created_at, created_by)
     values ('previewed', :fileName, :sha256, :source, '{}', '{}', 'null', :now, :by) returning id`,
    { fileName: given.fileName, sha256: given.sha256, source: given.source, now: given.now, by: given.by },
    tx,
  );
  const id = rows[0]?.id;
  if (id === undefined) throw new Error('The preview was not inserted.');
  return id;
}

/** Other service classes for the classes of the file: the preview is built again, the network is untouched. */
export async function remapNetworkImport(given: { id: number; mapping: ClassMapping }): Promise<{ id: number }> {
  return inTransaction(async (tx) => {
    const row = await findImportForChange(tx, given.id);
    refuseDiscarded(row);
    if (row.state === 'applied') {
      throw new Problem('not-possible-now', {
        reason: 'This import is saved already.',
        todo: 'Undo it first, or change single roads in the list.',
      });
    }
    const detail = await findNetworkImport({ id: given.id }, tx);
    if (!detail?.payload) throw new Problem('not-found', { what: 'import of roads' });
    const { report } = networkOf(detail.payload, given.mapping);
    await execute(
      tx,
      `update network_imports set class_mapping = cast(:mapping as jsonb), report = cast(:report as jsonb) where id = :id`,
      { id: given.id, mapping: JSON.stringify(given.mapping), report: JSON.stringify(report) },
    );
    return { id: given.id };
  });
}

/** Lets a preview go, with the lines it kept. Discarding twice is harmless. */
export async function discardNetworkImport(given: { id: number; by: number }): Promise<{ id: number }> {
  return inTransaction(async (tx) => {
    const row = await findImportForChange(tx, given.id);
    if (row.state === 'discarded') return { id: given.id };
    if (row.state === 'applied') {
      throw new Problem('not-possible-now', { reason: 'This import is saved already.', todo: 'Undo it first.' });
    }
    await execute(tx, `update network_imports set state = 'discarded', payload = 'null' where id = :id`, {
      id: given.id,
    });
    await recordAudit(tx, {
      personId: given.by,
      action: 'setup.roads.discard',
      subjectKind: 'network-import',
      subjectId: given.id,
    });
    return { id: given.id };
  });
}
