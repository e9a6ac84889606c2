import { type FinishRunInput, type Recorded } from '@/lib/contracts/runs';
import { Problem } from '@/lib/problem';
import { database } from '../connection';
import { inTransaction } from '../transaction';
import { recordAudit } from './audit';

interface FinishRun {
  input: FinishRunInput;
  by: number;
  now: Date;
}

/** A run ends. Finishing it again changes nothing, the first time stands. */
export async function finishRun({ input, by, now }: FinishRun): Promise<Recorded> {
  return inTransaction(async (tx) => {
    // Locked so that two finishes at once cannot both write.
    const run = await database().models.Run.findByPk(input.runId, { transaction: tx, lock: tx.LOCK.UPDATE });
    if (!run) throw new Problem('not-found', { what: 'run' });
    if (run.finishedAt) return { id: input.runId, result: 'already-recorded' };
    // A tablet whose clock runs behind may report an end before the start; the server's time then stands.
    const finishedAt = input.finishedAt < run.startedAt ? now : input.finishedAt;
    await run.update({ finishedAt }, { transaction: tx });
    await recordAudit(tx, { personId: by, action: 'run.finish', subjectKind: 'run', subjectId: input.runId });
    return { id: input.runId, result: 'recorded' };
  });
}
