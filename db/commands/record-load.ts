import { type LoadInput, type Recorded } from '@/lib/contracts/runs';
import { Problem } from '@/lib/problem';
import { findRun } from '../queries/runs';
import { inTransaction, selectRows } from '../transaction';
import { recordAudit } from './audit';

interface RecordLoad {
  load: LoadInput;
  by: number;
  now: Date;
}

/** A load taken at a yard. Sent twice, it is recorded once. */
export async function recordLoad({ load, by, now }: RecordLoad): Promise<Recorded> {
  return inTransaction(async (tx) => {
    if (!(await findRun({ id: load.runId }, tx))) throw new Problem('not-found', { what: 'run' });
    const inserted = await selectRows<{ id: string }>(
      `insert into loads (id, run_id, yard_id, material_id, mass_kg, loaded_at, recorded_at, recorded_by)
       values (:id, :runId, :yardId, :materialId, :massKg, :loadedAt, :now, :by)
       on conflict (id) do nothing returning id`,
      { ...load, now, by },
      tx,
    );
    if (inserted.length === 0) {
      const same = await selectRows<{ id: string }>(
        'select id from loads where id = :id and run_id = :runId and mass_kg = :massKg and material_id = :materialId',
        { ...load },
        tx,
      );
      if (same.length === 0) throw new Problem('already-exists', { what: 'a load with this id and another content' });
      return { id: load.id, result: 'already-recorded' };
    }
    await recordAudit(tx, {
      personId: by,
      action: 'load.record',
      subjectKind: 'load',
      subjectId: load.id,
      detail: { runId: load.runId, materialId: load.materialId, massKg: load.massKg },
    });
    return { id: load.id, result: 'recorded' };
  });
}
