import { Problem } from '@/lib/problem';
import { execute, inTransaction, selectRows, type Tx } from '../transaction';
import { type BeforeImage } from './apply-network-import';
import { recordAudit } from './audit';
import { findImportForChange, type ImportRow, lockNetwork } from './network-import-rules';

export interface UndoneNetworkImport {
  id: number;
  removed: number;
  restored: number;
  /** Roads that plans, runs or routes refer to: out of use, but not removed. */
  kept: number;
  wasUndone: boolean;
}

/**
 * Puts the network back as it was before an import was saved: changed and retired roads get every value back, new ones are
 * removed, except those that something refers to by now, which are retired. Undoing twice is harmless.
 */
export async function undoNetworkImport(given: { id: number; by: number; now: Date }): Promise<UndoneNetworkImport> {
  return inTransaction(async (tx) => {
    await lockNetwork(tx);
    const row = await findImportForChange(tx, given.id);
    if (row.state === 'undone') return { id: given.id, removed: 0, restored: 0, kept: 0, wasUndone: true };
    if (row.state !== 'applied') {
      throw new Problem('not-possible-now', {
        reason: 'This import is not saved, so there is nothing to undo.',
        todo: 'Discard it instead.',
      });
    }
    const image = await findImage(tx, given.id);
    await refuseWhenBuiltUpon(tx, row, image);
    await restore(tx, image.segments);
    const { removed, kept } = await remove(tx, image.addedSegmentIds, given.now);
    await removeNodes(tx, image.addedNodeIds);
    await execute(
      tx,
      `update network_imports set state = 'undone', undone_at = :now, undone_by = :by, before_image = null where id = :id`,
      given,
    );
    const counts = { removed, kept, restored: image.segments.length };
    await recordAudit(tx, {
      personId: given.by,
      action: 'setup.roads.undo',
      subjectKind: 'network-import',
      subjectId: given.id,
      detail: counts,
    });
    return { id: given.id, ...counts, wasUndone: false };
  });
}

async function findImage(tx: Tx, id: number): Promise<BeforeImage> {
  const rows = await selectRows<{ image: BeforeImage | null }>(
    `select before_image as image from network_imports where id = :id`,
    { id },
    tx,
  );
  return rows[0]?.image ?? { segments: [], addedSegmentIds: [], addedNodeIds: [], retiredSegmentIds: [] };
}

/** A later import that changed the same roads stands on this one, and has to be taken back first. */
async function refuseWhenBuiltUpon(tx: Tx, row: ImportRow, image: BeforeImage): Promise<void> {
  const rows = await selectRows<{ fileName: string }>(
    `select file_name as "fileName" from network_imports later
      where later.state = 'applied' and later.id <> :id and later.applied_at >= :appliedAt
        and (later.source = :source or exists (
          select 1 from segments s where s.import_id = later.id
             and s.id in (select jsonb_array_elements_text(cast(:ids as jsonb))::int)))
      order by later.applied_at desc limit 1`,
    {
      id: row.id,
      appliedAt: row.appliedAt,
      source: row.source,
      ids: JSON.stringify([...image.addedSegmentIds, ...image.segments.flatMap(idOf)]),
    },
    tx,
  );
  const later = rows[0];
  if (!later) return;
  throw new Problem('not-possible-now', {
    reason: `“${later.fileName}” was saved after this import and changed the same roads.`,
    todo: 'Undo that one first.',
  });
}

function idOf(image: unknown): number[] {
  return typeof image === 'object' && image !== null && 'id' in image ? [Number(image.id)] : [];
}

/** Every column that the image holds, so that columns added since keep what they have. */
async function restore(tx: Tx, segments: readonly unknown[]): Promise<void> {
  const [first] = segments;
  if (typeof first !== 'object' || first === null) return;
  const present = await selectRows<{ name: string }>(
    `select column_name as name from information_schema.columns
      where table_schema = current_schema() and table_name = 'segments' and column_name <> 'id'`,
    {},
    tx,
  );
  const columns = present.map(({ name }) => name).filter((name) => Object.hasOwn(first, name));
  await execute(
    tx,
    `update segments s set ${columns.map((name) => `"${name}" = before."${name}"`).join(', ')}
       from jsonb_populate_recordset(null::segments, cast(:rows as jsonb)) as before where s.id = before.id`,
    { rows: JSON.stringify(segments) },
  );
}

/** Tables that refer to a segment are asked of the catalogue: later ones count without a change here. */
async function remove(tx: Tx, ids: readonly number[], now: Date): Promise<{ removed: number; kept: number }> {
  if (ids.length === 0) return { removed: 0, kept: 0 };
  const references = await selectRows<{ tableName: string; columnName: string }>(
    `select c.conrelid::regclass::text as "tableName", a.attname as "columnName"
       from pg_constraint c join pg_attribute a on a.attrelid = c.conrelid and a.attnum = c.conkey[1]
      where c.contype = 'f' and c.confrelid = 'segments'::regclass and c.conparentid = 0`,
    {},
    tx,
  );
  const isUnused = references
    .map(({ tableName, columnName }) => `and not exists (select 1 from ${tableName} r where r."${columnName}" = s.id)`)
    .join(' ');
  const list = JSON.stringify(ids);
  const among = `s.id in (select jsonb_array_elements_text(cast(:list as jsonb))::int)`;
  const removed = await selectRows<{ id: number }>(
    `delete from segments s where ${among} ${isUnused} returning s.id`,
    { list },
    tx,
  );
  await execute(tx, `update segments s set retired_at = :now, updated_at = :now where ${among}`, { list, now });
  return { removed: removed.length, kept: ids.length - removed.length };
}

async function removeNodes(tx: Tx, ids: readonly number[]): Promise<void> {
  await execute(
    tx,
    `delete from nodes n where n.id in (select jsonb_array_elements_text(cast(:list as jsonb))::int)
        and not exists (select 1 from segments s where s.from_node_id = n.id)
        and not exists (select 1 from segments s where s.to_node_id = n.id)`,
    { list: JSON.stringify(ids) },
  );
}
