import { Problem } from '@/lib/problem';
import { execute, selectRows, type Tx } from '../transaction';

export interface ImportRow {
  id: number;
  state: 'previewed' | 'applied' | 'undone' | 'discarded';
  source: string;
  appliedAt: Date | null;
}

/**
 * One change of the network at a time: two imports side by side would each compare with a state that the other is
 * changing. Held until the transaction ends.
 */
export async function lockNetwork(tx: Tx): Promise<void> {
  await execute(tx, `select pg_advisory_xact_lock(hashtext('rimewright network'))`);
}

export async function findImportForChange(tx: Tx, id: number): Promise<ImportRow> {
  const rows = await selectRows<ImportRow>(
    `select id, state, source, applied_at as "appliedAt" from network_imports where id = :id for update`,
    { id },
    tx,
  );
  const row = rows[0];
  if (!row) throw new Problem('not-found', { what: 'import of roads' });
  return row;
}

export function refuseDiscarded({ state }: ImportRow): void {
  if (state !== 'discarded') return;
  throw new Problem('not-possible-now', {
    reason: 'This import was discarded.',
    todo: 'Choose the file again.',
  });
}
